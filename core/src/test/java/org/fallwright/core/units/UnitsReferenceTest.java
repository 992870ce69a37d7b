package org.fallwright.core.units;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

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
    double factor = Units.class.getField(field).getDouble(null);
    assertThat(factor).isCloseTo(printed, within(printed * SEVEN_DIGITS));
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
    assertThat(5100 * Units.PSI).isCloseTo(35_000_000, within(500_000.0));
  }
}
