package org.fallwright.core.statics;

import java.util.OptionalDouble;

/**
 * The angle at which the weight alone beats hinge and wind.
 *
 * <p>φ_c = asin((M_h + M_w)/(m·g·q)) − φ0 with q = hypot(u_g, w_g) and φ0 = atan2(u_g, w_g), never
 * below −δ. Where M_h + M_w ≥ m·g·q there is none: the hinge never lets go.
 */
final class CommitAngle {
  private CommitAngle() {}

  static boolean exists(Posture p) {
    return p.hingeNm + p.windNm < p.weightN * Math.hypot(p.ug, p.wg);
  }

  /** The angle [rad]; the sine is cut at 90° where there is none. */
  static double unfloored(Posture p) {
    double q = Math.hypot(p.ug, p.wg);
    double sine = Math.min(1, (p.hingeNm + p.windNm) / (p.weightN * q));
    return Math.asin(sine) - Math.atan2(p.ug, p.wg);
  }

  static double of(Posture p) {
    return Math.max(-p.sitBack(), unfloored(p));
  }

  /**
   * The hinge thickness at which the tree would come free, the hinge taken at its strongest [m];
   * empty where none would because the wind alone beats the weight.
   */
  static OptionalDouble thicknessThatWould(PullCase c, double strongest) {
    Draw n = Draw.nominal(c).with(4, strongest);
    double lo = 0;
    double hi = n.thicknessM();
    if (free(c, n, hi)) {
      return OptionalDouble.of(hi);
    }
    if (!free(c, n, 1e-9)) {
      return OptionalDouble.empty();
    }
    for (int i = 0; i < 80; i++) {
      double mid = (lo + hi) / 2;
      if (free(c, n, mid)) {
        lo = mid;
      } else {
        hi = mid;
      }
    }
    return OptionalDouble.of(lo);
  }

  private static boolean free(PullCase c, Draw n, double thickness) {
    return exists(new Posture(c, n.with(6, thickness)));
  }
}
