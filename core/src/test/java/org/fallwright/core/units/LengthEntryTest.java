package org.fallwright.core.units;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.assertj.core.api.Assertions.within;

import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;

class LengthEntryTest {
  @ParameterizedTest
  @CsvSource({
    "25, 25",
    "25m, 25",
    "163 cm, 1.63",
    "45mm, 0.045",
    "82ft, 24.9936",
    "64.3in, 1.63322",
    "64.3 IN, 1.63322",
    "12ft 6in, 3.81",
    "12ft6in, 3.81",
    "-2, -2"
  })
  void aLengthIsReadInItsUnit(String text, double metres) {
    assertThat(LengthEntry.metres("girth", text)).isCloseTo(metres, within(1e-12));
  }

  @ParameterizedTest
  @ValueSource(strings = {"25 yd", "tall", "1,63", "1.2.3", "12ft 6", "1e3", "m", "NaN"})
  void whatIsNoLengthIsRefusedByName(String text) {
    assertThatThrownBy(() -> LengthEntry.metres("girth", text))
        .isInstanceOf(IllegalArgumentException.class)
        .hasMessageContaining("girth is \"" + text + "\"")
        .hasMessageContaining("ft or in");
  }

  @Test
  void moreThanAFootOfInchesIsRefused() {
    assertThatThrownBy(() -> LengthEntry.metres("distance", "5ft 14in"))
        .hasMessageContaining("distance, its inches, is 14 in");
  }
}
