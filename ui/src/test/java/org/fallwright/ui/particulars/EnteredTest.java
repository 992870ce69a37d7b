package org.fallwright.ui.particulars;

import static org.assertj.core.api.Assertions.assertThat;

import org.fallwright.core.site.Site;
import org.fallwright.ui.DemoLike;
import org.fallwright.ui.text.Amounts;
import org.junit.jupiter.api.Test;

class EnteredTest {
  private final Entered metric =
      Entered.of(DemoLike.site(Site.Display.METRIC), new Amounts(Site.Display.METRIC));

  @Test
  void theFiveFieldNumbersComeWithHowTheyWereGot() {
    assertThat(metric.numbers())
        .extracting(Entered.Line::name)
        .containsExactly("Girth", "Height", "Lean", "Towards", "Line at");
    assertThat(metric.numbers().get(0).value()).isEqualTo("163.4 cm (DBH 52.0 cm)");
    assertThat(metric.numbers()).extracting(Entered.Line::note).containsOnly("measured");
  }

  @Test
  void whatNobodyLookedForIsNotNone() {
    assertThat(metric.looked()).hasSize(4);
    assertThat(metric.notSaid()).isEqualTo(2);
    assertThat(metric.looked().stream().filter(Entered.Line::open))
        .extracting(Entered.Line::value)
        .containsOnly("not said");
  }

  @Test
  void everyFigureThatTheToolFillsInIsNamed() {
    assertThat(metric.defaults())
        .hasSize(9)
        .contains("wind from the worst side")
        .doesNotContain("mass from the equation");
  }
}
