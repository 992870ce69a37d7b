package org.fallwright.ui.map;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import org.fallwright.core.site.Site.Display;
import org.fallwright.ui.text.Amounts;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

class ScaleBarTest {
  @ParameterizedTest
  @CsvSource({
    "METRIC, 24, 20",
    "METRIC, 20, 20",
    "METRIC, 9.9, 5",
    "METRIC, 0.7, 0.5",
    "METRIC, 170, 100",
    "US, 24, 15.24",
    "US, 31, 30.48",
    "US, 0.7, 0.6096"
  })
  void theBarIsOfARoundLengthInTheReadersUnits(Display display, double longest, double metres) {
    assertThat(ScaleBar.roundLength(new Amounts(display), longest)).isCloseTo(metres, within(1e-9));
  }
}
