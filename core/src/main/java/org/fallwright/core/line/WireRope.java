package org.fallwright.core.line;

import org.fallwright.core.reference.Figure;
import org.fallwright.core.reference.Hardware;
import org.fallwright.core.reference.Kind;
import org.fallwright.core.units.Range;

/**
 * Breaking load of a stranded wire rope by its core: F = K'·d²·R, d the diameter [m], R the grade
 * of its wires [Pa]. For 6×19 and 6×36 ropes; new and undamaged. Form of EN 12385-4; its constants
 * are carried from memory, and agree with the sling table of EN 13414-1 and with a published table
 * of 6×19 fibre core ropes (see the tests).
 */
public enum WireRope {
  FIBRE_CORE("wire.fibre-core"),
  STEEL_CORE("wire.steel-core");

  /** What stands behind the constants. */
  public static final Kind KIND = Kind.FROM_MEMORY;

  /** Usual grade of the wires [Pa]. */
  public static final double GRADE_1770 = 1.77e9;

  private final double constant;

  WireRope(String key) {
    constant = Hardware.value(key);
  }

  /** Minimum breaking load [N] of a diameter [m] and a grade [Pa]. */
  public double breakingN(double diameterM, double gradePa) {
    Range.check("diameter_m", diameterM, 0.003, 0.1, "m");
    Range.check("grade_Pa", gradePa, 1e9, 2.5e9, "Pa");
    return constant * diameterM * diameterM * gradePa;
  }

  /**
   * Axial stiffness EA of a wire rope that breaks at a load, the softest that is known [N]: the
   * load over the greatest stretch there, at a fifth of it and at break, the lesser. From memory,
   * for 6×19; chain of the same breaking load counts as no stiffer (planning allowance).
   */
  public static double softestN(double breakingN) {
    return Range.check("breaking_load_N", breakingN, 100, 5e6, "N") / softness().value();
  }

  /** The greatest stretch over the share of the breaking load at which it is reached. */
  static Share softness() {
    Figure atBreak = Hardware.of("wire.stretch-break.high");
    return new Share(
        "stretch over share of the breaking load, the softest known of wire rope",
        Math.max(Hardware.value("wire.stretch-20.high") / 0.2, atBreak.value()),
        atBreak.kind(),
        atBreak.source());
  }

  /**
   * Safe mass on a wire rope whose maker's figures are missing [kg]: 8·d², d in mm. Published:
   * Australian Emergency Manual, Disaster Rescue, 3.15.
   */
  public static double safeMassKg(double diameterM) {
    double mm = 1000 * Range.check("diameter_m", diameterM, 0.003, 0.1, "m");
    return Hardware.value("wire.safe-mass") * mm * mm;
  }

  /**
   * Length of rope on a drum [m]: in the handbook's form 0.2618·B·h·(D + h)/d² feet with inches
   * inside, B the barrel's width, D its diameter, h the depth of rope on it. Published: Handbook of
   * Oceanographic Winch, Wire and Cable Technology, ch. 12.
   */
  public static double onDrumM(
      double barrelWidthM, double barrelDiameterM, double depthM, double diameterM) {
    Range.check("barrel_width_m", barrelWidthM, 0.01, 5, "m");
    Range.check("barrel_diameter_m", barrelDiameterM, 0.01, 5, "m");
    Range.check("depth_m", depthM, 0, 2, "m");
    Range.check("diameter_m", diameterM, 0.003, 0.1, "m");
    return 0.2618
        * 12
        * barrelWidthM
        * depthM
        * (barrelDiameterM + depthM)
        / (diameterM * diameterM);
  }
}
