package org.fallwright.core.worksheet;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.assertj.core.api.Assertions.within;

import java.util.Map;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;

class FormulaTest {
  @ParameterizedTest
  @CsvSource(
      delimiter = ';',
      value = {
        "2 + 3 × 4; 14",
        "12 ÷ 2 ÷ 3; 2",
        "10 − 4 − 3; 3",
        "2 × 3^2; 18",
        "(−3)^2; 9",
        "1 ÷ 2^(−1); 2",
        "√(3^2 + 4^2); 5",
        "sin(30) + cos(60) + tan(45); 2",
        "asin(0.5) + atan(1); 75",
        "exp(ln(7)); 7",
        "max(1, 5, 3) − min(4, 2); 3",
        "abs(2 − 9); 7",
        "π ÷ 4 × 2^2; 3.141592653589793",
        "0 − (−0.25); 0.25",
      })
  void aSumGivesWhatACalculatorGives(String sum, double result) {
    assertThat(Formula.value(sum)).isCloseTo(result, within(1e-12));
  }

  @ParameterizedTest
  @ValueSource(strings = {"", "2 +", "(2", "2 3)", "sin 3", "min(1)", "x + 1", "2 ** 3"})
  void whatCannotBeReadIsRefused(String sum) {
    assertThatThrownBy(() -> Formula.value(sum))
        .isInstanceOf(IllegalArgumentException.class)
        .hasMessageContaining("cannot be read");
  }

  @Test
  void numbersTakeThePlaceOfSignsAndNegativeOnesStandInBrackets() {
    Map<String, String> numbers = Map.of("u_g", "−0.75", "W", "36.3", "δ", "1.47");
    assertThat(Formula.with("W × (u_g × cos(δ) − 2 × π)", numbers::get))
        .isEqualTo("36.3 × ((−0.75) × cos(1.47) − 2 × π)");
    assertThat(Formula.signs("W × (u_g × cos(δ) − W × π)")).containsExactly("W", "u_g", "δ");
  }
}
