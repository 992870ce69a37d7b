package org.fallwright.ui.app;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.ArrayList;
import java.util.List;
import org.fallwright.core.site.Looked;
import org.fallwright.core.site.Site;
import org.fallwright.ui.DemoLike;
import org.fallwright.ui.document.OpenSite;
import org.junit.jupiter.api.Test;

class NextThingTest {
  private final OpenSite open = new OpenSite();

  @Test
  void withoutASiteItIsToOpenOne() {
    assertThat(NextThing.of(open)).contains("open a site file");
  }

  @Test
  void whatWasNotLookedForComesBeforeEverythingElse() {
    Site site = DemoLike.site(Site.Display.US);
    open.open(null, site);
    open.planned(DemoLike.plan(site));
    assertThat(NextThing.of(open)).contains("Buried services");
  }

  @Test
  void aWorkableWayAsksForTheProofPullATightOneForALookAtItsWeakest() {
    Site site = allLooked();
    open.open(null, site);
    open.planned(DemoLike.plan(site));
    assertThat(NextThing.of(open)).contains("proof pull");
    open.choose(open.plan().orElseThrow().ranked().get(2));
    assertThat(NextThing.of(open)).contains("pull margin");
    open.choose(open.plan().orElseThrow().ranked().get(3));
    assertThat(NextThing.of(open)).contains("another way");
  }

  @Test
  void whilePlanningItIsToWait() {
    open.open(null, allLooked());
    open.planning(0.2);
    assertThat(NextThing.of(open)).contains("wait");
    open.notPlanned(null);
    assertThat(NextThing.of(open)).contains("plan again");
  }

  private static Site allLooked() {
    Site s = DemoLike.site(Site.Display.US);
    List<Looked> looked = new ArrayList<>();
    for (Looked.What w : Looked.What.values()) {
      looked.add(new Looked(w, Looked.Found.NONE, "crew lead"));
    }
    return new Site(
        s.version(),
        s.name(),
        s.origin(),
        s.display(),
        s.ruleSet(),
        s.declinationDeg(),
        s.picture(),
        s.tree(),
        s.cut(),
        s.targets(),
        s.wires(),
        looked,
        s.dropZones(),
        s.anchors(),
        s.spots(),
        s.gear(),
        s.conditions(),
        s.offer());
  }
}
