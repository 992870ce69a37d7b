package org.fallwright.core.rules;

import org.fallwright.core.units.Range;

/**
 * What a wire at a distance from the stump means, whichever way the tree is meant to fall: a lost
 * hinge or a parted line can send it anywhere.
 */
public enum WireReach {
  /**
   * Tree, rope or anchor can come within the approach distance: the work stops, its owner is
   * called.
   */
  STOP,
  /** Within two tree lengths and the approach distance where the rule set asks for a plan first. */
  AMBER,
  /** The same where no rule asks: said as advice. */
  ADVICE,
  /** Farther. */
  BEYOND;

  /**
   * Judges a wire.
   *
   * @param distanceM distance on the ground from the stump to below the conductor, position errors
   *     taken off [m]
   * @param heightM height of the tree [m]
   * @param approachM approach distance [m]
   * @param rules the rule set
   */
  public static WireReach of(double distanceM, double heightM, double approachM, RuleSet rules) {
    Range.check("distance_m", distanceM, -1000, 1e5, "m");
    Range.check("height_m", heightM, 0.5, 200, "m");
    Range.check("approach_m", approachM, 0, 100, "m");
    if (distanceM <= heightM + approachM) {
      return STOP;
    }
    if (distanceM <= 2 * heightM + approachM) {
      return rules.extraAdviceTwoH().yes() ? AMBER : ADVICE;
    }
    return BEYOND;
  }
}
