package org.fallwright.core.rules;

import org.fallwright.core.units.Range;

/**
 * Wind force by what can be seen on land, for a crew without a meter. Bounds in whole km/h, as the
 * land scale gives them; a speed between two whole ones belongs to the lower.
 *
 * <p>Source: Beaufort land scale as used in arboriculture; forces 4 to 7 read.
 */
public enum Beaufort {
  BELOW_4(0, "leaves and twigs at most"),
  F4(20, "small branches move"),
  F5(30, "small trees sway"),
  F6(40, "large branches move"),
  F7(51, "whole trees move"),
  ABOVE_7(62, "twigs and branches break");

  private final int fromKmh;
  private final String seen;

  Beaufort(int fromKmh, String seen) {
    this.fromKmh = fromKmh;
    this.seen = seen;
  }

  /** What can be seen. */
  public String seen() {
    return seen;
  }

  /**
   * The force of a wind.
   *
   * @param mps its speed [m/s]
   */
  public static Beaufort of(double mps) {
    Range.check("wind_mps", mps, 0, 100, "m/s");
    int kmh = (int) Math.floor(mps * 3.6 + 1e-9);
    Beaufort found = BELOW_4;
    for (Beaufort b : values()) {
      found = kmh >= b.fromKmh ? b : found;
    }
    return found;
  }
}
