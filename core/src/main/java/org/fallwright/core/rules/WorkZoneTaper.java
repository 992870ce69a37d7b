package org.fallwright.core.rules;

import org.fallwright.core.units.Range;

/**
 * Length of the taper of cones that closes a lane or a shoulder before a felling beside a road: to
 * 40 mph L = W·S²/60, from 45 mph L = W·S, W the width closed in feet, S the speed in mph; between
 * them the longer of the two. A lane that only shifts asks half of it, a shoulder a third.
 *
 * <p>Source: California MUTCD 2012, Table 6H-4 and its note. Other places have tables of their own.
 */
public final class WorkZoneTaper {
  private static final double FT = 0.3048;
  private static final double MPH = 0.44704;

  private WorkZoneTaper() {}

  /**
   * Length of a taper that closes a lane [m].
   *
   * @param widthM width closed [m]
   * @param speedMps speed allowed on the road before the work [m/s]
   */
  public static double mergingM(double widthM, double speedMps) {
    Range.check("width_m", widthM, 0.1, 30, "m");
    Range.check("speed_mps", speedMps, 1, 60, "m/s");
    double w = widthM / FT;
    double s = speedMps / MPH;
    double slow = w * s * s / 60;
    double fast = w * s;
    // speeds are posted in steps of five; rounding must not change the formula
    double steps = Math.round(s * 1e6) / 1e6;
    double feet = steps <= 40 ? slow : steps >= 45 ? fast : Math.max(slow, fast);
    return feet * FT;
  }

  /** Length of a taper that closes a shoulder [m]; see {@link #mergingM}. */
  public static double shoulderM(double widthM, double speedMps) {
    return mergingM(widthM, speedMps) / 3;
  }
}
