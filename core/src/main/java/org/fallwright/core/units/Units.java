package org.fallwright.core.units;

/**
 * Conversion factors into SI: a value in the named unit times its factor is the value in SI, and
 * the other way round by division. The pound, the inch, standard gravity, the mile and the knot are
 * exact by definition; the rest follows from them.
 */
public final class Units {
  /** Standard gravity [m/s²]. */
  public static final double GRAVITY = 9.80665;

  /** Inch [m]. */
  public static final double INCH = 0.0254;

  /** Foot [m]. */
  public static final double FOOT = 12 * INCH;

  /** Square foot [m²]. */
  public static final double SQUARE_FOOT = FOOT * FOOT;

  /** Cubic foot [m³]. */
  public static final double CUBIC_FOOT = SQUARE_FOOT * FOOT;

  /** Avoirdupois pound [kg]. */
  public static final double POUND = 0.45359237;

  /** Pound per cubic foot [kg/m³]. */
  public static final double POUND_PER_CUBIC_FOOT = POUND / CUBIC_FOOT;

  /** Short ton, 2,000 pounds [kg]. */
  public static final double SHORT_TON = 2000 * POUND;

  /** Pound-force [N]. */
  public static final double POUND_FORCE = POUND * GRAVITY;

  /** Kilogram-force [N]. */
  public static final double KILOGRAM_FORCE = GRAVITY;

  /** Short ton-force [N]. */
  public static final double SHORT_TON_FORCE = SHORT_TON * GRAVITY;

  /** Pound-force per square inch [Pa]. */
  public static final double PSI = POUND_FORCE / (INCH * INCH);

  /** Pound-force foot, of a moment or of an energy [N·m or J]. */
  public static final double POUND_FORCE_FOOT = POUND_FORCE * FOOT;

  /** Statute mile per hour [m/s]. */
  public static final double MILE_PER_HOUR = 5280 * FOOT / 3600;

  /** Knot [m/s]. */
  public static final double KNOT = 1852.0 / 3600;

  /** Kilometre per hour [m/s]. */
  public static final double KILOMETRE_PER_HOUR = 1000.0 / 3600;

  private Units() {}

  /** Slope in percent of a slope in degrees. */
  public static double percentOfDegrees(double degrees) {
    return 100 * Math.tan(Math.toRadians(degrees));
  }

  /** Slope in degrees of a slope in percent. */
  public static double degreesOfPercent(double percent) {
    return Math.toDegrees(Math.atan(percent / 100));
  }
}
