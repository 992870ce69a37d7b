package org.fallwright.plugins.vehicle;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.Random;
import java.util.stream.LongStream;
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
    if (t.tensionN() > 0 && !t.limit().equals(Traction.LIFT)) {
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
