package org.fallwright.plugins.vehicle;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.Set;
import org.fallwright.core.anchor.LockedWheels;
import org.fallwright.plugins.vehicle.Grip.Lock;
import org.junit.jupiter.api.Test;

/** Differentials, parking and lifting against figures worked by hand. */
class GripReferenceTest {
  private static final Chassis CAR = new Chassis(2000, 0.6, 3.0, 0.7, 0.5, 1.0);
  private static final double W = 2000 * 9.80665;

  /** Gravel of 0.35 under one side and wet grass of 0.20 under the other. */
  @Test
  void anOpenDifferentialFollowsTheWorseWheel() {
    assertThat(Grip.of(0.35, 0.20, Set.of()).rear()).isCloseTo(0.20, within(1e-12));
    assertThat(Grip.of(0.35, 0.20, Set.of(Lock.REAR)).rear()).isCloseTo(0.275, within(1e-12));
    assertThat(Grip.of(0.35, 0.20, Set.of(Lock.REAR)).front()).isCloseTo(0.20, within(1e-12));
    assertThat(Grip.of(0.35, 0.20, null).rear()).isCloseTo(0.20, within(1e-12));
    assertThat(Grip.of(0.35, 0.60, Set.of()).rear()).isCloseTo(0.35, within(1e-12));
    assertThat(Grip.of(0.35, null, Set.of()).rear()).isCloseTo(0.28, within(1e-12));
    assertThat(Grip.of(0.35, null, Set.of(Lock.REAR)).rear()).isCloseTo(0.35, within(1e-12));
    assertThat(Grip.braked(0.35, 0.20).front()).isCloseTo(0.275, within(1e-12));
  }

  /**
   * Level line and ground, grip 0.5 everywhere, centre open: both axles give what the rear gives, 2
   * x 0.5 x (0.4 W + T h/L) = T, T = 0.4 W / (1 - 0.5/3) = 0.48 W; the coupled pull is 0.5 W.
   */
  @Test
  void anOpenCentreDifferentialFollowsTheLighterAxle() {
    Traction open = Traction.of(CAR, Drive.AWD, new Grip(0.5, 0.5, true), 0, 0, 0);
    assertThat(open.tensionN()).isCloseTo(0.48 * W, within(1e-6));
    assertThat(open.limit()).isEqualTo(Limit.CENTRE_OPEN);
    Traction coupled = Traction.of(CAR, Drive.AWD, 0.5, 0, 0, 0);
    assertThat(coupled.tensionN()).isCloseTo(0.5 * W, within(1e-6));
  }

  /**
   * The front lifts at T = 0.6 W L/h: with the tow point 2.5 m up, 0.72 W, before grip of 0.9 ends
   * it; with the tow point at 0.5 m grip does, at 0.9 W.
   */
  @Test
  void aHighTowPointLiftsTheFrontBeforeTheTyresLetGo() {
    Chassis tall = new Chassis(2000, 0.6, 3.0, 0.7, 2.5, 1.0);
    Traction lifts = Traction.of(tall, Drive.AWD, 0.9, 0, 0, 0);
    assertThat(lifts.tensionN()).isCloseTo(0.72 * W, within(1e-6));
    assertThat(lifts.limit()).isEqualTo(Limit.LIFT);
    assertThat(lifts.frontN()).isCloseTo(0, within(1e-6));
    assertThat(Traction.of(CAR, Drive.AWD, 0.9, 0, 0, 0).tensionN())
        .isCloseTo(0.9 * W, within(1e-6));
  }

  /** Parked, all wheels: as any parked anchor; on the rear brake: 0.5 (0.4 W + T/6) = T. */
  @Test
  void parkedItHoldsByTheWheelsThatAreKeptFromRolling() {
    assertThat(Parked.CHOCKS.hold(CAR, 0.5, 0.1, 0.05).tensionN())
        .isEqualTo(
            LockedWheels.slidesAtN(
                2000, 0.5, Math.toDegrees(0.05), Math.toDegrees(0.15000000000000002)));
    assertThat(Parked.REAR_BRAKE.hold(CAR, 0.5, 0, 0).tensionN())
        .isCloseTo(0.2 * W / (1 - 0.5 / 6), within(1e-6));
    assertThat(Parked.ALL_WHEELS.hold(CAR, 0.5, 0.6, 0).tensionN()).isZero();
    assertThat(Parked.ALL_WHEELS.hold(CAR, 0.5, 0.6, 0).limit()).isEqualTo(Limit.STEEP_LINE);
  }

  /** 2.5 m of height on 1 m of wheelbase: the ground's slope alone lifts the front. */
  @Test
  void whatStandsTooSteepPullsNothing() {
    Chassis tower = new Chassis(2000, 0.4, 1.0, 2.5, 0.5, 0.5);
    Traction t = Traction.of(tower, Drive.AWD, 0.9, 0, 0, Math.toRadians(12));
    assertThat(t.tensionN()).isZero();
    assertThat(t.limit()).isEqualTo(Limit.TIPS);
  }

  @Test
  void tyresGetNoCreditWhereGripHelps() {
    for (Tyres tyres : Tyres.values()) {
      assertThat(tyres.lowOf(0.35, false)).as(tyres.key).isLessThanOrEqualTo(0.35);
      assertThat(tyres.lowOf(0.65, true)).as(tyres.key).isLessThanOrEqualTo(0.65);
      assertThat(tyres.highOf(0.6)).as(tyres.key).isBetween(0.6, 1.5);
    }
  }
}
