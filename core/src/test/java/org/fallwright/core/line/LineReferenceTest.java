package org.fallwright.core.line;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.List;
import org.fallwright.core.site.Gear;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/** Published or hand-worked figures, the source beside each. */
class LineReferenceTest {
  private static final double LBF = 4.4482216152605;
  private static final double G = 9.80665;

  /** Redirect multiplier 2·cos(θ/2), the common rigging table, to three decimals. */
  @ParameterizedTest
  @CsvSource({
    "0, 2.000",
    "15, 1.983",
    "30, 1.932",
    "45, 1.848",
    "60, 1.732",
    "75, 1.587",
    "90, 1.414",
    "105, 1.218",
    "120, 1.000",
    "135, 0.765",
    "150, 0.518",
    "165, 0.261",
    "180, 0.000"
  })
  void redirectMultiplier(double interior, double factor) {
    assertThat(LegLoads.blockLoadN(1, 1, interior)).isCloseTo(factor, within(0.0005));
    double a = Math.toRadians(interior);
    if (interior > 0) {
      LegLoads path =
          LegLoads.of(
              List.of(
                  new Point3(10, 0, 0),
                  new Point3(0, 0, 0),
                  new Point3(20 * Math.cos(a), 0, 20 * Math.sin(a))),
              List.of(0.9));
      assertThat(path.blocks().get(0).holding()).isCloseTo(factor, within(0.0005));
      assertThat(path.blocks().get(0).interiorDeg()).isCloseTo(interior, within(1e-9));
    }
  }

  /** Statics: 10 kN at 60 degrees 17.32 kN; with 9 kN in the other leg 16.46 kN. */
  @ParameterizedTest
  @CsvSource({"10, 10, 17.32", "10, 9, 16.46"})
  void redirectOfTenKilonewtons(double first, double second, double load) {
    assertThat(LegLoads.blockLoadN(first, second, 60)).isCloseTo(load, within(0.005));
  }

  /** Statics: 20 kN at 90, 120 and 60 degrees. */
  @ParameterizedTest
  @CsvSource({"90, 28.28", "120, 20.00", "60, 34.64"})
  void redirectOfTwentyKilonewtons(double interior, double load) {
    assertThat(LegLoads.blockLoadN(20, 20, interior)).isCloseTo(load, within(0.005));
  }

  /** 49 CFR 393.108 default working loads of chain in kg: within 3 % of the grade formula. */
  @ParameterizedTest
  @CsvSource({
    "GRADE_80, 7, 1570", "GRADE_80, 8, 2000", "GRADE_80, 10, 3200", "GRADE_80, 13, 5400",
    "GRADE_80, 16, 8200", "GRADE_100, 7, 1950", "GRADE_100, 8, 2600", "GRADE_100, 10, 4000",
    "GRADE_100, 13, 6800", "GRADE_100, 16, 10300"
  })
  void chainAgainstTheRegulation(ChainGrade grade, double mm, double kg) {
    assertThat(grade.workingN(mm / 1000) / G).isCloseTo(kg, within(0.03 * kg));
  }

  /** Grade 80, 13 mm, by the formula: breaks at 212.4 kN, works at 53.09 kN or 5,414 kg. */
  @Test
  void chainOfThirteenMillimetres() {
    assertThat(ChainGrade.GRADE_80.breakingN(0.013)).isCloseTo(212.4e3, within(50.0));
    assertThat(ChainGrade.GRADE_80.workingN(0.013)).isCloseTo(53.09e3, within(5.0));
    assertThat(ChainGrade.GRADE_80.workingN(0.013) / G).isCloseTo(5414, within(0.5));
  }

  /**
   * Published table of 6×19 fibre core ropes, improved plough steel (engineering table), inches and
   * lbf: the EN form with grade 1770 is within 4 % of each row.
   */
  @ParameterizedTest
  @CsvSource({
    "0.25, 5480",
    "0.375, 12200",
    "0.5, 21400",
    "0.625, 33400",
    "0.75, 47600",
    "0.875, 64400",
    "1, 83600"
  })
  void fibreCoreWireRope(double inches, double lbf) {
    double n = WireRope.FIBRE_CORE.breakingN(0.0254 * inches, WireRope.GRADE_1770);
    assertThat(n / LBF).isCloseTo(lbf, within(0.04 * lbf));
  }

  /**
   * EN 13414-1 Table 4, wire slings with ferruled eyes, steel core: 1.70, 3.00 and 4.60 t. The rope
   * formula with 0.9 for the ferrule and factor 5 gives 1.67, 2.96 and 4.63 t.
   */
  @ParameterizedTest
  @CsvSource({"12, 1.70, 1.67", "16, 3.00, 2.96", "20, 4.60, 4.63"})
  void wireSlings(double mm, double printedT, double formulaT) {
    double n = 0.9 * WireRope.STEEL_CORE.breakingN(mm / 1000, WireRope.GRADE_1770) / 5;
    assertThat(n / G / 1000).isCloseTo(formulaT, within(0.0051));
    assertThat(n / G / 1000).isCloseTo(printedT, within(0.025 * printedT));
  }

