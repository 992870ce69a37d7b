package org.fallwright.core.doubt;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.Arrays;
import org.junit.jupiter.api.Test;

class PointsTest {
  @Test
  void everyCoordinateFallsOnceIntoEachOfAsManyStrips() {
    double[][] points = Points.of(1024);
    for (Input input : Input.values()) {
      double[] sorted = points[input.ordinal()].clone();
      Arrays.sort(sorted);
      for (int i = 0; i < sorted.length; i++) {
        assertThat((int) (sorted[i] * sorted.length)).as(input + " " + i).isEqualTo(i);
      }
    }
  }

  @Test
  void theSamePointsEveryTime() {
    assertThat(Points.of(64)).isDeepEqualTo(Points.of(64));
  }

  @Test
  void noTwoInputsGoTogether() {
    double[][] points = Points.of(Sampler.TRIALS);
    for (Input a : Input.values()) {
      for (Input b : Input.values()) {
        if (a != b) {
          double c =
              Ranks.correlation(Ranks.of(points[a.ordinal()]), Ranks.of(points[b.ordinal()]));
          assertThat(c).as(a + " and " + b).isCloseTo(0, within(0.04));
        }
      }
    }
  }

  @Test
  void normalSharesAsInAnyTableAndCutAtTwoAndAHalf() {
    // standard normal distribution: 95 % lie below 1.645, 97.5 % below 1.960
    assertThat(Points.normal(0.95)).isCloseTo(1.6449, within(1e-4));
    assertThat(Points.normal(0.025)).isCloseTo(-1.9600, within(1e-4));
    assertThat(Points.normal(0.9999)).isEqualTo(2.5);
    assertThat(Points.normal(1e-9)).isEqualTo(-2.5);
  }
}
