package org.fallwright.core.doubt;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.assertj.core.api.Assertions.within;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.Random;
import java.util.concurrent.CancellationException;
import org.fallwright.core.advice.SteadyPull;
import org.fallwright.core.advice.TinySite;
import org.fallwright.core.plan.Plan;
import org.fallwright.core.plan.Planner;
import org.fallwright.core.plan.Reckoned;
import org.fallwright.core.plan.Verdict;
import org.fallwright.core.reference.Spreads;
import org.fallwright.core.site.Copy;
import org.fallwright.core.site.Quantity;
import org.fallwright.core.site.Site;
import org.fallwright.core.statics.EachTrial;
import org.fallwright.core.statics.Statics;
import org.junit.jupiter.api.Test;

class DoubtsTest {
  private static Doubts doubts(TinySite t) {
    return new Doubts(t.site(), SteadyPull.ONLY);
  }

  @Test
  void theSameAnswerEveryTime() {
    TinySite t = new TinySite();
    assertThat(doubts(t).of(t.direct())).isEqualTo(doubts(t).of(t.direct()));
  }

  @Test
  void theVerdictsMarginIsThatOfThePoorDayWhereNothingGrips() {
    TinySite t = new TinySite();
    Doubt d = doubts(t).of(t.direct());
    // a steady pull has one strength: its margin on a poor day is its pull over the 95th percentile
    assertThat(d.poorDayMargin()).isCloseTo(d.margin(), within(2e-3));
    assertThat(d.enough()).isEqualTo(d.enoughAtLeast());
    assertThat(d.marginAsEntered()).isGreaterThan(d.margin());
    assertThat(d.margins()).hasSize(101).isSorted();
    assertThat(d.curve()).allSatisfy(p -> assertThat(p.lowN()).isLessThanOrEqualTo(p.highN()));
    assertThat(d.shares().stream().mapToDouble(Doubt.Share::share).sum())
        .isCloseTo(1, within(1e-9));
  }

  @Test
  void aPullAtThePlanIsEnoughNineteenTimesInTwenty() {
    TinySite t = new TinySite();
    double plan = doubts(t).judge(t.direct()).figures().pullPlanN();
    t.lowN = plan;
    t.highN = plan;
    Doubt d = doubts(t).of(t.direct());
    assertThat(d.enough()).isCloseTo(0.95, within(1e-3));
    assertThat(d.margin()).isCloseTo(1, within(1e-9));
    assertThat(d.sentence()).contains("about 19 times in 20");
    assertThat(d.fails().get(0).check()).isEqualTo("pull");
    assertThat(d.fails().get(0).chance()).isCloseTo(0.05, within(1e-3));
  }

  /** Plain random draws, a million of them, in blocks as large as the even ones. */
  @Test
  void agreesWithAMillionPlainDraws() {
    TinySite t = new TinySite();
    Site site = t.site();
    Reckoned r = new org.fallwright.core.plan.Judge(site, SteadyPull.ONLY).reckon(t.direct());
    double even = new Statics(r.pull(), new Sampler(site).trials()).treeSide().planN();
    Random random = new Random(20);
    int blocks = 245;
    double[] needs = new double[blocks * Sampler.TRIALS];
    double[] ofBlock = new double[blocks];
    for (int b = 0; b < blocks; b++) {
      double[][] points = new double[Input.values().length][Sampler.TRIALS];
      for (double[] p : points) {
        Arrays.setAll(p, i -> (random.nextInt(1 << 30) + 0.5) / (1 << 30));
      }
      Statics s = new Statics(r.pull(), new Sampler(site, points).trials());
      ofBlock[b] = s.treeSide().planN();
      EachTrial each = s.eachTrial().orElseThrow();
      for (int i = 0; i < Sampler.TRIALS; i++) {
        needs[b * Sampler.TRIALS + i] = each.needN(i);
      }
    }
    Arrays.sort(needs);
    double million = Ranks.percentile(needs, 0.95);
    double mean = Arrays.stream(ofBlock).average().orElseThrow();
    double error =
        Math.sqrt(Arrays.stream(ofBlock).map(x -> (x - mean) * (x - mean)).sum() / (blocks - 1));
    // the error of one block of plain draws; even points must do better than that
    assertThat(even).as("error " + error).isCloseTo(million, within(error));
  }

  /**
   * Better known never makes it worse. The direction of the lean is left out: a tree that leans
   * straight against the lay leans less against it whatever the error, so that doubt helps there.
   */
  @Test
  void aNarrowerSpreadNeverLowersAMarginAboveOne() {
    long seed = 9;
    Random random = new Random(seed);
    int seen = 0;
    for (int n = 0; n < 12; n++) {
      TinySite t = TinySite.random(random);
      t.lowN *= 2;
      t.highN *= 2;
      Doubts doubts = doubts(t);
      Doubt d = doubts.brief(t.direct()).orElse(null);
      if (d == null || !(d.poorDayMargin() > 1) || Double.isInfinite(d.poorDayMargin())) {
        continue;
      }
      seen++;
      for (Doubt.Share s : d.shares()) {
        if (s.input() != Input.LEAN_AZIMUTH) {
          double middle = doubts.sampler().may(s.input()).middle();
          double narrower = doubts.poorDayMargin(t.direct(), Otherwise.halved(s.input(), middle));
          assertThat(narrower)
              .as("seed %d, site %d, %s", seed, n, s.input())
              .isGreaterThanOrEqualTo(d.poorDayMargin() * (1 - 2e-3));
        }
      }
    }
    assertThat(seen).isGreaterThan(3);
  }

