package org.fallwright.core.pull;

import org.fallwright.core.units.Range;

/**
 * The line that a source which another one drives is rigged with.
 *
 * @param parts metres of it that are hauled for a metre at the source's line end, from 1 to 100
 *     [m/m]; each of its parts then carries one over that of the tension there
 * @param stiffnessN its axial stiffness EA, the softest, from 1e3 to 1e9 [N]
 * @param lengthM its length, from 1 to 1000 [m]
 */
public record HaulLine(double parts, double stiffnessN, double lengthM) {
  /**
   * Checks all three.
   *
   * @throws IllegalArgumentException naming the field, its value, its limits and its unit
   */
  public HaulLine {
    Range.check("parts", parts, 1, 100, "");
    Range.check("stiffness_N", stiffnessN, 1e3, 1e9, "N");
    Range.check("length_m", lengthM, 1, 1000, "m");
  }
}
