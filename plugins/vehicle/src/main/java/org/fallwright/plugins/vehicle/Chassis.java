package org.fallwright.plugins.vehicle;

import org.fallwright.core.units.Units;

/**
 * What of a vehicle decides its axle loads.
 *
 * @param massKg mass [kg]
 * @param frontShare share of it on the front axle on level ground without a line
 * @param wheelbaseM front to rear axle [m]
 * @param cgHeightM mass centre above the ground [m]
 * @param hitchHeightM tow point above the ground [m]
 * @param overhangM tow point behind the rear axle [m]
 */
record Chassis(
    double massKg,
    double frontShare,
    double wheelbaseM,
    double cgHeightM,
    double hitchHeightM,
    double overhangM) {
  private static final double GRAVITY = Units.GRAVITY;

  double weightN() {
    return massKg * GRAVITY;
  }

  /** Load on the front axle on level ground without a line [N]. */
  double frontLevelN() {
    return weightN() * frontShare;
  }

  /**
   * Load on an axle across the ground as a straight line of the tension.
   *
   * @param atRestN without a line [N]
   * @param perNewton change for a newton of tension
   */
  record AxleLoad(double atRestN, double perNewton) {
    double at(double tensionN) {
      return atRestN + perNewton * tensionN;
    }

    /** Tension at which the axle lifts [N]; infinite where the line presses it down. */
    double liftsAtN() {
      return fallsToAtN(0);
    }

    /** Tension at which no more than this load is left on it [N]; infinite where none does. */
    double fallsToAtN(double leftN) {
      return perNewton < 0
          ? Math.max(0, (atRestN - leftN) / -perNewton)
          : atRestN < leftN ? 0 : Double.POSITIVE_INFINITY;
    }

    AxleLoad times(double factor) {
      return new AxleLoad(factor * atRestN, factor * perNewton);
    }

    AxleLoad plus(AxleLoad other) {
      return new AxleLoad(atRestN + other.atRestN, perNewton + other.perNewton);
    }
  }

  /**
   * Front axle: [W (b cos s − h_g sin s) − T (h cos a − o sin a)] / L.
   *
   * @param toGroundRad a, rise of the line above the ground, positive towards the tree [rad]
   * @param slopeRad s, positive where the ground rises away from the tree [rad]
   */
  AxleLoad front(double toGroundRad, double slopeRad) {
    double aheadOfRearM = frontShare * wheelbaseM;
    return new AxleLoad(
        weightN()
            * (aheadOfRearM * Math.cos(slopeRad) - cgHeightM * Math.sin(slopeRad))
            / wheelbaseM,
        -(hitchHeightM * Math.cos(toGroundRad) - overhangM * Math.sin(toGroundRad)) / wheelbaseM);
  }

  /** Rear axle: [W ((L − b) cos s + h_g sin s) + T (h cos a − (L + o) sin a)] / L. */
  AxleLoad rear(double toGroundRad, double slopeRad) {
    double behindFrontM = (1 - frontShare) * wheelbaseM;
    return new AxleLoad(
        weightN()
            * (behindFrontM * Math.cos(slopeRad) + cgHeightM * Math.sin(slopeRad))
            / wheelbaseM,
        (hitchHeightM * Math.cos(toGroundRad) - (wheelbaseM + overhangM) * Math.sin(toGroundRad))
            / wheelbaseM);
  }
}
