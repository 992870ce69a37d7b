package org.fallwright.core.units;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;

import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

class RangeTest {
  @Test
  void aValueOnTheLimitIsLetThroughUnchanged() {
    assertThat(Range.check("x", 2, 2, 5, "m")).isEqualTo(2);
    assertThat(Range.check("x", 5, 2, 5, "m")).isEqualTo(5);
  }

  @Test
  void aRefusalNamesFieldValueLimitsAndUnit() {
    assertThatThrownBy(() -> Range.check("height_m", 130.5, 2, 120, "m"))
        .isInstanceOf(IllegalArgumentException.class)
        .hasMessage("height_m is 130.5 m; it must be from 2 to 120 m");
  }

  @ParameterizedTest
  @ValueSource(doubles = {Double.NaN, Double.POSITIVE_INFINITY, Double.NEGATIVE_INFINITY})
  void whatIsNotFiniteIsRefused(double value) {
    assertThatThrownBy(() -> Range.check("x", value, -1e300, 1e300, ""))
        .isInstanceOf(IllegalArgumentException.class)
        .hasMessageStartingWith("x is ");
  }

  @Test
  void nothingStatedIsNotNought() {
    assertThat(Range.checkOrNull("x", null, 0, 1, "")).isNull();
    assertThatThrownBy(() -> Range.present("x", null)).hasMessage("x is null; it must be stated");
    assertThatThrownBy(() -> Range.text("x", " ")).hasMessageContaining("1 to 200 characters");
  }
}
