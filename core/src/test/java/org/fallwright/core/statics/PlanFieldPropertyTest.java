package org.fallwright.core.statics;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.List;
import java.util.Optional;
import java.util.Random;
import org.fallwright.core.line.Point3;
import org.junit.jupiter.api.Test;

/** The field is held to the statics at random points. The seed stands in each message. */
class PlanFieldPropertyTest {
  private static final long SEED = 20261201;

  @Test
  void everyPointIsWhatTheStaticsSay() {
    Random r = new Random(SEED);
    int compared = 0;
    int lost = 0;
    for (int i = 0; i < 400; i++) {
      PullCase c = RandomPulls.next(r);
      PlanField field = new PlanField(c);
      for (int k = 0; k < 20; k++) {
        Point3 p =
            new Point3(
                RandomPulls.between(r, -60, 60),
                RandomPulls.between(r, -60, 60),
                RandomPulls.between(r, -4, 8));
        TreeSide t = new Statics(bearingAt(c, p)).treeSide();
        Optional<PlanField.Asked> asked = field.at(p);
        assertThat(asked.isPresent()).as("seed %d, case %d", SEED, i).isEqualTo(t.movable());
        if (t.movable()) {
          double planN = asked.orElseThrow().planN();
          double holdN = asked.orElseThrow().holdN();
          assertThat(planN)
              .as("plan, seed %d, case %d, point %d", SEED, i, k)
              .isCloseTo(t.planN(), within(1e-9 * (1 + t.planN())));
          assertThat(holdN)
              .as("hold, seed %d, case %d, point %d", SEED, i, k)
              .isCloseTo(t.holdN(), within(1e-9 * (1 + t.holdN())));
          compared++;
        } else {
          lost++;
        }
      }
    }
    assertThat(compared).isGreaterThan(2000);
    assertThat(lost).isGreaterThan(1000);
  }

  private static PullCase bearingAt(PullCase c, Point3 p) {
    LineSet l = c.line();
    return new PullCase(
        c.layDeg(),
        c.tree(),
        c.wood(),
        c.cut(),
        c.wind(),
        new LineSet(
            l.attachHeightM(), List.of(p), List.of(l.legStiffnessN().get(0)), null, l.slackM()),
        c.spread());
  }
}
