package org.fallwright.core.tree;

import org.fallwright.core.units.Range;

/**
 * Height of a tree's mass centre above the ground, from its parts:
 *
 * <p>z = (1 − c)·s·H + c·(h_b + κ·(H − h_b))
 *
 * <p>with c the crown's share of the mass, s·H the height of the stem's centre by its {@link
 * StemForm}, h_b the height of the crown's base, H the tree's height, and κ the height of the
 * crown's centre within the crown (0.33 for a cone, 0.45 rounded). Engineering model: no published
 * table of whole trees is known. For usual shares it gives 0.33 to 0.41 of the height.
 */
public final class MassCentre {
  private MassCentre() {}

  /**
   * Height of the mass centre above the ground [m].
   *
   * @param stem form of the stem
   * @param crownShare crown's share of the mass, 0 to 1
   * @param crownBaseM height of the crown's base [m]
   * @param crownCentre height of the crown's centre within the crown, 0 to 1
   * @param heightM height of the tree [m]
   */
  public static double ofPartsM(
      StemForm stem, double crownShare, double crownBaseM, double crownCentre, double heightM) {
    Range.check("height_m", heightM, 1, 130, "m");
    Range.check("crown_share", crownShare, 0, 1, "");
    Range.check("crown_base_m", crownBaseM, 0, heightM, "m");
    Range.check("crown_centre", crownCentre, 0, 1, "");
    double crownM = crownBaseM + crownCentre * (heightM - crownBaseM);
    return (1 - crownShare) * stem.centre() * heightM + crownShare * crownM;
  }
}
