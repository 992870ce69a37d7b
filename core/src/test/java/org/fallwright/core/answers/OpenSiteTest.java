package org.fallwright.core.answers;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.List;
import java.util.Random;
import org.fallwright.core.advice.SteadyPull;
import org.fallwright.core.advice.TinySite;
import org.fallwright.core.plan.Judge;
import org.fallwright.core.plan.Judged;
import org.fallwright.core.plan.Plan;
import org.fallwright.core.plan.Planner;
import org.fallwright.core.plan.Verdict;
import org.fallwright.core.site.Case;
import org.fallwright.core.site.Copy;
import org.fallwright.core.site.Entry;
import org.fallwright.core.site.How;
import org.fallwright.core.site.Quantity;
import org.fallwright.core.site.Site;
import org.junit.jupiter.api.Test;

/** Ranges, what is not known, questions and named cases. */
class OpenSiteTest {
  private static Entry entry(Site s, String component) {
    return Entry.of(s).stream()
        .filter(e -> e.component().equals(component))
        .findFirst()
        .orElseThrow();
  }

  private static Site with(Site s, String component, Quantity q) {
    return entry(s, component).put(s, q);
  }

  @Test
  void nothingIsJudgedWhileAFigureIsNotKnown() {
    TinySite t = new TinySite();
    for (Entry e : Entry.of(t.site())) {
      Site unknown = e.put(t.site(), new Quantity(e.quantity().value(), How.UNKNOWN, null));
      Judged j = new Judge(unknown, SteadyPull.ONLY).judge(t.direct());
      assertThat(j.verdict()).as(e.field()).isEqualTo(Verdict.CANNOT_JUDGE);
      assertThat(j.sentence()).as(e.field()).contains("Nobody knows the " + e.name());
    }
  }

  @Test
  void aRangeIsJudgedAtItsWorseEnd() {
    TinySite t = new TinySite();
    Site range = with(t.site(), "leanDeg", Quantity.range(3, 5));
    Site middle = with(t.site(), "leanDeg", new Quantity(4, How.RANGE, 0.0));
    double needsMore = new Judge(range, SteadyPull.ONLY).judge(t.direct()).figures().pullPlanN();
    assertThat(needsMore)
        .isGreaterThan(new Judge(middle, SteadyPull.ONLY).judge(t.direct()).figures().pullPlanN());
    // alone in its doubt the range brings what its upper end brings
    double atEnd =
        new Judge(with(t.site(), "leanDeg", new Quantity(5, How.RANGE, 0.0)), SteadyPull.ONLY)
            .judge(t.direct())
            .figures()
            .pullNeededN();
    assertThat(needsMore).isGreaterThan(atEnd);
  }

  @Test
  void aTallerEndOfARangeWidensTheZones() {
    TinySite t = new TinySite();
    Judged low = new Judge(t.site(), SteadyPull.ONLY).judge(t.direct());
    Site range = with(t.site(), "heightM", Quantity.range(13, 17));
    Judged wide = new Judge(range, SteadyPull.ONLY).judge(t.direct());
    Judged tall =
        new Judge(with(t.site(), "heightM", Quantity.measured(17)), SteadyPull.ONLY)
            .judge(t.direct());
    assertThat(wide.ground().peopleRadiusM()).isEqualTo(tall.ground().peopleRadiusM());
    assertThat(wide.ground().peopleRadiusM()).isGreaterThan(low.ground().peopleRadiusM());
  }

  @Test
  void betweenTheEndsTheWorstIsNeverBetterThanTheVerdictOfTheRange() {
    int differ = 0;
    for (long seed = 1; seed <= 40; seed++) {
      TinySite t = TinySite.random(new Random(seed));
      Site s = with(t.site(), "leanDeg", Quantity.range(t.leanDeg, t.leanDeg + 5));
      s = with(s, "gustMps", Quantity.range(1, 8));
      Between b = Between.of(s, SteadyPull.ONLY, t.direct());
      Verdict own = new Judge(s, SteadyPull.ONLY).judge(t.direct()).verdict();
      assertThat(b.worst()).as("seed %d", seed).isGreaterThanOrEqualTo(own);
      assertThat(b.best()).as("seed %d", seed).isLessThanOrEqualTo(own);
      assertThat(b.ranges()).containsExactly("lean", "gust");
      if (b.best() != b.worst()) {
        differ++;
      }
    }
    assertThat(differ).isPositive();
  }

