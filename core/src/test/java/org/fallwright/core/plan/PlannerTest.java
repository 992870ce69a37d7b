package org.fallwright.core.plan;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.assertj.core.api.Assertions.within;

import java.util.List;
import java.util.concurrent.CancellationException;
import org.fallwright.core.site.Site;
import org.junit.jupiter.api.Test;

/** The planner on sites worked by hand. */
class PlannerTest {
  private static final String HOUSE =
      """
      {"id": "House", "kind": "structure",
       "shape": {"type": "polygon", "points": [[%s]]},
       "fix": "tapes", "stated_error_m": null, "ground_m": 0, "height_m": 5,
       "required_distance_m": 1.5, "occupied": true, "may_be_hit": false, "movable": false}""";

  private static Plan plan(Site site) {
    return new Planner(TinySite.SOURCES).plan(site);
  }

  private static Setup north() {
    return new Setup(0, 6, 0.03, "L2", List.of(), "steady", "pull", "R1", null);
  }

  /**
   * By hand: hinge middle 0.06 m ahead, kerf 2.936 deg; mass centre 3.8 m up and 0.2592 m behind
   * the hinge, attachment 5.8 m up and 0.3640 m behind; hinge 57 MPa x 0.24 m x (0.03 m)^2 / 6 =
   * 2,052 N m, wind at 2 m/s 61.7 N m; weight sat back -2,223.3 N m; lever 5.593 m; so 4,337 N m /
   * 5.593 m = 775.4 N. Commit: asin(2,113.7 / (4,903.3 N x 3.809 m)) + 3.902 deg = 10.40 deg.
   */
  @Test
  void theStraightPullIsThatWorkedByHand() {
    Judged j = new Judge(TinySite.site(20_000), TinySite.SOURCES).judge(north());
    assertThat(j.figures().pullNeededN()).isCloseTo(775.4, within(0.1));
    assertThat(j.figures().commitDeg()).isCloseTo(10.40, within(0.01));
    assertThat(j.figures().lineRiseDeg()).isCloseTo(9.37, within(0.05));
  }

  @Test
  void aStrongSourceFallsItStraightToTheAnchor() {
    Plan p = plan(TinySite.site(4_000));
    assertThat(p.ranked()).hasSize(1);
    Judged best = p.ranked().get(0);
    assertThat(best.verdict()).isEqualTo(Verdict.WORKABLE);
    assertThat(best.setup().layDeg() % 360).isIn(355.0, 0.0, 5.0);
    assertThat(p.judged()).isEqualTo(72);
    assertThat(p.byVerdict().values().stream().mapToInt(Integer::intValue).sum()).isEqualTo(72);
  }

  @Test
  void aWeakSourceIsRuledOutByItsPull() {
    Plan p = plan(TinySite.site(300));
    Judged best = p.ranked().get(0);
    assertThat(best.verdict()).isEqualTo(Verdict.NOT_WORKABLE);
    Check pull =
        best.checks().stream().filter(c -> c.id().equals("pull")).findFirst().orElseThrow();
    assertThat(pull.verdict()).isEqualTo(Verdict.NOT_WORKABLE);
    assertThat(p.byBindingCheck()).isNotEmpty();
    assertThat(p.bestRejected().keySet()).isEqualTo(p.byBindingCheck().keySet());
    assertThat(p.byBindingCheck().values().stream().mapToInt(Integer::intValue).sum())
        .isEqualTo(72);
  }

  @Test
  void aHouseInTheWayRulesTheStraightLayOut() {
    // the house stands across the north from 8 to 12 m; the tree with its margin is 13 m long
    Site site =
        TinySite.site(
            4_000,
            s -> TinySite.add(s, "targets", HOUSE.formatted("-6, 8], [6, 8], [6, 12], [-6, 12")));
    Judged j = new Judge(site, TinySite.SOURCES).judge(north());
    assertThat(j.verdict()).isEqualTo(Verdict.NOT_WORKABLE);
    assertThat(j.weakest().id()).isEqualTo("clear of House");
    assertThat(j.weakest().ratio()).isZero();
    assertThat(j.figures().clearanceTarget()).isEqualTo("House");
  }

  @Test
  void oneMoreTargetNeverMakesASetupBetter() {
    Judged without = new Judge(TinySite.site(4_000), TinySite.SOURCES).judge(north());
    Site site =
        TinySite.site(
            4_000,
            s -> TinySite.add(s, "targets", HOUSE.formatted("5, 2], [9, 2], [9, 6], [5, 6")));
    Judged with = new Judge(site, TinySite.SOURCES).judge(north());
    assertThat(with.standing()).isLessThanOrEqualTo(without.standing());
    assertThat(with.verdict()).isGreaterThanOrEqualTo(without.verdict());
  }

