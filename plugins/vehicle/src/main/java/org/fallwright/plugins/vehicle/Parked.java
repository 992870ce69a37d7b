package org.fallwright.plugins.vehicle;

import java.util.Arrays;
import org.fallwright.core.anchor.LockedWheels;
import org.fallwright.plugins.vehicle.Chassis.AxleLoad;

/** How a vehicle that stands is kept from rolling, and what it then holds. */
enum Parked {
  /** The driver's foot on a brake of all wheels, or all wheels in gear. */
  ALL_WHEELS("all-wheels"),
  /** Every wheel chocked; a chock only keeps a wheel from rolling and is given no more credit. */
  CHOCKS("chocks"),
  /** The parking brake on the rear wheels, the front wheels rolling. */
  REAR_BRAKE("rear-brake");

  /** Steepest slope and line that {@link LockedWheels} answers for [rad]. */
  private static final double STEEPEST_RAD = Math.toRadians(30);

  /** How it is written among the parameters. */
  final String key;

  Parked(String key) {
    this.key = key;
  }

  static Parked of(String key) {
    return Arrays.stream(values()).filter(p -> p.key.equals(key)).findFirst().orElseThrow();
  }

  /**
   * What it holds, taken low: where the wheels slide, by {@link LockedWheels} if all are kept from
   * rolling, else where the braked axle does; never more than lifts an axle. A line that rises or
   * falls more than 30 degrees from the ground holds nothing, as for every parked anchor.
   *
   * @param grip grip of each braked wheel, in the mean of both sides
   * @param riseRad rise of the line from the horizontal, positive towards the tree [rad]
   * @param slopeRad slope, positive where the ground rises away from the tree [rad]
   */
  Traction hold(Chassis chassis, double grip, double riseRad, double slopeRad) {
    if (this == REAR_BRAKE) {
      return Traction.of(chassis, Drive.RWD, grip, 0, riseRad, slopeRad);
    }
    double toGround = riseRad + slopeRad;
    AxleLoad front = chassis.front(toGround, slopeRad);
    AxleLoad rear = chassis.rear(toGround, slopeRad);
    if (Math.max(Math.abs(toGround), Math.abs(slopeRad)) > STEEPEST_RAD) {
      return new Traction(0, front.atRestN(), rear.atRestN(), Limit.STEEP_LINE);
    }
    double slides =
        LockedWheels.slidesAtN(
            chassis.massKg(), grip, Math.toDegrees(slopeRad), Math.toDegrees(toGround));
    return Traction.least(chassis, front, rear, slides, Limit.ALL_GRIP);
  }
}
