package org.fallwright.plugins.vehicle;

import java.util.List;
import org.fallwright.plugins.vehicle.Chassis.AxleLoad;

/**
 * The steady pull that a vehicle's grip allows, from the balance along the ground and the axle
 * loads under that pull.
 *
 * <p>T cos a + W sin s + f N_undriven = Σ mu N_driven, both axle loads straight lines of T (see
 * {@link Chassis}); with an open centre differential twice the lesser axle's mu N on the right; T
 * never below 0, and never more than lifts an axle. All wheels driven on one grip: T = W (mu cos s
 * − sin s) / (cos a + mu sin a), without rolling resistance.
 *
 * <p>W weight [N]; a rise of the line above the ground, positive towards the tree [rad]; s slope,
 * positive where the ground rises away from the tree [rad]; mu grip; f rolling resistance. Where
 * the line falls so steeply towards the tree that it presses the wheels down faster than it pulls,
 * no pull ends the grip: {@link #MOST_WEIGHTS} is counted then. Leaves out engine and gearing, a
 * line off the heading, ground that falls to the side, and every run-up: only a steady creep with
 * the line tight already. Statics of a rigid body on two axles; the same relations are in any text
 * on vehicle mechanics.
 *
 * @param tensionN T [N]
 * @param frontN load on the front axle under T [N]
 * @param rearN load on the rear axle under T [N]
 * @param limit what limits it
 */
record Traction(double tensionN, double frontN, double rearN, Limit limit) {
  /** Most weights that are ever counted as pull. Planning allowance. */
  static final double MOST_WEIGHTS = 2;

  private static final AxleLoad NONE = new AxleLoad(0, 0);

  /** As below, the same grip under all wheels. */
  static Traction of(
      Chassis chassis, Drive drive, double grip, double rolling, double riseRad, double slopeRad) {
    return of(chassis, drive, Grip.everywhere(grip), rolling, riseRad, slopeRad);
  }

  /**
   * The pull of one drive.
   *
   * @param rolling f, share of an undriven axle's load
   * @param riseRad rise of the line from the horizontal, positive towards the tree [rad]
   * @param slopeRad s [rad]
   */
  static Traction of(
      Chassis chassis, Drive drive, Grip grip, double rolling, double riseRad, double slopeRad) {
    double toGround = riseRad + slopeRad;
    AxleLoad front = chassis.front(toGround, slopeRad);
    AxleLoad rear = chassis.rear(toGround, slopeRad);
    AxleLoad byFront = drive.front ? front.times(grip.front()) : NONE;
    AxleLoad byRear = drive.rear ? rear.times(grip.rear()) : NONE;
    AxleLoad drag = (drive.front ? NONE : front).plus(drive.rear ? NONE : rear).times(-rolling);
    boolean even = drive == Drive.AWD && grip.even();
    List<AxleLoad> thrusts =
        even ? List.of(byFront.times(2), byRear.times(2)) : List.of(byFront.plus(byRear));

    double uphill = chassis.weightN() * Math.sin(slopeRad);
    double byGrip = Double.POSITIVE_INFINITY;
    for (AxleLoad thrust : thrusts) {
      AxleLoad pulls = thrust.plus(drag);
      double spare = pulls.atRestN() - uphill;
      double perNewton = Math.cos(toGround) - pulls.perNewton();
      byGrip =
          Math.min(
              byGrip,
              spare <= 0 ? 0 : perNewton > 0 ? spare / perNewton : Double.POSITIVE_INFINITY);
    }
    return least(chassis, front, rear, byGrip, even ? Limit.CENTRE_OPEN : drive.limit);
  }

  /** The pull by grip, cut where an axle lifts. */
  static Traction least(
      Chassis chassis, AxleLoad front, AxleLoad rear, double byGripN, Limit grip) {
    double mostN = MOST_WEIGHTS * chassis.weightN();
    double byLiftN = Math.min(front.liftsAtN(), rear.liftsAtN());
    double tension = byGripN;
    Limit limit = grip;
    if (front.atRestN() < 0 || rear.atRestN() < 0) {
      tension = 0;
      limit = Limit.TIPS;
    } else if (byLiftN < byGripN) {
      tension = byLiftN;
      limit = Limit.LIFT;
    }
    if (tension > mostN) {
      tension = mostN;
      limit = Limit.OWN_WEIGHT;
    }
    return new Traction(tension, front.at(tension), rear.at(tension), limit);
  }
}
