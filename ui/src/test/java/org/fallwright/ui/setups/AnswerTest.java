package org.fallwright.ui.setups;

import static org.assertj.core.api.Assertions.assertThat;

import com.fasterxml.jackson.databind.node.ArrayNode;
import org.fallwright.core.plan.Judged;
import org.fallwright.core.plan.Plan;
import org.fallwright.core.plan.Verdict;
import org.fallwright.core.site.Site;
import org.fallwright.ui.demo.DemoSite;
import org.fallwright.ui.text.Amounts;
import org.junit.jupiter.api.Test;

class AnswerTest {
  private static final DemoSite DEMO = DemoSite.asItIs();
  private final Judged six = DEMO.in(Site.Display.METRIC).judge(DemoSite.ROW_6);

  @Test
  void theStripSaysTheWayAndItsFiguresInOrder() {
    Answer a = Answer.of(six, new Amounts(Site.Display.METRIC));
    assertThat(a.verdict()).isEqualTo(Verdict.WORKABLE);
    assertThat(a.sentence()).startsWith("Hand-winch at A3 over A1, lay 003°. Plan for 6.36 kN");
    assertThat(a.cells())
        .containsExactly(
            new Answer.Cell("needs", "6.36 kN", "4.74 kN as entered"),
            new Answer.Cell("gives", "9.31 kN", "1.46 times the need"),
            new Answer.Cell("clears", "3.40 m", "Shed"),
            new Answer.Cell("weakest", "1.46", "pull"));
  }

  @Test
  void theVerdictsWordIsNotSaidTwice() {
    assertThat(six.sentence()).startsWith("Workable.");
    assertThat(Answer.of(six, new Amounts(Site.Display.METRIC)).sentence())
        .doesNotContain("Workable.");
  }

  @Test
  void theSameFiguresComeInUsUnits() {
    Answer a = Answer.of(DEMO.judge(DemoSite.ROW_6), new Amounts(Site.Display.US));
    assertThat(a.sentence()).contains("Plan for 1,430 lbf (6.36 kN)");
    assertThat(a.cells())
        .containsExactly(
            new Answer.Cell("needs", "1,430 lbf", "1,070 lbf as entered"),
            new Answer.Cell("gives", "2,090 lbf", "1.46 times the need"),
            new Answer.Cell("clears", "11 ft 2 in", "Shed"),
            new Answer.Cell("weakest", "1.46", "pull"));
  }

  @Test
  void aPlanWithoutSetupsSaysWhy() {
    Plan none = DEMO.with(s -> ((ArrayNode) s.at("/gear/sources")).removeAll()).plan();
    Answer a = Answer.nothing(none);
    assertThat(a.verdict()).isNull();
    assertThat(a.sentence()).contains("no setup to judge");
    assertThat(a.cells()).extracting(Answer.Cell::value).containsOnly("–");
  }
}