  @Test
  void theNeedRunsFromEndToEnd() {
    TinySite t = new TinySite();
    Site s = with(t.site(), "leanDeg", Quantity.range(3, 6));
    Between b = Between.of(s, SteadyPull.ONLY, t.direct());
    assertThat(b.needFromN()).isCloseTo(need(t, 3), within(1e-6));
    assertThat(b.needToN()).isCloseTo(need(t, 6), within(1e-6));
    assertThat(Between.of(t.site(), SteadyPull.ONLY, t.direct()).sentence())
        .isEqualTo("Nothing was entered as a range.");
  }

  private static double need(TinySite t, double lean) {
    Site s = with(t.site(), "leanDeg", Quantity.measured(lean));
    return new Judge(s, SteadyPull.ONLY).judge(t.direct()).figures().pullNeededN();
  }

  @Test
  void whatStopsTheJudgingIsAskedFirstThenWhatDecidesMost() {
    TinySite t = new TinySite();
    t.lowN = 6_500;
    Site s = with(t.site(), "leanDeg", new Quantity(4, How.UNKNOWN, null));
    s = with(s, "heightM", Quantity.range(14.9, 15.1));
    s = with(s, "gustMps", Quantity.range(0, 15));
    Plan plan = new Planner(SteadyPull.ONLY).plan(s);
    List<Questions.Question> q = Questions.of(s, SteadyPull.ONLY, plan).questions();
    assertThat(q.get(0).about()).isEqualTo("tree.lean_deg");
    assertThat(q.get(0).stops()).isTrue();
    List<Questions.Question> rest = q.stream().filter(x -> !x.stops()).toList();
    assertThat(rest)
        .isSortedAccordingTo((a, b) -> Integer.compare(b.decides(), a.decides()))
        .extracting(Questions.Question::about)
        .contains("conditions.gust_mps", "tree.height_m", "spots.spot", "anchors.point");
    assertThat(decides(q, "conditions.gust_mps")).isGreaterThan(decides(q, "tree.height_m"));
  }

  private static int decides(List<Questions.Question> q, String about) {
    return q.stream()
        .filter(x -> x.about().equals(about))
        .mapToInt(Questions.Question::decides)
        .findFirst()
        .orElseThrow();
  }

  @Test
  void nothingIsOpenWhereAllIsMeasuredAndTheLandIsKnown() {
    TinySite t = new TinySite();
    Site s = t.site();
    s = Copy.with(s, "spots", List.of(Copy.with(s.spots().get(0), "land", "owner")));
    s = Copy.with(s, "anchors", List.of(Copy.with((Record) s.anchors().get(0), "land", "owner")));
    Plan plan = new Planner(SteadyPull.ONLY).plan(s);
    assertThat(Questions.of(s, SteadyPull.ONLY, plan).questions()).isEmpty();
  }

  @Test
  void aCaseOverridesOnlyWhatItNames() {
    TinySite t = new TinySite();
    Case storm = new Case("storm", null, null, null, null, Quantity.measured(25), null, "16:40");
    Case same = new Case("same", null, null, null, null, null, null, null);
    Site s = Copy.with(t.site(), "cases", List.of(same, storm));
    DayVerdicts v = DayVerdicts.of(s, SteadyPull.ONLY, List.of(t.direct())).get(0);
    Judged own = new Judge(t.site(), SteadyPull.ONLY).judge(t.direct());
    assertThat(v.days()).extracting(DayVerdicts.Day::id).containsExactly("same", "storm");
    assertThat(v.days().get(0).verdict()).isEqualTo(own.verdict());
    assertThat(v.days().get(0).pullMargin()).isEqualTo(own.figures().pullMargin());
    assertThat(v.days().get(1).verdict()).isEqualTo(Verdict.NOT_WORKABLE);
    assertThat(v.days().get(1).finishBy()).isEqualTo("16:40");
    assertThat(v.sentence()).isEqualTo("Workable: same; not workable: storm.");
    assertThat(DayVerdicts.of(t.site(), SteadyPull.ONLY, List.of(t.direct())).get(0).days())
        .extracting(DayVerdicts.Day::id)
        .containsExactly("as entered");
  }
}
