package org.fallwright.core.line;

import org.fallwright.core.reference.Hardware;
import org.fallwright.core.units.Range;
import org.fallwright.core.units.Units;

/** Shackles: the factor of their standard, side loads, and what an unmarked one may carry. */
public final class Shackles {
  /**
   * Design factor up to 150 short tons. Published: ASME B30.26-2010, 26-1. A breaking load is never
   * to be reckoned with more.
   */
  public static final double DESIGN_FACTOR = Hardware.value("shackle.factor");

  private static final double LARGE_N = 150 * Units.SHORT_TON_FORCE;

  private Shackles() {}

  /** Design factor of a shackle of that rated load [N]. */
  public static double designFactor(double ratedN) {
    Range.check("rated_load_N", ratedN, 100, 1e7, "N");
    return ratedN <= LARGE_N ? DESIGN_FACTOR : Hardware.value("shackle.factor-large");
  }

  /**
   * Rated load of a shackle without a readable mark [N]: 3·D² short tons, D the diameter of its
   * body in inches. Published: US Navy rigging training manual.
   */
  public static double unmarkedN(double bodyDiameterM) {
    double inches = Range.check("body_diameter_m", bodyDiameterM, 0.004, 0.1, "m") / Units.INCH;
    return Hardware.value("shackle.unmarked") * inches * inches * Units.SHORT_TON_FORCE;
  }

  /**
   * Share of the rating that is left when it is loaded aside by an angle [degrees]: full up to 5,
   * then by the bands that end at 45 and 90.
   */
  public static double sideLoad(double asideDeg) {
    return Hardware.value(asideRow(asideDeg));
  }

  static String asideRow(double asideDeg) {
    Range.check("aside_deg", asideDeg, 0, 90, "degrees");
    return "shackle.aside-" + (asideDeg <= 5 ? 5 : asideDeg <= 45 ? 45 : 90);
  }
}
