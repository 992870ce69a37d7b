package org.fallwright.core.change;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.List;
import org.fallwright.core.advice.SteadyPull;
import org.fallwright.core.advice.TinySite;
import org.fallwright.core.plan.Judge;
import org.fallwright.core.plan.Planner;
import org.fallwright.core.plan.Verdict;
import org.fallwright.core.site.Copy;
import org.fallwright.core.site.Entry;
import org.fallwright.core.site.Fix;
import org.fallwright.core.site.Gear;
import org.fallwright.core.site.How;
import org.fallwright.core.site.Position;
import org.fallwright.core.site.Quantity;
import org.fallwright.core.site.Shape;
import org.fallwright.core.site.Site;
import org.fallwright.core.site.Target;
import org.junit.jupiter.api.Test;

class RemediesTest {
  private final TinySite tiny = new TinySite();

  private Remedies of(Site s) {
    return Remedies.of(s, SteadyPull.ONLY, tiny.direct());
  }

  private static Remedy first(Remedies r, Kind kind) {
    return r.remedies().stream()
        .filter(m -> m.edits().size() == 1 && m.edits().get(0).kind() == kind)
        .findFirst()
        .orElseThrow(() -> new AssertionError(kind + " is not among " + r.remedies()));
  }

  @Test
  void aCarUnderTheLineIsMovedAndAShedIsNot() {
    Target car =
        new Target(
            "Car",
            Target.Kind.CAR,
            new Shape.Circle(new Position(0, 50), 2),
            Fix.TAPES,
            null,
            0,
            1.5,
            0.5,
            false,
            false,
            true);
    Site s = Copy.with(tiny.site(), "targets", List.of(car));
    Remedies r = of(s);
    assertThat(r.stops()).contains("line clear of Car");
    assertThat(first(r, Kind.MOVE_THING).sentence()).startsWith("Move Car away");
    Remedies fixed = of(Copy.with(s, "targets", List.of(Copy.with(car, "movable", false))));
    assertThat(fixed.remedies())
        .noneMatch(m -> m.edits().stream().anyMatch(e -> e.kind() == Kind.MOVE_THING));
  }

  @Test
  void aShortLineIsMadeLongEnoughAndNoLonger() {
    Site s = tiny.site();
    Gear.Line rope = s.gear().lines().get(0);
    Site small =
        Copy.with(
            s, "gear", Copy.with(s.gear(), "lines", List.of(Copy.with(rope, "lengthM", 58.0))));
    Remedies r = of(small);
    assertThat(r.stops()).contains("line length");
    double longer = first(r, Kind.LONGER_LINE).edits().get(0).amount();
    Site less =
        Copy.with(
            s,
            "gear",
            Copy.with(s.gear(), "lines", List.of(Copy.with(rope, "lengthM", 58 + longer - 1))));
    assertThat(new Judge(less, SteadyPull.ONLY).judge(tiny.direct()).verdict())
        .isEqualTo(Verdict.NOT_WORKABLE);
    assertThat(first(r, Kind.STAND).sentence()).contains("nearer");
  }

  @Test
  void whatIsNotKnownIsToBeFoundOut() {
    Entry lean =
        Entry.of(tiny.site()).stream()
            .filter(e -> e.component().equals("leanDeg"))
            .findFirst()
            .orElseThrow();
    Remedies r = of(lean.put(tiny.site(), new Quantity(4, How.UNKNOWN, null)));
    assertThat(r.verdict()).isEqualTo(Verdict.CANNOT_JUDGE);
    assertThat(first(r, Kind.ANSWER).sentence()).startsWith("Find out the lean");
    assertThat(r.remedies()).hasSize(1);
  }

  @Test
  void ofAStrongGustTheWaitIsNoLongerThanNeeded() {
    tiny.gustMps = 12;
    Remedies r = of(tiny.site());
    assertThat(r.verdict()).isEqualTo(Verdict.NOT_WORKABLE);
    Edit wait = first(r, Kind.WIND).edits().get(0);
    double gust = wait.site().conditions().gustMps().value();
    tiny.gustMps = gust + 0.5;
    assertThat(new Judge(tiny.site(), SteadyPull.ONLY).judge(tiny.direct()).verdict())
        .isEqualTo(Verdict.NOT_WORKABLE);
  }

  @Test
  void whereNothingCanHelpItIsSaidThatPullingIsNotTheMethod() {
    tiny.lowN = 10;
    tiny.highN = 11;
    tiny.leanDeg = 12;
    Site s = tiny.site();
    SiteRemedies all = SiteRemedies.of(s, SteadyPull.ONLY, new Planner(SteadyPull.ONLY).plan(s));
    assertThat(all.remedies()).isEmpty();
    assertThat(all.binding()).isNotEmpty();
    assertThat(all.sentence()).contains("Pulling is not the method here");
  }

  @Test
  void ofASiteTheSmallestChangeOfItsLeadingSetupsIsSaid() {
    tiny.gustMps = 12;
    Site s = tiny.site();
    SiteRemedies all = SiteRemedies.of(s, SteadyPull.ONLY, new Planner(SteadyPull.ONLY).plan(s));
    assertThat(all.remedies()).isNotEmpty();
    assertThat(all.sentence())
        .isEqualTo(
            "Nothing works as it is. The smallest change: "
                + all.remedies().get(0).remedy().sentence());
    tiny.gustMps = 3;
    Site calm = tiny.site();
    assertThat(
            SiteRemedies.of(calm, SteadyPull.ONLY, new Planner(SteadyPull.ONLY).plan(calm))
                .sentence())
        .startsWith("Something on this site works");
  }
}
