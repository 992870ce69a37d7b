package org.fallwright.core.anchor;

import org.fallwright.core.reference.Allowances;
import org.fallwright.core.tree.StemVolume;
import org.fallwright.core.units.Range;

/**
 * What the species and soil tables say of a tree or stump used as an anchor; all help, so all are
 * to be taken low.
 *
 * @param morPa mean green modulus of rupture [Pa]
 * @param morCv its coefficient of variation
 * @param greenDensity green density of the stem [kg/m³]
 * @param rootPlateNmPerKg overturning moment of the root plate per kilogram of stem [N·m/kg]
 * @param stemForm which volume equation serves for it
 */
public record WoodFigures(
    double morPa, double morCv, double greenDensity, double rootPlateNmPerKg, StemVolume stemForm) {
  /**
   * Lowest overturning moment per kilogram of stem that was read, western hemlock [N·m/kg]; for
   * species without pulling tests. Published: Byrne 2005, critical turning moments of BC conifers.
   */
  public static final double LOWEST_ROOT_PLATE = Allowances.ROOT_PLATE_LEAST.value();

  public WoodFigures {
    Range.check("mor_Pa", morPa, 5e6, 2e8, "Pa");
    Range.check("mor_cv", morCv, 0, 0.5, "");
    Range.check("green_density", greenDensity, 200, 1500, "kg/m³");
    Range.check("root_plate_Nm_per_kg", rootPlateNmPerKg, 10, 400, "N·m/kg");
    Range.present("stem_form", stemForm);
  }
}
