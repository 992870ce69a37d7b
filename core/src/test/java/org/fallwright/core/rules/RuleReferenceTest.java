package org.fallwright.core.rules;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.List;
import java.util.Map;
import org.fallwright.core.outside.CheckValue;
import org.fallwright.core.reference.Allowances;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/** Published figures of the rules, the source beside each. */
class RuleReferenceTest {
  private static final double FT = 0.3048;
  private static final double IN = 0.0254;
  private static final RuleSets ALL = RuleSets.shipped();

  /** Two tree lengths, by each rule set's own source or as adopted from its neighbours'. */
  @ParameterizedTest
  @CsvSource({
    "US-OSHA, 29 CFR 1910.266(h)(1)(iv)",
    "US-EM385, 'EM 385-1-1, 31-8'",
    "UK, ",
    "DE-DGUV, DGUV Regel 114-018",
    "CA-BC, B.C. Reg. 296/97 26.1",
    "AU, ",
    "NZ, "
  })
  void twoTreeLengths(String key, String source) {
    Rule rule = ALL.byKey(key).peopleRadiusFactor();
    assertThat(rule.value()).isEqualTo(2);
    if (source != null) {
      CheckValue.of(source, key + ", people away, tree lengths", 2, "").isMet(rule.value(), 0);
    }
    assertThat(rule.value() * 24).isEqualTo(48);
    assertThat(rule.value() * 60 * FT).isCloseTo(36.58, within(0.005));
    assertThat(rule.fallback()).isFalse();
    assertThat(rule.metBy(48, 24)).isTrue();
    assertThat(rule.metBy(47.9, 24)).isFalse();
  }

  /** NWCG safety note: 2.5 lengths of a 20 m tree. */
  @Test
  void wildlandFireCuttingArea() {
    CheckValue.of("NWCG safety note, cutting area", "tree lengths in all directions", 2.5, "")
        .isMet(ALL.byKey("US-OSHA").stricterPeopleRadiusFactor().value(), 0);
  }

  /** Wildlife Tree Committee of British Columbia 2001: 1.5 lengths of a 30 m tree. */
  @Test
  void dangerousTreeLeftStanding() {
    CheckValue.of(
            "Wildlife Tree Committee of British Columbia 2001",
            "tree lengths round a tree left standing",
            1.5,
            "")
        .isMet(ALL.byKey("CA-BC").leftStandingFactor().value(), 0);
    assertThat(ALL.byKey("US-OSHA").leftStandingFactor().value() * 30).isEqualTo(60);
  }

  /**
   * 69 kV between phases by 29 CFR 1910.333, EM 385-1-1, 29 CFR 1926.1408 Table A, BC Table 19-1A.
   */
  @ParameterizedTest
  @CsvSource({"US-1910.333, 10, 0", "US-EM385, 10, 7.6", "US-1926.1408, 15, 0"})
  void sixtyNineKilovolts(String table, double feet, double inches) {
    approach(table, 69, feet * FT + inches * IN);
  }

  /** British Columbia Table 19-1A: 3, 4.5 and 6 m, upper voltages inclusive. */
  @ParameterizedTest
  @CsvSource({"69, 3", "75, 3", "75.1, 4.5", "250, 4.5", "250.1, 6", "550, 6"})
  void britishColumbia(double kv, double metres) {
    approach("CA-BC-19-1A", kv, metres);
    assertThat(distance("CA-BC-19-1A", kv)).isEqualTo(metres);
  }

  /**
   * 230 kV: EM 385-1-1 16 ft 0 in; 132.8 kV to ground by 1910.333, begun steps whole: 13 ft 0 in.
   */
  @ParameterizedTest
  @CsvSource({"US-EM385, 16", "US-1910.333, 13"})
  void twoHundredAndThirtyKilovolts(String table, double feet) {
    approach(table, 230, feet * FT);
  }

  /** 29 CFR 1926.1408 Table A at the edges of its bands and at 500 kV; upper limits inclusive. */
  @ParameterizedTest
  @CsvSource({
    "50, 10",
    "50.1, 15",
    "200, 15",
    "200.1, 20",
    "350, 20",
    "500, 25",
    "750, 35",
    "1000, 45"
  })
  void craneTable(double kv, double feet) {
    approach("US-1926.1408", kv, feet * FT);
  }

