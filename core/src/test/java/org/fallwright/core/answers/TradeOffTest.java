package org.fallwright.core.answers;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.List;
import java.util.Random;
import java.util.TreeSet;
import org.fallwright.core.advice.SteadyPull;
import org.fallwright.core.advice.TinySite;
import org.fallwright.core.plan.Plan;
import org.fallwright.core.plan.Planner;
import org.fallwright.core.plan.Setup;
import org.fallwright.core.plan.Verdict;
import org.fallwright.core.site.Copy;
import org.fallwright.core.site.Fix;
import org.fallwright.core.site.Position;
import org.fallwright.core.site.Shape;
import org.fallwright.core.site.Site;
import org.fallwright.core.site.Target;
import org.junit.jupiter.api.Test;

class TradeOffTest {
  private static final Target SHED =
      new Target(
          "Shed",
          Target.Kind.STRUCTURE,
          new Shape.Circle(new Position(14, 10), 2),
          Fix.TAPES,
          null,
          0,
          3,
          1,
          false,
          false,
          false);

  private static Plan plan(long seed) {
    Site s = TinySite.random(new Random(seed)).site();
    Site more =
        Copy.with(
            Copy.with(s, "targets", List.of(SHED)),
            "offer",
            Copy.with(
                Copy.with(s.offer(), "attachHeightsM", List.of(5.0, 6.0, 9.0)),
                "layStepDeg",
                30.0));
    return new Planner(SteadyPull.ONLY).plan(more);
  }

  @Test
  void nobodyOnTheFrontIsBeatenAndWhoIsNotOnItIs() {
    int beaten = 0;
    for (long seed = 1; seed <= 12; seed++) {
      Plan plan = plan(seed);
      TradeOff t = TradeOff.of(plan);
      for (int i = 0; i < plan.ranked().size(); i++) {
        if (plan.ranked().get(i).verdict().compareTo(Verdict.TIGHT) > 0) {
          continue;
        }
        int rank = i + 1;
        double clear = plan.ranked().get(i).figures().clearanceM();
        double margin = plan.ranked().get(i).figures().pullMargin();
        boolean on = t.front().stream().anyMatch(c -> c.rank() == rank);
        boolean better =
            plan.ranked().stream()
                .filter(j -> j.verdict().compareTo(Verdict.TIGHT) <= 0)
                .anyMatch(
                    j ->
                        j.figures().clearanceM() >= clear
                            && j.figures().pullMargin() >= margin
                            && (j.figures().clearanceM() > clear
                                || j.figures().pullMargin() > margin));
        assertThat(on).as("seed %d, rank %d", seed, rank).isEqualTo(!better);
        beaten += better ? 1 : 0;
      }
    }
    assertThat(beaten).isPositive();
  }

  @Test
  void everySetupThatWorksIsInOneGroup() {
    for (long seed = 1; seed <= 12; seed++) {
      Plan plan = plan(seed);
      List<Integer> in =
          TradeOff.of(plan).groups().stream().flatMap(g -> g.ranks().stream()).toList();
      long works =
          plan.ranked().stream().filter(j -> j.verdict().compareTo(Verdict.TIGHT) <= 0).count();
      assertThat(new TreeSet<>(in)).as("seed %d", seed).hasSize(in.size()).hasSize((int) works);
    }
  }

  @Test
  void twinsUseTheSamePlacesAndLieClose() {
    Setup s = new TinySite().direct();
    assertThat(TradeOff.twins(s, s.withLay(3))).isTrue();
    assertThat(TradeOff.twins(s, s.withLay(357))).isTrue();
    assertThat(TradeOff.twins(s, s.withLay(3.5))).isFalse();
    assertThat(TradeOff.twins(s, s.withAttachHeight(9))).isTrue();
    assertThat(TradeOff.twins(s, s.withAttachHeight(9.25))).isFalse();
    assertThat(TradeOff.twins(s, new TinySite().redirected())).isFalse();
  }
}
