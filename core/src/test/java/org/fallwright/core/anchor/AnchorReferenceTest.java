package org.fallwright.core.anchor;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/** Published or hand-worked figures, the source beside each. */
class AnchorReferenceTest {
  /**
   * Norway spruce, DBH 40 cm, 25 m: volume by Fonweban et al. 2012, 850 kg/m³; overturning by
   * Nicoll et al. 2006, free-draining mineral soil, shallow and deep rooting; printed to four
   * figures.
   */
  @Test
  void norwaySpruceOfTheBritishPullingTests() {
    double volume = StemForm.SPRUCE.volumeM3(0.40, 25);
    assertThat(volume).isCloseTo(1.355, within(0.0005));
    double mass = 850 * volume;
    assertThat(mass).isCloseTo(1152, within(0.5));
    assertThat(WoodAnchor.rootPlateNm(126.0, mass)).isCloseTo(145.2e3, within(50.0));
    assertThat(WoodAnchor.rootPlateNm(146.6, mass)).isCloseTo(168.9e3, within(50.0));
    // stem break 0.9 × 36 MPa at the diameter over bark: it uproots first
    assertThat(WoodAnchor.stemNm(0.9 * 36e6, 0.40)).isCloseTo(203.6e3, within(50.0));
  }

  /**
   * Beech, DBH 40 cm, 25 m, by the stand-in row of Fonweban et al. 2012; 1,158 kg/m³ and 65 MPa.
   */
  @Test
  void beechByTheStandInRow() {
    double volume = StemForm.OTHER.volumeM3(0.40, 25);
    assertThat(volume).isCloseTo(1.153, within(0.0005));
    assertThat(1158 * volume).isCloseTo(1335, within(0.6));
    assertThat(WoodAnchor.stemNm(65e6, 0.40)).isCloseTo(408e3, within(500.0));
  }

  /**
   * Form factors at breast height that follow from Fonweban et al. 2012, printed to two figures.
   */
  @ParameterizedTest
  @CsvSource({
    "SPRUCE, 0.20, 15, 0.49", "SPRUCE, 0.40, 25, 0.43", "SPRUCE, 0.60, 30, 0.40",
    "OTHER, 0.20, 15, 0.45", "OTHER, 0.40, 25, 0.37", "OTHER, 0.60, 30, 0.32"
  })
  void formFactors(StemForm form, double dbh, double height, double factor) {
    double cylinder = Math.PI / 4 * dbh * dbh * height;
    assertThat(form.volumeM3(dbh, height) / cylinder).isCloseTo(factor, within(0.0051));
  }

  /**
   * Byrne 2005: moment per kilogram of lodgepole pine, hybrid spruce, western redcedar, hemlock.
   */
  @ParameterizedTest
  @CsvSource({"145.6, 72.8", "118.6, 59.3", "94.5, 47.25", "77.4, 38.7"})
  void overturningMomentOfA500KgStem(double perKg, double kNm) {
    assertThat(WoodAnchor.rootPlateNm(perKg, 500) / 1000).isCloseTo(kNm, within(0.001));
  }

  /** Round beam: 20 kN at 1.0 m on a 0.30 m stem gives 7.55 MPa. */
  @Test
  void stemStress() {
    assertThat(WoodAnchor.stemNm(7.55e6, 0.30)).isCloseTo(20e3, within(20.0));
  }

  /** Forests 14(3):533, 2023: a moment of 20 kN·m at 0.25° of tilt points to 50 kN·m. */
  @Test
  void gentlePullingTest() {
    assertThat(WoodAnchor.fromQuarterDegreeNm(20e3)).isCloseTo(50e3, within(1e-6));
  }

  /** Parallelogram of forces; 0.518, 0.577, 0.707, 1.000 at 30, 60, 90, 120 degrees. */
  @ParameterizedTest
  @CsvSource({"30, 0.518", "60, 0.577", "90, 0.707", "120, 1.000"})
  void equalLegs(double included, double share) {
    TwoLegs legs = TwoLegs.share(1, included / 2, included / 2);
    assertThat(legs.firstN()).isCloseTo(share, within(0.0005));
    assertThat(legs.secondN()).isCloseTo(share, within(0.0005));
  }

