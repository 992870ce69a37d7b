package org.fallwright.core.statics;

import org.fallwright.core.line.Point3;
import org.fallwright.core.reference.Allowances;
import org.fallwright.core.tree.StemTaper;

/**
 * Stiffness of what the pull stretches, seen at the tree.
 *
 * <p>Line: 1/K = Σ L·r²/(EA) over all loaded legs as found standing, the softest EA, r the leg's
 * tension over the tension at the tree while holding; plus 1/k_S of a source that is elastic
 * itself. Path, while the stem is whole: 1/K_p = 1/K + cos²α·Σ (w_a − z)²·Δz/(E·π·d⁴/64·(1 −
 * loss)), z the middles of ⌈w_a/0.5⌉ equal slices from the hinge to the attachment, E the mean
 * green modulus, d inside the bark, α the rise of the first leg. Left out: what slings, anchors and
 * sag give.
 *
 * @param lineNPerM K [N/m]
 * @param pathNPerM K_p [N/m]
 * @param riseRad α [rad]
 * @param lengthM all legs without a base leg [m]
 */
record PathStiffness(double lineNPerM, double pathNPerM, double riseRad, double lengthM) {
  private static final double SLICE = Allowances.STEM_SLICE.value();

  static PathStiffness of(PullCase c, StemTaper taper) {
    return of(c, bend(c, taper));
  }

  /**
   * @param bend Σ (w_a − z)²·Δz/(E·π·d⁴/64·(1 − loss)), see {@link #bend} [m/N]
   */
  static PathStiffness of(PullCase c, double bend) {
    LineSet line = c.line();
    Point3 from = StemStrength.attachment(c);
    double give = 0;
    double length = 0;
    double rise = 0;
    for (int i = 0; i < line.points().size(); i++) {
      Point3 leg = line.points().get(i).minus(from);
      double l = leg.length();
      if (i == 0) {
        rise = Math.asin(-leg.up() / l);
      }
      give += l / line.legStiffnessN().get(i);
      length += l;
      from = line.points().get(i);
    }
    if (line.base() != null) {
      LineSet.BaseLeg b = line.base();
      give += b.lengthM() * b.ratio() * b.ratio() / b.stiffnessN();
    }
    if (line.sourceNPerM() != null) {
      give += 1 / line.sourceNPerM();
    }
    double cos = Math.cos(rise);
    return new PathStiffness(1 / give, 1 / (give + cos * cos * bend), rise, length);
  }

  /** How the stem gives below the line, square to it [m/N]; the same whatever the line's course. */
  static double bend(PullCase c, StemTaper taper) {
    double wa = c.line().attachHeightM();
    int slices = (int) Math.ceil(wa / SLICE);
    double dz = wa / slices;
    double bend = 0;
    for (int i = 0; i < slices; i++) {
      double z = (i + 0.5) * dz;
      double d = taper.insideBarkM(z + c.tree().cutHeightM());
      double ei = c.wood().moePa() * Math.PI * Math.pow(d, 4) / 64 * (1 - c.tree().cavityLoss(d));
      bend += (wa - z) * (wa - z) * dz / ei;
    }
    return bend;
  }
}
