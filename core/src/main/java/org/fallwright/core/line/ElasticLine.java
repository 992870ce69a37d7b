package org.fallwright.core.line;

import org.fallwright.core.units.Range;

/**
 * Stretch and stored energy of a line.
 *
 * <p>Stretch T/K, energy T²/(2·K): T the tension [N], K the stiffness of all that stretches [N/m],
 * of a single leg EA/L with L its length [m] and EA its axial stiffness [N]. Linear; a new fibre
 * rope stretches more at first and stores more. A parted line gives a part of it back as motion.
 * Elasticity.
 *
 * @param stretchM stretch [m]
 * @param energyJ stored energy [J]
 */
public record ElasticLine(double stretchM, double energyJ) {
  /** A line of a stiffness [N/m] at a tension [N]. */
  public static ElasticLine of(double tensionN, double stiffnessNPerM) {
    Range.check("tension_N", tensionN, 0, 1e8, "N");
    Range.check("stiffness_N_per_m", stiffnessNPerM, 1e-2, 1e12, "N/m");
    double stretch = tensionN / stiffnessNPerM;
    return new ElasticLine(stretch, tensionN * stretch / 2);
  }
}
