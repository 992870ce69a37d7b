package org.fallwright.core.statics;

import org.fallwright.core.reference.Allowances;
import org.fallwright.core.line.Point3;
import org.fallwright.core.tree.StemTaper;

/**
 * The tension at the tree that breaks the stem below the line.
 *
 * <p>The tension that brings 32·M(S)/(π·d³·(1 − loss)) to f_knot·σ_r,5% at the weakest section S.
 * Sections 0.5, 1.0, … m above the hinge and below the attachment A, on the leaning axis, the tree
 * as found standing; M(S) is |A − S| across the line, per newton; d inside the bark [m]; σ_r,5% =
 * σ_r·(1 − 1.645·CV). Left out: the stem's own weight, shear.
 *
 * @param tensionN breaking tension at the tree [N]; infinite where no section lies below the line
 * @param sectionM height of the weakest section above the hinge [m]
 */
record StemStrength(double tensionN, double sectionM) {
  private static final double STEP = Allowances.STEM_SLICE.value();

  static StemStrength of(PullCase c, StemTaper taper) {
    Point3 a = attachment(c);
    Point3 leg = c.line().bearing().minus(a);
    double length = leg.length();
    double strength =
        c.wood().knotFactor() * c.wood().morPa() * (1 - OneAtATime.Z * c.wood().morCv());
    double least = Double.POSITIVE_INFINITY;
    double where = 0;
    for (int i = 1; i * STEP < c.line().attachHeightM(); i++) {
      double h = i * STEP;
      double share = 1 - h / c.line().attachHeightM();
      Point3 arm = new Point3(a.e() * share, a.n() * share, c.line().attachHeightM() - h);
      double moment = cross(arm, leg) / length;
      double d = taper.insideBarkM(h + c.tree().cutHeightM());
      double breaks = strength * Math.PI * d * d * d * (1 - c.tree().cavityLoss(d)) / (32 * moment);
      if (breaks < least) {
        least = breaks;
        where = h;
      }
    }
    return new StemStrength(least, where);
  }

  /** The attachment as found standing, metres from the stump's centre at hinge level. */
  static Point3 attachment(PullCase c) {
    double h = c.line().attachHeightM();
    double off = h * Math.tan(Math.toRadians(c.tree().leanDeg()));
    double az = Math.toRadians(c.tree().leanAzimuthDeg());
    return new Point3(off * Math.sin(az), off * Math.cos(az), h);
  }

  private static double cross(Point3 p, Point3 q) {
    double x = p.n() * q.up() - p.up() * q.n();
    double y = p.up() * q.e() - p.e() * q.up();
    double z = p.e() * q.n() - p.n() * q.e();
    return Math.sqrt(x * x + y * y + z * z);
  }
}
