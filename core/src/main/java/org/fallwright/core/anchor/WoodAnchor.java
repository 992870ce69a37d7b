package org.fallwright.core.anchor;

import org.fallwright.core.reference.Allowances;
import org.fallwright.core.units.Range;

/**
 * The tension that a standing tree's root plate and stem hold at a sling.
 *
 * <p>Root plate: M_a = C·m, with C the overturning moment per kilogram of green stem [N·m/kg] and m
 * the stem's mass [kg]; saturated ground takes half of it off, a pull that runs steeply downhill a
 * quarter. Arm: z_e = max(z + 0.5 m, 1.0 m), z the sling's height above the ground [m]: the plate
 * turns about a point below the ground, and a sling at the ground must not hold without end. Stem:
 * σ·π·d³/32 over the same arm, σ the 5th percentile of the green modulus of rupture, d = 0.94·DBH
 * inside the bark. Leaves out the tree's own lean and wind, and the help of an uplifting line.
 *
 * <p>Sources: moment proportional to stem mass, Nicoll et al. 2006 and Byrne 2005 (published); arm,
 * soil and downhill factors and the bark share are planning allowances.
 *
 * @param rootPlateN what the root plate holds [N]
 * @param stemN what the stem holds in bending [N]
 */
public record WoodAnchor(double rootPlateN, double stemN) {
  /** Depth of the turning point below the ground [m]; planning allowance. */
  static final double TURNING_DEPTH_M = Allowances.SLING_ARM_RISE.value();

  /** Least arm [m]; planning allowance. */
  static final double LEAST_ARM_M = Allowances.SLING_ARM_LEAST.value();

  /** What saturated ground leaves of the root plate; planning allowance. */
  static final double SATURATED = Allowances.SATURATED.value();

  /** What a steep downhill pull leaves of the root plate; planning allowance. */
  static final double DOWNHILL = Allowances.DOWNHILL.value();

  /** Stem diameter inside the bark over that outside; planning allowance. */
  static final double INSIDE_BARK = Allowances.BARK_RATIO.value();

  /** Standard deviations between a mean and its 5th percentile. */
  static final double FIFTH = Allowances.PERCENTILE_SDS.value();

  /**
   * The two strengths.
   *
   * @param stemMassKg green mass of the stem [kg]
   * @param wood figures of its species and soil
   * @param dbhM diameter over bark at 1.3 m [m]
   * @param slingM height of the sling above the ground [m]
   * @param saturated whether the ground is saturated
   * @param downhill whether the load pulls steeply downwards
   */
  public static WoodAnchor of(
      double stemMassKg,
      WoodFigures wood,
      double dbhM,
      double slingM,
      boolean saturated,
      boolean downhill) {
    Range.check("stem_mass_kg", stemMassKg, 0.1, 200_000, "kg");
    double arm = armM(slingM);
    double moment =
        rootPlateNm(wood.rootPlateNmPerKg(), stemMassKg)
            * (saturated ? SATURATED : 1)
            * (downhill ? DOWNHILL : 1);
    double sigma = wood.morPa() * (1 - FIFTH * wood.morCv());
    return new WoodAnchor(moment / arm, stemNm(sigma, INSIDE_BARK * dbhM) / arm);
  }

  /** Overturning moment of a root plate [N·m] from C [N·m/kg] and the stem's mass [kg]. */
  public static double rootPlateNm(double nmPerKg, double stemMassKg) {
    return nmPerKg * stemMassKg;
  }

  /** Bending moment that a round stem of diameter d [m] holds at a stress [Pa], in N·m. */
  public static double stemNm(double stressPa, double diameterM) {
    return stressPa * Math.PI * Math.pow(diameterM, 3) / 32;
  }

  /** Arm of a sling at a height above the ground [m]. */
  public static double armM(double slingM) {
    Range.check("sling_height_m", slingM, 0, 10, "m");
    return Math.max(slingM + TURNING_DEPTH_M, LEAST_ARM_M);
  }

  /**
   * Overturning moment that a gentle pulling test points to [N·m]: 2.5 times the moment at 0.25
   * degrees of base tilt. Published: Forests 14(3):533, 2023. A proof pull can be set against it.
   */
  public static double fromQuarterDegreeNm(double momentNm) {
    return 2.5 * Range.check("moment_Nm", momentNm, 0, 1e8, "N·m");
  }
}
