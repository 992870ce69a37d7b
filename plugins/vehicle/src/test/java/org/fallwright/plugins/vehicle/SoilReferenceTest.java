package org.fallwright.plugins.vehicle;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatIllegalArgumentException;
import static org.assertj.core.api.Assertions.within;

import org.fallwright.plugins.vehicle.Soil.Tyre;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/** The traction equation of Brixius against figures worked from it by hand and apart from this. */
class SoilReferenceTest {
  /**
   * Slip 0.15, mobility numbers that the equation's users call hard, firm, tilled and soft: gross
   * traction, resistance and net, from 0.88 (1 - e^(-0.1 Bn)) (1 - e^-1.125) + 0.04 and 1/Bn + 0.04
   * + 0.075/sqrt Bn, to the last digit given.
   */
  @ParameterizedTest
  @CsvSource({
    "80, 0.634, 0.061, 0.573",
    "55, 0.632, 0.068, 0.564",
    "40, 0.623, 0.077, 0.547",
    "20, 0.554, 0.107, 0.447",
  })
  void tractionByMobility(double mobility, double gross, double resistance, double net) {
    assertThat(Soil.gross(mobility, 0.15)).isCloseTo(gross, within(0.0006));
    assertThat(Soil.resistance(mobility, 0.15)).isCloseTo(resistance, within(0.0006));
    assertThat(Soil.gross(mobility, 0.15) - Soil.resistance(mobility, 0.15))
        .isCloseTo(net, within(0.0006));
  }

  /**
   * Hand-worked: 1,000 kPa, 0.46 m by 1.60 m, 20 kN on the wheel: 1000 x 0.46 x 1.6 / 20 = 36.8;
   * times (1 + 5 x 0.2) / (1 + 3 x 0.46/1.6) = 2/1.8625: 39.5.
   */
  @Test
  void mobilityOfATractorTyre() {
    assertThat(new Soil(1e6, true).mobility(new Tyre(0.46, 1.6), 20e3))
        .isCloseTo(39.5, within(0.05));
  }

  /** An axle of two such wheels, 40 kN: net 0.5456 of it, 21.8 kN. */
  @Test
  void thrustOfAnAxle() {
    assertThat(new Soil(1e6, true).thrustN(new Tyre(0.46, 1.6), 40e3))
        .isCloseTo(21_830, within(30.0));
    assertThat(new Soil(1e6, true).thrustN(new Tyre(0.46, 1.6), 0)).isZero();
  }

  /**
   * Hand-worked: two-wheel drive, level line and ground, 3,000 kg, 30 % in front, wheelbase 2.2 m,
   * hitch 0.5 m, tyres 0.40 by 1.40 m, 1,200 kPa, no rolling resistance. At 13.40 kN the rear axle
   * bears 20,594 + 13,400 x 0.5/2.2 = 23,639 N, 11,820 N a wheel: Bn = 1.2e6 x 0.56 / 11,820 x 2 /
   * 1.857 = 61.2, net 0.6330 - 0.0659 = 0.5671 of it, 13,406 N: it pulls on. At 13.42 kN it bears
   * 23,644 N, of which 0.5671 are 13,408 N, less than 13,420.
   */
  @Test
  void aTractorFindsItsBalance() {
    Chassis tractor = new Chassis(3000, 0.30, 2.2, 0.9, 0.5, 0.6);
    FieldTraction field =
        new FieldTraction(
            new Soil(1.2e6, true), null, new Tyre(0.4, 1.4), Grip.everywhere(0.35), 0.35);
    Traction t = field.of(tractor, Drive.RWD, 0, 0, 0);
    assertThat(t.tensionN()).isBetween(13_400.0, 13_420.0);
    assertThat(t.limit()).isEqualTo(Limit.REAR_GRIP);
  }

  @Test
  void unmeasuredSoilNeverGivesMoreThanTheGroundsGrip() {
    Chassis tractor = new Chassis(3000, 0.30, 2.2, 0.9, 0.5, 0.6);
    Soil usual = Soil.of("grass", true, null);
    assertThat(usual.coneIndexPa()).isEqualTo(450e3);
    Grip wet = Grip.everywhere(0.2);
    Traction field =
        new FieldTraction(usual, null, new Tyre(0.4, 1.4), wet, 0.2)
            .of(tractor, Drive.RWD, 0, 0, 0);
    double byGrip = Traction.of(tractor, Drive.RWD, 0.2, 0, 0, 0).tensionN();
    assertThat(field.tensionN()).isCloseTo(byGrip, within(1e-3));
  }

  @Test
  void asphaltIsNoSoil() {
    assertThatIllegalArgumentException()
        .isThrownBy(() -> Soil.of("asphalt", false, null))
        .withMessageStartingWith("cone_index_kPa is missing; on asphalt it must be measured");
  }
}