  /** Resolving by hand: 3-4-5 triangle, legs at a right angle. */
  @Test
  void unequalLegs() {
    TwoLegs legs =
        TwoLegs.share(5, Math.toDegrees(Math.atan2(3, 4)), Math.toDegrees(Math.atan2(4, 3)));
    assertThat(legs.firstN()).isCloseTo(4, within(1e-12));
    assertThat(legs.secondN()).isCloseTo(3, within(1e-12));
  }

  /** US Army TM 5-5420-278-10, Table 9 and p. 317: 26,600 lb line, 5 ft deep, 1:2. */
  @ParameterizedTest
  @CsvSource({"1.0, 8.39, 8.39, false", "1.5, 5.93, 3.95, true"})
  void deadman(double diameterFt, double lengthFt, double ratio, boolean accepted) {
    Deadman log = Deadman.log(26_600, 5, 2, diameterFt);
    assertThat(log.powerLbPerSqFt()).isEqualTo(3600);
    assertThat(log.lengthFt()).isCloseTo(lengthFt, within(0.005));
    assertThat(log.lengthOverDiameter()).isCloseTo(ratio, within(0.005));
    assertThat(log.accepted()).isEqualTo(accepted);
  }

  /** US Navy NAVEDTRA 14251 pp. 172–173: 700, 1,800 and 4,000 lb are 3.11, 8.01 and 17.79 kN. */
  @ParameterizedTest
  @CsvSource({"SINGLE, 3.11", "ONE_ONE_ONE, 8.01", "THREE_TWO_ONE, 17.79"})
  void pickets(Pickets holdfast, double kN) {
    assertThat(holdfast.holdsN() / 1000).isCloseTo(kN, within(0.005));
  }

  /** Australian Emergency Manual, Disaster Rescue, 8.3: 350 kg a picket, 2 t in all. */
  @ParameterizedTest
  @CsvSource({"1, 350", "5, 1750", "6, 2000"})
  void steelPickets(int pickets, double kg) {
    assertThat(Pickets.steelRowKg(pickets)).isEqualTo(kg);
  }

  /** USACE US&R field guide, 5th ed. 2006 (second hand): 1,520 lb at 750 and at 55 lb a pin. */
  @ParameterizedTest
  @CsvSource({"750, 3", "55, 28"})
  void pins(double eachLb, int pins) {
    assertThat(Pickets.pinsFor(1520, eachLb)).isEqualTo(pins);
  }

  /** Statics of a 22.56 kN vehicle with locked wheels, worked by hand to four figures. */
  @ParameterizedTest
  @CsvSource({
    "0.60, 0, 0, 13.536",
    "0.60, 0, 15, 12.073",
    "0.35, 0, 15, 7.474",
    "0.35, 5, 15, 5.584",
    "0.20, 0, 0, 4.512",
    "0.60, 10, 0, 9.413",
    "0.60, -10, 0, 17.248"
  })
  void lockedWheels(double grip, double uphill, double rise, double kN) {
    double mass = 22_560 / 9.80665;
    assertThat(LockedWheels.slidesAtN(mass, grip, uphill, rise) / 1000)
        .isCloseTo(kN, within(0.0006));
  }

  /**
   * Arboriculture Australia 2022, Tree Rescue Manual p. 214: a 3,000 kg vehicle without chocks
   * drags on grass at about 10 kN; with its 0.35 the formula gives 10.30.
   */
  @Test
  void vehicleDraggedOnGrass() {
    assertThat(LockedWheels.slidesAtN(3000, 0.35, 0, 0)).isCloseTo(10.30e3, within(5.0));
  }

  /**
   * The demo site's anchors by the same tables (white oak 1,010 kg/m³, paper birch 833, Norway
   * spruce 850, pine 560): moments worked by hand from the volume equation.
   */
  @ParameterizedTest
  @CsvSource({
    "OTHER, 0.62, 19, 1010, 77.4, 137.1", "OTHER, 0.27, 13, 833, 77.4, 19.3",
    "SPRUCE, 0.44, 23, 850, 126.0, 159.2", "OTHER, 0.40, 15, 560, 77.4, 28.8"
  })
  void momentsOfTheDemoSite(
      StemForm form, double dbh, double height, double density, double perKg, double kNm) {
    double mass = density * form.volumeM3(dbh, height);
    assertThat(WoodAnchor.rootPlateNm(perKg, mass) / 1000).isCloseTo(kNm, within(0.05));
  }
}
