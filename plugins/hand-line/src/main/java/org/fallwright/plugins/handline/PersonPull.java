package org.fallwright.plugins.handline;

import org.fallwright.core.pull.PullOffer.Limit;
import org.fallwright.core.pull.Wording;
import org.fallwright.core.units.Units;

/**
 * What one person can pull for a moment without moving the feet: the least of three limits.
 *
 * @param tipN pull that brings the body upright about the feet [N]
 * @param slipN pull at which the boots slip [N]
 * @param strengthN what a person keeps up on such footing [N]
 */
record PersonPull(double tipN, double slipN, double strengthN) {
  private static final double GRAVITY = Units.GRAVITY;

  /**
   * Height of the mass centre over stature. From memory, not checked against a table: men 0.55 to
   * 0.57, women 0.54 to 0.56.
   */
  private static final double MASS_CENTRE_SHARE = 0.55;

  private static final Limit SLIP =
      new Limit(
          new Wording("boots slip", "las botas se resbalan"),
          new Wording(
              "On this ground the boots slip before the people run out of strength.",
              "En este suelo las botas se resbalan antes de que a la gente le falte fuerza."));

  private static final Limit TIP =
      new Limit(
          new Wording("body tips forward", "el cuerpo se va hacia adelante"),
          new Wording(
              "The line draws the people upright: leaning back farther or holding it lower would"
                  + " give more.",
              "La cuerda endereza a la gente: más inclinada hacia atrás o con las manos más abajo"
                  + " daría más."));

  private static final Limit STRENGTH =
      new Limit(
          new Wording("strength of a person", "fuerza de una persona"),
          new Wording(
              "The boots grip well enough; a person cannot keep up more than this.",
              "Las botas agarran bien; una persona no puede sostener más que esto."));

  /** The pull that can be had [N]. */
  double leastN() {
    return Math.min(tipN, Math.min(slipN, strengthN));
  }

  /** What limits it, and why. */
  Limit limit() {
    if (slipN <= tipN && slipN <= strengthN) {
      return SLIP;
    }
    return tipN <= strengthN ? TIP : STRENGTH;
  }

  /**
   * Pull that tips a straight body, leaning away from the tree, about its feet.
   *
   * <p>T = m g x_c / (y_h cos a + x_h sin a), x_c = 0.55 s sin b. Moments about the feet;
   * quasi-static, no jerk. Infinite where the line passes behind or under the feet.
   *
   * @param massKg m [kg]
   * @param statureM s [m]
   * @param leanRad b, lean of the body from upright, away from the tree [rad]
   * @param handHeightM y_h, hands above the feet [m]
   * @param handXM x_h, hands from the feet, positive away from the tree [m]
   * @param riseRad a, rise of the line from the horizontal, positive towards the tree [rad]
   * @return T [N]
   */
  static double tipN(
      double massKg,
      double statureM,
      double leanRad,
      double handHeightM,
      double handXM,
      double riseRad) {
    double arm = handHeightM * Math.cos(riseRad) + handXM * Math.sin(riseRad);
    double massArm = MASS_CENTRE_SHARE * statureM * Math.sin(leanRad);
    return arm > 0 ? massKg * GRAVITY * massArm / arm : Double.POSITIVE_INFINITY;
  }

  /**
   * Pull at which the boots slip towards the tree.
   *
   * <p>T = m g (mu cos s − sin s) / (cos(a + s) + mu sin(a + s)), never below 0. The rising line
   * takes load off the feet. Leaves out a foot braced on something solid.
   *
   * @param massKg m [kg]
   * @param grip mu, boots on ground
   * @param riseRad a, rise of the line from the horizontal, positive towards the tree [rad]
   * @param slopeRad s, positive where the ground falls towards the tree [rad]
   * @return T [N]; infinite where a steeply falling line presses the feet down faster than it pulls
   */
  static double slipN(double massKg, double grip, double riseRad, double slopeRad) {
    double along = massKg * GRAVITY * (grip * Math.cos(slopeRad) - Math.sin(slopeRad));
    if (along <= 0) {
      return 0;
    }
    double toGround = riseRad + slopeRad;
    double share = Math.cos(toGround) + grip * Math.sin(toGround);
    return share > 0 ? along / share : Double.POSITIVE_INFINITY;
  }
}