  /** EM 385-1-1 at 500 kV: 25 ft 0 in. */
  @Test
  void fiveHundredKilovolts() {
    approach("US-EM385", 500, 25 * FT);
  }

  /**
   * The rows of the US consensus table for tree work follow from the same growth at the top of each
   * band (rows from memory, arithmetic checked): 72.5, 121, 145, 169, 242, 362, 550, 800 kV.
   */
  @ParameterizedTest
  @CsvSource({
    "72.5, 10, 9",
    "121, 12, 4",
    "145, 13, 2",
    "169, 14, 0",
    "242, 16, 5",
    "362, 20, 5",
    "550, 26, 8",
    "800, 35, 0"
  })
  void consensusTable(double kv, double feet, double inches) {
    CheckValue.of("ANSI Z133, approach by voltage", kv + " kV", feet * FT + inches * IN, "m")
        .fromMemory()
        .isMet(distance("US-EM385", kv), 0.5 * IN);
  }

  /** 29 CFR 1910.333 and 1910.269(x): 10 ft or 3.05 m for a 12.47 kV line. */
  @Test
  void distributionLine() {
    Rule rule = ALL.byKey("US-OSHA").approachDistanceM(12.47).orElseThrow();
    CheckValue.of("29 CFR 1910.333 and 1910.269", "approach at 12.47 kV", 3.05, "m")
        .isMet(rule.value(), 0.005);
    assertThat(rule.fallback()).isFalse();
    // a 15 m tree 17 m from the line
    assertThat(WireReach.of(17, 15, rule.value(), ALL.byKey("US-OSHA"))).isEqualTo(WireReach.STOP);
  }

  /** HSE GS6 as restated: 9 m from wood poles, 15 m from towers. */
  @ParameterizedTest
  @CsvSource({"false, 8.9, false", "false, 9.1, true", "true, 14.9, false", "true, 15.1, true"})
  void britishConsultation(boolean towers, double metres, boolean met) {
    Rule rule = ALL.byKey("UK").consultDistanceM(towers).orElseThrow();
    assertThat(rule.metBy(metres, 1)).isEqualTo(met);
  }

  @ParameterizedTest
  @CsvSource({"false, 9", "true, 15"})
  void britishConsultationDistances(boolean towers, double metres) {
    CheckValue.of("HSE GS6, restated", towers ? "from towers" : "from wood poles", metres, "m")
        .fromMemory()
        .isMet(ALL.byKey("UK").consultDistanceM(towers).orElseThrow().value(), 0);
  }

  /** DGUV Regel 114-018, 3.2.6.6: a direct rope longer than two lengths of a 20 m tree. */
  @Test
  void germanDirectPull() {
    Rule rule = ALL.byKey("DE-DGUV").operatorRadiusFactor();
    assertThat(rule.metBy(40.0, 20)).isFalse();
    assertThat(rule.metBy(40.1, 20)).isTrue();
    // on the ground a rope of 40 m to 12 m up the stem reaches only 38.2 m
    double ground = Math.sqrt(40 * 40 - 12 * 12);
    assertThat(ground).isCloseTo(38.2, within(0.05));
    assertThat(rule.metBy(ground, 20)).isFalse();
  }

  /** 45 degrees off the line opposite the fall, either side (glossaries). */
  @ParameterizedTest
  @CsvSource({"90, 225, 315", "350, 125, 215", "30, 165, 255"})
  void escapeAzimuths(double lay, double first, double second) {
    assertThat(ALL.byKey("US-OSHA").escapeAzimuthsDeg(lay)).isEqualTo(List.of(first, second));
  }

  /** OAR 437-007-0810(9): 25 ft. */
  @Test
  void oregonEscapeLength() {
    CheckValue.of("OAR 437-007-0810(9)", "length of an escape route", 25, "ft")
        .isMet(ALL.byKey("US-OSHA").escapeLengthM().value() / FT, 1e-9);
  }

  /** Bavarian state forest-owner school and GUV-I 8627, a 55 kN winch, in kN. */
  @Test
  void germanGearForAWinch() {
    RuleSet de = ALL.byKey("DE-DGUV");
    winch("rope breaks at", 110, de.lineTwiceSource());
    winch("choker rated", 55, de.chokerOverSource());
    winch("redirect gear rated", 110, de.redirectGearOverSource());
    winch("redirect strop breaks at", 220, de.redirectStropOverSource());
    winch("redirect anchor bears", 110, de.redirectAnchorTwiceT());
    // 20 kN: the anchor is sized for 40 whatever the angle
    assertThat(de.redirectAnchorTwiceT().value() * 20).isEqualTo(40);
  }

