package org.fallwright.plugins.vehicle;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.EnumSet;
import java.util.Random;
import java.util.stream.LongStream;
import org.fallwright.plugins.vehicle.Grip.Lock;
import org.fallwright.plugins.vehicle.Soil.Tyre;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;

class TractionPropertyTest {
  static LongStream seeds() {
    return LongStream.range(0, 300);
  }

  @ParameterizedTest
  @MethodSource("seeds")
  void balancesAlongAndAcrossTheGround(long seed) {
    Sample s = new Sample(seed);
    Traction t = s.pull(s.drive, s.grip, s.rolling);
    double weight = s.chassis.weightN();
    double a = s.rise + s.slope;
    assertThat(t.frontN() + t.rearN())
        .as("seed %d", seed)
        .isCloseTo(weight * Math.cos(s.slope) - t.tensionN() * Math.sin(a), within(1e-9 * weight));
    if (t.tensionN() > 0 && t.limit() == s.drive.limit) {
      double driven = (s.drive.front ? t.frontN() : 0) + (s.drive.rear ? t.rearN() : 0);
      double undriven = t.frontN() + t.rearN() - driven;
      assertThat(t.tensionN() * Math.cos(a) + weight * Math.sin(s.slope) + s.rolling * undriven)
          .as("seed %d", seed)
          .isCloseTo(s.grip * driven, within(1e-9 * weight));
    }
  }

  @ParameterizedTest
  @MethodSource("seeds")
  void noAxleEverLeavesTheGroundByPulling(long seed) {
    Sample s = new Sample(seed);
    Traction t = s.pull(s.drive, s.grip, s.rolling);
    double least = -1e-9 * s.chassis.weightN();
    assertThat(Math.min(t.frontN(), t.rearN())).as("seed %d", seed).isGreaterThan(least);
    assertThat(t.tensionN()).as("seed %d", seed).isBetween(0.0, 1e7);
  }

  @ParameterizedTest
  @MethodSource("seeds")
  void moreGripAndLessRollingNeverPullLess(long seed) {
    Sample s = new Sample(seed);
    double pull = s.pull(s.drive, s.grip, s.rolling).tensionN();
    double spare = 1e-9 * s.chassis.weightN();
    assertThat(s.pull(s.drive, s.grip + 0.1, s.rolling).tensionN())
        .as("seed %d", seed)
        .isGreaterThanOrEqualTo(pull - spare);
    assertThat(s.pull(s.drive, s.grip, 0).tensionN())
        .as("seed %d", seed)
        .isGreaterThanOrEqualTo(pull - spare);
  }

  @ParameterizedTest
  @MethodSource("seeds")
  void heavierNeverPullsLessOnLevelGround(long seed) {
    Sample s = new Sample(seed);
    Chassis c = s.chassis;
    Chassis heavier =
        new Chassis(
            c.massKg() * 1.2,
            c.frontShare(),
            c.wheelbaseM(),
            c.cgHeightM(),
            c.hitchHeightM(),
            c.overhangM());
    double before = Traction.of(c, s.drive, s.grip, s.rolling, s.rise, 0).tensionN();
    assertThat(Traction.of(heavier, s.drive, s.grip, s.rolling, s.rise, 0).tensionN())
        .as("seed %d", seed)
        .isGreaterThanOrEqualTo(before * (1 - 1e-9));
  }

  /** Of all wheels, along the ground: the rise unloads the tyres and never helps them. */
  @ParameterizedTest
  @MethodSource("seeds")
  void aRisingLineNeverHelpsTheTyres(long seed) {
    Sample s = new Sample(seed);
    double a = Math.max(0, s.rise + s.slope);
    double flat = alongN(s, a);
    double steeper = alongN(s, a + 0.1);
    assertThat(steeper).as("seed %d", seed).isLessThanOrEqualTo(flat + 1e-9 * s.chassis.weightN());
  }

  private static double alongN(Sample s, double toGround) {
    Traction t = Traction.of(s.chassis, Drive.AWD, s.grip, 0, toGround - s.slope, s.slope);
    return t.tensionN() * Math.cos(toGround);
  }

  @ParameterizedTest
  @MethodSource("seeds")
  void liftingAnAxleCutsThePull(long seed) {
    Sample s = new Sample(seed);
    Chassis c = s.chassis;
    Traction t = Traction.of(raised(c), Drive.AWD, 1.0, 0, 0, s.slope);
    if (t.limit() == Limit.LIFT) {
      double without = Traction.of(c, Drive.AWD, 1.0, 0, 0, s.slope).tensionN();
      assertThat(t.tensionN()).as("seed %d", seed).isLessThanOrEqualTo(without);
      assertThat(Math.min(t.frontN(), t.rearN()))
          .as("seed %d", seed)
          .isCloseTo(0, within(1e-6 * c.weightN()));
    }
  }

