package org.fallwright.core.advice;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.assertj.core.api.Assertions.within;

import com.fasterxml.jackson.databind.JsonNode;
import com.fasterxml.jackson.databind.ObjectMapper;
import java.io.IOException;
import java.util.List;
import java.util.Map;
import org.fallwright.core.plan.Judge;
import org.fallwright.core.plan.Judged;
import org.fallwright.core.plan.Plan;
import org.fallwright.core.plan.Planner;
import org.fallwright.core.plan.Setup;
import org.fallwright.core.plan.Verdict;
import org.fallwright.core.site.Position;
import org.fallwright.core.site.Site;
import org.junit.jupiter.api.Test;

/** Advice on a site small enough to work out by hand. */
class AdviceTest {
  private final TinySite tiny = new TinySite();

  private Judge judge() {
    return new Judge(tiny.site(), SteadyPull.ONLY);
  }

  private Judged judged(Setup s) {
    return judge().judge(s);
  }

  private static void close(double value, double expected) {
    assertThat(value).isCloseTo(expected, within(1e-9 * Math.abs(expected)));
  }

  @Test
  void aBlockAtARightAngleCarriesTheRootOfBothSquares() {
    // the first leg falls 7 m over 40 m of ground, the second runs level and square to it
    tiny.anchor = new Position(0, 40);
    Site site = spotEastOfTheAnchor();
    Judge judge = new Judge(site, SteadyPull.ONLY);
    Judged j = judge.judge(tiny.redirected());
    Readings.Reading[] at = Readings.of(site, judge, j).places().toArray(Readings.Reading[]::new);
    assertThat(at)
        .extracting(Readings.Reading::at)
        .containsExactly(
            "tree end (tree to point)", "sling at point", "source end (point to spot)");
    double plan = j.figures().pullPlanN();
    close(at[0].plan().haulingN(), plan);
    close(at[0].plan().holdingN(), plan);
    // the block passes on 0.9: the leg behind it carries 1/0.9
    close(at[2].plan().haulingN(), plan / 0.9);
    close(at[2].plan().holdingN(), plan);
    close(at[1].plan().holdingN(), plan * Math.sqrt(2));
    close(at[1].plan().haulingN(), plan * Math.hypot(1, 1 / 0.9));
    close(at[2].hold().haulingN(), j.figures().holdN() / 0.9);
    close(at[2].ceiling().notPassedN(), j.figures().ceilingN());
    close(at[2].plan().surelyN(), plan / 0.9);
  }

  /** The source 10 m east of the anchor, at the height of its sling. */
  private Site spotEastOfTheAnchor() {
    Site s = tiny.site();
    var spot = s.spots().get(0);
    var moved =
        new org.fallwright.core.site.Spot(
            spot.id(),
            new org.fallwright.core.site.Place(new Position(10, 40), 0.5, spot.place().fix(), null),
            null,
            spot.surface(),
            false,
            0,
            null,
            null);
    return new Site(
        s.version(),
        s.name(),
        s.origin(),
        s.display(),
        s.ruleSet(),
        null,
        null,
        s.tree(),
        s.cut(),
        s.targets(),
        s.wires(),
        s.looked(),
        s.dropZones(),
        s.anchors(),
        List.of(moved),
        s.gear(),
        s.conditions(),
        s.offer(),
        s.strips());
  }

  @Test
  void aDirectLineReadsTheSameAtBothEndsAndAtItsAnchor() {
    Judged j = judged(tiny.anchored());
    Readings r = Readings.of(tiny.site(), judge(), j);
    assertThat(r.places())
        .extracting(Readings.Reading::at)
        .containsExactly("tree end and source end (tree to point)", "sling at point");
    assertThat(r.places())
        .allSatisfy(p -> close(p.plan().haulingN(), j.figures().pullPlanN()))
        .allSatisfy(p -> close(p.ceiling().holdingN(), j.figures().ceilingN()));
  }

  @Test
  void whatGivesFirstIsTheLeastStrengthOverItsLoad() {
    FirstToGive f = FirstToGive.of(tiny.site(), judge(), judged(tiny.anchored()));
    // rope 150 kN with an end of 0.9; sling and link 40 kN × 5; the point 400 kN; all see T itself
    assertThat(f.parts().get(0).part()).isEqualTo("stem");
    assertThat(f.parts().get(1).part()).isEqualTo("line rope");
    close(f.parts().get(1).tensionN(), 135_000);
    close(f.parts().get(2).tensionN(), 200_000);
    // the stem's ceiling has its factor of 3 inside
    assertThat(judged(tiny.anchored()).figures().ceilingPart()).isEqualTo("stem");
    close(f.parts().get(0).tensionN(), 3 * f.ceilingN());
    assertThat(f.sentence()).contains("stem gives first").doesNotContain("enough to break it");
  }

