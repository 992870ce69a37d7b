package org.fallwright.core.statics;

import org.fallwright.core.reference.Allowances;

/**
 * Moment of the wind on the crown about the hinge.
 *
 * <p>M = ½·ρ·C_d·A·V²·w_c with C_d = C·V^(−N), V taken not below 10 m/s in C_d (crowns streamline
 * only above that; the power fits start there, Mayhead 1973). Against the lay: the component that
 * pushes the tree back, never negative. Aside: the size of the component across the lay. Where the
 * direction is not known, all of it counts in each. A gust below 2 m/s counts as 2 m/s (planning
 * allowance). Left out: sheltering, swaying.
 *
 * @param againstNm against the lay [N·m]
 * @param asideNm across the lay, without sign [N·m]
 */
public record WindMoment(double againstNm, double asideNm) {
  /** Least gust reckoned with [m/s]; planning allowance. */
  public static final double LEAST_GUST = Allowances.GUST_LEAST.value();

  /** Speed below which the drag coefficient stays constant [m/s]; start of the published fits. */
  public static final double CLAMP = Allowances.WIND_CLAMP.value();

  public static WindMoment of(Wind wind, double gustMps, double dragFactor, double layDeg) {
    double v = Math.max(LEAST_GUST, gustMps);
    double cd = wind.dragC() * Math.pow(Math.max(CLAMP, v), -wind.dragN());
    double m = 0.5 * wind.airDensity() * cd * wind.areaM2() * v * v * wind.heightM() * dragFactor;
    if (wind.towardDeg() == null) {
      return new WindMoment(m, m);
    }
    double turn = Math.toRadians(wind.towardDeg() - layDeg);
    return new WindMoment(Math.max(0, -m * Math.cos(turn)), Math.abs(m * Math.sin(turn)));
  }
}