  /** Or the law above would hold of nothing. */
  @Test
  void someOfTheSamplesLift() {
    assertThat(
            seeds()
                .mapToObj(Sample::new)
                .filter(
                    s ->
                        Traction.of(raised(s.chassis), Drive.AWD, 1.0, 0, 0, s.slope).limit()
                            == Limit.LIFT)
                .count())
        .isGreaterThan(100);
  }

  private static Chassis raised(Chassis c) {
    return new Chassis(c.massKg(), c.frontShare(), c.wheelbaseM(), c.cgHeightM(), 4, c.overhangM());
  }

  @ParameterizedTest
  @MethodSource("seeds")
  void openDifferentialsAndAWorseSideNeverPullMore(long seed) {
    Sample s = new Sample(seed);
    double worse = s.grip * 0.6;
    double locked = through(s, Grip.of(s.grip, worse, EnumSet.allOf(Lock.class)));
    double open = through(s, Grip.of(s.grip, worse, EnumSet.noneOf(Lock.class)));
    double every = through(s, Grip.everywhere(s.grip));
    double spare = 1e-9 * s.chassis.weightN();
    assertThat(open).as("seed %d", seed).isLessThanOrEqualTo(locked + spare);
    assertThat(locked).as("seed %d", seed).isLessThanOrEqualTo(every + spare);
  }

  private static double through(Sample s, Grip grip) {
    return Traction.of(s.chassis, s.drive, grip, s.rolling, s.rise, s.slope).tensionN();
  }

  /** The search in steps finds what the closed form gives where the soil gives constant grip. */
  @ParameterizedTest
  @MethodSource("seeds")
  void onSoilCappedByGripBothWaysAgree(long seed) {
    Sample s = new Sample(seed);
    double grip = Math.min(0.25, s.grip);
    Tyre tyre = new Tyre(0.6, 1.9);
    FieldTraction field =
        new FieldTraction(new Soil(5e6, false), tyre, tyre, Grip.everywhere(grip), grip);
    Traction closed = Traction.of(s.chassis, s.drive, grip, s.rolling, s.rise, s.slope);
    Traction stepped = field.of(s.chassis, s.drive, s.rolling, s.rise, s.slope);
    assertThat(stepped.tensionN())
        .as("seed %d", seed)
        .isCloseTo(closed.tensionN(), within(1e-6 * s.chassis.weightN()));
    assertThat(stepped.limit()).as("seed %d", seed).isEqualTo(closed.limit());
  }

  @ParameterizedTest
  @MethodSource("seeds")
  void firmerSoilNeverPullsLess(long seed) {
    Sample s = new Sample(seed);
    Tyre tyre = new Tyre(0.4, 1.4);
    double soft = 100e3 + 3e6 * s.grip;
    double before = onSoil(s, soft, tyre);
    assertThat(onSoil(s, 1.3 * soft, tyre))
        .as("seed %d", seed)
        .isGreaterThanOrEqualTo(before - 1e-6 * s.chassis.weightN());
  }

  private static double onSoil(Sample s, double coneIndexPa, Tyre tyre) {
    return new FieldTraction(new Soil(coneIndexPa, true), tyre, tyre, Grip.everywhere(0.3), 0.3)
        .of(s.chassis, s.drive, s.rolling, s.rise, s.slope)
        .tensionN();
  }

  @ParameterizedTest
  @MethodSource("seeds")
  void oneAxleNeverPullsMoreThanAll(long seed) {
    Sample s = new Sample(seed);
    double all = s.pull(Drive.AWD, s.grip, s.rolling).tensionN();
    assertThat(s.pull(Drive.RWD, s.grip, s.rolling).tensionN())
        .as("seed %d", seed)
        .isLessThanOrEqualTo(all + 1e-9 * s.chassis.weightN());
    assertThat(s.pull(Drive.FWD, s.grip, s.rolling).tensionN())
        .as("seed %d", seed)
        .isLessThanOrEqualTo(all + 1e-9 * s.chassis.weightN());
  }

  /** A vehicle on ground up to 15 degrees steep under a line that rises 40 at most. */
  private static final class Sample {
    final Chassis chassis;
    final Drive drive;
    final double grip;
    final double rolling;
    final double rise;
    final double slope;

    Sample(long seed) {
      Random r = new Random(seed);
      chassis =
          new Chassis(
              r.nextDouble(500, 20_000),
              r.nextDouble(0.25, 0.7),
              r.nextDouble(2, 5),
              r.nextDouble(0.4, 1.3),
              r.nextDouble(0.3, 1),
              r.nextDouble(0, 1.5));
      drive = Drive.values()[r.nextInt(Drive.values().length)];
      grip = r.nextDouble(0.05, 1);
      rolling = r.nextDouble(0, 0.1);
      rise = Math.toRadians(r.nextDouble(-10, 40));
      slope = Math.toRadians(r.nextDouble(-15, 15));
    }

    Traction pull(Drive of, double mu, double f) {
      return Traction.of(chassis, of, mu, f, rise, slope);
    }
  }
}
