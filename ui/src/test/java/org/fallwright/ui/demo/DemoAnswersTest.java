package org.fallwright.ui.demo;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import com.fasterxml.jackson.databind.node.ObjectNode;
import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import org.fallwright.core.advice.LimitsCard;
import org.fallwright.core.answers.DayVerdicts;
import org.fallwright.core.answers.Ladder;
import org.fallwright.core.answers.Rung;
import org.fallwright.core.plan.Check;
import org.fallwright.core.plan.Judge;
import org.fallwright.core.plan.Judged;
import org.fallwright.core.plan.Plan;
import org.fallwright.core.plan.Verdict;
import org.fallwright.core.site.Site;
import org.fallwright.core.units.DisplayUnits;
import org.junit.jupiter.api.Test;

/** Why-not ladders, sentences, cases and the limits card on the demo with the real plugins. */
class DemoAnswersTest {
  private static final DemoSite DEMO = DemoSite.coarse(Site.Display.METRIC);
  private static final DisplayUnits IN = DisplayUnits.METRIC;

  private static Ladder ladder(String pointed) {
    return Ladder.of(DEMO.site(), DemoSite.sources(), DEMO.plan(), pointed);
  }

  @Test
  void theWetBirchIsStoppedAtTheAnchorAndNowhereElse() {
    Ladder l = ladder("A2");
    assertThat(l.setup().redirects()).containsExactly("A2");
    assertThat(l.steps())
        .extracting(Ladder.Step::verdict)
        .containsExactly(
            Verdict.WORKABLE,
            Verdict.TIGHT,
            Verdict.WORKABLE,
            Verdict.WORKABLE,
            Verdict.NOT_WORKABLE,
            Verdict.WORKABLE,
            Verdict.WORKABLE);
    assertThat(l.firstMiss().rung()).isEqualTo(Rung.ANCHOR);
    assertThat(l.steps().get(1).check()).isEqualTo("clear of F1");
    assertThat(l.steps().get(3).limit()).isCloseTo(49.5, within(0.1));
    assertThat(l.firstMiss().sentence()).startsWith("Anchor A2 bears ");
    assertThat(l.firstMiss().place())
        .isEqualTo(DEMO.site().anchor("A2").orElseThrow().place().at());
  }

  @Test
  void eachPlaceAndALayOverTheShedSayTheirOwnReason() {
    assertThat(ladder("A1").firstMiss()).isNull();
    assertThat(ladder("S1").firstMiss().rung()).isEqualTo(Rung.ANCHOR);
    assertThat(ladder("V2").firstMiss().rung()).isEqualTo(Rung.PULL);
    assertThat(ladder("HC").firstMiss().rung()).isEqualTo(Rung.PULL);
    Ladder.Step shed = ladder("39").firstMiss();
    assertThat(shed.rung()).isEqualTo(Rung.LAY);
    assertThat(shed.sentence()).startsWith("The tree can come down on Shed: 14");
  }

  @Test
  void everyCheckOfThePlanBelongsToOneRung() {
    for (Judged j : all(DEMO.plan())) {
      Ladder l = Ladder.ofSetup(DEMO.site(), j, "x");
      for (Check c : j.checks()) {
        assertThat(Rung.known(c.id())).as(c.id()).hasSize(1).containsExactly(Rung.of(c.id()));
      }
      assertThat(l.steps()).extracting(Ladder.Step::rung).containsExactly(Rung.values());
      assertThat(l.firstMiss() == null)
          .as(j.sentence())
          .isEqualTo(j.verdict().compareTo(Verdict.TIGHT) <= 0);
    }
  }

  private static List<Judged> all(Plan plan) {
    List<Judged> all = new ArrayList<>(plan.ranked());
    all.addAll(plan.bestRejected().values());
    return all;
  }

  @Test
  void everyRejectedSetupExplainsItselfInOneSentenceWithItsOwnNumbers() {
    int rejected = 0;
    for (Judged j : all(DEMO.plan())) {
      if (j.verdict() == Verdict.NOT_WORKABLE) {
        rejected++;
        Check c = j.weakest();
        assertThat(j.sentence()).isEqualTo("Not workable. " + c.why());
        assertThat(c.why()).matches("[A-Z][^\n]*[^.]\\.");
        assertThat(c.why()).as("%s %s %s", c.id(), c.value(), c.limit()).contains(numbers(c));
      }
    }
    assertThat(rejected).isGreaterThan(30);
  }

