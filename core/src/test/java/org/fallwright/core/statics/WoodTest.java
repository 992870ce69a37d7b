package org.fallwright.core.statics;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.assertj.core.api.Assertions.within;

import java.util.Random;
import org.junit.jupiter.api.Test;

/** Two rupture strengths, where sources disagree: the high one resists, the low one holds. */
class WoodTest {
  private static final long SEED = 20260118;

  private static PullCase holding(PullCase c, double share) {
    Wood w = c.wood();
    return new PullCase(
        c.layDeg(),
        c.tree(),
        new Wood(
            w.morPa(),
            w.morCv(),
            w.moePa(),
            w.shearPa(),
            w.crushPa(),
            w.knotFactor(),
            share * w.morPa()),
        c.cut(),
        c.wind(),
        c.line(),
        c.spread());
  }

  /** The pull does not see it; stem, steering and the way the hinge stops the tree all do. */
  @Test
  void onlyWhatHoldsIsTakenLow() {
    Random r = new Random(SEED);
    int compared = 0;
    for (int i = 0; i < 300; i++) {
      PullCase c = RandomPulls.next(r);
      Statics one = new Statics(c);
      Statics two = new Statics(holding(c, 0.8));
      if (one.treeSide().status() != Status.BACK_LEANER) {
        continue;
      }
      TreeSide a = one.treeSide();
      TreeSide b = two.treeSide();
      assertThat(b.planN()).as("seed %d, case %d", SEED, i).isEqualTo(a.planN());
      assertThat(b.hingeNm()).isEqualTo(a.hingeNm());
      assertThat(b.stemBreakN()).isCloseTo(0.8 * a.stemBreakN(), within(1e-9 * a.stemBreakN()));
      assertThat(b.steerShare())
          .as("seed %d, case %d", SEED, i)
          .isCloseTo(a.steerShare() / 0.8, within(1e-9));
      assertThat(two.holding(true).pretensionTopN())
          .as("seed %d, case %d", SEED, i)
          .isLessThanOrEqualTo(one.holding(true).pretensionTopN());
      compared++;
    }
    assertThat(compared).as("seed %d", SEED).isGreaterThan(100);
  }

  @Test
  void woodThatHoldsMoreThanItResistsIsRefused() {
    assertThatThrownBy(() -> new Wood(34e6, 0.16, 6e9, 5e6, 14e6, 1, 39e6))
        .hasMessageStartingWith("mor_holds_Pa is 39000000 Pa");
  }
}
