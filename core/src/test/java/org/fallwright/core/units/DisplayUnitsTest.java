package org.fallwright.core.units;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;
import static org.fallwright.core.units.DisplayUnits.METRIC;
import static org.fallwright.core.units.DisplayUnits.US;

import java.util.Locale;
import java.util.Random;
import org.fallwright.core.site.Site;
import org.fallwright.core.units.DisplayUnits.Measure;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;

class DisplayUnitsTest {
  @ParameterizedTest
  @CsvSource(
      delimiter = '|',
      value = {
        "4700 | 4.7 kN | 1,060 lbf",
        "6357 | 6.36 kN | 1,430 lbf",
        "350 | 0.35 kN | 78.7 lbf",
        "137000 | 137 kN | 30,800 lbf",
        "0 | 0 kN | 0 lbf",
        "-4700 | -4.7 kN | -1,060 lbf"
      })
  void force(double n, String metric, String us) {
    assertThat(METRIC.force(n)).isEqualTo(metric);
    assertThat(US.force(n)).isEqualTo(us);
  }

  @Test
  void bothUnitsSideBySideWithTheUsersFirst() {
    assertThat(METRIC.both(u -> u.force(4700))).isEqualTo("4.7 kN (1,060 lbf)");
    assertThat(US.both(u -> u.force(4700))).isEqualTo("1,060 lbf (4.7 kN)");
  }

  @ParameterizedTest
  @CsvSource(
      delimiter = '|',
      value = {
        "0.3 | 0.30 m | 1 ft 0 in",
        "17.5 | 17.5 m | 57 ft 5 in",
        "44.1 | 44.1 m | 145 ft",
        "-0.7 | -0.70 m | -2 ft 4 in",
        "-0.001 | 0.00 m | 0 ft 0 in",
        "1.8287 | 1.83 m | 6 ft 0 in",
        "30.479 | 30.5 m | 100 ft"
      })
  void length(double m, String metric, String us) {
    assertThat(METRIC.length(m)).isEqualTo(metric);
    assertThat(US.length(m)).isEqualTo(us);
  }

  @ParameterizedTest
  @CsvSource(
      delimiter = '|',
      value = {"0.045 | 45 mm | 1.8 in", "0.58 | 58.0 cm | 22.8 in", "0.1 | 10.0 cm | 3.9 in"})
  void smallLength(double m, String metric, String us) {
    assertThat(METRIC.smallLength(m)).isEqualTo(metric);
    assertThat(US.smallLength(m)).isEqualTo(us);
  }

  @Test
  void theOtherQuantities() {
    assertThat(METRIC.mass(3711)).isEqualTo("3,710 kg");
    assertThat(US.mass(3711)).isEqualTo("8,180 lb");
    assertThat(METRIC.speed(4)).isEqualTo("4.0 m/s");
    assertThat(US.speed(4)).isEqualTo("8.9 mph");
    assertThat(METRIC.moment(8930)).isEqualTo("8.93 kN·m");
    assertThat(US.moment(8930)).isEqualTo("6,590 lbf·ft");
    assertThat(METRIC.energy(3100)).isEqualTo("3.1 kJ");
    assertThat(US.energy(3100)).isEqualTo("2,290 ft·lbf");
    assertThat(METRIC.stress(57e6)).isEqualTo("57 MPa");
    assertThat(US.stress(57e6)).isEqualTo("8,270 psi");
    assertThat(METRIC.area(81.3)).isEqualTo("81.3 m²");
    assertThat(US.area(81.3)).isEqualTo("875 ft²");
    assertThat(METRIC.angle(Math.toRadians(7.46))).isEqualTo("7.5°");
    assertThat(US.angle(Math.toRadians(-0.61))).isEqualTo("-0.6°");
  }

  @Test
  void roundNumbersStayRoundWhereRoundingHasASide() {
    assertThat(US.forceAtMost(1000 * Units.POUND_FORCE)).isEqualTo("1,000 lbf");
    assertThat(US.forceAtLeast(1000 * Units.POUND_FORCE)).isEqualTo("1,000 lbf");
    assertThat(METRIC.forceAtMost(15_799)).isEqualTo("15.7 kN");
    assertThat(METRIC.forceAtLeast(6361)).isEqualTo("6.37 kN");
  }

  @ParameterizedTest
  @ValueSource(longs = {1, 2, 3, 4, 5})
  void whatHoldsIsNeverShownAsMoreAndWhatLoadsNeverAsLess(long seed) {
    Random random = new Random(seed);
    for (int i = 0; i < 200; i++) {
      double n = Math.exp(random.nextDouble() * 14);
      for (DisplayUnits units : DisplayUnits.values()) {
        double si = units.unit(Measure.FORCE).inSi();
        assertThat(number(units.forceAtMost(n)) * si)
            .as("seed %d, %s N", seed, n)
            .isLessThanOrEqualTo(n * (1 + 1e-11));
        assertThat(number(units.forceAtLeast(n)) * si)
            .as("seed %d, %s N", seed, n)
            .isGreaterThanOrEqualTo(n * (1 - 1e-11));
      }
    }
  }

  @Test
  void whatIsNotANumberShowsAsADash() {
    assertThat(METRIC.force(Double.NaN)).isEqualTo("–");
    assertThat(US.length(Double.NaN)).isEqualTo("–");
    assertThat(METRIC.smallLength(Double.NaN)).isEqualTo("–");
    assertThat(US.angle(Double.NaN)).isEqualTo("–");
    assertThat(US.force(Double.POSITIVE_INFINITY)).isEqualTo("∞");
  }

  @Test
  void theComputersOwnLanguageDoesNotChangeTheFigures() {
    Locale before = Locale.getDefault();
    try {
      Locale.setDefault(Locale.GERMANY);
      assertThat(METRIC.both(u -> u.force(4700))).isEqualTo("4.7 kN (1,060 lbf)");
    } finally {
      Locale.setDefault(before);
    }
  }

  @ParameterizedTest
  @CsvSource({"FORCE, 1060, 4715.115", "LENGTH, 10, 3.048", "ANGLE, 180, 3.14159265"})
  void entryInUsUnits(Measure measure, double entered, double si) {
    DisplayUnits.Unit unit = US.unit(measure);
    assertThat(unit.toSi(entered)).isCloseTo(si, within(1e-3));
    assertThat(unit.fromSi(unit.toSi(entered))).isCloseTo(entered, within(1e-9));
  }

  @Test
  void everySiteDisplayHasItsUnits() {
    for (Site.Display display : Site.Display.values()) {
      assertThat(display.units().name()).isEqualTo(display.name());
    }
  }

  private static double number(String shown) {
    return Double.parseDouble(shown.replace(",", "").replaceAll(" .*", ""));
  }

  @Test
  void aLengthThatFallsShortByAHairNeverShowsAsTheOneAsked() {
    assertThat(DisplayUnits.US.lengthAgainst(0.895, 0.9)).isEqualTo("just under 2 ft 11 in");
    assertThat(DisplayUnits.METRIC.lengthAgainst(0.8999, 0.9)).isEqualTo("just under 0.90 m");
    assertThat(DisplayUnits.US.lengthAgainst(0.9, 0.9)).isEqualTo("2 ft 11 in");
    assertThat(DisplayUnits.US.lengthAgainst(0.85, 0.9)).isEqualTo("2 ft 9 in");
  }
}