  /** What the sentence of a failed check must say, worked out from its figures alone. */
  private static List<String> numbers(Check c) {
    String thing = c.id().substring(c.id().lastIndexOf(' ') + 1);
    return switch (c.unit()) {
      case "N" ->
          List.of(IN.both(u -> u.forceAtMost(c.value())), IN.both(u -> u.forceAtLeast(c.limit())));
      case "deg" ->
          List.of(
              String.format(Locale.ROOT, "%.0f", c.value()),
              String.format(Locale.ROOT, "%.0f", c.limit()));
      case "m" ->
          c.id().startsWith("inside ")
              ? List.of(IN.length(-c.value()))
              : c.value() < 0 && c.id().startsWith("clear of ")
                  ? List.of("can come down on " + thing)
                  : c.value() <= 0
                      ? List.of("over or through")
                      : List.of(IN.length(c.value()), IN.length(c.limit()));
      default -> pure(c, thing);
    };
  }

  private static List<String> pure(Check c, String thing) {
    if (c.id().startsWith("usable ")) {
      assertThat(c.value()).isZero();
      return List.of(thing + " is refused");
    }
    if (c.id().equals("hold stability")) {
      return c.value() < 0
          ? List.of("can never hold one")
          : List.of(String.format(Locale.ROOT, "%.1f", c.value()));
    }
    return List.of(
        String.format(Locale.ROOT, "%.1f %%", 100 * c.value()),
        String.format(Locale.ROOT, "%.0f %%", 100 * c.limit()));
  }

  @Test
  void theMeadowWorksDryAndNotWet() {
    DayVerdicts v =
        DayVerdicts.of(
                DEMO.site(),
                DemoSite.sources(),
                List.of(DemoSite.direct(354, "pickup", "awd", "V2")))
            .get(0);
    assertThat(v.sentence())
        .isEqualTo(
            "Workable: dry afternoon; not workable: as planned, wet morning, November, leaf off,"
                + " dusk.");
    assertThat(v.days().get(3).finishBy()).isEqualTo("16:40");
  }

  /** Every cell of both tables against the file itself, altered and judged. */
  @Test
  void everyCellOfTheLimitsCardIsThatSiteJudged() {
    LimitsCard card = LimitsCard.of(DEMO.site(), DemoSite.sources(), DemoSite.ROW_6);
    int cells = 0;
    for (LimitsCard.Row r : card.rows()) {
      for (LimitsCard.Cell c : r.cells()) {
        double mass =
            switch (c.tree()) {
              case A_FIFTH_HEAVIER, LEANING_MORE_AND_HEAVIER -> 1.2;
              case TWO_FIFTHS_HEAVIER -> 1.4;
              default -> 1;
            };
        double lean =
            switch (c.tree()) {
              case LEANING_MORE, LEANING_MORE_AND_HEAVIER -> 3;
              default -> 0;
            };
        Judged j =
            DEMO.with(s -> times(s, "/tree/mass_kg", mass))
                .with(s -> plus(s, "/tree/lean_deg", lean))
                .judge(DemoSite.ROW_6.withAttachHeight(r.heightM()));
        assertThat(c.verdict()).as("%s at %s", c.tree(), r.heightM()).isEqualTo(j.verdict());
        assertThat(c.weakest()).isEqualTo(j.weakest().id());
        assertThat(c.pullPlanN()).isCloseTo(j.figures().pullPlanN(), within(1e-6));
        assertThat(c.pullMargin()).isCloseTo(j.figures().pullMargin(), within(1e-9));
        cells++;
      }
    }
    for (LimitsCard.WindRow r : card.wind()) {
      for (LimitsCard.WindCell c : r.cells()) {
        Judged j =
            DEMO.with(s -> ((ObjectNode) s.at("/tree/lean_deg")).put("value", r.leanDeg()))
                .with(s -> ((ObjectNode) s.at("/conditions/gust_mps")).put("value", c.gustMps()))
                .judge(DemoSite.ROW_6);
        assertThat(c.verdict())
            .as("lean %s, gust %s", r.leanDeg(), c.gustMps())
            .isEqualTo(j.verdict());
        assertThat(c.weakest()).isEqualTo(j.weakest().id());
        assertThat(c.pullPlanN()).isCloseTo(j.figures().pullPlanN(), within(1e-6));
        cells++;
      }
    }
    assertThat(cells).isEqualTo(4 * 5 + 3 * 5);
    assertThat(new Judge(DEMO.site(), DemoSite.sources()).judge(DemoSite.ROW_6).verdict())
        .isEqualTo(card.wind().get(0).cells().get(0).verdict());
  }

  private static void times(ObjectNode s, String at, double factor) {
    ObjectNode q = (ObjectNode) s.at(at);
    q.put("value", q.get("value").asDouble() * factor);
  }

  private static void plus(ObjectNode s, String at, double more) {
    ObjectNode q = (ObjectNode) s.at(at);
    q.put("value", q.get("value").asDouble() + more);
  }
}
