package org.fallwright.core.worksheet;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.assertj.core.api.Assertions.within;

import java.util.List;
import org.fallwright.core.units.DisplayUnits;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.EnumSource;

class WorkingsTest {
  private final Workings w = new Workings(DisplayUnits.METRIC);

  private Line last(String symbol) {
    return w.finish("", List.of(), List.of(), List.of()).line(symbol).orElseThrow();
  }

  @Test
  void aResultIsRoundedAndGoesOnRounded() {
    w.section("one");
    w.given("x", "a third", 1 / 3.0, Dimension.NUMBER, Basis.ENTERED);
    w.work("y", "three of them", "3 × x", Dimension.NUMBER, Basis.STATICS);
    Line y = last("y");
    assertThat(y.numbers()).isEqualTo("3 × 0.333333");
    assertThat(y.result()).isEqualTo("0.999999");
    assertThat(y.dependsOn()).containsExactly("x");
  }

  @Test
  void sixDigitsCountAndWholeOnesAreNeverCut() {
    w.section("one");
    w.given("x", "x", 1, Dimension.NUMBER, Basis.ENTERED);
    w.work("a", "a", "x × 12345678.9", Dimension.NUMBER, Basis.STATICS);
    w.work("b", "b", "x × 0.000123456789", Dimension.NUMBER, Basis.STATICS);
    w.work("c", "c", "x − 3", Dimension.NUMBER, Basis.STATICS);
    w.work("d", "d", "x − 1", Dimension.NUMBER, Basis.STATICS);
    assertThat(last("a").result()).isEqualTo("12345679");
    assertThat(last("b").result()).isEqualTo("0.000123457");
    assertThat(last("c").result()).isEqualTo("−2.00000");
    assertThat(last("d").result()).isEqualTo("0");
  }

  @Test
  void aLineIsWrittenOnceAndAfterWhatItRestsOn() {
    w.section("one");
    w.given("x", "x", 1, Dimension.NUMBER, Basis.ENTERED);
    assertThatThrownBy(() -> w.given("x", "again", 1, Dimension.NUMBER, Basis.ENTERED))
        .hasMessageContaining("x twice");
    assertThatThrownBy(() -> w.work("y", "y", "x + z", Dimension.NUMBER, Basis.STATICS))
        .hasMessageContaining("no line z yet");
  }

  @Test
  void whatUnitsStillAskForEndsTheFormula() {
    assertThat(Workings.fit(1)).isEmpty();
    assertThat(Workings.fit(144)).isEqualTo(" × 144");
    assertThat(Workings.fit(1 / 12.0)).isEqualTo(" ÷ 12");
    assertThat(Workings.fit(0.44704)).isEqualTo(" × 0.44704");
  }

  @ParameterizedTest
  @EnumSource(DisplayUnits.class)
  void theHingeMomentWorkedInAnyUnitsIsTheSame(DisplayUnits in) {
    Workings u = new Workings(in);
    u.section("hinge");
    u.given("σ_r", "strength", 57e6, Dimension.STRESS, Basis.ENTERED);
    u.given("b", "width", 0.464, Dimension.SMALL_LENGTH, Basis.ENTERED);
    u.given("t", "thickness", 0.045, Dimension.SMALL_LENGTH, Basis.ENTERED);
    double small = u.unit(Dimension.SMALL_LENGTH);
    u.work(
        "M_h",
        "moment",
        "σ_r × b × t^2 ÷ 6"
            + Workings.fit(
                u.unit(Dimension.STRESS) * small * small * small / u.unit(Dimension.MOMENT)),
        Dimension.MOMENT,
        Basis.BEAM_THEORY);
    // 57 MPa × 0.464 m × (0.045 m)² ÷ 6 = 8926.2 N·m
    assertThat(u.value("M_h") * u.unit(Dimension.MOMENT)).isCloseTo(8926.2, within(0.1));
  }
}
