package org.fallwright.plugins.winch;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import com.fasterxml.jackson.databind.JsonNode;
import com.fasterxml.jackson.databind.ObjectMapper;
import java.io.IOException;
import java.io.InputStream;
import java.util.stream.Stream;
import java.util.stream.StreamSupport;
import org.fallwright.core.outside.CheckValue;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.MethodSource;

class DrumReferenceTest {
  /** Invented cases, worked out apart from this program; agree to 1e-6 of the value. */
  @ParameterizedTest
  @MethodSource("cases")
  void agreesWithTheSeparateWorkingOut(JsonNode one) {
    JsonNode in = one.get("inputs");
    Drum drum = new Drum(in.get("drum").doubleValue(), in.get("rope").doubleValue());
    double expected = one.get("expected").get("pull_N").doubleValue();
    assertThat(drum.pullN(in.get("p1").doubleValue(), in.get("layer").intValue()))
        .isCloseTo(expected, within(1e-6 * expected));
  }

  static Stream<JsonNode> cases() throws IOException {
    try (InputStream file = DrumReferenceTest.class.getResourceAsStream("winch-layer-cases.json")) {
      JsonNode all = new ObjectMapper().readTree(file);
      assertThat(all).hasSizeGreaterThanOrEqualTo(8);
      return StreamSupport.stream(all.spliterator(), false).toList().stream();
    }
  }

  /**
   * US Army TM 9-2320-279-10-2, Table 2-7: a winch of 20,000 lbf on its five layers. The table fits
   * layers of 0.1005 of the first radius each within 0.1 %.
   */
  @ParameterizedTest
  @CsvSource({"1, 20000", "2, 18173", "3, 16663", "4, 15361", "5, 14254"})
  void anArmyWinchLosesPullByItsLayers(int layer, double published) {
    Drum drum = new Drum(2 - 0.1005, 0.1005);
    CheckValue.of(
            "US Army TM 9-2320-279-10-2, Table 2-7",
            "20000 lbf winch, layer " + layer,
            published,
            "lbf")
        .isMetWithinShare(drum.pullN(20_000, layer), 0.001);
  }

  /** Hand-worked: drum 100 mm, rope 12 mm, 40 kN and 3 m/min on the bare drum. */
  @ParameterizedTest
  @CsvSource({"1, 40.00, 3.00", "2, 32.94, 3.64", "3, 28.00, 4.29", "4, 24.35, 4.93"})
  void pullFallsAndSpeedGrows(int layer, double kilonewtons, double metresAMinute) {
    Drum drum = new Drum(0.1, 0.012);
    assertThat(drum.pullN(40, layer)).isCloseTo(kilonewtons, within(0.005));
    assertThat(drum.speedMps(3, layer)).isCloseTo(metresAMinute, within(0.005));
  }
}
