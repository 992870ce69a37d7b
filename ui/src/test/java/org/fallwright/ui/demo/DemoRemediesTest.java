package org.fallwright.ui.demo;

import static org.assertj.core.api.Assertions.assertThat;
import static org.fallwright.ui.demo.DemoSite.ROW_4;
import static org.fallwright.ui.demo.DemoSite.ROW_6;
import static org.fallwright.ui.demo.DemoSite.ROW_7;
import static org.fallwright.ui.demo.DemoSite.direct;
import static org.fallwright.ui.demo.DemoSite.tackle;

import com.fasterxml.jackson.databind.node.ArrayNode;
import com.fasterxml.jackson.databind.node.ObjectNode;
import org.fallwright.core.change.Edit;
import org.fallwright.core.change.Kind;
import org.fallwright.core.change.Remedies;
import org.fallwright.core.change.Remedy;
import org.fallwright.core.change.SiteRemedies;
import org.fallwright.core.plan.Judge;
import org.fallwright.core.plan.Judged;
import org.fallwright.core.plan.Planner;
import org.fallwright.core.plan.Setup;
import org.fallwright.core.plan.Verdict;
import org.fallwright.core.site.Site;
import org.junit.jupiter.api.Test;

/** The demo's switches, turned the bad way: the change that turns them back is among those said. */
class DemoRemediesTest {
  private static final DemoSite DEMO = DemoSite.asItIs().in(Site.Display.METRIC);

  private static Remedies of(DemoSite site, Setup setup, Verdict before) {
    Remedies r = Remedies.of(site.site(), DemoSite.sources(), setup);
    assertThat(r.verdict()).as(r.sentence()).isEqualTo(before);
    for (Remedy m : r.remedies()) {
      Judged again = new Judge(m.site(), DemoSite.sources()).judge(m.setup());
      assertThat(again.verdict()).as(m.sentence()).isEqualTo(m.verdict());
      assertThat(m.verdict()).as(m.sentence()).isLessThan(before);
    }
    return r;
  }

  /** The single change of a kind that is proposed first. */
  private static Remedy said(Remedies r, Kind kind) {
    return r.remedies().stream()
        .filter(m -> m.edits().size() == 1 && m.edits().get(0).kind() == kind)
        .findFirst()
        .orElseThrow(
            () ->
                new AssertionError(
                    kind
                        + " is not among "
                        + r.remedies().stream().map(Remedy::sentence).toList()));
  }

  @Test
  void twoDrivenWheelsAreToBeFour() {
    Remedies r = of(DEMO, direct(7, "pickup", "rwd", "V1"), Verdict.NOT_WORKABLE);
    assertThat(said(r, Kind.MODE).sentence())
        .isEqualTo("Run pickup as \"awd\" in place of \"rwd\": then workable.");
    assertThat(r.stops()).containsExactly("pull");
  }

  @Test
  void theMeadowIsToBeDry() {
    Remedies r = of(DEMO, direct(354, "pickup", "awd", "V2"), Verdict.NOT_WORKABLE);
    assertThat(said(r, Kind.DRY).verdict()).isEqualTo(Verdict.WORKABLE);
    assertThat(said(r, Kind.DRY).pullMargin()).isBetween(1.335, 1.345);
  }

  @Test
  void withTheShortLineItIsToStandNearerOrTakeTheLongOne() {
    Setup shortLine = ROW_4.withLine("L2");
    Remedies r = of(DEMO, shortLine, Verdict.NOT_WORKABLE);
    Edit nearer = said(r, Kind.STAND).edits().get(0);
    assertThat(nearer.amount()).isEqualTo(1.5);
    assertThat(nearer.what()).isEqualTo("stand 1.50 m nearer than V1");
    assertThat(said(r, Kind.OTHER_LINE).sentence())
        .startsWith("Take line L1 (80.0 m) in place of L2");
  }

  @Test
  void aCarUnderTheLineIsToBeMoved() {
    DemoSite under =
        DEMO.with(
            s ->
                DemoSite.entry(s.get("targets"), "C1")
                    .withObject("/shape")
                    .withArray("points")
                    .forEach(p -> ((ArrayNode) p).set(0, p.get(0).asDouble() - 1)));
    Remedies r = of(under, ROW_4, Verdict.NOT_WORKABLE);
    assertThat(said(r, Kind.MOVE_THING).sentence()).startsWith("Move C1 away");
    assertThat(said(r, Kind.MOVE_THING).verdict()).isEqualTo(Verdict.WORKABLE);
  }

