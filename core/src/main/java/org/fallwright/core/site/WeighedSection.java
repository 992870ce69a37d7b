package org.fallwright.core.site;

import org.fallwright.core.units.Range;

/**
 * A piece of the tree above the cut whose mass was weighed or counted.
 *
 * @param massKg green mass [kg]
 * @param midHeightM height of its middle above the ground as it stands [m]
 */
public record WeighedSection(double massKg, double midHeightM) {
  public WeighedSection {
    Range.check("mass_kg", massKg, 0.1, 500_000, "kg");
    Range.check("mid_height_m", midHeightM, 0, 120, "m");
  }
}
