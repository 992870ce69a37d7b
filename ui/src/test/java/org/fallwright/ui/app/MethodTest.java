package org.fallwright.ui.app;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.List;
import java.util.Map;
import org.fallwright.core.plan.Plan;
import org.fallwright.core.plan.Verdict;
import org.fallwright.core.site.Site;
import org.fallwright.ui.demo.OneCrew;
import org.fallwright.ui.document.OpenSite;
import org.fallwright.ui.setups.Answer;
import org.fallwright.ui.text.Amounts;
import org.junit.jupiter.api.Test;

/** Where everything fails, the window says that pulling is not the method. */
class MethodTest {
  private final Answer best =
      Answer.of(OneCrew.PLAN.ranked().get(0), new Amounts(Site.Display.METRIC));

  @Test
  void theStripSaysItBeforeTheWaysOwnSentence() {
    Answer said = best.inPlan(OneCrew.PLAN);
    assertThat(said.sentence())
        .startsWith(
            "Pulling is not the method here: all " + OneCrew.PLAN.judged() + " setups fail.")
        .endsWith(best.sentence());
    assertThat(said.cells()).isEqualTo(best.cells());
  }

  @Test
  void theNextThingIsAnotherMethod() {
    OpenSite open = new OpenSite();
    open.open(null, OneCrew.SITE);
    open.planned(OneCrew.PLAN);
    assertThat(NextThing.of(open)).contains("another method").contains("crane");
  }

  @Test
  void nothingIsSaidOfTheMethodWhereOneSetupIsNotJudged() {
    Plan open =
        new Plan(
            OneCrew.PLAN.ranked(),
            2,
            Map.of(Verdict.NOT_WORKABLE, 1, Verdict.CANNOT_JUDGE, 1),
            Map.of("pull margin", 1),
            Map.of(),
            List.of());
    assertThat(best.inPlan(open)).isEqualTo(best);
    OpenSite site = new OpenSite();
    site.open(null, OneCrew.SITE);
    site.planned(open);
    assertThat(NextThing.of(site)).contains("another way");
  }
}
