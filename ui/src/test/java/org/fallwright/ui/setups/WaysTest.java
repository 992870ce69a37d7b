package org.fallwright.ui.setups;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import org.fallwright.core.plan.Judged;
import org.fallwright.core.plan.Plan;
import org.fallwright.core.plan.Setup;
import org.fallwright.core.plan.Verdict;
import org.fallwright.core.site.Site;
import org.fallwright.ui.DemoLike;
import org.fallwright.ui.text.Amounts;
import org.junit.jupiter.api.Test;

class WaysTest {
  private final Site site = DemoLike.site(Site.Display.METRIC);
  private final Amounts metric = new Amounts(Site.Display.METRIC);

  @Test
  void ranksCountUpAndReasonsComeMostOftenFirst() {
    Ways w = Ways.of(DemoLike.plan(site), metric);
    assertThat(w.ranked()).extracting(Ways.Row::lead).containsExactly("1", "2", "3", "4");
    assertThat(w.ruledOut())
        .extracting(Ways.Row::title)
        .containsExactly("Clearance  (212)", "Anchor A2 at plan  (31)", "Pull margin  (9)");
    assertThat(w.ruledOut().get(0).detail())
        .isEqualTo("nearest: hand winch (usual) at S1, lay 039°");
    assertThat(w.summary()).isEqualTo("279 setups judged: 21 workable, 6 tight");
  }

  @Test
  void aWayTellsItsLayLineAndHinge() {
    Ways w = Ways.of(DemoLike.plan(site), metric);
    assertThat(w.ranked().get(0).title()).isEqualTo("Hand winch (usual) at A3 over A1");
    assertThat(w.ranked().get(0).detail()).isEqualTo("lay 003°, line L1 at 10.5 m, hinge 45 mm");
    assertThat(w.ranked().get(0).margin()).isEqualTo("1.46");
  }

  @Test
  void aDrivenTackleNamesItsDriver() {
    Setup s =
        new Setup(
            3,
            10.5,
            0.045,
            "L1",
            List.of(),
            "tackle",
            "3",
            "A1",
            new Setup.Driver("pickup", "pull", "V1"));
    assertThat(Way.title(s)).isEqualTo("tackle (3) at A1 by pickup at V1");
  }

  @Test
  void ofManyWaysThatDoNotWorkOnlySomeAreListed() {
    List<Judged> many = new ArrayList<>(DemoLike.plan(site).ranked().subList(0, 2));
    for (int i = 0; i < 50; i++) {
      many.add(DemoLike.judged(site, i, "crew", "HC", List.of(), Verdict.NOT_WORKABLE, 0.1));
    }
    Ways w = Ways.of(new Plan(many, 52, Map.of(), Map.of(), Map.of(), List.of()), metric);
    assertThat(w.ranked()).hasSize(14);
  }
}