  @Test
  void anAnchorRejectedOnTheSiteIsObeyed() {
    Site site =
        TinySite.site(
            4_000,
            s ->
                ((com.fasterxml.jackson.databind.node.ObjectNode) s.get("anchors").get(0))
                    .put("rejected", "it moved"));
    Judged j = new Judge(site, TinySite.SOURCES).judge(north());
    assertThat(j.verdict()).isEqualTo(Verdict.NOT_WORKABLE);
    assertThat(j.weakest().id()).isEqualTo("usable R1");
    assertThat(j.weakest().why()).contains("it moved");
  }

  @Test
  void wiresThatNobodyLookedForStopTheJudging() {
    Site site =
        TinySite.site(
            4_000,
            s ->
                s.set(
                    "looked",
                    com.fasterxml.jackson.databind.node.JsonNodeFactory.instance.arrayNode()));
    Plan p = plan(site);
    assertThat(p.ranked()).allMatch(j -> j.verdict() == Verdict.CANNOT_JUDGE);
    assertThat(p.byVerdict()).containsOnlyKeys(Verdict.CANNOT_JUDGE);
  }

  @Test
  void aSourceWithoutItsPluginIsLeftOutAndSaid() {
    Plan p = new Planner(List::of).plan(TinySite.site(4_000));
    assertThat(p.ranked()).isEmpty();
    assertThat(p.notes()).anyMatch(n -> n.contains("no plugin \"steady\" is loaded"));
  }

  @Test
  void theAnswerIsTheSameOnEveryRun() {
    Site site = TinySite.site(1_500);
    Plan a = plan(site);
    Plan b = plan(site);
    assertThat(b.ranked().get(0).setup()).isEqualTo(a.ranked().get(0).setup());
    assertThat(b.ranked().get(0).figures()).isEqualTo(a.ranked().get(0).figures());
    assertThat(b.byBindingCheck()).isEqualTo(a.byBindingCheck());
  }

  @Test
  void theQuickLookAndTheFullOneAgree() {
    Judge judge = new Judge(TinySite.site(1_500), TinySite.SOURCES);
    for (double lay = 0; lay < 360; lay += 15) {
      Judged full = judge.judge(north().withLay(lay));
      Look quick = judge.look(north().withLay(lay));
      assertThat(quick.verdict()).isEqualTo(full.verdict());
      assertThat(quick.failing()).isEqualTo(full.failing());
      assertThat(quick.standing()).isEqualTo(full.standing());
      assertThat(quick.standings()).containsExactly(full.standings().toArray(Double[]::new));
    }
  }

  @Test
  void itCanBeCancelled() {
    assertThatThrownBy(
            () -> new Planner(TinySite.SOURCES).plan(TinySite.site(1_500), share -> {}, () -> true))
        .isInstanceOf(CancellationException.class);
  }

  @Test
  void onALayThatFallsSteeplyTheTreeMaySlideOn() {
    // the anchor thirty metres north lies six metres lower: 11.3 degrees, more than ten
    Site steep =
        TinySite.site(
            4_000,
            s ->
                ((com.fasterxml.jackson.databind.node.ObjectNode)
                        s.get("anchors").get(0).get("place"))
                    .put("ground_m", -6));
    Judged down = new Judge(steep, TinySite.SOURCES).judge(north());
    Judged level = new Judge(TinySite.site(4_000), TinySite.SOURCES).judge(north());
    double reach = level.ground().footprint().getEnvelopeInternal().getMaxY();
    assertThat(down.ground().footprint().getEnvelopeInternal().getMaxY())
        .isCloseTo(reach + 5, within(0.1));
    assertThat(down.notes()).anyMatch(n -> n.contains("slide"));
    assertThat(level.notes()).noneMatch(n -> n.contains("slide"));
    // uphill there is nothing to slide
    Judged up = new Judge(steep, TinySite.SOURCES).judge(north().withLay(180));
    assertThat(up.notes()).noneMatch(n -> n.contains("slide"));
  }

  @Test
  void aLineTiedAtTheCutIsRefused() {
    Site low =
        TinySite.site(
            4_000,
            s ->
                ((com.fasterxml.jackson.databind.node.ObjectNode) s.get("offer"))
                    .putArray("attach_heights_m")
                    .add(0.7));
    assertThatThrownBy(() -> plan(low))
        .isInstanceOf(IllegalArgumentException.class)
        .hasMessage(
            "offer.attach_heights_m holds 0.7 m, which is 0.50 m above the cut; it must be more"
                + " than 0.5 m above it");
  }
}