  /** HSE, Chainsaws and tree felling continue to kill; DGUV Regel 114-018, 3.2.6.6. */
  @Test
  void freeHandPulling() {
    assertThat(ALL.byKey("UK").freeHand()).isEqualTo(RuleSet.FreeHand.REFUSED);
    assertThat(ALL.byKey("DE-DGUV").freeHand()).isEqualTo(RuleSet.FreeHand.REFUSED);
    assertThat(ALL.byKey("US-OSHA").freeHand()).isEqualTo(RuleSet.FreeHand.FLAGGED);
  }

  /** Victoria, No Go Zone rules: 6.4 m from poles, 10 m from towers without a spotter. */
  @ParameterizedTest
  @CsvSource({"22, 6.4", "66, 10"})
  void victoria(double kv, double metres) {
    CheckValue.of("Victoria, No Go Zone rules", "approach at " + kv + " kV", metres, "m")
        .isMet(ALL.byKey("AU").approachDistanceM(kv).orElseThrow().value(), 0);
  }

  /** MUTCD 2012, California edition, Table 6H-4: a 12 ft lane at 25, 35, 40, 45 and 55 mph. */
  @ParameterizedTest
  @CsvSource({"25, 125", "35, 245", "40, 320", "45, 540", "55, 660"})
  void mergingTaper(double mph, double feet) {
    CheckValue.of("California MUTCD 2012 Table 6H-4", "12 ft lane at " + mph + " mph", feet, "ft")
        .isMet(WorkZoneTaper.mergingM(12 * FT, mph * 0.44704) / FT, 0.51);
  }

  /** The same note: a shoulder asks a third, 82 ft at 35 mph. */
  @Test
  void shoulderTaper() {
    CheckValue.of("California MUTCD 2012 Table 6H-4", "12 ft shoulder at 35 mph", 82, "ft")
        .isMet(WorkZoneTaper.shoulderM(12 * FT, 35 * 0.44704) / FT, 0.5);
  }

  /** EM 385-1-1, 31-8: a structure 30 ft away, pieces of at most a third. */
  @Test
  void piecesBesideAStructure() {
    Rule rule = ALL.byKey("US-EM385").pieceOverDistance().orElseThrow();
    CheckValue.of("EM 385-1-1, 31-8", "piece 30 ft from a structure", 10, "ft")
        .fromMemory()
        .isMet(rule.value() * 30, 1e-9);
    assertThat(rule.metBy(10, 30)).isTrue();
    assertThat(rule.metBy(10.1, 30)).isFalse();
  }

  /** OAR 437-007-0815: wedges on hand from over 15 in. */
  @ParameterizedTest
  @CsvSource({"15.0, false", "15.1, true"})
  void wedgesOnHand(double inches, boolean asked) {
    assertThat(ALL.byKey("US-OSHA").wedgesOverDbhM().orElseThrow().metBy(inches * IN, 1))
        .isEqualTo(asked);
  }

  /** Beaufort land scale: 39 km/h is force 5, 40 km/h force 6. */
  @ParameterizedTest
  @CsvSource({"20, F4", "29, F4", "30, F5", "39, F5", "40, F6", "50, F6", "51, F7", "61, F7"})
  void beaufort(double kmh, Beaufort force) {
    assertThat(Beaufort.of(kmh / 3.6)).isEqualTo(force);
  }

  /**
   * 29 CFR 1910.269, 69 kV phase to ground: the present table's 3.29 ft, not the 3 ft 0 in of the
   * one before 2014.
   */
  @Test
  void thePresentTableOfQualifiedWorkers() {
    double metres = distance("US-1910.269-R6", 69);
    CheckValue.of("29 CFR 1910.269 Table R-6 (2014)", "69 kV, phase to ground", 3.29, "ft")
        .fromMemory()
        .isMet(metres / FT, 0.01);
    assertThat(metres).as("more than the superseded table's").isGreaterThan(3 * FT + 0.05);
    for (String key : ALL.keys()) {
      assertThat(ALL.byKey(key).approachTables())
          .as(key)
          .doesNotContain(ALL.table("US-1910.269-R6"));
    }
  }

