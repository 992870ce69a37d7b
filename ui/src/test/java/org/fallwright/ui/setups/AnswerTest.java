package org.fallwright.ui.setups;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.List;
import java.util.Map;
import org.fallwright.core.plan.Judged;
import org.fallwright.core.plan.Plan;
import org.fallwright.core.plan.Verdict;
import org.fallwright.core.site.Site;
import org.fallwright.ui.DemoLike;
import org.fallwright.ui.text.Amounts;
import org.junit.jupiter.api.Test;

class AnswerTest {
  private final Site site = DemoLike.site(Site.Display.METRIC);
  private final Judged best = DemoLike.plan(site).ranked().get(0);

  @Test
  void theStripSaysTheWayAndItsFiguresInOrder() {
    Answer a = Answer.of(best, new Amounts(Site.Display.METRIC));
    assertThat(a.verdict()).isEqualTo(Verdict.WORKABLE);
    assertThat(a.sentence()).startsWith("Hand winch (usual) at A3 over A1, lay 003°. Plan for");
    assertThat(a.cells())
        .containsExactly(
            new Answer.Cell("needs", "6.36 kN", "4.73 kN as entered"),
            new Answer.Cell("gives", "9.28 kN", "1.46 times the need"),
            new Answer.Cell("clears", "3.90 m", "Shed"),
            new Answer.Cell("weakest", "1.46", "pull margin"));
  }

  @Test
  void theVerdictsWordIsNotSaidTwice() {
    assertThat(Answer.of(best, new Amounts(Site.Display.US)).sentence())
        .doesNotContain("Workable.");
  }

  @Test
  void theSameFiguresComeInUsUnits() {
    assertThat(Answer.of(best, new Amounts(Site.Display.US)).cells().get(0).value())
        .isEqualTo("1,430 lbf");
  }

  @Test
  void aPlanWithoutSetupsSaysWhy() {
    Plan none = new Plan(List.of(), 0, Map.of(), Map.of(), Map.of(), List.of());
    Answer a = Answer.nothing(none);
    assertThat(a.verdict()).isNull();
    assertThat(a.sentence()).contains("no setup to judge");
    assertThat(a.cells()).extracting(Answer.Cell::value).containsOnly("–");
  }
}
