package org.fallwright.core.tree.field;

import org.fallwright.core.units.Range;

/**
 * The lean as it looks from one side: the angle between the stem and a plumb line held up against
 * it.
 *
 * @param azimuthDeg direction the viewer looks in [degrees from true north]
 * @param toTheRight how far the stem goes off the plumb line, to the viewer's right positive; from
 *     the vertical, in degrees or in per cent of the height
 */
public record SideView(double azimuthDeg, Reading toTheRight) {
  public SideView {
    Range.check("azimuth_deg", azimuthDeg, 0, 360, "degrees");
    Range.present("to_the_right", toTheRight);
  }
}
