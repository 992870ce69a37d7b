package org.fallwright.maps.picture;

import org.fallwright.core.site.Position;
import org.fallwright.core.units.Range;

/**
 * A point seen in a picture whose place on the site's plane is known.
 *
 * @param x pixels from the picture's left edge
 * @param y pixels from its upper edge
 * @param at its place
 */
public record ControlPoint(double x, double y, Position at) {
  /** Farthest pixel that is taken. */
  public static final double FARTHEST = 1_000_000;

  public ControlPoint {
    Range.check("x of a control point", x, -FARTHEST, FARTHEST, "pixels");
    Range.check("y of a control point", y, -FARTHEST, FARTHEST, "pixels");
    Range.present("place of a control point", at);
  }
}
