package org.fallwright.ui.text;

import static org.assertj.core.api.Assertions.assertThat;

import org.fallwright.core.site.Site.Display;
import org.junit.jupiter.api.Test;

class AmountsTest {
  private final Amounts metric = new Amounts(Display.METRIC);
  private final Amounts us = new Amounts(Display.US);

  @Test
  void azimuthsHaveThreeDigitsAndStayBelowAFullTurn() {
    assertThat(metric.azimuth(3)).isEqualTo("003°");
    assertThat(metric.azimuth(359.99)).isEqualTo("000°");
    assertThat(metric.azimuth(-5)).isEqualTo("355°");
    assertThat(metric.azimuth(7.5)).isEqualTo("007.5°");
  }

  @Test
  void whatIsNoNumberIsSaidInWords() {
    assertThat(metric.ratio(Double.NaN)).isEqualTo("not known");
    assertThat(metric.ratio(Double.POSITIVE_INFINITY)).isEqualTo("no limit");
    assertThat(metric.amount(Double.NaN, "N")).isEqualTo("not known");
  }

  @Test
  void aNeedIsNeverShownSmallerNorAGiftLarger() {
    assertThat(metric.forceNeeded(6361)).isEqualTo("6.37 kN");
    assertThat(metric.forceGiven(6369)).isEqualTo("6.36 kN");
  }

  @Test
  void checksComeInTheReadersUnits() {
    assertThat(metric.amount(12.5, "m")).isEqualTo("12.5 m");
    assertThat(us.amount(12.5, "m")).isEqualTo("41 ft 0 in");
    assertThat(metric.amount(3, "")).isEqualTo("3");
    assertThat(us.roundLength(30.48)).isEqualTo("100 ft");
  }
}
