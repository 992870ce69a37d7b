package org.fallwright.core.site;

import org.fallwright.core.units.Range;

/**
 * An area that the fallen tree must lie inside.
 *
 * @param id its name on the plan
 * @param shape its outline, a polygon
 */
public record DropZone(String id, Shape.Polygon shape) {
  public DropZone {
    Range.text("id", id);
    Range.present("shape", shape);
  }
}