  @Test
  void aSourceStrongEnoughToBreakThePartIsSaidSo() {
    tiny.highN = 140_000;
    FirstToGive f = FirstToGive.of(tiny.site(), judge(), judged(tiny.direct()));
    // the stop at a reading holds the source near the ceiling as long as there is a load cell
    assertThat(f.sourceHighN()).isLessThan(140_000);
    assertThat(f.sentence()).doesNotContain("enough to break it");
  }

  @Test
  void theTipMovesAsATurnAboutTheHingeMovesIt() {
    Judged j = judged(tiny.direct());
    Observables o = Observables.of(tiny.site(), SteadyPull.ONLY, j);
    // Ds 0.50, a quarter face, 40 mm: the hinge's middle is 0.25 − 0.125 − 0.02 = 0.105 m ahead
    double up = 15 - 0.3;
    double u = -up * Math.tan(Math.toRadians(4)) - 0.105;
    double phi = Math.toRadians(j.figures().commitDeg());
    close(o.tipAtCommitM(), u * Math.cos(phi) + up * Math.sin(phi) - u);
    assertThat(o.tipAtEndM()).isGreaterThan(o.tipAtCommitM());
    // gape: kerf + (0.50 − 0.125 − 0.04)·φ
    close(o.gapeAtCommitM(), 0.01 + 0.335 * phi);
    // two metres of travel for a metre of line, 0.1 m a stroke
    close(o.travelAtCommitM(), 2 * o.lineInAtCommitM());
    close(o.strokesAtCommit(), 20 * o.lineInAtCommitM());
  }

  @Test
  void theProofPullIsThePullToPlanForAndItsMomentOnTheRoots() {
    Judged j = judged(tiny.redirected());
    ProofPull p = ProofPull.of(tiny.site(), j).orElseThrow();
    close(p.treeN(), j.figures().pullPlanN());
    close(p.sourceEndN(), j.figures().pullPlanN() / 0.9);
    close(p.momentNm(), j.figures().pullPlanN() * j.figures().leverM());
    assertThat(p.gentleTiltDeg()).isEqualTo(0.2);
    assertThat(p.mostTiltDeg()).isEqualTo(0.25);
    // 0.2 degrees in a metre is 3.5 mm; what is said is less
    assertThat(1000 * Math.tan(Math.toRadians(0.2))).isBetween(3.0, 3.5);
    assertThat(p.sentence()).contains("slack again").contains("3 mm in 1 m");
  }

  @Test
  void noProofPullOfASetupThatIsNotWorkable() {
    tiny.lowN = 500;
    assertThat(judged(tiny.direct()).verdict()).isEqualTo(Verdict.NOT_WORKABLE);
    assertThat(ProofPull.of(tiny.site(), judged(tiny.direct()))).isEmpty();
  }

  @Test
  void aSourceFarTooWeakLeavesNoHingeNoHeightAndNoWind() {
    tiny.lowN = 500;
    Site site = tiny.site();
    HingeRange h = HingeRange.of(site, judge(), tiny.direct());
    assertThat(h.advised()).isNull();
    assertThat(h.limit()).isNotNull();
    assertThat(h.sentence()).startsWith("No hinge of any thickness will do");
    assertThat(LineHeightRange.of(site, judge(), tiny.direct()).tight()).isNull();
    WindLimit w = WindLimit.of(site, SteadyPull.ONLY, tiny.direct());
    assertThat(w.tight()).isNull();
    assertThat(w.sentence()).startsWith("Not even in calm air");
  }

  @Test
  void theLineStaysBelowEightTenthsOfTheTreeAndOnAStemThickEnough() {
    LineHeightRange r = LineHeightRange.of(tiny.site(), judge(), tiny.direct());
    // 0.45 m at 1.3 m and nothing at 15 m; 0.94 of it is inside the bark: 0.10 m is at 11.76 m
    assertThat(r.lookedToM()).isEqualTo(11.75);
    assertThat(r.lookedFromM()).isEqualTo(1);
    assertThat(r.topReason()).contains("thinner than 10.0 cm");
    assertThat(r.workable().holds(r.bestM())).isTrue();
  }

  @Test
  void theCardHasARowForEachHeightThatTheStemTakes() {
    LimitsCard card = LimitsCard.of(tiny.site(), SteadyPull.ONLY, tiny.direct());
    assertThat(card.rows()).extracting(LimitsCard.Row::heightM).containsExactly(9.5, 8.0, 6.5, 5.0);
    tiny.attachM = 11;
    assertThat(LimitsCard.of(tiny.site(), SteadyPull.ONLY, tiny.direct()).rows())
        .extracting(LimitsCard.Row::heightM)
        .containsExactly(11.0, 9.5, 8.0);
    tiny.leanDeg = 43;
    assertThat(LimitsCard.of(tiny.site(), SteadyPull.ONLY, tiny.direct()).rows())
        .allSatisfy(r -> assertThat(r.cells()).hasSize(3));
  }

