package org.fallwright.core.anchor;

import org.fallwright.core.units.Range;

/**
 * Holding power of picket holdfasts, wooden pickets of 3 in by 5 ft driven 3 to 4 ft into
 * undisturbed loam and leaned 15 degrees back: ultimate figures for the breaking load of a rated
 * point.
 *
 * <p>Published: US Navy NAVEDTRA 14251 pp. 172–173. Other soils hold less: loose sand under a
 * tenth.
 */
public enum Pickets {
  SINGLE(700),
  ONE_ONE_ONE(1800),
  THREE_TWO_ONE(4000);

  private static final double POUND_FORCE_N = 4.4482216152605;

  private final double pounds;

  Pickets(double pounds) {
    this.pounds = pounds;
  }

  /** Holding power [N]. */
  public double holdsN() {
    return pounds * POUND_FORCE_N;
  }

  /**
   * Mass that a row of steel pickets can be trusted to hold, in kg: 350 each, 2,000 in all; 25 mm
   * by 1.5 m, two thirds buried, 1 m apart. Published: Australian Emergency Manual, Disaster
   * Rescue, 8.3.
   */
  public static double steelRowKg(int pickets) {
    return Math.min(350 * Range.check("pickets", pickets, 1, 50, ""), 2000);
  }

  /**
   * Pins needed for a load at the design load of one, both in the same unit. Published (second
   * hand): USACE US&amp;R Structures Specialist field guide, 5th ed. 2006.
   */
  public static int pinsFor(double load, double eachHolds) {
    Range.check("load", load, 0, 1e8, "");
    Range.check("each_holds", eachHolds, 1e-3, 1e8, "");
    return (int) Math.ceil(load / eachHolds);
  }
}
