package org.fallwright.plugins.handline;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.ArrayList;
import java.util.List;
import java.util.Random;
import java.util.stream.LongStream;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;

class PersonPullPropertyTest {
  static LongStream seeds() {
    return LongStream.range(0, 300);
  }

  @ParameterizedTest
  @MethodSource("seeds")
  void moreGripNeverPullsLess(long seed) {
    Sample s = new Sample(seed);
    double more = s.grip + s.random.nextDouble(0, 0.5);
    assertThat(PersonPull.slipN(s.mass, more, s.rise, s.slope))
        .as("seed %d", seed)
        .isGreaterThanOrEqualTo(PersonPull.slipN(s.mass, s.grip, s.rise, s.slope) * (1 - 1e-12));
  }

  /**
   * The part of the pull along the ground never grows as the line rises. The tension itself may, on
   * a line so steep that it takes much of the weight: people then hang in it more than they pull.
   */
  @ParameterizedTest
  @MethodSource("seeds")
  void aRisingLineNeverHelpsTheBoots(long seed) {
    Sample s = new Sample(seed);
    double steeper = s.rise + s.random.nextDouble(0, 0.3);
    double flat = along(s, s.rise);
    assertThat(along(s, steeper)).as("seed %d", seed).isLessThanOrEqualTo(flat + 1e-9);
    double knee = Math.atan(s.grip) - s.slope;
    if (steeper <= knee) {
      assertThat(PersonPull.slipN(s.mass, s.grip, steeper, s.slope))
          .as("seed %d", seed)
          .isLessThanOrEqualTo(PersonPull.slipN(s.mass, s.grip, s.rise, s.slope) + 1e-9);
    }
  }

  @ParameterizedTest
  @MethodSource("seeds")
  void whoIsHeavierOrLeansMoreIsNotDrawnUprightSooner(long seed) {
    Sample s = new Sample(seed);
    double tip = PersonPull.tipN(s.mass, s.stature, s.lean, s.hands, 0.1, s.rise);
    assertThat(PersonPull.tipN(s.mass + 10, s.stature, s.lean, s.hands, 0.1, s.rise))
        .as("seed %d", seed)
        .isGreaterThanOrEqualTo(tip);
    assertThat(PersonPull.tipN(s.mass, s.stature, s.lean + 0.05, s.hands, 0.1, s.rise))
        .as("seed %d", seed)
        .isGreaterThanOrEqualTo(tip);
    assertThat(PersonPull.tipN(s.mass, s.stature, s.lean, s.hands + 0.1, 0.1, s.rise))
        .as("seed %d", seed)
        .isLessThanOrEqualTo(tip);
  }

  @ParameterizedTest
  @MethodSource("seeds")
  void oneMoreNeverMeansLessAndTheCrewNeverBeatsItsSum(long seed) {
    Random r = new Random(seed);
    List<PersonPull> crew = new ArrayList<>();
    double before = 0;
    double sum = 0;
    for (int n = 0; n < 12; n++) {
      PersonPull one =
          new PersonPull(
              r.nextDouble(0, 500),
              r.nextDouble(0, 500),
              r.nextDouble(0, 310),
              r.nextDouble(0, 500));
      crew.add(one);
      sum += one.leastN();
      double now = Crew.pullN(crew);
      assertThat(now).as("seed %d, %d people", seed, n + 1).isBetween(before, sum + 1e-9);
      before = now;
    }
  }

  @ParameterizedTest
  @MethodSource("seeds")
  void theLimitIsTheLeastOfTheFour(long seed) {
    Random r = new Random(seed);
    PersonPull p =
        new PersonPull(
            r.nextDouble(0, 500), r.nextDouble(0, 500), r.nextDouble(0, 310), r.nextDouble(0, 500));
    double named =
        switch (p.limit()) {
          case BOOTS -> p.slipN();
          case TIPPING -> p.tipN();
          case STRENGTH -> p.strengthN();
          case HANDS -> p.handsN();
          case NOBODY -> Double.NaN;
        };
    assertThat(named).as("seed %d", seed).isEqualTo(p.leastN());
  }

  private static double along(Sample s, double rise) {
    return PersonPull.slipN(s.mass, s.grip, rise, s.slope) * Math.cos(rise + s.slope);
  }

  /** A person on ground up to 15 degrees steep under a line that rises 40 at most. */
  private static final class Sample {
    final Random random;
    final double mass;
    final double stature;
    final double grip;
    final double rise;
    final double slope;
    final double lean;
    final double hands;

    Sample(long seed) {
      random = new Random(seed);
      mass = random.nextDouble(30, 200);
      stature = random.nextDouble(1.2, 2.3);
      grip = random.nextDouble(0.05, 1);
      rise = Math.toRadians(random.nextDouble(-10, 40));
      slope = Math.toRadians(random.nextDouble(-15, 15));
      lean = Math.toRadians(random.nextDouble(0, 40));
      hands = random.nextDouble(0.3, 1.8);
    }
  }
}
