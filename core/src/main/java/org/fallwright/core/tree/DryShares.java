package org.fallwright.core.tree;

import org.fallwright.core.units.Range;

/**
 * How the dry mass above the ground divides among the parts of a tree: share = exp(β0 + β1/D), D in
 * centimetres over bark at 1.3 m; branches are what is left. From Jenkins et al. 2003 (source
 * "jenkins-2003"). The stem ends where it is about 10 cm thick, so the branches hold its tip.
 *
 * @param wood share of the stem's wood
 * @param bark share of the stem's bark
 * @param foliage share of the leaves or needles
 */
public record DryShares(double wood, double bark, double foliage) {
  /**
   * The shares of a tree.
   *
   * @param broadleaf whether it is a broadleaf (else a conifer)
   * @param dbhM stem diameter over bark at 1.3 m [m]
   */
  public static DryShares of(boolean broadleaf, double dbhM) {
    double d = 100 * Range.check("dbh_m", dbhM, 0.025, 5, "m");
    return broadleaf
        ? new DryShares(
            Math.exp(-0.3065 - 5.4240 / d),
            Math.exp(-2.0129 - 1.6805 / d),
            Math.exp(-4.0813 + 5.8816 / d))
        : new DryShares(
            Math.exp(-0.3737 - 1.8055 / d),
            Math.exp(-2.0980 - 1.1432 / d),
            Math.exp(-2.9584 + 4.4766 / d));
  }

  /** Share of the branches. */
  public double branches() {
    return 1 - wood - bark - foliage;
  }

  /** Share of the crown in a tree that has shed its leaves. */
  public double bareCrown() {
    return branches() / (1 - foliage);
  }

  /** Share of the crown: branches and leaves. */
  public double crown() {
    return branches() + foliage;
  }
}
