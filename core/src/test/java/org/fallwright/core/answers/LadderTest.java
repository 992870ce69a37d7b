package org.fallwright.core.answers;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;

import java.util.Arrays;
import java.util.List;
import java.util.Random;
import java.util.Set;
import java.util.TreeSet;
import org.fallwright.core.advice.SteadyPull;
import org.fallwright.core.advice.TinySite;
import org.fallwright.core.plan.Check;
import org.fallwright.core.plan.Judge;
import org.fallwright.core.plan.Judged;
import org.fallwright.core.plan.Plan;
import org.fallwright.core.plan.Planner;
import org.fallwright.core.plan.Setup;
import org.fallwright.core.plan.Verdict;
import org.fallwright.core.site.Anchor;
import org.fallwright.core.site.Copy;
import org.fallwright.core.site.Site;
import org.junit.jupiter.api.Test;

class LadderTest {
  private static final int SITES = 60;

  /** Written out here once more, so that a change of the order is seen. */
  private static final List<String> ORDER =
      List.of(
          "usable",
          "lay lands clear",
          "line runs clear",
          "kit reaches",
          "anchor holds",
          "source pulls and holds",
          "people can stand clear");

  private static Ladder ladder(Site site, Setup s) {
    return Ladder.ofSetup(site, new Judge(site, SteadyPull.ONLY).judge(s), "setup");
  }

  @Test
  void theOrderIsFixed() {
    assertThat(Arrays.stream(Rung.values()).map(Rung::word)).containsExactlyElementsOf(ORDER);
  }

  @Test
  void everyCheckBelongsToExactlyOneRung() {
    Set<String> seen = new TreeSet<>();
    for (long seed = 1; seed <= SITES; seed++) {
      TinySite t = TinySite.random(new Random(seed));
      Judge judge = new Judge(t.site(), SteadyPull.ONLY);
      for (Setup s : List.of(t.direct(), t.redirected(), t.anchored())) {
        for (Check c : judge.judge(s).checks()) {
          seen.add(c.id());
          assertThat(Arrays.stream(Rung.values()).filter(r -> r.holds(c.id())))
              .as("seed %d, %s", seed, c.id())
              .hasSize(1)
              .containsExactly(Rung.of(c.id()));
        }
      }
    }
    assertThat(seen).hasSizeGreaterThan(20);
  }

  @Test
  void theFirstMissIsMarkedAndTheRestStillShown() {
    int missed = 0;
    for (long seed = 1; seed <= SITES; seed++) {
      TinySite t = TinySite.random(new Random(seed));
      t.lowN *= 0.4;
      Ladder l = ladder(t.site(), t.redirected());
      assertThat(l.steps())
          .as("seed %d", seed)
          .extracting(Ladder.Step::rung)
          .containsExactly(Rung.values());
      boolean works = l.verdict().compareTo(Verdict.TIGHT) <= 0;
      assertThat(l.steps().stream().allMatch(Ladder.Step::kept))
          .as("seed %d", seed)
          .isEqualTo(works);
      assertThat(l.steps().stream().filter(Ladder.Step::firstMiss).count())
          .as("seed %d", seed)
          .isEqualTo(works ? 0 : 1);
      if (!works) {
        missed++;
        int at = l.steps().indexOf(l.firstMiss());
        assertThat(l.steps().subList(0, at)).as("seed %d", seed).allMatch(Ladder.Step::kept);
      }
    }
    assertThat(missed).isGreaterThan(5);
  }

  @Test
  void aStepIsTheWorstOfItsChecks() {
    for (long seed = 1; seed <= SITES; seed++) {
      TinySite t = TinySite.random(new Random(seed));
      Judged j = new Judge(t.site(), SteadyPull.ONLY).judge(t.direct());
      for (Ladder.Step s : Ladder.ofSetup(t.site(), j, "x").steps()) {
        Verdict worst =
            j.checks().stream()
                .filter(c -> Rung.of(c.id()) == s.rung())
                .map(Check::verdict)
                .reduce(Verdict.WORKABLE, Verdict::worse);
        assertThat(s.verdict()).as("seed %d, %s", seed, s.rung()).isEqualTo(worst);
      }
    }
  }

  @Test
  void aRejectedAnchorIsMissedAtTheFirstRungAndHoldsNothing() {
    TinySite t = new TinySite();
    Site s = t.site();
    Anchor point = s.anchors().get(0);
    Anchor rejected = (Anchor) Copy.with((Record) point, "rejected", "it moves");
    Ladder l = ladder(Copy.with(s, "anchors", List.of(rejected)), t.anchored());
    assertThat(l.firstMiss().rung()).isEqualTo(Rung.USABLE);
    assertThat(l.firstMiss().sentence()).contains("it moves");
    assertThat(l.steps().get(4).kept()).isFalse();
    assertThat(l.steps().get(4).firstMiss()).isFalse();
  }

  @Test
  void itPointsAtAnchorsSpotsAndLays() {
    TinySite t = new TinySite();
    Site s = t.site();
    Plan plan = new Planner(SteadyPull.ONLY).plan(s);
    Ladder spot = Ladder.of(s, SteadyPull.ONLY, plan, "spot");
    assertThat(spot.setup().place()).isEqualTo("spot");
    assertThat(spot.steps().get(0).sentence()).contains("Nobody has said whose land");
    assertThat(spot.sentence()).startsWith("The best setup that uses spot is");
    assertThat(Uses.of(Ladder.of(s, SteadyPull.ONLY, plan, "point").setup())).contains("point");
    Ladder lay = Ladder.of(s, SteadyPull.ONLY, plan, "12.5");
    assertThat(lay.setup().layDeg()).isEqualTo(12.5);
    for (String bad : List.of("A9", "-3", "361")) {
      assertThatThrownBy(() -> Ladder.of(s, SteadyPull.ONLY, plan, bad))
          .as(bad)
          .hasMessage(
              "\"%s\" is no anchor or spot of the site (point, spot) and no lay from 0 to 360 degrees",
              bad);
    }
  }

  @Test
  void ofALayTheBestWayIsExplained() {
    for (long seed = 1; seed <= 20; seed++) {
      TinySite t = TinySite.random(new Random(seed));
      Site s = t.site();
      Plan plan = new Planner(SteadyPull.ONLY).plan(s);
      Ladder l = Ladder.of(s, SteadyPull.ONLY, plan, "20");
      Judge judge = new Judge(s, SteadyPull.ONLY);
      for (Judged j : plan.ranked()) {
        assertThat(l.verdict())
            .as("seed %d", seed)
            .isLessThanOrEqualTo(judge.judge(j.setup().withLay(20)).verdict());
      }
    }
  }

  @Test
  void anAnchorThatNothingCanUseIsSaidSo() {
    TinySite t = new TinySite();
    Site s = t.site();
    Anchor other = (Anchor) Copy.with((Record) s.anchors().get(0), "id", "lonely");
    Site two = Copy.with(s, "anchors", List.of(s.anchors().get(0), other));
    Site noRedirect = Copy.with(two, "offer", Copy.with(two.offer(), "redirects", 0));
    Plan plan = new Planner(SteadyPull.ONLY).plan(noRedirect);
    assertThatThrownBy(() -> Ladder.of(noRedirect, SteadyPull.ONLY, plan, "lonely"))
        .hasMessageStartingWith("lonely is in no setup");
  }
}
