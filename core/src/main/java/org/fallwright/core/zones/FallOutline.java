package org.fallwright.core.zones;

import org.fallwright.core.reference.Allowances;
import org.fallwright.core.units.Range;

/**
 * What of a tree decides the ground that it covers when it falls.
 *
 * @param heightM height above the ground [m]
 * @param crownBaseM height of the crown's base above the ground [m]
 * @param crownRadiusM radius of the crown [m]
 * @param stumpDiameterM stem diameter at the cut [m]
 * @param leanDeg lean of the stem axis from the vertical [degrees]
 * @param leanAzimuthDeg direction that the tree leans towards [degrees]
 */
public record FallOutline(
    double heightM,
    double crownBaseM,
    double crownRadiusM,
    double stumpDiameterM,
    double leanDeg,
    double leanAzimuthDeg) {
  /** Margin beyond the tip, share of the height: planning allowance. */
  static final double TIP_SHARE = Allowances.TIP_SHARE.value();

  /** Least margin beyond the tip [m]: planning allowance. */
  static final double TIP_LEAST_M = Allowances.TIP_LEAST.value();

  /** Ground behind the stump for the butt, share of the height: planning allowance. */
  static final double BUTT_SHARE = Allowances.BUTT_SHARE.value();

  /** Least ground behind the stump for the butt [m]: planning allowance. */
  static final double BUTT_LEAST_M = Allowances.BUTT_LEAST.value();

  public FallOutline {
    Range.check("height_m", heightM, 2, 120, "m");
    Range.check("crown_base_m", crownBaseM, 0, heightM, "m");
    Range.check("crown_radius_m", crownRadiusM, 0.1, 40, "m");
    Range.check("stump_diameter_m", stumpDiameterM, 0.05, 6, "m");
    Range.check("lean_deg", leanDeg, 0, 45, "degrees");
    Range.check("lean_azimuth_deg", leanAzimuthDeg, -360, 720, "degrees");
  }

  /** Height with the tip margin, H + max(0.1 H, 3 m) [m]. */
  public double reachM() {
    return reachM(heightM);
  }

  /** Length that the butt can slide or kick behind the stump, max(0.1 H, 2 m) [m]. */
  public double buttM() {
    return Math.max(BUTT_SHARE * heightM, BUTT_LEAST_M);
  }

  static double reachM(double heightM) {
    return heightM + Math.max(TIP_SHARE * heightM, TIP_LEAST_M);
  }

  /** Tangent of the side lean seen along the lay, positive to the lay's right. */
  double sideLean(double layDeg) {
    return Math.tan(Math.toRadians(leanDeg)) * Math.sin(Math.toRadians(leanAzimuthDeg - layDeg));
  }
}
