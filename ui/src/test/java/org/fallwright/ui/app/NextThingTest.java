package org.fallwright.ui.app;

import static org.assertj.core.api.Assertions.assertThat;

import org.fallwright.core.plan.Judged;
import org.fallwright.core.plan.Verdict;
import org.fallwright.core.site.Site;
import org.fallwright.ui.demo.DemoSite;
import org.fallwright.ui.document.OpenSite;
import org.junit.jupiter.api.Test;

class NextThingTest {
  private static final DemoSite DEMO = DemoSite.coarse(Site.Display.US);
  private final OpenSite open = new OpenSite();

  @Test
  void withoutASiteItIsToOpenOne() {
    assertThat(NextThing.of(open)).contains("open a site file");
  }

  @Test
  void whatWasNotLookedForComesBeforeEverythingElse() {
    DemoSite demo = DEMO.only("hand-winch", "A3").notLooked("buried-services");
    open.open(null, demo.site());
    open.planned(demo.plan());
    assertThat(NextThing.of(open)).contains("Buried services");
  }

  @Test
  void aWorkableWayAsksForTheProofPullATightOneForALookAtItsWeakest() {
    open.open(null, DEMO.site());
    open.planned(DEMO.plan());
    assertThat(NextThing.of(open)).contains("proof pull");
    Judged tight = DEMO.best(Verdict.TIGHT);
    open.choose(tight);
    assertThat(NextThing.of(open)).contains(tight.weakest().id()).doesNotContain("proof pull");
    open.choose(DEMO.best(Verdict.NOT_WORKABLE));
    assertThat(NextThing.of(open)).contains("another way");
  }

  @Test
  void whatCannotBeJudgedAsksForWhatIsMissing() {
    DemoSite blank = DEMO.only("hand-winch", "A3").voltageBlank();
    open.open(null, blank.site());
    open.planned(blank.plan());
    assertThat(NextThing.of(open)).contains(blank.best(Verdict.CANNOT_JUDGE).weakest().id());
  }

  @Test
  void whilePlanningItIsToWait() {
    open.open(null, DEMO.site());
    open.planning(0.2);
    assertThat(NextThing.of(open)).contains("wait");
    open.notPlanned(null);
    assertThat(NextThing.of(open)).contains("plan again");
  }
}