  @Test
  void fourPartsWithoutALoadCellAreToHaveOneOrFewerParts() {
    DemoSite none = DEMO.with(s -> ((ObjectNode) s.get("gear")).putNull("load_cell"));
    Remedies r = of(none, tackle(3, "4", "pickup", "rwd", "V1"), Verdict.NOT_WORKABLE);
    assertThat(said(r, Kind.LOAD_CELL).verdict()).isEqualTo(Verdict.TIGHT);
    assertThat(said(r, Kind.MODE).sentence()).startsWith("Run tackle as \"3\" in place of \"4\"");
  }

  @Test
  void aVoltageThatNobodyStatedIsToBeStated() {
    Remedies r = of(DEMO.voltageBlank(), ROW_6, Verdict.CANNOT_JUDGE);
    assertThat(r.remedies()).hasSize(1);
    assertThat(said(r, Kind.ANSWER).sentence())
        .startsWith("Have the owner of W1 state its voltage");
    Remedies two = of(DEMO.voltageBlank().notLooked("people-indoors"), ROW_6, Verdict.CANNOT_JUDGE);
    assertThat(said(two, Kind.ANSWER).sentence()).contains("W1").contains("who is indoors");
  }

  @Test
  void aStrongGustIsToBeWaitedOut() {
    DemoSite ten = DEMO.with(s -> ((ObjectNode) s.at("/conditions/gust_mps")).put("value", 10.0));
    assertThat(said(of(ten, ROW_6, Verdict.NOT_WORKABLE), Kind.WIND).sentence())
        .startsWith("Wait until gusts are no more than ");
  }

  @Test
  void aLayTowardsTheShedIsToBeTurnedAway() {
    Remedy turn = said(of(DEMO, ROW_4.withLay(11), Verdict.NOT_WORKABLE), Kind.LAY);
    assertThat(turn.edits().get(0).what()).contains("to the left");
    assertThat(turn.setup().layDeg()).isBetween(9.0, 10.0);
  }

  @Test
  void aLowLineIsToGoUpAndAThickHingeToBeThinner() {
    assertThat(said(of(DEMO, ROW_4.withAttachHeight(8), Verdict.TIGHT), Kind.LINE_HEIGHT).verdict())
        .isEqualTo(Verdict.WORKABLE);
    Remedy thinner = said(of(DEMO, ROW_4.withHinge(0.06), Verdict.TIGHT), Kind.HINGE);
    assertThat(thinner.edits().get(0).what()).contains("thinner");
  }

  @Test
  void theBirchNeedsDryGroundAndSomethingMore() {
    Remedies r = of(DEMO, ROW_7, Verdict.NOT_WORKABLE);
    assertThat(r.remedies()).isNotEmpty();
    assertThat(r.remedies())
        .allSatisfy(m -> assertThat(m.edits()).hasSize(2))
        .allSatisfy(m -> assertThat(m.edits().get(0).kind()).isEqualTo(Kind.DRY));
  }

  @Test
  void aCrewOnAHandLineCannotBeHelped() {
    SiteRemedies all = SiteRemedies.of(OneCrew.SITE, DemoSite.sources(), OneCrew.PLAN);
    assertThat(all.remedies()).isEmpty();
    assertThat(all.sentence()).contains("Pulling is not the method here");
    assertThat(all.binding()).isNotEmpty();
  }

  /** Planned as a whole, not only judged: the changed site's best setup is as good as was said. */
  @Test
  void aPlanOfTheChangedSiteFindsIt() {
    DemoSite[] sites = {
      DEMO.only("pickup", "V2"),
      DEMO.only("hand-winch", "A3")
          .with(
              s ->
                  ((ArrayNode) s.get("cut").withArray("hinge_thicknesses_m"))
                      .removeAll()
                      .add(0.09)),
      DEMO.only("pickup", "V1")
          .with(s -> ((ObjectNode) s.at("/conditions/gust_mps")).put("value", 9.0)),
      DEMO.only("hand-winch", "A3")
          .with(s -> ((ObjectNode) s.at("/tree/lean_deg")).put("value", 12.0))
    };
    int planned = 0;
    for (DemoSite d : sites) {
      SiteRemedies all = SiteRemedies.of(d.site(), DemoSite.sources(), d.plan());
      for (SiteRemedies.For f : all.remedies().subList(0, Math.min(3, all.remedies().size()))) {
        Judged best = new Planner(DemoSite.sources()).plan(f.remedy().site()).ranked().get(0);
        assertThat(best.verdict())
            .as(f.remedy().sentence())
            .isLessThanOrEqualTo(f.remedy().verdict());
        planned++;
      }
    }
    assertThat(planned).isGreaterThanOrEqualTo(5);
  }
}
