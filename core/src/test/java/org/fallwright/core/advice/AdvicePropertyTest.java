package org.fallwright.core.advice;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.Random;
import org.fallwright.core.plan.Figures;
import org.fallwright.core.plan.Judge;
import org.fallwright.core.plan.Judged;
import org.fallwright.core.plan.Setup;
import org.fallwright.core.plan.Verdict;
import org.fallwright.core.site.Site;
import org.junit.jupiter.api.Test;

/** Laws of the advice on random sites; each message names its seed. */
class AdvicePropertyTest {
  private static final int SITES = 60;

  private static void eachSite(java.util.function.BiConsumer<Long, TinySite> law) {
    for (long seed = 1; seed <= SITES; seed++) {
      law.accept(seed, TinySite.random(new Random(seed)));
    }
  }

  @Test
  void eachEndIsJudgedGoodAndOneStepBeyondIsNot() {
    int[] ends = new int[1];
    eachSite(
        (seed, t) -> {
          Site site = t.site();
          HingeRange h = HingeRange.of(site, new Judge(site, SteadyPull.ONLY), t.direct());
          WindLimit w = WindLimit.of(site, SteadyPull.ONLY, t.direct());
          // judged afresh, by a judge that has seen nothing else
          ends[0] +=
              ends(seed, h.tight(), Verdict.TIGHT, 0.0005, x -> hinge(t, x))
                  + ends(seed, h.workable(), Verdict.WORKABLE, 0.0005, x -> hinge(t, x))
                  + ends(seed, w.tight(), Verdict.TIGHT, 0.1, x -> gust(t, x))
                  + ends(seed, w.workable(), Verdict.WORKABLE, 0.1, x -> gust(t, x));
        });
    assertThat(ends[0]).as("ends found").isGreaterThan(SITES);
  }

  private static Judged hinge(TinySite t, double thickness) {
    return new Judge(t.site(), SteadyPull.ONLY).judge(t.direct().withHinge(thickness));
  }

  private static Judged gust(TinySite t, double gust) {
    return new Judge(Altered.gust(t.site(), gust), SteadyPull.ONLY).judge(t.direct());
  }

  private static int ends(
      long seed,
      Span s,
      Verdict worst,
      double step,
      java.util.function.DoubleFunction<Judged> judge) {
    if (s == null) {
      return 0;
    }
    assertThat(judge.apply(s.lowest()).verdict()).as("seed %d", seed).isLessThanOrEqualTo(worst);
    assertThat(judge.apply(s.highest()).verdict()).as("seed %d", seed).isLessThanOrEqualTo(worst);
    int ends = 0;
    if (s.below() != null) {
      Judged out = judge.apply(s.lowest() - step);
      assertThat(out.verdict()).as("seed %d", seed).isGreaterThan(worst);
      assertThat(out.weakest().id()).as("seed %d", seed).isEqualTo(s.below().id());
      ends++;
    }
    if (s.above() != null) {
      Judged out = judge.apply(s.highest() + step);
      assertThat(out.verdict()).as("seed %d", seed).isGreaterThan(worst);
      assertThat(out.weakest().id()).as("seed %d", seed).isEqualTo(s.above().id());
      ends++;
    }
    return ends;
  }

  @Test
  void aSourceThatCanBeCountedOnForMoreNeverNarrowsTheHingeRange() {
    eachSite(
        (seed, t) -> {
          Span weaker = HingeRange.of(t.site(), judge(t), t.direct()).tight();
          // the most it can do stays as it was, and so what the parts must stand
          t.lowN = Math.min(t.highN, t.lowN * 1.3);
          Span stronger = HingeRange.of(t.site(), judge(t), t.direct()).tight();
          if (weaker != null) {
            assertThat(stronger.lowest()).as("seed %d", seed).isLessThanOrEqualTo(weaker.lowest());
            assertThat(stronger.highest())
                .as("seed %d", seed)
                .isGreaterThanOrEqualTo(weaker.highest());
          }
        });
  }

