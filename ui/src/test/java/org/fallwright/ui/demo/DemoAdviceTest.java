package org.fallwright.ui.demo;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;
import static org.fallwright.ui.demo.DemoSite.ROW_4;
import static org.fallwright.ui.demo.DemoSite.ROW_6;

import com.fasterxml.jackson.databind.node.ObjectNode;
import java.util.List;
import org.fallwright.core.advice.FirstToGive;
import org.fallwright.core.advice.HingeRange;
import org.fallwright.core.advice.LimitsCard;
import org.fallwright.core.advice.LineHeightRange;
import org.fallwright.core.advice.Observables;
import org.fallwright.core.advice.ProofPull;
import org.fallwright.core.advice.Readings;
import org.fallwright.core.advice.WindLimit;
import org.fallwright.core.plan.Judge;
import org.fallwright.core.plan.Judged;
import org.fallwright.core.plan.Setup;
import org.fallwright.core.plan.Verdict;
import org.fallwright.core.site.Site;
import org.junit.jupiter.api.Test;

/** What the advice says on the demo site; figures recomputed, none carried from elsewhere. */
class DemoAdviceTest {
  private static final DemoSite DEMO = DemoSite.asItIs();
  private static final Site SITE = DEMO.site();
  private static final Judge JUDGE = new Judge(SITE, DemoSite.sources());

  private static HingeRange hinge(Setup s) {
    return HingeRange.of(SITE, JUDGE, s);
  }

  @Test
  void theWinchPullsAHingeOfSixtyMillimetresAndTheAimAsksForTwenty() {
    HingeRange h = hinge(ROW_6);
    assertThat(h.workable().lowest()).isCloseTo(0.0185, within(1e-6));
    assertThat(h.workable().below().id()).isEqualTo("clear of Shed");
    assertThat(h.workable().highest()).isCloseTo(0.059, within(1e-6));
    assertThat(h.workable().above().id()).isEqualTo("pull");
    assertThat(h.tight().highest()).isCloseTo(0.0765, within(1e-6));
    assertThat(h.usualM()).isCloseTo(0.052, within(1e-9));
    assertThat(h.sentence()).contains("59 mm").contains("52 mm), lies inside.");
  }

  @Test
  void thePickupNearTheShedBearsLess() {
    HingeRange h = hinge(ROW_4);
    assertThat(h.workable().lowest()).isCloseTo(0.038, within(1e-6));
    assertThat(h.workable().highest()).isCloseTo(0.051, within(1e-6));
    assertThat(h.sentence()).contains("52 mm), lies outside.");
  }

  @Test
  void theWindEndsTheWorkByTheAimBeforeThePullGivesOut() {
    WindLimit w = WindLimit.of(SITE, DemoSite.sources(), ROW_6);
    assertThat(w.workable().highest()).isCloseTo(6.0, within(1e-6));
    assertThat(w.workable().above().id()).isEqualTo("pull");
    assertThat(w.tight().highest()).isCloseTo(7.7, within(1e-6));
    assertThat(w.tight().above().id()).isEqualTo("clear of Shed");
    // the pull alone would last longer
    assertThat(marginAt(7.9)).isGreaterThan(1);
    assertThat(marginAt(8.5)).isLessThan(1);
  }

  private static double marginAt(double gust) {
    return DEMO.with(s -> ((ObjectNode) s.at("/conditions/gust_mps")).put("value", gust))
        .judge(ROW_6)
        .figures()
        .pullMargin();
  }

  @Test
  void aKnownWindFromBehindLeavesMoreRoomThanOneFromAnySide() {
    Site behind =
        DEMO.with(s -> ((ObjectNode) s.at("/conditions")).put("wind_toward_deg", 3)).site();
    assertThat(WindLimit.of(behind, DemoSite.sources(), ROW_6).tight().highest())
        .isGreaterThan(7.7);
  }

  @Test
  void theLineMaySitFromNineMetresUp() {
    LineHeightRange r = LineHeightRange.of(SITE, JUDGE, ROW_6);
    assertThat(r.workable().lowest()).isEqualTo(9);
    assertThat(r.workable().below().id()).isEqualTo("pull");
    assertThat(r.workable().highest()).isEqualTo(14);
    assertThat(r.workable().above()).isNull();
    assertThat(r.bestM()).isEqualTo(12.25);
    assertThat(r.tight().lowest()).isEqualTo(7.25);
    LineHeightRange pickup = LineHeightRange.of(SITE, JUDGE, ROW_4);
    assertThat(pickup.workable().highest()).isEqualTo(12.5);
    assertThat(pickup.workable().above().id()).isEqualTo("line clear of A1");
  }

