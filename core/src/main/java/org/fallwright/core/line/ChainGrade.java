package org.fallwright.core.line;

import org.fallwright.core.reference.Hardware;
import org.fallwright.core.units.Range;

/**
 * Round-link chain by grade: breaking load = R·2·π·d²/4, working load a quarter of it; R the mean
 * stress at break [Pa], d the diameter of the link's wire [m]. Against the default working loads of
 * 49 CFR 393.108 the two lifting grades come within 3 %; grades 30, 43 and 70 come out lower than
 * the table, which asks less of a tie-down, or the same. A chain without a mark counts as grade 30,
 * 49 CFR 393.108. Grade 70 is a tie-down grade and not for slings.
 */
public enum ChainGrade {
  /** Also what a chain without a mark counts as. */
  GRADE_30(30),
  GRADE_43(43),
  GRADE_70(70),
  GRADE_80(80),
  GRADE_100(100);

  private final double stressPa;

  ChainGrade(int grade) {
    stressPa = 1e6 * Hardware.value("chain.g" + grade + ".stress");
  }

  /** Breaking load [N] of a wire diameter [m]. */
  public double breakingN(double diameterM) {
    Range.check("diameter_m", diameterM, 0.004, 0.05, "m");
    return stressPa * Math.PI * diameterM * diameterM / 2;
  }

  /** Working load [N] of a wire diameter [m]. */
  public double workingN(double diameterM) {
    return breakingN(diameterM) / Hardware.value("chain.factor");
  }
}
