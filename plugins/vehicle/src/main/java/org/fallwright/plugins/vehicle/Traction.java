package org.fallwright.plugins.vehicle;

import org.fallwright.core.pull.PullOffer.Limit;
import org.fallwright.core.pull.Wording;
import org.fallwright.plugins.vehicle.Chassis.AxleLoad;

/**
 * The steady pull that a vehicle's grip allows, from the balance along the ground and the axle
 * loads under that pull.
 *
 * <p>T cos a + W sin s + f N_undriven = mu N_driven, both axle loads straight lines of T (see
 * {@link Chassis}); T never below 0, and never more than lifts an axle. All wheels driven or
 * locked: T = W (mu cos s − sin s) / (cos a + mu sin a), without rolling resistance.
 *
 * <p>W weight [N]; a rise of the line above the ground, positive towards the tree [rad]; s slope,
 * positive where the ground rises away from the tree [rad]; mu grip; f rolling resistance. Leaves
 * out engine and gearing, an open differential (take the grip of the worse wheel) and every run-up:
 * only a steady creep with the line tight already. Statics of a rigid body on two axles; the same
 * relations are in any text on vehicle mechanics.
 *
 * @param tensionN T [N]
 * @param frontN load on the front axle under T [N]
 * @param rearN load on the rear axle under T [N]
 * @param limit what limits it, and why
 */
record Traction(double tensionN, double frontN, double rearN, Limit limit) {
  static final Limit LIFT =
      new Limit(
          new Wording("axle lift", "se levanta un eje"),
          new Wording(
              "More pull would lift an axle off the ground.",
              "Con más tiro se levantaría un eje del suelo."));

  /**
   * The pull of one drive.
   *
   * @param grip mu
   * @param rolling f, share of an undriven axle's load
   * @param riseRad rise of the line from the horizontal, positive towards the tree [rad]
   * @param slopeRad s [rad]
   */
  static Traction of(
      Chassis chassis, Drive drive, double grip, double rolling, double riseRad, double slopeRad) {
    double toGround = riseRad + slopeRad;
    AxleLoad front = chassis.front(toGround, slopeRad);
    AxleLoad rear = chassis.rear(toGround, slopeRad);
    AxleLoad none = new AxleLoad(0, 0);
    AxleLoad driven = (drive.front ? front : none).plus(drive.rear ? rear : none);
    AxleLoad undriven = (drive.front ? none : front).plus(drive.rear ? none : rear);

    double spare =
        grip * driven.atRestN()
            - rolling * undriven.atRestN()
            - chassis.weightN() * Math.sin(slopeRad);
    double perNewton =
        Math.cos(toGround) + rolling * undriven.perNewton() - grip * driven.perNewton();
    double byGrip = spare <= 0 ? 0 : perNewton > 0 ? spare / perNewton : Double.POSITIVE_INFINITY;
    double byLift = Math.min(front.liftsAtN(), rear.liftsAtN());
    double tension = Math.min(byGrip, byLift);
    return new Traction(
        tension, front.at(tension), rear.at(tension), byLift < byGrip ? LIFT : drive.limit);
  }
}