  /** Australian Emergency Manual, Disaster Rescue, 3.15: a 14 mm wire rope, 1,568 kg. */
  @Test
  void safeMassOfAWireRope() {
    assertThat(WireRope.safeMassKg(0.014)).isCloseTo(1568, within(1e-9));
  }

  /**
   * Handbook of Oceanographic Winch, Wire and Cable Technology, ch. 12: barrel 10 in wide, 3 in
   * diameter, 2 in deep, rope 3/8 in: 186.2 ft or 56.7 m.
   */
  @Test
  void ropeOnADrum() {
    double metres = WireRope.onDrumM(10 * .0254, 3 * .0254, 2 * .0254, .375 * .0254);
    assertThat(metres).isCloseTo(56.7, within(0.06));
    assertThat(metres / 0.3048).isCloseTo(186.2, within(0.1));
  }

  /**
   * US Navy Builder manual: 3 in round nylon 21,600 lb, manila 8,100 lb; 1/2 in thick nylon 5,922
   * lb.
   */
  @ParameterizedTest
  @CsvSource({"NYLON, 0.95493, 21600", "MANILA, 0.95493, 8100", "NYLON, 0.5, 5922"})
  void laidRopes(FibreRule rope, double inches, double lb) {
    assertThat(rope.breakingN(0.0254 * inches) / LBF).isCloseTo(lb, within(1.0));
  }

  /**
   * UFC 4-159-03 Table 6-8, 1 in double braid nylon, EA 529 kN: 30 kN on 40 m, 2.268 m and 34.0 kJ.
   */
  @Test
  void stretchAndEnergy() {
    ElasticLine line = ElasticLine.of(30e3, 40, 529e3);
    assertThat(line.stretchM()).isCloseTo(2.268, within(0.0005));
    assertThat(line.energyJ()).isCloseTo(34.0e3, within(50.0));
    // its breaking load of 149.5 kN would stretch it by 28 %
    assertThat(ElasticLine.of(149.5e3, 1, 529e3).stretchM()).isCloseTo(0.28, within(0.005));
  }

  /** Bowline 60 % (Plymouth Cordage 1946) on 60 kN: 7.2 kN at factor 5, 3.6 kN at 10. */
  @ParameterizedTest
  @CsvSource({"1, 7200", "10, 3600"})
  void knottedFibreLine(double ruleFactor, double allowed) {
    Gear.Line line =
        new Gear.Line(
            "L", "polyester", false, 0.016, 50, 60e3, RopeEnd.BOWLINE.factor(), 1, 1, 1e6, true);
    assertThat(PartStrength.line(line, ruleFactor).allowedN()).isCloseTo(allowed, within(1e-6));
  }

  /**
   * 29 CFR 1918 App. II Table 1, manila 1 in: basket at 60, 45, 30 degrees over vertical, in lb.
   */
  @ParameterizedTest
  @CsvSource({"60, 3100", "45, 2600", "30, 1800"})
  void basketOfManila(double degrees, double lb) {
    assertThat(SlingHitch.basket(degrees)).isCloseTo(lb / 1800, within(0.035));
  }

  /** The same table: choker 900 of 1,800 lb; the lower end of its chokers is taken. */
  @Test
  void chokerOfManila() {
    assertThat(SlingHitch.CHOKER_NATURAL_FIBRE.factor()).isBetween(0.45, 900.0 / 1800);
  }

  /** US Navy rigging training manual: an unmarked 5/8 in shackle, 1.17 short tons. */
  @Test
  void unmarkedShackle() {
    assertThat(Shackles.unmarkedN(0.625 * 0.0254) / (2000 * LBF)).isCloseTo(1.17, within(0.005));
  }

  /** The metric form of the same rule, 0.417·D² tonnes with D in cm. */
  @Test
  void unmarkedShackleInMetric() {
    assertThat(Shackles.unmarkedN(0.02) / G / 1000).isCloseTo(0.417 * 4, within(0.03));
  }

  /** ASME B30.26-2010: design factor of a shackle up to 150 short tons. */
  @Test
  void shackleFactor() {
    PartStrength s = PartStrength.rated(31.9e3, Shackles.DESIGN_FACTOR);
    assertThat(s.strengthN()).isCloseTo(159.5e3, within(1e-6));
    assertThat(s.allowedN()).isCloseTo(31.9e3, within(1e-6));
  }
}
