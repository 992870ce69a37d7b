package org.fallwright.plugins.handline;

import static java.lang.Math.toRadians;
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

class PersonPullReferenceTest {
  /** Invented cases, worked out apart from this program; agree to 1e-6 of the value. */
  @ParameterizedTest
  @MethodSource("cases")
  void agreesWithTheSeparateWorkingOut(JsonNode one) {
    JsonNode in = one.get("inputs");
    JsonNode out = one.get("expected");
    double rise = toRadians(in.get("rise_deg").doubleValue());
    PersonPull pull =
        new PersonPull(
            PersonPull.tipN(
                in.get("mass").doubleValue(),
                in.get("stature").doubleValue(),
                toRadians(in.get("body_deg").doubleValue()),
                in.get("hand_height").doubleValue(),
                in.get("hand_x").doubleValue(),
                rise),
            PersonPull.slipN(
                in.get("mass").doubleValue(),
                in.get("mu").doubleValue(),
                rise,
                toRadians(in.get("slope_deg").doubleValue())),
            in.get("strength").doubleValue(),
            Double.POSITIVE_INFINITY);
    same(pull.tipN(), out, "tip_N");
    same(pull.slipN(), out, "slip_N");
    same(pull.leastN(), out, "one_N");
    same(pull.leastN() * Crew.persons(in.get("people").intValue()), out, "crew_N");
  }

  static Stream<JsonNode> cases() throws IOException {
    try (InputStream file =
        PersonPullReferenceTest.class.getResourceAsStream("person-cases.json")) {
      JsonNode all = new ObjectMapper().readTree(file);
      assertThat(all).hasSizeGreaterThanOrEqualTo(8);
      return StreamSupport.stream(all.spliterator(), false).toList().stream();
    }
  }

  /** Hand-worked from the force balance of a straight body: 80 kg, grip, rise, pull. */
  @ParameterizedTest
  @CsvSource({"0.6, 0, 470.7", "0.6, 20, 411.1", "0.1, 20, 80.6"})
  void slipsOnLevelGround(double grip, double riseDeg, double expected) {
    assertThat(PersonPull.slipN(80, grip, toRadians(riseDeg), 0)).isCloseTo(expected, within(0.05));
  }

  /** 80 kg, 1.75 m, 20 deg back, hands 1.0 m up and 0.1 m behind the feet, level line. */
  @Test
  void tipsAtAKnownPull() {
    assertThat(PersonPull.tipN(80, 1.75, toRadians(20), 1.0, 0.1, 0))
        .isCloseTo(258.3, within(0.05));
  }

  /** With the hands at the mass centre and a level line the limit is W tan b. */
  @ParameterizedTest
  @CsvSource({"15, 210.2", "20, 285.5", "30, 452.9"})
  void tipsAtWeightTimesTangentWithHandsAtTheMassCentre(double leanDeg, double expected) {
    double height = 0.55 * 1.75 * Math.cos(toRadians(leanDeg));
    assertThat(PersonPull.tipN(80, 1.75, toRadians(leanDeg), height, 0, 0))
        .isCloseTo(expected, within(0.05));
  }

  /** Totals by the straight fit, in single persons' pulls, hand-worked; eight count as seven. */
  @ParameterizedTest
  @CsvSource({
    "1, 1.00", "2, 1.86", "3, 2.58", "4, 3.16", "5, 3.60", "6, 3.90", "7, 4.06", "8, 4.06"
  })
  void crewsLoseByTheFit(int people, double persons) {
    assertThat(Crew.persons(people)).isCloseTo(persons, within(1e-9));
  }

  /**
   * Ringelmann's measured factors for two, three and eight (63 kgf alone, 248 kgf together); the
   * straight line misses the last by 0.018.
   */
  @ParameterizedTest
  @CsvSource({"2, 0.93", "3, 0.85", "8, 0.492"})
  void theFitIsNearTheMeasuredFactors(int people, double measured) {
    CheckValue.of("Ringelmann 1913, by popular accounts", "share left of " + people, measured, "")
        .isMet(Crew.factor(people), 0.02);
  }

  private static void same(double value, JsonNode out, String key) {
    double expected = out.get(key).doubleValue();
    assertThat(value).as(key).isCloseTo(expected, within(Math.max(1e-9, 1e-6 * expected)));
  }
}
