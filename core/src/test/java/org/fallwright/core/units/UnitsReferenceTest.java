package org.fallwright.core.units;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import org.fallwright.core.outside.CheckValue;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/**
 * Conversion factors against NIST Special Publication 811 (2008), Appendix B.8, as printed there to
 * seven digits; the tolerance is half of the last digit printed.
 */
class UnitsReferenceTest {
  private static final double SEVEN_DIGITS = 6e-7;

  @ParameterizedTest(name = "{0}")
  @CsvSource({
    "INCH, 2.54E-02",
    "FOOT, 3.048E-01",
    "SQUARE_FOOT, 9.290304E-02",
    "CUBIC_FOOT, 2.831685E-02",
    "POUND, 4.5359237E-01",
    "POUND_PER_CUBIC_FOOT, 1.601846E+01",
    "SHORT_TON, 9.071847E+02",
    "POUND_FORCE, 4.448222E+00",
    "KILOGRAM_FORCE, 9.80665E+00",
    "SHORT_TON_FORCE, 8.896443E+03",
    "PSI, 6.894757E+03",
    "POUND_FORCE_FOOT, 1.355818E+00",
    "MILE_PER_HOUR, 4.4704E-01",
    "KNOT, 5.144444E-01",
    "KILOMETRE_PER_HOUR, 2.777778E-01",
    "GRAVITY, 9.80665E+00"
  })
  void factorIsAsPrinted(String field, double printed) throws ReflectiveOperationException {
    CheckValue.of("NIST Special Publication 811 (2008), Appendix B.8", field, printed, "SI")
        .isMetWithinShare(Units.class.getField(field).getDouble(null), SEVEN_DIGITS);
  }

  /** Rise over run by hand: 1 in 1, 1 in 10, 1 in 4, and the 30-60-90 triangle. */
  @ParameterizedTest
  @CsvSource({"45, 100", "5.710593, 10", "14.036243, 25", "30, 57.735027", "-45, -100", "0, 0"})
  void slopeInDegreesAndPercent(double degrees, double percent) {
    assertThat(Units.percentOfDegrees(degrees)).isCloseTo(percent, within(1e-5));
    assertThat(Units.degreesOfPercent(percent)).isCloseTo(degrees, within(1e-6));
  }

  /** Pressure of a 20 mph wind, 1.02 lb/ft² (half of 1.225 kg/m³ times the speed squared). */
  @Test
  void windPressureInPoundsPerSquareFoot() {
    double pa = 0.5 * 1.225 * Math.pow(20 * Units.MILE_PER_HOUR, 2);
    assertThat(pa).isCloseTo(49.0, within(0.05));
    assertThat(pa / (Units.PSI / 144)).isCloseTo(1.02, within(0.005));
  }

  /** Wood Handbook Table 5-3 prints ponderosa pine as 5,100 psi and as 35,000 kPa. */
  @Test
  void onePrintedStrengthInBothUnits() {
    CheckValue.of("USDA Wood Handbook, Table 5-3", "ponderosa pine, 5100 psi in kPa", 35_000, "kPa")
        .isMet(5100 * Units.PSI / 1000, 500);
  }

  /** A table that prints each breaking load in kip and in 100 kN. */
  @ParameterizedTest
  @CsvSource({"33.6, 1.495", "74, 3.292", "91, 4.048", "322, 14.323", "680, 30.248"})
  void kipInHundredKilonewtons(double kip, double printed) {
    CheckValue.of("UFC 4-159-03 (2005), Table 6-8", kip + " kip", printed, "100 kN")
        .isMet(kip * 1000 * Units.POUND_FORCE / 1e5, 0.0006);
  }

  /** Knots and miles per hour at the edges of the forces of the wind, each as a whole number. */
  @ParameterizedTest
  @CsvSource({"16, 18", "21, 24", "27, 31", "33, 38", "40, 46", "47, 54", "55, 63", "63, 72"})
  void knotsInMilesPerHour(double knots, double mph) {
    CheckValue.of("Beaufort scale, public table", knots + " kn", mph, "mph")
        .isMet(knots * Units.KNOT / Units.MILE_PER_HOUR, 0.6);
  }
}
