package org.fallwright.plugins.vehicle;

import java.util.Map;
import org.fallwright.core.units.Range;

/**
 * What a field tyre does on soil, by the traction equation of Brixius (1987; also in ASABE D497).
 *
 * <p>Bn = CI b d / W · (1 + 5 δ/h) / (1 + 3 b/d); gross traction 0.88 (1 − e^(−0.1 Bn)) (1 −
 * e^(−7.5 s)) + 0.04; motion resistance 1/Bn + 0.04 + 0.5 s/√Bn; net is gross less resistance, all
 * as shares of the wheel's load. CI cone index [Pa], b width and d diameter of the tyre [m], W load
 * on the wheel [N], δ/h deflection of the tyre over the height of its side, s slip.
 *
 * <p>Range: bias-ply field tyres on soil that is neither very loose nor saturated. The constants
 * 0.88, 0.1, 7.5, 0.04 and 0.5 were read in the specification of a public tillage tool; the shape
 * of Bn is from memory and agrees with a public program's. Leaves out sward, sideways slope, dual
 * wheels and what a second pass gains.
 *
 * @param coneIndexPa CI [Pa]
 * @param measured whether it was measured here
 */
record Soil(double coneIndexPa, boolean measured) {
  /** Deflection over the height of the side wall. From memory: about this. */
  static final double DEFLECTION = 0.2;

  /** Slip that is planned with. Planning allowance, about where field tyres work best. */
  static final double SLIP = 0.15;

  /** Gross traction that the equation never passes, at full slip on ground without give. */
  static final double GROSS_MOST = 0.88 + 0.04;

  /**
   * Cone index where none was measured [Pa], by ground, dry and wet. ASABE D497's usual figures
   * from memory, tilled 900 and soft 450 kPa, each a class lower than one would call it: a planning
   * allowance.
   */
  private static final Map<String, double[]> USUAL =
      Map.of("grass", new double[] {900e3, 450e3}, "earth", new double[] {900e3, 450e3});

  /** A driven tyre. */
  record Tyre(double widthM, double diameterM) {
    Tyre {
      Range.check("tyre_width_m", widthM, 0.1, 1.2, "m");
      Range.check("tyre_diameter_m", diameterM, 0.4, 2.5, "m");
    }
  }

  Soil {
    Range.check("cone_index_kPa", coneIndexPa / 1000, 100, 5000, "kPa");
  }

  /**
   * The soil of a ground of the surface table.
   *
   * @param coneIndexKpa measured; null: not
   * @throws IllegalArgumentException if nothing is measured and the ground is no soil
   */
  static Soil of(String ground, boolean wet, Double coneIndexKpa) {
    if (coneIndexKpa != null) {
      return new Soil(coneIndexKpa * 1000, true);
    }
    double[] usual = USUAL.get(ground);
    if (usual == null) {
      throw new IllegalArgumentException(
          "cone_index_kPa is missing; on "
              + ground
              + " it must be measured, a number from 100 to 5000 kPa, or the pull be worked out by"
              + " grip");
    }
    return new Soil(usual[wet ? 1 : 0], false);
  }

  /** Bn of a wheel under that load. */
  double mobility(Tyre tyre, double wheelLoadN) {
    double b = tyre.widthM();
    double d = tyre.diameterM();
    return coneIndexPa * b * d / wheelLoadN * (1 + 5 * DEFLECTION) / (1 + 3 * b / d);
  }

  /** Gross traction over load. */
  static double gross(double mobility, double slip) {
    return 0.88 * (1 - Math.exp(-0.1 * mobility)) * (1 - Math.exp(-7.5 * slip)) + 0.04;
  }

  /** Motion resistance over load. */
  static double resistance(double mobility, double slip) {
    return 1 / mobility + 0.04 + 0.5 * slip / Math.sqrt(mobility);
  }

  /**
   * Net thrust of an axle of two driven tyres [N] at the planned slip; negative where the tyres
   * sink in so far that they drag.
   */
  double thrustN(Tyre tyre, double axleLoadN) {
    if (axleLoadN <= 0) {
      return 0;
    }
    double bn = mobility(tyre, axleLoadN / 2);
    return axleLoadN * (gross(bn, SLIP) - resistance(bn, SLIP));
  }
}
