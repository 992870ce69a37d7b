package org.fallwright.core.site;

import org.fallwright.core.units.Range;

/**
 * A figure that somebody vouches for in place of the catalogue's.
 *
 * @param value the figure; the field that holds it sets its range
 * @param why who says so, or where it stands
 */
public record Stated(double value, String why) {
  public Stated {
    Range.check("value", value, 0, 1, "");
    Range.text("why", why);
  }

  /** This figure, if it lies in the range of the field that holds it. */
  Stated within(String field, double least, double most) {
    Range.check(field + ".value", value, least, most, "");
    return this;
  }
}