  @Test
  void theCardHoldsTheWholeSetupNotThePullAlone() {
    LimitsCard card = LimitsCard.of(SITE, DemoSite.sources(), ROW_6);
    assertThat(card.rows())
        .extracting(LimitsCard.Row::heightM)
        .containsExactly(12.0, 10.5, 9.0, 7.5);
    assertThat(card.rows().stream().map(DemoAdviceTest::marks))
        .containsExactly("....+", "..++x", ".++xx", "+xxxx");
    assertThat(card.rows().get(3).cells().get(4).weakest()).isEqualTo("hold stability");
    double[] plan = {6.360, 7.204, 8.059, 8.169, 9.392};
    List<LimitsCard.Cell> planned = card.rows().get(1).cells();
    for (int i = 0; i < plan.length; i++) {
      assertThat(planned.get(i).pullPlanN() / 1000).isCloseTo(plan[i], within(0.002));
    }
    assertThat(planned.get(0).pullPlanN()).isEqualTo(JUDGE.judge(ROW_6).figures().pullPlanN());
  }

  private static String marks(LimitsCard.Row row) {
    StringBuilder marks = new StringBuilder();
    for (LimitsCard.Cell c : row.cells()) {
      marks.append(
          c.verdict() == Verdict.WORKABLE ? '.' : c.verdict() == Verdict.TIGHT ? '+' : 'x');
    }
    return marks.toString();
  }

  @Test
  void theTreeGoesWithTwoMetresOfLineIn() {
    Observables o = Observables.of(SITE, DemoSite.sources(), JUDGE.judge(ROW_6));
    assertThat(o.lineInAtCommitM()).isCloseTo(2.06, within(0.01));
    assertThat(o.strokesAtCommit()).isCloseTo(34.4, within(0.1));
    assertThat(o.gapeAtCommitM()).isCloseTo(0.071, within(0.0006));
    assertThat(o.tipAtCommitM()).isCloseTo(2.70, within(0.01));
    assertThat(o.tipAtEndM()).isCloseTo(3.64, within(0.01));
    assertThat(o.sentence()).contains("34 strokes").contains("71 mm");
    Observables wheels = Observables.of(SITE, DemoSite.sources(), JUDGE.judge(ROW_4));
    assertThat(wheels.strokesAtCommit()).isNaN();
    assertThat(wheels.travelAtCommitM()).isCloseTo(2.12, within(0.01));
  }

  @Test
  void theOakIsReadAtItsSlingTheWinchAtItsOwn() {
    Judged j = JUDGE.judge(ROW_6);
    Readings r = Readings.of(SITE, JUDGE, j);
    assertThat(r.places())
        .extracting(Readings.Reading::at)
        .containsExactly(
            "tree end (T1 to A1)", "sling at A1", "source end (A1 to A3)", "sling at A3");
    double plan = j.figures().pullPlanN();
    assertThat(r.places().get(1).plan().haulingN()).isCloseTo(1.45 * plan, within(0.005 * plan));
    assertThat(r.places().get(1).plan().holdingN()).isCloseTo(1.41 * plan, within(0.005 * plan));
    assertThat(r.places().get(3).plan().haulingN()).isCloseTo(plan / 0.95, within(1e-6 * plan));
    // never later than the stop that the plan itself names
    assertThat(r.places().get(2).ceiling().notPassedN())
        .isCloseTo(j.figures().stopReadingN(), within(1e-6));
  }

  @Test
  void theStemGivesFirst() {
    FirstToGive f = FirstToGive.of(SITE, JUDGE, JUDGE.judge(ROW_6));
    assertThat(f.parts())
        .extracting(FirstToGive.Giving::part)
        .containsExactly("stem", "block at A1", "anchor A1");
    assertThat(f.parts().get(0).tensionN() / 1000).isCloseTo(47.1, within(0.05));
  }

  @Test
  void theProofPullNamesEveryAnchorAndTheTreesOwnRoots() {
    ProofPull p = ProofPull.of(SITE, JUDGE.judge(ROW_6)).orElseThrow();
    assertThat(p.sourceEndN() / 1000).isCloseTo(6.69, within(0.01));
    assertThat(p.watch()).anyMatch(w -> w.startsWith("A1:")).anyMatch(w -> w.startsWith("A3:"));
    assertThat(p.watch()).anyMatch(w -> w.startsWith("T1: its root flare"));
    assertThat(p.momentNm() / 1000).isCloseTo(60.3, within(0.1));
    assertThat(p.sentence()).contains("1/8 in in 3 ft");
  }

  @Test
  void whileAVoltageIsMissingNothingIsAdvised() {
    Site blank = DEMO.with(s -> DemoSite.entry(s.get("wires"), "W1").putNull("voltage_kv")).site();
    Judge judge = new Judge(blank, DemoSite.sources());
    HingeRange h = HingeRange.of(blank, judge, ROW_6);
    assertThat(h.advised()).isNull();
    assertThat(h.sentence()).startsWith("No hinge can be advised yet").contains("voltage");
    WindLimit w = WindLimit.of(blank, DemoSite.sources(), ROW_6);
    assertThat(w.tight()).isNull();
    assertThat(w.sentence()).startsWith("No wind limit can be given yet");
    assertThat(ProofPull.of(blank, judge.judge(ROW_6))).isEmpty();
  }
}
