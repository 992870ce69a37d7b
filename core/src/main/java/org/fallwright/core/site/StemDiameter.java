package org.fallwright.core.site;

import org.fallwright.core.units.Range;

/**
 * A stem diameter measured on the tree.
 *
 * @param heightM height above the ground [m]
 * @param diameterM diameter over bark [m]
 */
public record StemDiameter(double heightM, double diameterM) {
  public StemDiameter {
    Range.check("height_m", heightM, 0, 130, "m");
    Range.check("diameter_m", diameterM, 0.01, 6, "m");
  }
}
