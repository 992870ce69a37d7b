package org.fallwright.core.line;

import org.fallwright.core.units.Range;

/**
 * Load on a sling as rigged over its vertical rating. Basket: 2·sin of the angle of its legs to the
 * horizontal (statics). Choker: natural fibre 0.45, the lower of 29 CFR 1918 App. II Table 1
 * (published); wire 0.75 and synthetic 0.80 from memory of ASME B30.9, for a choke angle above 120
 * degrees.
 */
public enum SlingHitch {
  VERTICAL(1),
  CHOKER_NATURAL_FIBRE(0.45),
  CHOKER_WIRE(0.75),
  CHOKER_SYNTHETIC(0.80);

  private final double factor;

  SlingHitch(double factor) {
    this.factor = factor;
  }

  /** Factor on the vertical rating. */
  public double factor() {
    return factor;
  }

  /** Factor of a basket whose legs stand at an angle to the horizontal [degrees]. */
  public static double basket(double legToHorizontalDeg) {
    Range.check("leg_to_horizontal_deg", legToHorizontalDeg, 30, 90, "degrees");
    return 2 * Math.sin(Math.toRadians(legToHorizontalDeg));
  }
}
