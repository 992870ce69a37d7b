package org.fallwright.core.statics;

/**
 * THE force balance of the pulled tree about its hinge: weight, wind, hinge and line.
 *
 * <p>Need(φ) = (M_h + M_w − M_g(φ)) / ℓ(φ): the tension at the tree that moves it at angle φ. While
 * the lever is positive it only falls as the tree comes over. Hold without credit for the hinge:
 * (M_w − M_g(−δ)) / ℓ(−δ). Each contribution is one class: {@link HingeMoment}, {@link WindMoment},
 * the weight and the lever in the posture.
 */
final class ForceBalance {
  private ForceBalance() {}

  /** Tension at the tree that moves it [N]. */
  static double need(Posture p, double phi) {
    return (p.hingeNm + p.windNm - p.weightMoment(phi)) / p.lever(phi);
  }

  /** Tension at the tree that holds it once the hinge is gone, sat back [N]. */
  static double hold(Posture p) {
    double phi = -p.sitBack();
    return (p.windNm - p.weightMoment(phi)) / p.lever(phi);
  }

  /** Tension at which the hinge alone, in calm air, lets the tree move [N]. */
  static double letsGo(Posture p, double phi) {
    return (p.holdsShare * p.hingeNm - p.weightMoment(phi)) / p.lever(phi);
  }

  /** Back-lean against what the stump's edge holds; 1 where the tree just rocks back. */
  static double rest(Posture p) {
    double phi = -p.sitBack();
    double edge = p.hinge.backCutM() + p.hinge.thicknessM() / 2;
    return (p.windNm - p.weightMoment(phi)) / (p.weightN * edge);
  }
}
