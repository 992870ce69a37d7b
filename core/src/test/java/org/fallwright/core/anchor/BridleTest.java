package org.fallwright.core.anchor;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.Random;
import org.fallwright.core.line.Point3;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

class BridleTest {
  private static final Point3 APEX = new Point3(0, 0, 1);
  private static final Point3 LEFT = new Point3(-3, -4, 1);
  private static final Point3 RIGHT = new Point3(3, -4, 1);

  private static Bridle pulled(double e, double n, double up) {
    return Bridle.of(APEX, LEFT, RIGHT, new Point3(e, n, up));
  }

  @Test
  void straightBetweenItsLegsEachTakesTheSame() {
    Bridle b = pulled(0, 10, 0);
    // cosine of half the angle between them is 4/5
    assertThat(b.first()).isCloseTo(0.625, within(1e-9));
    assertThat(b.second()).isCloseTo(0.625, within(1e-9));
    assertThat(b.refused()).isEmpty();
  }

  @Test
  void alongOneLegThatLegTakesItAll() {
    Bridle b = pulled(3, 4, 0);
    assertThat(b.first()).isCloseTo(1, within(1e-6));
    assertThat(b.second()).isCloseTo(0, within(1e-6));
  }

  @Test
  void outsideItsLegsOneIsSlack() {
    assertThat(pulled(4, 3, 0).refused()).hasValueSatisfying(w -> assertThat(w).contains("slack"));
    assertThat(pulled(0, -1, 0).refused()).isPresent();
  }

  /** A load that rises swings both legs up, and both anchors with them. */
  @Test
  void aRisingLoadLiftsBothAnchors() {
    double up = 10 * Math.tan(Math.toRadians(20));
    Bridle b = pulled(0, 10, up);
    assertThat(b.first()).isCloseTo(0.625, within(1e-9));
    assertThat(b.second()).isCloseTo(0.625, within(1e-9));
    assertThat(b.firstPull().length()).isCloseTo(5, within(1e-9));
    // four fifths of the leg lie along the load's rise
    double rise = Math.toDegrees(Math.asin(0.8 * Math.sin(Math.toRadians(20))));
    assertThat(b.firstPull().riseDeg()).isCloseTo(rise, within(1e-9));
    assertThat(b.secondPull().riseDeg()).isCloseTo(rise, within(1e-9));
    assertThat(b.firstPull().e()).isCloseTo(3, within(1e-9));
    assertThat(b.secondPull().e()).isCloseTo(-3, within(1e-9));
    assertThat(pulled(0, 10, 10.2).refused())
        .hasValueSatisfying(w -> assertThat(w).contains("swing by 46 degrees"));
  }

  @Test
  void legsTooWideTooNarrowOrTooShortAreRefused() {
    Point3 pull = new Point3(0, 1, 0);
    assertThat(Bridle.of(APEX, new Point3(-5, -1, 1), new Point3(5, -1, 1), pull).refused())
        .hasValueSatisfying(w -> assertThat(w).contains("157 degrees"));
    assertThat(Bridle.of(APEX, LEFT, LEFT, pull).refused()).isPresent();
    assertThat(Bridle.of(APEX, APEX, RIGHT, pull).refused()).isPresent();
  }

  /** The two legs' tensions and the load are in balance, wherever they stand in space. */
  @ParameterizedTest
  @ValueSource(longs = {31, 32, 33, 34})
  void sharesBalanceTheLoad(long seed) {
    Random random = new Random(seed);
    int shared = 0;
    for (int i = 0; i < 300; i++) {
      Point3 one = point(random);
      Point3 two = point(random);
      double t1 = 0.05 + random.nextDouble();
      double t2 = 0.05 + random.nextDouble();
      Point3 force = one.times(t1 / one.length()).plus(two.times(t2 / two.length())).times(-1);
      Bridle b = Bridle.of(new Point3(0, 0, 0), one, two, force);
      if (b.refused().isEmpty()) {
        assertThat(b.first() * force.length()).as("seed %d", seed).isCloseTo(t1, within(1e-6));
        assertThat(b.second() * force.length()).as("seed %d", seed).isCloseTo(t2, within(1e-6));
        shared++;
      } else {
        double included = one.angleDeg(two);
        assertThat(included < 1 || included > Bridle.WIDEST_DEG).as("seed %d", seed).isTrue();
      }
    }
    assertThat(shared).as("seed %d", seed).isGreaterThan(100);
  }

  private static Point3 point(Random random) {
    return new Point3(
        1 + 5 * random.nextDouble(), 8 * random.nextDouble() - 4, random.nextDouble());
  }
}