  @Test
  void aCellOfTheCardIsThatSiteJudged() {
    tiny.massKg = 2000.0;
    LimitsCard.Cell heavier =
        LimitsCard.of(tiny.site(), SteadyPull.ONLY, tiny.direct()).rows().get(1).cells().get(4);
    assertThat(heavier.tree()).isEqualTo(LimitsCard.Tree.LEANING_MORE_AND_HEAVIER);
    tiny.massKg = 2400.0;
    tiny.leanDeg = 7;
    Judged j = judged(tiny.direct());
    close(heavier.pullPlanN(), j.figures().pullPlanN());
    assertThat(heavier.verdict()).isEqualTo(j.verdict());
    assertThat(heavier.weakest()).isEqualTo(j.weakest().id());
  }

  @Test
  void aMassThatWasNotEnteredGrowsWithItsSpread() {
    tiny.massKg = null;
    double plain = judged(tiny.direct()).figures().pullPlanN();
    Site same = Altered.heavier(tiny.site(), 1);
    close(new Judge(same, SteadyPull.ONLY).judge(tiny.direct()).figures().pullPlanN(), plain);
  }

  @Test
  void pullingIsNotTheMethodOnlyWhereEverythingWasJudgedAndFails() {
    tiny.lowN = 500;
    Plan nothing = new Planner(SteadyPull.ONLY).plan(tiny.site());
    NotByPulling n = NotByPulling.of(nothing).orElseThrow();
    assertThat(n.binding().stream().mapToInt(NotByPulling.Binding::setups).sum())
        .isEqualTo(n.judged());
    assertThat(n.binding()).isSortedAccordingTo((a, b) -> Integer.compare(b.setups(), a.setups()));
    assertThat(n.sentence())
        .startsWith("Pulling is not the method here")
        .contains("dismantling")
        .contains("crane");
    tiny.lowN = 12_000;
    assertThat(NotByPulling.of(new Planner(SteadyPull.ONLY).plan(tiny.site()))).isEmpty();
    assertThat(NotByPulling.of(new Plan(List.of(), 0, Map.of(), Map.of(), Map.of(), List.of())))
        .isEmpty();
    Plan unknown =
        new Plan(
            List.of(),
            2,
            Map.of(Verdict.NOT_WORKABLE, 1, Verdict.CANNOT_JUDGE, 1),
            Map.of("pull", 1),
            Map.of(),
            List.of());
    assertThat(NotByPulling.of(unknown)).isEmpty();
  }

  @Test
  void allOfItIsWrittenWithUnitsInTheNames() throws IOException {
    Site site = tiny.site();
    Plan plan = new Planner(SteadyPull.ONLY).plan(site);
    Advice advice = Advice.of(site, SteadyPull.ONLY, plan, 1);
    byte[] first = AdviceJson.write(site, advice, "0");
    assertThat(AdviceJson.write(site, Advice.of(site, SteadyPull.ONLY, plan, 1), "0"))
        .isEqualTo(first);
    JsonNode doc = new ObjectMapper().readTree(first);
    assertThat(doc.path("format").asText()).isEqualTo("fallwright-advice");
    JsonNode a = doc.path("advice");
    assertThat(a.at("/judged/verdict").asText()).isEqualTo("workable");
    assertThat(a.at("/hinge/workable/lowest").asDouble())
        .isEqualTo(advice.hinge().workable().lowest(), within(1e-8));
    assertThat(a.at("/hinge/workable/unit").asText()).isEqualTo("m");
    assertThat(a.at("/hinge/workable/above/check").asText()).isNotEmpty();
    assertThat(a.at("/wind/planned_mps").asDouble()).isEqualTo(3);
    assertThat(a.at("/wind/toward_deg").isNull()).isTrue();
    assertThat(a.at("/line_height/best_m").isNumber()).isTrue();
    assertThat(a.at("/readings/places/0/plan/hauling_N").isNumber()).isTrue();
    assertThat(a.at("/first_to_give/parts/0/tension_N").isNumber()).isTrue();
    assertThat(a.at("/proof_pull/moment_Nm").isNumber()).isTrue();
    assertThat(a.at("/card/rows/0/cells/1/tree").asText()).isEqualTo("20 % heavier");
    assertThat(a.at("/card/rows/0/cells/1/pull_plan_N").isNumber()).isTrue();
    assertThat(a.at("/not_by_pulling").isNull()).isTrue();
  }

  @Test
  void aRankThatThePlanDoesNotHaveIsRefused() {
    Plan plan = new Planner(SteadyPull.ONLY).plan(tiny.site());
    int beyond = plan.ranked().size() + 1;
    assertThatThrownBy(() -> Advice.of(tiny.site(), SteadyPull.ONLY, plan, beyond))
        .isInstanceOf(IllegalArgumentException.class)
        .hasMessage("rank is " + beyond + "; it must be from 1 to " + (beyond - 1));
  }
}
