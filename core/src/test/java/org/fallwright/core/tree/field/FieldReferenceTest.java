package org.fallwright.core.tree.field;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import org.fallwright.core.units.Units;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/** Field measurements worked by hand, to the digits that a tape and a clinometer give. */
class FieldReferenceTest {
  /** Girth over 3.1416, three digits. */
  @ParameterizedTest(name = "girth {0} m")
  @CsvSource({"1.63, 0.519", "1.00, 0.318", "3.14159, 1.000", "0.85, 0.271"})
  void girth(double girthM, double diameterM) {
    assertThat(Girth.diameterM(girthM)).isCloseTo(diameterM, within(5e-4));
  }

  /** 64 1/2 in round is 20 1/2 in through: 64.5/3.1416 = 20.53. */
  @Test
  void girthInInches() {
    assertThat(Girth.diameterM(64.5 * Units.INCH) / Units.INCH).isCloseTo(20.53, within(0.005));
  }

  /** Table of tangents: 6 % is 3.4 degrees, 100 % is 45, 10 degrees are 17.6 %, 31 are 60.1. */
  @ParameterizedTest(name = "{0} % are {1} degrees")
  @CsvSource({"6, 3.43", "100, 45.0", "17.63, 10.0", "60.09, 31.0", "-12, -6.84"})
  void percentAndDegrees(double percent, double degrees) {
    assertThat(Reading.percent(percent).deg()).isCloseTo(degrees, within(0.006));
    assertThat(Reading.degrees(degrees).tangent()).isCloseTo(percent / 100, within(2e-4));
  }

  /**
   * 25·(tan 32.5 + tan 3.7) = 25·(0.6371 + 0.0647) = 17.5; in per cent the height is the distance
   * times the difference of the readings over a hundred; 100 ft back, +66 and −6: 72 ft.
   */
  @Test
  void heightFromTapeAndClinometer() {
    assertThat(new TapedHeight(25, Reading.degrees(32.5), Reading.degrees(-3.7)).heightM())
        .isCloseTo(17.54, within(0.005));
    assertThat(new TapedHeight(25, Reading.percent(64), Reading.percent(-6)).heightM())
        .isCloseTo(17.5, within(1e-9));
    double feet =
        new TapedHeight(100 * Units.FOOT, Reading.percent(66), Reading.percent(-6)).heightM()
            / Units.FOOT;
    assertThat(feet).isCloseTo(72, within(1e-9));
    // from below: the base is seen above the level, 20·(0.90 − 0.10)
    assertThat(new TapedHeight(20, Reading.percent(90), Reading.percent(10)).heightM())
        .isCloseTo(16, within(1e-9));
    assertThat(new TapedHeight(20, Reading.percent(90), Reading.percent(10)).eyeM())
        .isCloseTo(-2, within(1e-9));
  }

  /**
   * 17.5 m, 25 m back, eye 1.6 m up, 6 degrees towards the viewer: the tip is 1.839 m nearer, and
   * 1.6 + 15.9·25/23.161 = 18.76 m is read, 7 % too much. Away: 1.6 + 15.9·25/26.839 = 16.41.
   */
  @Test
  void aLeanTowardsTheViewerIsReadTooHigh() {
    assertThat(TapedHeight.readM(17.5, 6, 25, 1.6)).isCloseTo(18.76, within(0.005));
    assertThat(TapedHeight.readM(17.5, 6, 25, 1.6) / 17.5).isCloseTo(1.072, within(5e-4));
    assertThat(TapedHeight.readM(17.5, -6, 25, 1.6)).isCloseTo(16.41, within(0.005));
    assertThat(TapedHeight.readM(17.5, 0, 25, 1.6)).isCloseTo(17.5, within(1e-12));
  }

  /** 0.63 m out at 6.0 m is 6.0 degrees; 4 in on 6 ft 4 in (1 in 19) is 3.0. */
  @Test
  void leanByPlumb() {
    assertThat(Lean.byPlumb(0.63, 6.0, 188).deg()).isCloseTo(5.99, within(0.006));
    assertThat(Lean.byPlumb(4 * Units.INCH, 76 * Units.INCH, 10).deg())
        .isCloseTo(3.01, within(0.006));
    assertThat(Lean.byPlumb(0, 6.0, 188).deg()).isZero();
    assertThat(Lean.byPlumb(0.63, 6.0, 188).azimuthDeg()).isEqualTo(188);
  }

  /** A stem at 84 degrees from the level leans by 6; at 951 % too (tan 84 = 9.514). */
  @Test
  void leanByAClinometerAlongTheStem() {
    assertThat(Lean.byStem(Reading.degrees(84), 90).deg()).isCloseTo(6, within(1e-12));
    assertThat(Lean.byStem(Reading.percent(951.4), 90).deg()).isCloseTo(6, within(0.001));
  }

  /**
   * A lean of 8 degrees 30 degrees off a line shows 6.94 degrees along it and 4.02 square to it:
   * tan 8·cos 30 = 0.1217, tan 8·sin 30 = 0.0703.
   */
  @Test
  void leanInParts() {
    Lean lean = new Lean(8, 210);
    assertThat(lean.partDeg(180)).isCloseTo(6.94, within(0.005));
    assertThat(lean.partDeg(270)).isCloseTo(4.02, within(0.005));
    assertThat(lean.partDeg(90)).isCloseTo(-4.02, within(0.005));
  }

  /**
   * The same tree from two sides: looking east (right is south) it goes 6.94 degrees to the right,
   * looking south (right is west) 4.02 to the right: it leans 8.0 towards 210.
   */
  @Test
  void leanByTwoViews() {
    Lean lean =
        Lean.byTwoViews(
            new SideView(90, Reading.degrees(6.94)), new SideView(180, Reading.degrees(4.02)));
    assertThat(lean.deg()).isCloseTo(8.0, within(0.01));
    assertThat(lean.azimuthDeg()).isCloseTo(210, within(0.1));
    // 3 % and 4 % square to each other are 5 %: 2.86 degrees, atan(3/4) = 36.9 east of north
    Lean percent =
        Lean.byTwoViews(new SideView(270, Reading.percent(4)), new SideView(0, Reading.percent(3)));
    assertThat(percent.deg()).isCloseTo(2.862, within(0.001));
    assertThat(percent.azimuthDeg()).isCloseTo(36.87, within(0.01));
  }

  /** Magnetic 191 with 3 degrees west is true 188; 355 with 14 east is 9. */
  @ParameterizedTest
  @CsvSource({"191, -3, 188", "355, 14, 9", "2, -14.5, 347.5", "0, 0, 0"})
  void compass(double magnetic, double declination, double trueDeg) {
    assertThat(Lean.trueDeg(magnetic, declination)).isCloseTo(trueDeg, within(1e-9));
  }
}
