package org.fallwright.core.line;

import org.fallwright.core.units.Range;

/**
 * Breaking load of a laid rope without a label: c·C² pounds, C the circumference in inches. Rules
 * of thumb of the US Navy Builder manual (published). For a check of an entered figure, never in
 * its place.
 */
public enum FibreRule {
  MANILA(900),
  NYLON(2400);

  private static final double POUND_FORCE_N = 4.4482216152605;

  private final double pounds;

  FibreRule(double pounds) {
    this.pounds = pounds;
  }

  /** Breaking load [N] of a diameter [m]. */
  public double breakingN(double diameterM) {
    Range.check("diameter_m", diameterM, 0.003, 0.1, "m");
    double circumferenceIn = Math.PI * diameterM / 0.0254;
    return pounds * circumferenceIn * circumferenceIn * POUND_FORCE_N;
  }
}
