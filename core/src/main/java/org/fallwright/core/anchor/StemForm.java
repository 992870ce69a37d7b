package org.fallwright.core.anchor;

import org.fallwright.core.units.Range;

/**
 * Stem volume of a standing tree from its diameter at breast height and its height.
 *
 * <p>V = a·D^b·H^c, with V in m³, D the diameter over bark at 1.3 m in cm and H the height in m.
 * Measured on British conifers of about 7 to 60 cm; for broadleaves the second row is a stand-in
 * that gives less volume than a paraboloid does, which is the safe side for an anchor. Leaves out
 * crown, bark and butt flare.
 *
 * <p>Source: Fonweban et al. 2012, stem-volume equations for British conifers (published).
 */
public enum StemForm {
  /** Spruces. */
  SPRUCE(6.8e-5, 1.827421, 0.981362),
  /** Pines, larches and Douglas-fir; stand-in for broadleaves. */
  OTHER(8.6e-5, 1.634205, 1.079539);

  private final double factor;
  private final double diameterPower;
  private final double heightPower;

  StemForm(double factor, double diameterPower, double heightPower) {
    this.factor = factor;
    this.diameterPower = diameterPower;
    this.heightPower = heightPower;
  }

  /** a of the equation. */
  public double factor() {
    return factor;
  }

  /** b of the equation. */
  public double diameterPower() {
    return diameterPower;
  }

  /** c of the equation. */
  public double heightPower() {
    return heightPower;
  }

  /**
   * Stem volume [m³].
   *
   * @param dbhM diameter at breast height [m]
   * @param heightM height of the tree [m]
   */
  public double volumeM3(double dbhM, double heightM) {
    Range.check("dbh_m", dbhM, 0.02, 4, "m");
    Range.check("height_m", heightM, 1, 120, "m");
    return factor * Math.pow(100 * dbhM, diameterPower) * Math.pow(heightM, heightPower);
  }
}
