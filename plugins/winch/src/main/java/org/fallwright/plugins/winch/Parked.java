package org.fallwright.plugins.winch;

import org.fallwright.core.anchor.LockedWheels;

/**
 * A machine on the ground that the winch sits on, all its wheels locked.
 *
 * <p>It holds what {@link LockedWheels} says, grip taken low: chocks, blades and banks, which help,
 * are credited with nothing, for no figures of them are published. Tipping is left out.
 *
 * @param massKg mass of the machine [kg]
 */
record Parked(double massKg) {
  /** Greatest rise of the line from the ground that is reckoned [degrees]. */
  static final double STEEPEST_DEG = 30;

  /**
   * Tension at which it slides towards the tree [N]; 0 where the line rises more steeply than
   * {@link #STEEPEST_DEG}. A line that falls more steeply than that towards the tree presses the
   * machine down further; no more is credited for it.
   *
   * @param grip of tyres on that ground
   * @param uphillRad slope along the line, positive where it rises away from the tree [rad]
   * @param riseRad rise of the line from the horizontal, positive towards the tree [rad]
   */
  double slidesAtN(double grip, double uphillRad, double riseRad) {
    double toGroundDeg = Math.toDegrees(riseRad + uphillRad);
    if (toGroundDeg > STEEPEST_DEG) {
      return 0;
    }
    double slopeDeg = Math.toDegrees(uphillRad);
    return slopeDeg > STEEPEST_DEG
        ? 0
        : LockedWheels.slidesAtN(
            massKg, grip, Math.max(slopeDeg, -STEEPEST_DEG), Math.max(toGroundDeg, -STEEPEST_DEG));
  }
}
