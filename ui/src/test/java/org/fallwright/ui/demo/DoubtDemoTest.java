package org.fallwright.ui.demo;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import org.fallwright.core.doubt.Doubt;
import org.fallwright.core.doubt.Doubts;
import org.fallwright.core.doubt.Input;
import org.fallwright.core.plan.Judged;
import org.fallwright.core.plan.Setup;
import org.fallwright.core.plan.Verdict;
import org.fallwright.core.reference.Spreads;
import org.fallwright.core.site.Copy;
import org.fallwright.core.site.Quantity;
import org.fallwright.core.site.Site;
import org.fallwright.core.site.SubjectTree;
import org.junit.jupiter.api.Test;

/** The doubt of the demo's rows. */
class DoubtDemoTest {
  private static final Setup TWO_TO_ONE = DemoSite.tackle(3, "2", "pickup", "rwd", "V1");

  private final Site site = DemoSite.asItIs().site();
  private final Doubts doubts = new Doubts(site, DemoSite.sources());

  @Test
  void theTackleOfTwoIsEnoughNineteenTimesInTwentyAndTightForThat() {
    Doubt d = doubts.of(TWO_TO_ONE);
    assertThat(d.verdict()).isEqualTo(Verdict.TIGHT);
    assertThat(d.margin()).isBetween(1.0, 1.1);
    assertThat(d.enoughAtLeast()).isBetween(0.95, 0.975);
    assertThat(doubts.judge(TWO_TO_ONE).weakest().id()).isEqualTo("pull");
    // the plain calculation would call it comfortable, and the sentence says what it is
    assertThat(d.marginAsEntered()).isGreaterThan(1.25);
    assertThat(d.sentence())
        .startsWith("Tight. The pull is enough about 19 times in 20 if the ground grips")
        .contains("By the entered figures alone the margin would read");
    assertThat(d.failsFirst()).isEqualTo("pull");
  }

  @Test
  void noRowGetsAnotherVerdictByTheTrials() {
    for (Setup row :
        List.of(
            DemoSite.ROW_4,
            DemoSite.ROW_6,
            DemoSite.ROW_7,
            DemoSite.ROW_8,
            TWO_TO_ONE,
            DemoSite.tackle(3, "3", "pickup", "rwd", "V1"),
            DemoSite.tackle(3, "4", "pickup", "rwd", "V1"),
            DemoSite.direct(7, "pickup", "rwd", "V1"),
            DemoSite.direct(323, "hand-winch", "pull", "A3"))) {
      Judged once = DemoSite.asItIs().judge(row);
      Judged all = doubts.judge(row);
      assertThat(all.verdict()).as("%s", row).isEqualTo(once.verdict());
      assertThat(all.figures().sampled()).isTrue();
      assertThat(all.figures().pullPlanN() / once.figures().pullPlanN())
          .as("%s", row)
          .isBetween(1.0, 1.03);
    }
  }

  /** Each spread halved in the site file, by a plus-or-minus of the person's own. */
  @Test
  void halvingEachSpreadConfirmsTheThreeThatAreNamedFirst() {
    Doubt d = doubts.of(DemoSite.ROW_6);
    List<Input> named = d.measure().stream().limit(3).map(Doubt.Measure::input).toList();
    Map<Input, Double> halved = new LinkedHashMap<>();
    SubjectTree t = site.tree();
    halved.put(Input.MASS, tree("massKg", t.massKg(), Spreads.of(Spreads.What.MASS, t.massKg())));
    halved.put(
        Input.MASS_CENTRE,
        tree(
            "massCentreM",
            t.massCentreM(),
            Spreads.massCentreM(t.massCentreM(), t.heightM().value())));
    halved.put(
        Input.LEAN, tree("leanDeg", t.leanDeg(), Spreads.of(Spreads.What.LEAN, t.leanDeg())));
    halved.put(
        Input.LEAN_AZIMUTH,
        tree(
            "leanAzimuthDeg",
            t.leanAzimuthDeg(),
            Spreads.of(Spreads.What.LEAN_AZIMUTH, t.leanAzimuthDeg())));
    halved.put(
        Input.STUMP,
        tree(
            "stumpDiameterM",
            t.stumpDiameterM(),
            Spreads.of(Spreads.What.STUMP_DIAMETER, t.stumpDiameterM())));
    Quantity gust = site.conditions().gustMps();
    halved.put(
        Input.GUST,
        poorDay(
            Copy.with(
                site,
                "conditions",
                Copy.with(
                    site.conditions(),
                    "gustMps",
                    half(gust, Spreads.of(Spreads.What.GUST, gust))))));
    assertThat(halved.keySet()).containsAll(named);
    double least = named.stream().mapToDouble(halved::get).min().orElseThrow();
    assertThat(least).isGreaterThan(d.poorDayMargin());
    halved.forEach(
        (input, margin) -> {
          if (!named.contains(input)) {
            assertThat(margin).as("%s", input).isLessThan(least);
          }
        });
  }

  private double tree(String component, Quantity q, double sd) {
    return poorDay(Copy.with(site, "tree", Copy.with(site.tree(), component, half(q, sd))));
  }

  private static Quantity half(Quantity q, double sd) {
    return new Quantity(q.value(), q.how(), sd / 2);
  }

  private static double poorDay(Site other) {
    return new Doubts(other, DemoSite.sources())
        .brief(DemoSite.ROW_6)
        .orElseThrow()
        .poorDayMargin();
  }
}
