package org.fallwright.core.line;

import org.fallwright.core.units.Range;

/**
 * Round-link chain by grade: breaking load = R·2·π·d²/4, working load a quarter of it; R the mean
 * stress at break [Pa], d the diameter of the link's wire [m]. Formula of the lifting-chain grades;
 * agrees with the default working loads of 49 CFR 393.108 within 3 %. A chain without a mark counts
 * as the weakest grade, 49 CFR 393.108.
 */
public enum ChainGrade {
  UNMARKED(3e8),
  GRADE_80(8e8),
  GRADE_100(1e9);

  private final double stressPa;

  ChainGrade(double stressPa) {
    this.stressPa = stressPa;
  }

  /** Breaking load [N] of a wire diameter [m]. */
  public double breakingN(double diameterM) {
    Range.check("diameter_m", diameterM, 0.004, 0.05, "m");
    return stressPa * Math.PI * diameterM * diameterM / 2;
  }

  /** Working load [N] of a wire diameter [m]. */
  public double workingN(double diameterM) {
    return breakingN(diameterM) / 4;
  }
}
