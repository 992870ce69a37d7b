package org.fallwright.core.statics;

/**
 * Moment that the hinge holds against the pull: M_h = k·σ_r·b·t²/6.
 *
 * <p>k hinge factor, σ_r green modulus of rupture [Pa], b width against the pull [m], t thickness
 * [m]. Beam theory: no published test of a felling hinge is known. k runs from 1 to 1.5 (planning
 * allowance); the modulus of rupture already holds some plastic flow.
 */
public final class HingeMoment {
  private HingeMoment() {}

  /** The moment [N·m]. */
  public static double of(double k, double morPa, double widthM, double thicknessM) {
    return k * morPa * widthM * thicknessM * thicknessM / 6;
  }
}
