package org.fallwright.core.statics;

/**
 * What the hinge carries besides bending along the fall, as shares of its full strength.
 *
 * <p>Steering: (±[m·g·v_g + T·(w_a'·e_v − v_a·e_w)] + M_w,side) ÷ (σ_r·t·b_s²/6). Turning about the
 * vertical: ±T·(u_a'·e_v − v_a·e_u) ÷ (green shear strength × t·b_s²/6). e is the unit vector from
 * the attachment to the bearing point. Beam theory; shear and bending together are left out.
 */
final class HingeStress {
  private HingeStress() {}

  /** Steering share of one sign at one angle and tension. */
  static double steering(Posture p, double phi, double tensionN, int sign) {
    double leg = p.leg(phi);
    double ev = (p.pv - p.va) / leg;
    double ew = (p.pw - p.wa(phi)) / leg;
    double side = p.weightN * p.vg + tensionN * (p.wa(phi) * ev - p.va * ew);
    return (sign * side + p.windAsideNm) / (p.holdsShare * p.draw.morPa() * section(p));
  }

  /** Turning share of one sign at one angle and tension. */
  static double turning(Posture p, double phi, double tensionN, int sign, double shearPa) {
    double leg = p.leg(phi);
    double eu = (p.pu - p.ua(phi)) / leg;
    double ev = (p.pv - p.va) / leg;
    return sign * tensionN * (p.ua(phi) * ev - p.va * eu) / (shearPa * section(p));
  }

  private static double section(Posture p) {
    double b = p.hinge.steerWidthM();
    return p.hinge.thicknessM() * b * b / 6;
  }
}
