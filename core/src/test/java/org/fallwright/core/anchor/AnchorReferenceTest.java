package org.fallwright.core.anchor;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import org.fallwright.core.outside.CheckValue;
import org.fallwright.core.site.Anchor.Holdfast;
import org.fallwright.core.site.Anchor.PicketSoil;
import org.fallwright.core.tree.StemVolume;
import org.fallwright.core.units.Units;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/** Published or hand-worked figures, the source beside each. */
class AnchorReferenceTest {
  private static final String NICOLL =
      "Fonweban et al. 2012 and Nicoll et al. 2006, by a public wind-risk model";
  private static final String FONWEBAN = "Fonweban et al. 2012, by a public wind-risk model";

  /** Norway spruce, DBH 40 cm, 25 m, 850 kg/m³, free-draining mineral soil. */
  @Test
  void norwaySpruceOfTheBritishPullingTests() {
    double volume = StemVolume.SPRUCE.volumeM3(0.40, 25);
    worked(NICOLL, "spruce 40 cm, 25 m, volume", 1.355, "m³", volume, 0.0005);
    double mass = 850 * volume;
    worked(NICOLL, "the same, stem mass", 1152, "kg", mass, 0.5);
    double shallow = WoodAnchor.rootPlateNm(126.0, mass) / 1000;
    worked(NICOLL, "the same, overturning, shallow", 145.2, "kN·m", shallow, 0.05);
    double deep = WoodAnchor.rootPlateNm(146.6, mass) / 1000;
    worked(NICOLL, "the same, overturning, deep", 168.9, "kN·m", deep, 0.05);
    // stem break 0.9 × 36 MPa at the diameter over bark: it uproots first
    double stem = WoodAnchor.stemNm(0.9 * 36e6, 0.40) / 1000;
    worked(NICOLL, "the same, stem breaking", 203.6, "kN·m", stem, 0.05);
  }

  /** Beech, DBH 40 cm, 25 m, by the stand-in row; 1,158 kg/m³ and 65 MPa. */
  @Test
  void beechByTheStandInRow() {
    double volume = StemVolume.PINE.volumeM3(0.40, 25);
    worked(FONWEBAN, "beech 40 cm, 25 m, volume", 1.153, "m³", volume, 0.0005);
    worked(FONWEBAN, "the same, stem mass", 1335, "kg", 1158 * volume, 0.6);
    double stem = WoodAnchor.stemNm(65e6, 0.40) / 1000;
    worked("Lavers 1969", "beech 40 cm, stem breaking", 408, "kN·m", stem, 0.5);
  }

  /** Form factors at breast height that follow from the equations, to two figures. */
  @ParameterizedTest
  @CsvSource({
    "SPRUCE, 0.20, 15, 0.49", "SPRUCE, 0.40, 25, 0.43", "SPRUCE, 0.60, 30, 0.40",
    "PINE, 0.20, 15, 0.45", "PINE, 0.40, 25, 0.37", "PINE, 0.60, 30, 0.32"
  })
  void formFactors(StemVolume form, double dbh, double height, double factor) {
    double cylinder = Math.PI / 4 * dbh * dbh * height;
    String what = "anchor " + form + " " + dbh + " m, " + height + " m, form factor";
    worked(FONWEBAN, what, factor, "", form.volumeM3(dbh, height) / cylinder, 0.0051);
  }

  /** Lodgepole pine, hybrid spruce, western redcedar, hemlock. */
  @ParameterizedTest
  @CsvSource({"145.6, 72.8", "118.6, 59.3", "94.5, 47.25", "77.4, 38.7"})
  void overturningMomentOfA500KgStem(double perKg, double kNm) {
    double ours = WoodAnchor.rootPlateNm(perKg, 500) / 1000;
    worked("Byrne 2005 (abstract)", "500 kg stem at " + perKg + " N·m/kg", kNm, "kN·m", ours, 1e-3);
  }

  @Test
  void lowestRootPlate() {
    CheckValue.of("Byrne 2005 (abstract)", "western hemlock", 77.4, "N·m/kg")
        .isMet(WoodFigures.LOWEST_ROOT_PLATE, 0);
  }

