package org.fallwright.core.change;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.Random;
import java.util.Set;
import java.util.TreeSet;
import org.fallwright.core.advice.SteadyPull;
import org.fallwright.core.advice.TinySite;
import org.fallwright.core.plan.Judge;
import org.fallwright.core.plan.Judged;
import org.fallwright.core.plan.Planner;
import org.fallwright.core.plan.Verdict;
import org.fallwright.core.site.Site;
import org.junit.jupiter.api.Test;

/** Laws of the proposals on random sites; each message names its seed. */
class RemediesPropertyTest {
  private static final int SITES = 40;

  /** Random sites whose source is weak, so that many do not work. */
  private static TinySite weak(long seed) {
    TinySite t = TinySite.random(new Random(seed));
    t.lowN *= 0.4;
    t.leanDeg += 3;
    return t;
  }

  @Test
  void whatIsProposedIsAsGoodAsSaidWhenItIsMadeAndPlanned() {
    int proposals = 0;
    Set<Kind> kinds = new TreeSet<>();
    for (long seed = 1; seed <= SITES; seed++) {
      TinySite t = weak(seed);
      Site site = t.site();
      Remedies all = Remedies.of(site, SteadyPull.ONLY, t.direct());
      for (Remedy r : all.remedies()) {
        proposals++;
        r.edits().forEach(e -> kinds.add(e.kind()));
        assertThat(r.verdict()).as("seed %d", seed).isLessThan(all.verdict());
        // by a judge that has seen nothing else
        Judged again = new Judge(r.site(), SteadyPull.ONLY).judge(r.setup());
        assertThat(again.verdict()).as("seed %d, %s", seed, r.sentence()).isEqualTo(r.verdict());
        // and by a plan of the changed site, which has the setup on offer
        Verdict planned = new Planner(SteadyPull.ONLY).plan(r.site()).ranked().get(0).verdict();
        assertThat(planned).as("seed %d, %s", seed, r.sentence()).isLessThanOrEqualTo(r.verdict());
        // no distance, rule or factor was dropped
        assertThat(r.site().ruleSet()).isEqualTo(site.ruleSet());
        assertThat(r.site().targets()).isEqualTo(site.targets());
      }
    }
    assertThat(proposals).isGreaterThan(30);
    assertThat(kinds).hasSizeGreaterThan(3);
  }

  @Test
  void theyComeInTheOrderOfTheirEffort() {
    for (long seed = 1; seed <= SITES; seed++) {
      TinySite t = weak(seed);
      assertThat(Remedies.of(t.site(), SteadyPull.ONLY, t.redirected()).remedies())
          .as("seed %d", seed)
          .isSortedAccordingTo(Remedies.SMALLEST_FIRST);
    }
  }

  @Test
  void aWorkableSetupNeedsNone() {
    int workable = 0;
    for (long seed = 1; seed <= SITES; seed++) {
      TinySite t = TinySite.random(new Random(seed));
      Remedies r = Remedies.of(t.site(), SteadyPull.ONLY, t.direct());
      if (r.verdict() == Verdict.WORKABLE) {
        workable++;
        assertThat(r.remedies()).as("seed %d", seed).isEmpty();
        assertThat(r.stops()).as("seed %d", seed).isEmpty();
      } else {
        assertThat(r.stops()).as("seed %d", seed).isNotEmpty();
      }
    }
    assertThat(workable).isPositive();
  }
}