  @Test
  void aThickerHingeNeverLowersThePullNeeded() {
    eachSite(
        (seed, t) -> {
          Judge judge = judge(t);
          double before = 0;
          for (double thickness = 0.01; thickness <= 0.12; thickness += 0.005) {
            Figures f = judge.judge(t.direct().withHinge(thickness)).figures();
            if (!Double.isNaN(f.pullNeededN())) {
              assertThat(f.pullNeededN())
                  .as("seed %d, %.3f m", seed, thickness)
                  .isGreaterThanOrEqualTo(before);
              before = f.pullNeededN();
            }
          }
        });
  }

  @Test
  void aStrongerWindNeverImprovesAnything() {
    eachSite(
        (seed, t) -> {
          Judged before = gust(t, 0);
          for (double gust = 1; gust <= 12; gust += 1) {
            Judged now = gust(t, gust);
            Figures f = now.figures();
            Figures was = before.figures();
            assertThat(now.verdict())
                .as("seed %d, %.1f m/s", seed, gust)
                .isGreaterThanOrEqualTo(before.verdict());
            if (!Double.isNaN(f.pullPlanN()) && !Double.isNaN(was.pullPlanN())) {
              assertThat(f.pullPlanN())
                  .as("seed %d, %.1f m/s", seed, gust)
                  .isGreaterThanOrEqualTo(was.pullPlanN());
              // a person who stops at the ceiling takes from the source; with and without one do
              // not compare
              if (f.leansOnStopReading() == was.leansOnStopReading()) {
                assertThat(f.pullMargin())
                    .as("seed %d, %.1f m/s", seed, gust)
                    .isLessThanOrEqualTo(was.pullMargin());
              }
            }
            before = now;
          }
        });
  }

  @Test
  void aHeavierBackLeanerAsksForMoreAtEveryHeight() {
    eachSite(
        (seed, t) -> {
          for (LimitsCard.Row r : LimitsCard.of(t.site(), SteadyPull.ONLY, t.direct()).rows()) {
            double plain = r.cells().get(0).pullPlanN();
            double heavier = r.cells().get(1).pullPlanN();
            double heaviest = r.cells().get(2).pullPlanN();
            if (plain > 0 && t.leanDeg > 3) {
              assertThat(heavier).as("seed %d", seed).isGreaterThan(plain);
              assertThat(heaviest).as("seed %d", seed).isGreaterThan(heavier);
              assertThat(r.cells().get(3).pullPlanN()).as("seed %d", seed).isGreaterThan(plain);
            }
          }
        });
  }

  @Test
  void whatGivesFirstGivesBeyondItsOwnCeilingAndInOrder() {
    eachSite(
        (seed, t) -> {
          Setup s = t.redirected();
          Judged j = judge(t).judge(s);
          FirstToGive f = FirstToGive.of(t.site(), judge(t), j);
          if (Double.isNaN(j.figures().pullPlanN())) {
            assertThat(f.parts()).as("seed %d", seed).isEmpty();
            return;
          }
          assertThat(f.parts())
              .as("seed %d", seed)
              .hasSize(3)
              .isSortedAccordingTo((a, b) -> Double.compare(a.tensionN(), b.tensionN()))
              .allMatch(g -> g.tensionN() > f.ceilingN());
          // two ways to the same load: by the parts, and by the judged loads at the most
          j.loads().stream()
              .filter(l -> l.part().equals(f.parts().get(0).part()))
              .forEach(
                  l ->
                      assertThat(f.parts().get(0).tensionN())
                          .as("seed %d", seed)
                          .isCloseTo(
                              l.strengthN()
                                  / Math.max(
                                      l.atHighN() / j.figures().sourceHighN(),
                                      l.atPlanN() / j.figures().workingN()),
                              within(1e-6 * l.strengthN())));
        });
  }

  private static Judge judge(TinySite t) {
    return new Judge(t.site(), SteadyPull.ONLY);
  }
}
