package org.fallwright.core.reference;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.assertj.core.api.Assertions.within;

import org.fallwright.core.reference.Spreads.What;
import org.fallwright.core.site.Fix;
import org.fallwright.core.site.How;
import org.fallwright.core.site.Place;
import org.fallwright.core.site.Position;
import org.fallwright.core.site.Quantity;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.EnumSource;

class SpreadsTest {
  @ParameterizedTest
  @CsvSource({
    "DBH, 0.52, MEASURED, 0.0104",
    "HEIGHT, 20, ESTIMATED, 1.6",
    "LEAN, 5, MEASURED, 0.5",
    "LEAN_AZIMUTH, 188, GUESSED, 30",
    "MASS, 3700, ESTIMATED, 555",
    "HINGE_THICKNESS, 0.045, MEASURED, 0.0045",
    "ATTACH_HEIGHT, 10.5, ESTIMATED, 0.5",
    "GREEN_DENSITY, 1000, GUESSED, 150",
    "GUST, 4, ESTIMATED, 1.6"
  })
  void usualSpread(What what, double value, How how, double sd) {
    assertThat(Spreads.of(what, new Quantity(value, how, null))).isCloseTo(sd, within(1e-12));
  }

  @Test
  void thePersonsOwnPlusOrMinusTakesItsPlace() {
    assertThat(Spreads.of(What.MASS, new Quantity(3700, How.GUESSED, 40.0))).isEqualTo(40);
    assertThat(Spreads.massCentreM(new Quantity(7, How.GUESSED, 0.1), 17.5)).isEqualTo(0.1);
  }

  @Test
  void aGustIsNeverKnownBetterThanToAMetreASecond() {
    assertThat(Spreads.of(What.GUST, Quantity.measured(0))).isEqualTo(1);
    assertThat(Spreads.of(What.GUST, new Quantity(4, How.MEASURED, 0.2))).isEqualTo(1);
    assertThat(Spreads.of(What.GUST, new Quantity(0, How.GUESSED, null)))
        .isCloseTo(1.2, within(1e-12));
  }

  @Test
  void aMassCentreIsSpreadByTheTreesHeight() {
    assertThat(Spreads.massCentreM(Quantity.estimated(7), 17.5)).isCloseTo(0.7, within(1e-12));
    assertThatThrownBy(() -> Spreads.of(What.MASS_CENTRE, Quantity.estimated(7)))
        .hasMessageContaining("height");
  }

  @Test
  void aBearingPointIsOffByHalfItsPositionError() {
    Place place = new Place(new Position(1, 2), 0, Fix.PHONE, null);
    assertThat(Spreads.bearingAsideM(place)).isEqualTo(4);
  }

  @ParameterizedTest
  @EnumSource
  void aGuessIsNeverCloserThanAnEstimateNorThatThanAMeasurement(What what) {
    assertThat(what.usual(How.MEASURED).value()).isLessThan(what.usual(How.ESTIMATED).value());
    assertThat(what.usual(How.ESTIMATED).value()).isLessThan(what.usual(How.GUESSED).value());
  }
}