  /** Round beam: 20 kN at 1.0 m on a 0.30 m stem. */
  @Test
  void stemStress() {
    assertThat(WoodAnchor.stemNm(7.55e6, 0.30)).isCloseTo(20e3, within(20.0));
  }

  @Test
  void gentlePullingTest() {
    CheckValue.of("Forests 14(3):533, 2023", "anchorage over moment at 0.25 deg", 2.5, "")
        .isMet(WoodAnchor.fromQuarterDegreeNm(20e3) / 20e3, 1e-12);
  }

  /** Parallelogram of forces. */
  @ParameterizedTest
  @CsvSource({"30, 0.518", "60, 0.577", "90, 0.707", "120, 1.000"})
  void equalLegs(double included, double share) {
    TwoLegs legs = TwoLegs.share(1, included / 2, included / 2);
    assertThat(legs.firstN()).isCloseTo(share, within(0.0005));
    assertThat(legs.secondN()).isCloseTo(share, within(0.0005));
  }

  /** 3-4-5 triangle, legs at a right angle. */
  @Test
  void unequalLegs() {
    TwoLegs legs =
        TwoLegs.share(5, Math.toDegrees(Math.atan2(3, 4)), Math.toDegrees(Math.atan2(4, 3)));
    assertThat(legs.firstN()).isCloseTo(4, within(1e-12));
    assertThat(legs.secondN()).isCloseTo(3, within(1e-12));
  }

  /** 26,600 lb line, 5 ft deep, 1:2. */
  @ParameterizedTest
  @CsvSource({"1.0, 8.39, 8.39, false", "1.5, 5.93, 3.95, true"})
  void deadman(double diameterFt, double lengthFt, double ratio, boolean accepted) {
    Deadman log = Deadman.log(26_600, 5, 2, diameterFt);
    String source = "US Army TM 5-5420-278-10, p. 317";
    worked(source, diameterFt + " ft log, length", lengthFt, "ft", log.lengthFt(), 0.005);
    worked(source, diameterFt + " ft log, slenderness", ratio, "", log.lengthOverDiameter(), 0.005);
    assertThat(log.accepted()).isEqualTo(accepted);
    // a log of the length asked holds the line's breaking load
    double holds =
        Deadman.holdsN(
            5 * Units.FOOT, 2, diameterFt * Units.FOOT, log.lengthFt() * Units.FOOT, false);
    worked(source, diameterFt + " ft log holds", 26_600, "lbf", holds / Units.POUND_FORCE, 1e-6);
  }

  /** Holding power by mean depth, line at 1:1 to 1:4. */
  @ParameterizedTest
  @CsvSource({
    "3, 950, 1300, 1450, 1500",
    "4, 1750, 2200, 2600, 2700",
    "5, 2800, 3600, 4000, 4100",
    "6, 3800, 5100, 5800, 6000",
    "7, 5100, 7000, 8000, 8400"
  })
  void deadmanTable(int feet, double one, double two, double three, double four) {
    double[] row = {one, two, three, four};
    for (int run = 1; run <= 4; run++) {
      CheckValue.of(
              "US Army TM 5-5420-278-10, Table 9",
              "deadman " + feet + " ft deep, 1:" + run,
              row[run - 1],
              "lbf/ft²")
          .isMet(Deadman.power(feet, run), 0);
    }
  }

  @ParameterizedTest
  @CsvSource({"SINGLE, 700, 3.11", "ONE_ONE_ONE, 1800, 8.01", "THREE_TWO_ONE, 4000, 17.79"})
  void pickets(Holdfast holdfast, double lbf, double kN) {
    double n = Pickets.holdsN(holdfast, 1, PicketSoil.UNDISTURBED_LOAM, false);
    String source = "US Navy NAVEDTRA 14251, pp. 172-173";
    CheckValue.of(source, holdfast + " in loam", lbf, "lbf").isMet(n / Units.POUND_FORCE, 1e-9);
    worked(source, holdfast + " in loam", kN, "kN", n / 1000, 0.005);
  }