  @Test
  void theThreeNamedFirstAreThoseWhoseHalvingHelpsMost() {
    TinySite t = new TinySite();
    Doubts doubts = doubts(t);
    Doubt d = doubts.of(t.direct());
    List<Input> named = d.measure().stream().limit(3).map(Doubt.Measure::input).toList();
    double least = named.stream().mapToDouble(i -> halved(doubts, t, i)).min().orElseThrow();
    assertThat(least).isGreaterThan(d.poorDayMargin());
    for (Input other : Input.values()) {
      if (other.measurable() && !named.contains(other)) {
        assertThat(halved(doubts, t, other)).as("%s", other).isLessThanOrEqualTo(least);
      }
    }
  }

  private static double halved(Doubts doubts, TinySite t, Input i) {
    return doubts.poorDayMargin(t.direct(), Otherwise.halved(i, doubts.sampler().may(i).middle()));
  }

  /** Halved in the site file, by the person's own plus-or-minus, it comes to the same. */
  @Test
  void halvingASpreadIsEnteringHalfOfIt() {
    TinySite t = new TinySite();
    Doubts doubts = doubts(t);
    Site site = t.site();
    Quantity lean = site.tree().leanDeg();
    double half = Spreads.of(Spreads.What.LEAN, lean) / 2;
    Site better =
        Copy.with(
            site,
            "tree",
            Copy.with(site.tree(), "leanDeg", new Quantity(lean.value(), lean.how(), half)));
    Doubt d = new Doubts(better, SteadyPull.ONLY).brief(t.direct()).orElseThrow();
    assertThat(d.poorDayMargin()).isCloseTo(halved(doubts, t, Input.LEAN), within(1e-9));
  }

  @Test
  void barsLieAboutTheMarginAndSentencesSayWhatAnErrorDoes() {
    TinySite t = new TinySite();
    Doubt d = doubts(t).of(t.direct());
    Doubt.Bar mass =
        d.bars().stream().filter(b -> b.input() == Input.MASS).findFirst().orElseThrow();
    assertThat(mass.marginAtLow()).isGreaterThan(d.margin());
    assertThat(mass.marginAtHigh()).isLessThan(d.margin());
    Doubt.Measure lean =
        d.measure().stream().filter(m -> m.input() == Input.LEAN).findFirst().orElseThrow();
    assertThat(lean.sentence())
        .startsWith("Measure the lean again from the side: a degree more takes the margin from ");
    assertThat(lean.marginIfOff()).isLessThan(d.margin());
  }

  @Test
  void aHingeThatNeverLetsGoHasNoMargin() {
    TinySite t = new TinySite();
    t.hingeM = 0.16;
    t.leanDeg = 0;
    assertThat(doubts(t).brief(t.direct())).isEmpty();
    assertThatThrownBy(() -> doubts(t).of(t.direct()))
        .isInstanceOf(IllegalArgumentException.class)
        .hasMessageContaining("no margin to doubt");
  }

  @Test
  void stopsWhereItIsCancelled() {
    TinySite t = new TinySite();
    assertThatThrownBy(() -> doubts(t).of(t.direct(), share -> {}, () -> true))
        .isInstanceOf(CancellationException.class);
  }

  @Test
  void theLeadingSetupsOfAPlanAreJudgedOverTheTrialsAndSaySo() {
    Site site = new TinySite().site();
    Plan searched = new Planner(SteadyPull.ONLY).plan(site);
    Plan plan = Doubted.plan(site, SteadyPull.ONLY);
    assertThat(searched.ranked()).noneMatch(j -> j.figures().sampled());
    assertThat(plan.ranked().stream().limit(Doubted.LEADING)).allMatch(j -> j.figures().sampled());
    assertThat(plan.ranked())
        .hasSameSizeAs(searched.ranked())
        .isSortedAccordingTo(Planner.BEST_FIRST);
    assertThat(plan.notes()).anyMatch(n -> n.contains("ways the site may be"));
  }

  /** One input at a time comes out a little low; the difference is bounded and mostly small. */
  @Test
  void oneInputAtATimeIsCloseToTheTrialsOnRandomSites() {
    long seed = 4;
    Random random = new Random(seed);
    List<Double> off = new ArrayList<>();
    for (int n = 0; n < 25; n++) {
      TinySite t = TinySite.random(random);
      Doubt d = doubts(t).brief(t.direct()).orElse(null);
      if (d == null || d.verdict() == Verdict.CANNOT_JUDGE) {
        continue;
      }
      Doubt.Compared plan = d.compared().get(0);
      if (plan.oneAtATime() > 500) {
        off.add(plan.sampled() / plan.oneAtATime() - 1);
      }
    }
    assertThat(off).hasSizeGreaterThan(8).allSatisfy(o -> assertThat(o).isBetween(-0.05, 0.15));
    off.sort(null);
    assertThat(off.get(off.size() / 2)).as("seed " + seed).isBetween(0.0, 0.06);
  }
}
