package org.fallwright.core.line;

import org.fallwright.core.units.Range;

/** Shackles: the factor of their standard, side loads, and what an unmarked one may carry. */
public final class Shackles {
  /**
   * Design factor up to 150 short tons. Published: ASME B30.26-2010, 26-1. A breaking load is never
   * to be reckoned with more.
   */
  public static final double DESIGN_FACTOR = 5;

  private static final double SHORT_TON_N = 8896.443230521;

  private Shackles() {}

  /**
   * Rated load of a shackle without a readable mark [N]: 3·D² short tons, D the diameter of its
   * body in inches. Published: US Navy rigging training manual.
   */
  public static double unmarkedN(double bodyDiameterM) {
    double inches = Range.check("body_diameter_m", bodyDiameterM, 0.004, 0.1, "m") / 0.0254;
    return 3 * inches * inches * SHORT_TON_N;
  }

  /**
   * Share of the rating that is left when it is loaded aside by an angle [degrees]: 1, 0.7 and 0.5
   * up to 5, 45 and 90 degrees. Angle bands published in WAC 296-155-33905; shares from training
   * slides on B30.26.
   */
  public static double sideLoad(double asideDeg) {
    Range.check("aside_deg", asideDeg, 0, 90, "degrees");
    return asideDeg <= 5 ? 1 : asideDeg <= 45 ? 0.7 : 0.5;
  }
}
