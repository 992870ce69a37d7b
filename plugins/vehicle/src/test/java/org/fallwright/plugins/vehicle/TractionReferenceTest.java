package org.fallwright.plugins.vehicle;

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

class TractionReferenceTest {
  /** The worked figures go by a weight rounded to 22.56 kN, which is this mass. */
  private static final Chassis TRUCK = new Chassis(22_560 / 9.80665, 0.57, 3.50, 0.70, 0.55, 1.20);

  /** Invented cases, worked out apart from this program; agree to 1e-6 of the value. */
  @ParameterizedTest
  @MethodSource("cases")
  void agreesWithTheSeparateWorkingOut(JsonNode one) {
    JsonNode in = one.get("inputs");
    JsonNode out = one.get("expected");
    Chassis chassis =
        new Chassis(
            in.get("mass").doubleValue(),
            in.get("front_share").doubleValue(),
            in.get("wheelbase").doubleValue(),
            in.get("h_cg").doubleValue(),
            in.get("hitch_height").doubleValue(),
            in.get("overhang").doubleValue());
    Traction traction =
        pull(
            chassis,
            in.get("drive").textValue(),
            in.get("mu").doubleValue(),
            in.get("rolling").doubleValue(),
            toRadians(in.get("rise_deg").doubleValue()),
            toRadians(in.get("grade_deg").doubleValue()));
    same(traction.tensionN(), out, "tension_N");
    same(traction.frontN(), out, "front_N");
    same(traction.rearN(), out, "rear_N");
    same(chassis.frontLevelN(), out, "front_level_N");
  }

  static Stream<JsonNode> cases() throws IOException {
    try (InputStream file = TractionReferenceTest.class.getResourceAsStream("vehicle-cases.json")) {
      JsonNode all = new ObjectMapper().readTree(file);
      assertThat(all).hasSizeGreaterThanOrEqualTo(8);
      return StreamSupport.stream(all.spliterator(), false).toList().stream();
    }
  }

  /**
   * Hand-worked from the balance of a vehicle of 22.56 kN, 57 % of it in front: drive, rise above
   * the ground, slope, grip, rolling resistance, pull and axle loads in kN to the last digit given.
   */
  @ParameterizedTest
  @CsvSource({
    "rwd, 0, 0, 0.60, 0.00, 6.426, 11.849, 10.711",
    "rwd, 15, 0, 0.60, 0.00, 5.372, 12.520, 8.649",
    "rwd, 15, 0, 0.35, 0.02, 3.037, 12.668, 9.106",
    "fwd, 15, 0, 0.60, 0.00, 7.687, 12.375, 8.196",
  })
  void pullsAndLoadsItsAxles(
      String drive,
      double toGroundDeg,
      double slopeDeg,
      double grip,
      double rolling,
      double tensionKn,
      double frontKn,
      double rearKn) {
    Traction traction = at(drive, toGroundDeg, slopeDeg, grip, rolling);
    assertThat(traction.tensionN()).isCloseTo(tensionKn * 1e3, within(0.6));
    assertThat(traction.frontN()).isCloseTo(frontKn * 1e3, within(0.6));
    assertThat(traction.rearN()).isCloseTo(rearKn * 1e3, within(0.6));
  }

  /** The same, all wheels driven or locked, whose pull needs no axle loads. */
  @ParameterizedTest
  @CsvSource({
    "awd, 0, 0, 0.60, 13.536",
    "awd, 15, 0, 0.60, 12.073",
    "locked, 15, 0, 0.35, 7.474",
    "awd, 15, 5, 0.35, 5.584",
    "locked, 0, 0, 0.20, 4.512",
    "locked, 0, 10, 0.60, 9.413",
    "locked, 0, -10, 0.60, 17.248",
  })
  void allWheelsTogether(
      String drive, double toGroundDeg, double slopeDeg, double grip, double tensionKn) {
    assertThat(at(drive, toGroundDeg, slopeDeg, grip, 0.05).tensionN())
        .isCloseTo(tensionKn * 1e3, within(0.6));
  }

  /** A field report gives about 10 kN to drag a 3,000 kg vehicle over grass of grip 0.35. */
  @Test
  void draggedOverGrass() {
    Chassis dragged = new Chassis(3000, 0.5, 3, 0.7, 0.5, 1);
    double drags = Parked.CHOCKS.hold(dragged, 0.35, 0, 0).tensionN();
    assertThat(drags).isCloseTo(10_300, within(5.0));
    CheckValue.of(
            "Arboriculture Australia 2022, Tree Rescue Manual p. 214",
            "3000 kg dragged on grass",
            10,
            "kN")
        .isMet(drags / 1000, 0.31);
  }

  /** A line's rise above the ground is its rise from the horizontal and the slope together. */
  private static Traction at(
      String drive, double toGroundDeg, double slopeDeg, double grip, double rolling) {
    return pull(
        TRUCK, drive, grip, rolling, toRadians(toGroundDeg - slopeDeg), toRadians(slopeDeg));
  }

  private static Traction pull(
      Chassis chassis, String drive, double grip, double rolling, double rise, double slope) {
    return drive.equals("locked")
        ? Parked.ALL_WHEELS.hold(chassis, grip, rise, slope)
        : Traction.of(chassis, Drive.of(drive), grip, rolling, rise, slope);
  }

  private static void same(double value, JsonNode out, String key) {
    double expected = out.get(key).doubleValue();
    assertThat(value).as(key).isCloseTo(expected, within(Math.max(1e-9, 1e-6 * expected)));
  }
}
