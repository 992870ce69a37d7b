package org.fallwright.plugins.handline;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.Collections;
import java.util.List;
import java.util.stream.DoubleStream;
import org.fallwright.core.line.Wraps;
import org.fallwright.core.reference.SurfaceTable;
import org.junit.jupiter.api.Test;

/** Crews, hands, ways to haul and turns against figures that were published or worked by hand. */
class CrewReferenceTest {
  private static List<PersonPull> pulls(double... newtons) {
    return DoubleStream.of(newtons)
        .mapToObj(n -> new PersonPull(9e9, 9e9, n, Double.POSITIVE_INFINITY))
        .toList();
  }

  /** Hand-worked: 3 of 200 N are 0.86 x 600 = 516 N; with a fourth of 20 N, 0.79 x 620 = 490 N. */
  @Test
  void aWeakFourthStandsBySoThatTheThreeLoseNothing() {
    assertThat(Crew.pullN(pulls(200, 200, 200))).isCloseTo(516, within(1e-9));
    assertThat(Crew.pullN(pulls(200, 20, 200, 200))).isCloseTo(516, within(1e-9));
  }

  /** Hand-worked: 150 + 120 + 90 = 360 N, times 0.86; the two strongest alone 270 x 0.93. */
  @Test
  void threeOfDifferentStrengthAddUpBeforeTheLoss() {
    assertThat(Crew.pullN(pulls(90, 150, 120))).isCloseTo(309.6, within(1e-9));
  }

  /** Equal people give what the fit says, eight and more as much as seven. */
  @Test
  void equalPeopleFollowTheFit() {
    for (int n : new int[] {1, 2, 4, 7, 8, 20}) {
      List<PersonPull> all = Collections.nCopies(n, pulls(110).get(0));
      assertThat(Crew.pullN(all)).as("%d", n).isCloseTo(110 * Crew.persons(n), within(1e-9));
    }
  }

  /**
   * Published: one hand on a fixed cylinder along the pull, 435 N in the mean (Young and others
   * 2009, abstract). Hand-worked with half of it: 12 mm has 12/22 of that, 237.3 N for two hands.
   */
  @Test
  void handsHoldHalfOfWhatWasMeasured() {
    assertThat(Hands.slipN(2, 0.012)).isCloseTo(237.27, within(0.01));
    assertThat(Hands.slipN(2, 0.030)).isCloseTo(435, within(1e-9));
  }

  /**
   * Published: moving, trained teams pull 75.5 % of what they hold (Cayero and others 2022); one
   * hand of a man pulls about 147 N (Mital, Nicholson, Ayoub). On dry grass, 200 N standing.
   */
  @Test
  void walkingAndHandOverHandGiveLessThanStanding() {
    var dry = SurfaceTable.of("grass", false);
    assertThat(Haul.NOT_STATED.strengthN(dry)).isCloseTo(200, within(1e-9));
    assertThat(Haul.WALKING.strengthN(dry)).isCloseTo(151.0, within(1e-9));
    assertThat(Haul.HAND_OVER_HAND.strengthN(dry)).isCloseTo(147, within(1e-9));
    assertThat(Haul.HAND_OVER_HAND.strengthN(SurfaceTable.of("grass", true)))
        .isCloseTo(110, within(1e-9));
  }

  /**
   * Hand-worked: two turns on bark, friction 0.2 at the least, e^(0.2 x 4 pi) = 12.35 times a tail
   * of 50 N = 617 N; three turns of HMPE on metal, 0.05: e^(0.05 x 6 pi) = 2.566, 128 N.
   */
  @Test
  void turnsMultiplyTheTail() {
    assertThat(Capture.turnsHoldN(Wraps.ROPE_ON_BARK, 2, 50, 1e6)).isCloseTo(617.3, within(0.1));
    assertThat(Capture.turnsHoldN(Wraps.HMPE_ON_METAL, 3, 50, 1e6)).isCloseTo(128.3, within(0.1));
    assertThat(Capture.turnsHoldN(Wraps.ROPE_ON_BARK, 2, 50, 500)).isEqualTo(500);
  }
}
