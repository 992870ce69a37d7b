package org.fallwright.plugins.winch;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import org.fallwright.core.line.WireRope;
import org.fallwright.core.line.Wraps;
import org.fallwright.core.outside.CheckValue;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

class WinchReferenceTest {
  private static final String WINCH_HANDBOOK =
      "Handbook of Oceanographic Winch, Wire and Cable Technology, ch. 12";

  /**
   * The handbook's formula in feet and inches, 0.2618 · B · h · (D + h)/d²: barrel 10 in wide, 3 in
   * thick, 3/8 in rope, and so 26 turns a layer; a barrel of whole turns agrees to its last digit.
   */
  @ParameterizedTest
  @CsvSource({"1", "2", "4", "5"})
  void fullLayersHoldWhatTheHandbookSays(int layers) {
    double inch = 0.0254;
    double rope = 0.375 * inch;
    double width = 26 * rope;
    Drum drum = new Drum(3 * inch, rope);
    double feet = 0.2618 * (width / inch) * (layers * 0.375) * (3 + layers * 0.375) / 0.140625;
    double length = lastOn(drum, width, layers);
    CheckValue.of(WINCH_HANDBOOK, layers + " layers, 26 turns of 3/8 in on 3 in", feet, "ft")
        .worked()
        .isMetWithinShare(length / (12 * inch), 1e-4);
    assertThat(length)
        .isCloseTo(WireRope.onDrumM(width, 3 * inch, layers * rope, rope), within(1e-4 * length));
  }

  /** The greatest length that still lies on so many layers, by halving. */
  private static double lastOn(Drum drum, double width, int layers) {
    double low = 0;
    double high = 1000;
    for (int i = 0; i < 60; i++) {
      double mid = (low + high) / 2;
      if (drum.layers(mid, width) <= layers) {
        low = mid;
      } else {
        high = mid;
      }
    }
    return low;
  }

  /** The same handbook's worked drum, 186.2 ft at 2 in of depth, ends within its sixth layer. */
  @Test
  void aWorkedDrumEndsWithinItsSixthLayer() {
    Drum drum = new Drum(0.0762, 0.009525);
    assertThat(drum.layers(186.2 * 0.3048, 0.254)).isEqualTo(6);
  }

  /** Hand-worked: 0.15 and three turns give 16.90, so that 592 N on the tail hold 10 kN. */
  @Test
  void threeTurnsOfBeltFriction() {
    CheckValue.of("Eytelwein, belt friction", "friction 0.15, three turns", 16.90, "")
        .worked()
        .isMet(Wraps.ratio(0.15, 3, 180), 0.005);
    CheckValue.of("Eytelwein, belt friction", "tail that holds 10 kN there", 592, "N")
        .worked()
        .isMet(10_000 / Wraps.ratio(0.15, 3, 180), 0.5);
  }

  /** Wraps on smooth metal, low figures; hand-worked e^(2 pi mu n). */
  @ParameterizedTest
  @CsvSource({
    "POLYESTER_ON_METAL, 1, 1.874",
    "POLYESTER_ON_METAL, 3, 6.586",
    "POLYESTER_ON_METAL, 5, 23.14",
    "HMPE_ON_METAL, 3, 2.566",
    "HMPE_ON_METAL, 5, 4.810",
    "WIRE_ON_GREASY_STEEL, 3, 3.741",
    "WIRE_ON_DRY_STEEL, 3, 9.602",
  })
  void aCapstanByItsTurns(Wraps contact, double turns, double ratio) {
    assertThat(new Capstan(contact, turns).slipsAtN(100))
        .isCloseTo(100 * ratio, within(0.05 * ratio));
  }

  /** Hand-worked: crank 0.30 m, 250 N, gear 5 of efficiency 0.8, drum radius 50 mm: 6,000 N. */
  @Test
  void aCrankDrum() {
    double wireATurn = 2 * Math.PI * 0.05 / 5;
    CheckValue.of("Balance of work at a crank", "0.30 m, 250 N, 5:1 at 0.8, 50 mm", 6000, "N")
        .worked()
        .isMet(HandDrive.lever(0.30, 360, wireATurn, 0.8).pullN(250), 1e-6);
  }

  /**
   * A through-rope device of 1 t: 40 to 60 of way for one, 0.7 to 0.8 of efficiency, 200 to 500 N
   * at rated load; from memory.
   */
  @ParameterizedTest
  @CsvSource({"40, 0.7", "60, 0.8", "50, 0.75"})
  void aThroughRopeDeviceNeedsWhatIsSaidOfIt(double ratio, double efficiency) {
    double force = new HandDrive(ratio * efficiency).handN(9_807);
    assertThat(force).isBetween(200.0, 500.0);
    CheckValue.of("Typical data of wire-rope grip hoists", ratio + ":1, most at 1 t", 500, "N")
        .fromMemory()
        .isNotExceeded(force);
  }

  /** A 3,000 kg vehicle on grass of 0.35 drags at about 10 kN. */
  @Test
  void aMachineDragsOnGrass() {
    CheckValue.of(
            "Arboriculture Australia 2022, Tree Rescue Manual p. 214",
            "3000 kg dragged on grass",
            10_000,
            "N")
        .isMetWithinShare(new Parked(3000).slidesAtN(0.35, 0, 0), 0.05);
  }

  /**
   * Hand-worked, W 22.56 kN: grip 0.6, the line 15 degrees up; the ground 10 degrees either way.
   */
  @ParameterizedTest
  @CsvSource({"0, 0, 13.536", "0, 15, 12.073", "10, -10, 9.413", "-10, 10, 17.248"})
  void lockedWheelsBySlopeAndLine(double uphill, double rise, double kilonewtons) {
    Parked parked = new Parked(22_560 / 9.80665);
    assertThat(parked.slidesAtN(0.6, Math.toRadians(uphill), Math.toRadians(rise)) / 1000)
        .isCloseTo(kilonewtons, within(0.001));
  }
}
