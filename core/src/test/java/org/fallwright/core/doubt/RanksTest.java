package org.fallwright.core.doubt;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import org.junit.jupiter.api.Test;

class RanksTest {
  @Test
  void equalValuesShareTheMiddleOfTheirRanks() {
    assertThat(Ranks.of(new double[] {5, 1, 5, Double.POSITIVE_INFINITY}))
        .containsExactly(1.5, 0, 1.5, 3);
  }

  @Test
  void whatRisesTogetherGoesTogetherHoweverBent() {
    double[] x = {1, 2, 3, 4, 5};
    double[] cubes = {1, 8, 27, 64, 125};
    double[] down = {5, 4, 3, 2, 1};
    assertThat(Ranks.correlation(Ranks.of(x), Ranks.of(cubes))).isCloseTo(1, within(1e-12));
    assertThat(Ranks.correlation(Ranks.of(x), Ranks.of(down))).isCloseTo(-1, within(1e-12));
    assertThat(Ranks.correlation(Ranks.of(x), Ranks.of(new double[] {7, 7, 7, 7, 7}))).isZero();
  }

  /** Worked by hand: 1 − 6·Σd²/(n(n² − 1)) with d = 0, 1, 1, 0: 1 − 12/60 = 0.8. */
  @Test
  void aRankCorrelationWorkedByHand() {
    double c =
        Ranks.correlation(
            Ranks.of(new double[] {1, 2, 3, 4}), Ranks.of(new double[] {10, 30, 20, 40}));
    assertThat(c).isCloseTo(0.8, within(1e-12));
  }

  @Test
  void percentilesLieOnStraightLinesBetweenTheValues() {
    double[] sorted = {0, 10, 20, 30};
    assertThat(Ranks.percentile(sorted, 0)).isZero();
    assertThat(Ranks.percentile(sorted, 0.5)).isEqualTo(15);
    assertThat(Ranks.percentile(sorted, 1)).isEqualTo(30);
    double[] endless = {1, Double.POSITIVE_INFINITY, Double.POSITIVE_INFINITY};
    assertThat(Ranks.percentile(endless, 0.75)).isInfinite();
  }
}
