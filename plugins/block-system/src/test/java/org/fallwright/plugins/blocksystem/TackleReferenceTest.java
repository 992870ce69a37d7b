package org.fallwright.plugins.blocksystem;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import com.fasterxml.jackson.databind.JsonNode;
import com.fasterxml.jackson.databind.ObjectMapper;
import java.io.IOException;
import java.io.InputStream;
import java.util.stream.Stream;
import java.util.stream.StreamSupport;
import org.fallwright.core.outside.CheckValue;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.MethodSource;

class TackleReferenceTest {
  /** Invented cases, worked out apart from this program; agree to 1e-6 of the value. */
  @ParameterizedTest
  @MethodSource("cases")
  void agreesWithTheSeparateWorkingOut(JsonNode one) {
    JsonNode in = one.get("inputs");
    JsonNode out = one.get("expected");
    Tackle tackle =
        new Tackle(
            in.get("parts").intValue(),
            in.get("k").doubleValue(),
            in.get("form").textValue().equals("B"));
    double gain = out.get("gain").doubleValue();
    double anchor = out.get("anchor").doubleValue();
    assertThat(tackle.gain()).isCloseTo(gain, within(1e-6 * gain));
    assertThat(tackle.anchorHauling() * tackle.gain()).isCloseTo(anchor, within(1e-6 * anchor));
  }

  static Stream<JsonNode> cases() throws IOException {
    try (InputStream file = TackleReferenceTest.class.getResourceAsStream("tackle-cases.json")) {
      JsonNode all = new ObjectMapper().readTree(file);
      assertThat(all).hasSizeGreaterThanOrEqualTo(8);
      return StreamSupport.stream(all.spliterator(), false).toList().stream();
    }
  }

  /**
   * Hand-worked sums of powers, three digits: parts, k, haul from moving, haul from fixed block.
   */
  @ParameterizedTest
  @CsvSource({
    "2, 0.96, 1.960, 1.882",
    "2, 0.917, 1.917, 1.758",
    "2, 0.50, 1.500, 0.750",
    "3, 0.95, 2.852, 2.710",
    "3, 0.90, 2.710, 2.439",
    "3, 0.80, 2.440, 1.952",
    "4, 0.96, 3.766, 3.616",
    "4, 0.95, 3.710, 3.524",
    "4, 0.80, 2.952, 2.362",
    "5, 0.90, 4.095, 3.686",
    "6, 0.96, 5.431, 5.214",
    "6, 0.50, 1.969, 0.984",
  })
  void gainsByPartsAndEfficiency(int parts, double k, double moving, double fixed) {
    String what = parts + " parts, k " + k;
    CheckValue.of("Sum of powers of k", what + ", from the moving block", moving, "")
        .worked()
        .isMet(new Tackle(parts, k, false).gain(), 0.00051);
    CheckValue.of("Sum of powers of k", what + ", from the fixed block", fixed, "")
        .worked()
        .isMet(new Tackle(parts, k, true).gain(), 0.00051);
  }

  /** An oilfield handbook's block page: four parts on plain bearings lift 3,250 lb by 1,000 lb. */
  @Test
  void fourPartsOnPlainBearings() {
    CheckValue.of("Pipeline Rules of Thumb Handbook", "4 parts, plain bearings, gain", 3.25, "")
        .isMet(new Tackle(4, 0.917, true).gain(), 0.03);
    assertThat(new Tackle(4, 0.917, true).gain()).isCloseTo(3.24, within(0.02));
  }

  /**
   * The friction-factor form (K^N − 1)/(K^S N (K − 1)) with K = 1.09 and four parts on four sheaves
   * gives 0.8099, a gain of 3.240.
   */
  @Test
  void theFrictionFactorFormAgrees() {
    CheckValue.of("Friction-factor form, after Kemp and Young", "K 1.09, 4 on 4, gain", 3.240, "")
        .worked()
        .isMet(new Tackle(4, 1 / 1.09, true).gain(), 0.001);
  }

  /** Two double blocks give 3 1/3 in a light-artillery handbook, at 8 to 9 % a sheave. */
  @Test
  void twoDoubleBlocks() {
    CheckValue.of("Handbook for Light Artillery", "two double blocks, gain", 10.0 / 3, "")
        .isMet(new Tackle(4, 0.925, true).gain(), 0.03);
  }

  /** The same handbook: a double and a treble block give 4, at 8 to 9 % a sheave. */
  @Test
  void aDoubleAndATrebleBlock() {
    CheckValue.of("Handbook for Light Artillery", "double and treble block, gain", 4, "")
        .isMet(new Tackle(5, 0.925, true).gain(), 0.05);
  }

  /** Hand-worked, k 0.9: load on the anchor per newton hauled. */
  @ParameterizedTest
  @CsvSource({"2, false, 0.900", "3, false, 1.710", "3, true, 3.439"})
  void loadsItsAnchor(int parts, boolean fromFixed, double anchor) {
    Tackle tackle = new Tackle(parts, 0.9, fromFixed);
    assertThat(tackle.anchorHauling() * tackle.gain()).isCloseTo(anchor, within(0.0006));
  }
}
