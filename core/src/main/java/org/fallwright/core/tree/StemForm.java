package org.fallwright.core.tree;

import org.fallwright.core.units.Range;

/**
 * Solids of revolution that a stem resembles: diameter at height h is d0·(1 − h/H)^p, so the volume
 * is A0·H/(2p + 1) and its centre lies at H/(2p + 2). Geometry; no source needed. The middle of a
 * stem is near a paraboloid, its tip near a cone, its butt near a neiloid.
 */
public enum StemForm {
  CYLINDER(0),
  PARABOLOID(0.5),
  CONE(1),
  NEILOID(1.5);

  private final double power;

  StemForm(double power) {
    this.power = power;
  }

  /** Volume [m³] of a stem of that base diameter [m] and height [m]. */
  public double volumeM3(double baseM, double heightM) {
    return Math.PI / 4 * baseM * baseM * heightM * factor();
  }

  /** Volume over that of the cylinder about it. */
  public double factor() {
    return 1 / (2 * power + 1);
  }

  /** Height of its centre over its whole height. */
  public double centre() {
    return 1 / (2 * power + 2);
  }

  /**
   * Diameter at a height [m].
   *
   * @param baseM diameter at the base [m]
   * @param share height over the whole height, 0 to 1
   */
  public double diameterM(double baseM, double share) {
    return baseM * Math.pow(1 - Range.check("share", share, 0, 1, ""), power);
  }
}
