package org.fallwright.ui.document;

import static org.assertj.core.api.Assertions.assertThat;

import com.fasterxml.jackson.databind.node.ArrayNode;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import org.fallwright.core.plan.Judged;
import org.fallwright.core.plan.Plan;
import org.fallwright.core.site.LeftBehind;
import org.fallwright.core.site.Site;
import org.fallwright.ui.demo.DemoSite;
import org.junit.jupiter.api.Test;

class OpenSiteTest {
  private final Site site = DemoSite.coarse(Site.Display.US).site();
  private final Plan plan = DemoSite.coarse(Site.Display.US).plan();
  private final OpenSite open = new OpenSite();
  private final List<OpenSite.Change> told = new ArrayList<>();

  @Test
  void aPlanBringsItsBestSetup() {
    open.open(null, site);
    open.planned(plan);
    assertThat(open.chosen()).contains(plan.ranked().get(0));
    assertThat(open.display()).isEqualTo(Site.Display.US);
    assertThat(open.progress()).isNaN();
  }

  @Test
  void aPlanWithoutSetupsChoosesNone() {
    open.planned(
        DemoSite.asItIs().with(s -> ((ArrayNode) s.at("/gear/sources")).removeAll()).plan());
    assertThat(open.chosen()).isEmpty();
  }

  @Test
  void anotherSiteForgetsThePlan() {
    open.open(null, site);
    open.planned(plan);
    open.notPlanned("stopped");
    open.open(null, site);
    assertThat(open.plan()).isEmpty();
    assertThat(open.chosen()).isEmpty();
    assertThat(open.failure()).isEmpty();
  }

  @Test
  void inOtherUnitsTheSameSetupStaysChosen() {
    open.open(null, site);
    open.planned(plan);
    Judged before = plan.bestRejected().get("pull");
    open.choose(before);
    Site metric = site.in(Site.Display.METRIC);
    Plan again = DemoSite.coarse(Site.Display.METRIC).plan();
    open.reworded(metric, again);
    assertThat(open.chosen()).contains(again.bestRejected().get("pull"));
    assertThat(open.chosen().orElseThrow().setup()).isEqualTo(before.setup());
    assertThat(open.chosen().orElseThrow().sentence()).isNotEqualTo(before.sentence());
    assertThat(open.site()).contains(metric);
  }

  @Test
  void anEditDropsThePlanAndComesBackToTheWayLookedAt() {
    open.open(null, site);
    open.planned(plan);
    Judged before = plan.ranked().get(2);
    open.choose(before);
    assertThat(open.changed()).isFalse();
    Site edited = site.leaving(new LeftBehind("LC1", null));
    open.edited(edited);
    assertThat(open.changed()).isTrue();
    assertThat(open.plan()).isEmpty();
    assertThat(open.chosen()).isEmpty();
    open.planned(plan);
    assertThat(open.chosen()).contains(before);
    open.planned(plan);
    assertThat(open.chosen()).contains(plan.ranked().get(0));
  }

  @Test
  void otherUnitsOnTheScreenAreNotSaved() {
    open.open(null, site);
    open.edited(site.leaving(new LeftBehind("LC1", null)).in(Site.Display.METRIC));
    assertThat(open.toSave()).contains(site.leaving(new LeftBehind("LC1", null)));
    open.saved(Path.of("x.fallsite.json"));
    assertThat(open.changed()).isFalse();
    assertThat(open.file()).contains(Path.of("x.fallsite.json"));
  }

  @Test
  void listenersHearWhatChangedOnceEach() {
    open.listen(told::add);
    open.open(null, site);
    open.planned(plan);
    open.choose(plan.ranked().get(1));
    open.choose(plan.ranked().get(1));
    open.point(plan.ranked().get(1).checks().get(1));
    open.show(Site.Display.METRIC);
    assertThat(told)
        .containsExactly(
            OpenSite.Change.SITE,
            OpenSite.Change.PLAN,
            OpenSite.Change.CHOICE,
            OpenSite.Change.CHECK,
            OpenSite.Change.UNITS);
  }
}