  @ParameterizedTest
  @CsvSource({"ONE_ONE, 1400", "TWO_ONE, 2000"})
  void picketsFromMemory(Holdfast holdfast, double lbf) {
    double n = Pickets.holdsN(holdfast, 1, PicketSoil.UNDISTURBED_LOAM, false);
    CheckValue.of("US Army FM 5-125", holdfast + " in loam", lbf, "lbf")
        .fromMemory()
        .isMet(n / Units.POUND_FORCE, 1e-9);
  }

  @ParameterizedTest
  @CsvSource({"1, 350", "5, 1750", "6, 2000"})
  void steelPickets(int pickets, double kg) {
    double n = Pickets.holdsN(Holdfast.STEEL_ROW, pickets, PicketSoil.UNDISTURBED_LOAM, false);
    CheckValue.of(
            "Australian Emergency Manual, Disaster Rescue, 8.3",
            pickets + " steel pickets",
            kg,
            "kg")
        .isMet(n / Units.KILOGRAM_FORCE, 1e-9);
  }

  @ParameterizedTest
  @CsvSource({
    "COHESIVE_POOR, 500, 1000",
    "COHESIVE_AVERAGE, 750, 1500",
    "COHESIVE_GOOD, 1000, 2000",
    "SAND_LOOSE, 50, 150",
    "SAND_MEDIUM, 55, 180",
    "SAND_DENSE, 63, 190"
  })
  void pins(PicketSoil soil, double thin, double thick) {
    String source = "USACE US&R field guide, 5th ed. 2006 (second hand)";
    CheckValue.of(source, "1 in pin, " + soil, thin, "lbf")
        .isMet(Pickets.holdsN(Holdfast.THIN_PINS, 1, soil, false) / Units.POUND_FORCE, 1e-9);
    CheckValue.of(source, "3 in pin, " + soil, thick, "lbf")
        .isMet(Pickets.holdsN(Holdfast.THICK_PINS, 1, soil, false) / Units.POUND_FORCE, 1e-9);
  }

  /** 1,520 lb at 750 and at 55 lb a pin. */
  @ParameterizedTest
  @CsvSource({"750, 3", "55, 28"})
  void pinsForALoad(double eachLb, int pins) {
    CheckValue.of(
            "USACE US&R field guide, 5th ed. 2006 (second hand)",
            "pins of " + eachLb + " lb for 1520 lb",
            pins,
            "")
        .isMet(Pickets.pinsFor(1520, eachLb), 0);
  }

  /** A 22.56 kN vehicle with locked wheels, worked by hand to four figures. */
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
    double mass = 22_560 / Units.GRAVITY;
    assertThat(LockedWheels.slidesAtN(mass, grip, uphill, rise) / 1000)
        .isCloseTo(kN, within(0.0006));
  }

  /** A 3,000 kg vehicle without chocks drags on grass at about 10 kN. */
  @Test
  void vehicleDraggedOnGrass() {
    CheckValue.of(
            "Arboriculture Australia 2022, Tree Rescue Manual p. 214",
            "3000 kg dragged on grass",
            10,
            "kN")
        .isMet(LockedWheels.slidesAtN(3000, 0.35, 0, 0) / 1000, 0.31);
  }

  /**
   * The demo site's anchors by the same tables (white oak 1,010 kg/m³, paper birch 833, Norway
   * spruce 850, pine 560): moments worked by hand from the volume equation.
   */
  @ParameterizedTest
  @CsvSource({
    "PINE, 0.62, 19, 1010, 77.4, 137.1", "PINE, 0.27, 13, 833, 77.4, 19.3",
    "SPRUCE, 0.44, 23, 850, 126.0, 159.2", "PINE, 0.40, 15, 560, 77.4, 28.8"
  })
  void momentsOfTheDemoSite(
      StemVolume form, double dbh, double height, double density, double perKg, double kNm) {
    double mass = density * form.volumeM3(dbh, height);
    assertThat(WoodAnchor.rootPlateNm(perKg, mass) / 1000).isCloseTo(kNm, within(0.05));
  }

  private static void worked(
      String source, String what, double theirs, String unit, double ours, double tolerance) {
    CheckValue.of(source, what, theirs, unit).worked().isMet(ours, tolerance);
  }
}
