package org.fallwright.core.tree;

import org.fallwright.core.units.Range;

/**
 * What more weight in the crown does to the whole tree. With c the crown's share of the mass and f
 * the factor on the crown's mass, the whole grows by 1 + c·(f − 1), the crown's share becomes
 * c·f/(1 + c·(f − 1)), and the mass centre moves towards the crown's.
 *
 * @param share crown's share of the mass before, 0 to 1
 * @param factor crown's mass after over that before, from 0 (no crown)
 */
public record CrownLoad(double share, double factor) {
  public CrownLoad {
    Range.check("crown_share", share, 0, 1, "");
    Range.check("crown_factor", factor, 0, 10, "");
  }

  /** The tree's mass after over that before. */
  public double massFactor() {
    return 1 + share * (factor - 1);
  }

  /** Crown's share of the mass after. */
  public double shareAfter() {
    return share * factor / massFactor();
  }

  /**
   * Height of the mass centre after [m].
   *
   * @param centreM height of the mass centre before [m]
   * @param crownM height of the crown's middle [m]
   */
  public double centreM(double centreM, double crownM) {
    return (centreM + share * (factor - 1) * crownM) / massFactor();
  }
}
