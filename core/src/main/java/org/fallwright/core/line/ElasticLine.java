package org.fallwright.core.line;

import org.fallwright.core.units.Range;

/**
 * Stretch and stored energy of a line.
 *
 * <p>Stretch T·L/(EA), energy T²·L/(2·EA): T the tension [N], L the length [m], EA the axial
 * stiffness [N]. Linear; a new fibre rope stretches more at first and stores more. A parted line
 * gives a part of it back as motion. Elasticity.
 *
 * @param stretchM stretch [m]
 * @param energyJ stored energy [J]
 */
public record ElasticLine(double stretchM, double energyJ) {
  /** A line of a length and stiffness at a tension. */
  public static ElasticLine of(double tensionN, double lengthM, double stiffnessN) {
    Range.check("tension_N", tensionN, 0, 1e8, "N");
    Range.check("length_m", lengthM, 0, 1e4, "m");
    Range.check("stiffness_N", stiffnessN, 1e3, 1e9, "N");
    double stretch = tensionN * lengthM / stiffnessN;
    return new ElasticLine(stretch, tensionN * stretch / 2);
  }
}
