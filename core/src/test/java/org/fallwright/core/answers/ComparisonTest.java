package org.fallwright.core.answers;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;

import org.fallwright.core.advice.SteadyPull;
import org.fallwright.core.advice.TinySite;
import org.fallwright.core.plan.Plan;
import org.fallwright.core.plan.Planner;
import org.fallwright.core.site.Site;
import org.junit.jupiter.api.Test;

class ComparisonTest {
  private final Site site = new TinySite().site();
  private final Plan plan = new Planner(SteadyPull.ONLY).plan(site);

  @Test
  void aSetupDoesNotDifferFromItself() {
    Comparison c = Comparison.of(site, SteadyPull.ONLY, plan, 1, 1);
    assertThat(c.rows()).isEmpty();
    assertThat(c.saves()).contains("ask for the same kit");
    assertThat(c.leansOn()).startsWith("Both lean on ");
  }

  @Test
  void onlyWhatReadsOtherwiseIsShown() {
    Comparison c = Comparison.of(site, SteadyPull.ONLY, plan, 1, 2);
    assertThat(c.rows()).isNotEmpty().noneMatch(r -> r.first().equals(r.second()));
    Comparison back = Comparison.of(site, SteadyPull.ONLY, plan, 2, 1);
    assertThat(back.rows())
        .containsExactlyInAnyOrderElementsOf(
            c.rows().stream().map(r -> new FigureRow(r.name(), r.second(), r.first())).toList());
  }

  @Test
  void theSentenceSaysWhoNeedsLessLine() {
    double one = plan.ranked().get(0).figures().lineLengthM();
    double two = plan.ranked().get(1).figures().lineLengthM();
    assertThat(Math.abs(one - two)).isGreaterThan(1);
    String shorter = "setup " + (one < two ? 1 : 2) + " has ";
    String said = Comparison.of(site, SteadyPull.ONLY, plan, 1, 2).saves();
    int at = said.toLowerCase(java.util.Locale.ROOT).indexOf(shorter);
    assertThat(at).isNotNegative();
    assertThat(said.substring(at).split(";")[0]).contains("less line, by ");
  }

  @Test
  void aRankThatIsNotThereIsRefused() {
    assertThatThrownBy(() -> Comparison.of(site, SteadyPull.ONLY, plan, 1, 99))
        .isInstanceOf(IllegalArgumentException.class)
        .hasMessageContaining("rank is 99");
  }
}
