package org.fallwright.core.tree;

import org.fallwright.core.reference.Moisture;
import org.fallwright.core.reference.Species;
import org.fallwright.core.units.Range;

/**
 * Green mass of a stem: volume times green density. The density of a kind of tree is what the
 * sources give, and where the moisture of its heartwood and sapwood is known a stem can be as dry
 * as the one and as wet as the other: low and high are the ends of all of it. A tree's mass where
 * the site asks for it ({@link DerivedMass}), else a check beside the mass equation.
 *
 * @param lowKg with the least density [kg]: where mass helps
 * @param massKg with the nominal density [kg]
 * @param highKg with the greatest density [kg]: where mass resists
 */
public record StemMass(double lowKg, double massKg, double highKg) {
  /**
   * The mass of that volume.
   *
   * @param volumeM3 volume over the bark [m³], by {@link StemTaper}, {@link StemForm} or {@link
   *     StemVolume}
   */
  public static StemMass of(double volumeM3, Species species) {
    Range.check("volume_m3", volumeM3, 0.001, 500, "m³");
    Moisture wet = species.moisture();
    double low = species.densityLow();
    double high = species.densityHigh();
    return new StemMass(
        volumeM3 * (wet == null ? low : Math.min(low, wet.densityLow())),
        volumeM3 * species.greenDensity().value(),
        volumeM3 * (wet == null ? high : Math.max(high, wet.densityHigh())));
  }

  /** Mass of a tree that has this stem [kg], nominal, by the crown's share of its mass. */
  public double treeKg(double crownShare) {
    return massKg / (1 - Range.check("crown_share", crownShare, 0, 0.9, ""));
  }
}