  /** Widths and depths of hinge and face: Hale 2019; 0.8 D is training practice. */
  @Test
  void hingeOfASixtyCentimetreStem() {
    CheckValue.of("Hale 2019, The Craft of Felling", "hinge of a 60 cm stem", 6.0, "cm")
        .isMet(Allowances.HINGE_THICKNESS_SHARE.value() * 60, 1e-9);
    CheckValue.of("training practice", "hinge length of a 60 cm stem", 48, "cm")
        .fromMemory()
        .isMet(Allowances.HINGE_WIDTH_SHARE.value() * 60, 1e-9);
  }

  /** Depth of the face: Michigan a third, Washington a quarter, EM 385-1-1 a third. */
  @Test
  void depthOfTheFace() {
    CheckValue.of("WAC 296-54-53910(10)", "face depth over diameter", 0.25, "")
        .isMet(face("US-OSHA", RuleSet.FaceLimit.DEPTH_LEAST), 0);
    CheckValue.of("Mich. Admin. Code R 408.15336(3)", "face depth over diameter", 1 / 3.0, "")
        .isMet(face("US-OSHA", RuleSet.FaceLimit.DEPTH_MOST), 1e-9);
    CheckValue.of("EM 385-1-1, 31-2.d", "face depth over diameter", 1 / 3.0, "")
        .isMet(face("US-EM385", RuleSet.FaceLimit.DEPTH_LEAST), 1e-9);
    CheckValue.of("OSHA CPL 2-1.22, J.11.f(2)", "least opening of an open face", 70, "deg")
        .isMet(face("US-OSHA", RuleSet.FaceLimit.OPEN_LEAST_DEG), 0);
    CheckValue.of("OSHA CPL 2-1.22, J.11.f(2)", "greatest opening of an open face", 90, "deg")
        .isMet(face("US-OSHA", RuleSet.FaceLimit.OPEN_MOST_DEG), 0);
    assertThat(ALL.byKey("NZ").face(RuleSet.FaceLimit.DEPTH_MOST)).isEmpty();
  }

  private static double face(String key, RuleSet.FaceLimit limit) {
    return ALL.byKey(key).face(limit).orElseThrow().value();
  }

  /** Bavarian state forest-owner school: about 5 m beside the winch. */
  @Test
  void besideTheWinch() {
    CheckValue.of("Bavarian state forest-owner school", "beside a winch run by machine", 5, "m")
        .isMet(ALL.byKey("DE-DGUV").operatorBesideWinchM().value(), 0);
    assertThat(ALL.byKey("NZ").operatorBesideWinchM().fallbackFrom()).isEqualTo("DE-DGUV");
  }

  /** EM 385-1-1, 31-8: two tree lengths of path. */
  @Test
  void fellingPath() {
    CheckValue.of("EM 385-1-1, 31-8", "felling path, tree lengths", 2, "")
        .fromMemory()
        .isMet(ALL.byKey("US-EM385").pathLengthFactor().orElseThrow().value(), 0);
  }

  /** WorkCover New South Wales code 2006, from memory; Victoria's greater distances stay. */
  @ParameterizedTest
  @CsvSource({"132, 3, 10", "330, 6, 10", "500, 8, 10"})
  void newSouthWales(double kv, double metres, double used) {
    CheckValue.of("WorkCover NSW code 2006", "approach at " + kv + " kV", metres, "m")
        .fromMemory()
        .isMet(distance("AU-NSW", kv), 0);
    assertThat(ALL.byKey("AU").approachDistanceM(kv).orElseThrow().value()).isEqualTo(used);
  }

  private static void winch(String what, double kN, Rule rule) {
    CheckValue.of(
            "Bavarian state forest-owner school and GUV-I 8627", "55 kN winch, " + what, kN, "kN")
        .isMet(55 * rule.value(), 0);
  }

  private static final Map<String, String> TABLES =
      Map.of(
          "US-1910.333", "29 CFR 1910.333, restated",
          "US-EM385", "EM 385-1-1",
          "US-1926.1408", "29 CFR 1926.1408 Table A",
          "CA-BC-19-1A", "British Columbia OHS Regulation, Table 19-1A");

  private static void approach(String table, double kv, double metres) {
    CheckValue.of(TABLES.get(table), "approach at " + kv + " kV", metres, "m")
        .isMet(distance(table, kv), 0.0005);
  }

  private static double distance(String table, double kv) {
    return ALL.table(table).distance(kv).orElseThrow().value();
  }
}
