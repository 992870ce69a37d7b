package org.fallwright.plugins.vehicle;

import java.util.function.DoubleUnaryOperator;
import org.fallwright.plugins.vehicle.Chassis.AxleLoad;
import org.fallwright.plugins.vehicle.Soil.Tyre;

/**
 * The steady pull of a tractor on soil: the balance of {@link Traction}, with the net thrust of
 * {@link Soil} for each driven axle under the load that the pull leaves on it.
 *
 * <p>The first pull at which the balance is lost is searched upwards from none in {@link #STEPS}
 * steps and then halved down; from below, so that the answer is never more than the balance allows.
 * Where the cone index was not measured, no axle gives more than the ground's grip.
 */
final class FieldTraction {
  private static final int STEPS = 400;
  private static final int HALVINGS = 60;

  private final Soil soil;
  private final Tyre front;
  private final Tyre rear;
  private final Grip grip;
  private final double groundGrip;

  /**
   * Takes what does not change with the pull.
   *
   * @param front tyre of the front axle; null where only the rear drives
   * @param rear tyre of the rear axle; null where only the front drives
   * @param grip grip of the ground through the differentials
   * @param groundGrip grip of the ground itself
   */
  FieldTraction(Soil soil, Tyre front, Tyre rear, Grip grip, double groundGrip) {
    this.soil = soil;
    this.front = front;
    this.rear = rear;
    this.grip = grip;
    this.groundGrip = groundGrip;
  }

  /** The pull of one drive; see {@link Traction#of}. */
  Traction of(Chassis chassis, Drive drive, double rolling, double riseRad, double slopeRad) {
    double toGround = riseRad + slopeRad;
    AxleLoad onFront = chassis.front(toGround, slopeRad);
    AxleLoad onRear = chassis.rear(toGround, slopeRad);
    double uphill = chassis.weightN() * Math.sin(slopeRad);
    DoubleUnaryOperator spare =
        t -> {
          double byFront = drive.front ? thrustN(front, grip.front(), onFront.at(t)) : 0;
          double byRear = drive.rear ? thrustN(rear, grip.rear(), onRear.at(t)) : 0;
          double thrust =
              drive == Drive.AWD && grip.even() ? 2 * Math.min(byFront, byRear) : byFront + byRear;
          double undriven =
              (drive.front ? 0 : Math.max(0, onFront.at(t)))
                  + (drive.rear ? 0 : Math.max(0, onRear.at(t)));
          return thrust - rolling * undriven - uphill - t * Math.cos(toGround);
        };
    double most =
        Math.min(
            Traction.MOST_WEIGHTS * chassis.weightN() * (1 + 1e-9),
            Math.min(onFront.liftsAtN(), onRear.liftsAtN()));
    Limit limit = drive == Drive.AWD && grip.even() ? Limit.CENTRE_OPEN : drive.limit;
    return Traction.least(chassis, onFront, onRear, firstLost(spare, most), limit);
  }

  private double thrustN(Tyre tyre, double share, double loadN) {
    double net = soil.thrustN(tyre, loadN);
    if (net <= 0 || groundGrip <= 0) {
      return Math.min(net, 0);
    }
    double through = net * share / groundGrip;
    return soil.measured() ? through : Math.min(through, share * loadN);
  }

  /** The first pull from 0 up at which nothing is spare; infinite if there is none up to most. */
  private static double firstLost(DoubleUnaryOperator spare, double most) {
    if (spare.applyAsDouble(0) <= 0) {
      return 0;
    }
    double low = 0;
    for (int i = 1; i <= STEPS; i++) {
      double high = most * i / STEPS;
      if (spare.applyAsDouble(high) <= 0) {
        for (int k = 0; k < HALVINGS; k++) {
          double middle = (low + high) / 2;
          if (spare.applyAsDouble(middle) > 0) {
            low = middle;
          } else {
            high = middle;
          }
        }
        return low;
      }
      low = high;
    }
    return Double.POSITIVE_INFINITY;
  }
}
