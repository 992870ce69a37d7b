package org.fallwright.core.tree;

import java.util.Collections;
import java.util.List;
import java.util.Map;
import java.util.SortedMap;
import java.util.TreeMap;
import org.fallwright.core.reference.Allowances;
import org.fallwright.core.site.CutPlan;
import org.fallwright.core.site.StemDiameter;
import org.fallwright.core.site.SubjectTree;
import org.fallwright.core.units.Range;

/**
 * Stem diameter at a height above the ground: straight lines between what is known over the bark,
 * which is the diameter at the cut (that inside the bark over {@link Allowances#BARK_RATIO}), the
 * diameter at 1.3 m, further ones measured, and none at the top. Where a further diameter was
 * measured at the height of the cut or at 1.3 m, the first two win. Below the lowest known height
 * the stem counts as thick as there. Inside the bark it is {@link Allowances#BARK_RATIO} of that.
 */
public final class StemTaper {
  /** Height of the diameter at breast height above the ground [m]. */
  public static final double BREAST_HEIGHT_M = 1.3;

  private final TreeMap<Double, Double> known = new TreeMap<>();

  private StemTaper(double heightM) {
    known.put(heightM, 0.0);
  }

  /** The stem of that tree, cut as planned. */
  public static StemTaper of(SubjectTree tree, CutPlan cut) {
    return of(
        tree.heightM().value(),
        tree.dbhM().value(),
        tree.diameters(),
        cut.heightM(),
        stumpInsideBarkM(tree));
  }

  /**
   * A stem from its figures.
   *
   * @param heightM height of the tree [m]
   * @param dbhM diameter over bark at 1.3 m [m]
   * @param diameters further diameters over bark
   * @param cutM height of the cut [m]
   * @param stumpInsideBarkM diameter inside the bark at the cut [m]
   */
  public static StemTaper of(
      double heightM,
      double dbhM,
      List<StemDiameter> diameters,
      double cutM,
      double stumpInsideBarkM) {
    StemTaper taper = new StemTaper(heightM);
    for (StemDiameter d : diameters) {
      if (d.heightM() < heightM) {
        taper.known.put(d.heightM(), d.diameterM());
      }
    }
    if (heightM > BREAST_HEIGHT_M) {
      taper.known.put(BREAST_HEIGHT_M, dbhM);
    }
    taper.known.put(cutM, stumpInsideBarkM / Allowances.BARK_RATIO.value());
    return taper;
  }

  /**
   * Stem diameter at the cut, inside the bark [m]: as measured, else DBH times {@link
   * Allowances#FLARE} times {@link Allowances#BARK_RATIO}.
   */
  public static double stumpInsideBarkM(SubjectTree tree) {
    return tree.stumpDiameterM() != null
        ? tree.stumpDiameterM().value()
        : tree.dbhM().value() * Allowances.FLARE.value() * Allowances.BARK_RATIO.value();
  }

  /**
   * Diameter over the bark [m].
   *
   * @param heightM height above the ground [m], from 0 to the tree's height
   */
  public double overBarkM(double heightM) {
    Range.check("height_m", heightM, 0, known.lastKey(), "m");
    Map.Entry<Double, Double> below = known.floorEntry(heightM);
    Map.Entry<Double, Double> above = known.ceilingEntry(heightM);
    if (below == null || below.getKey().equals(above.getKey())) {
      return above.getValue();
    }
    double way = (heightM - below.getKey()) / (above.getKey() - below.getKey());
    return below.getValue() + way * (above.getValue() - below.getValue());
  }

  /** The known diameters over bark [m] by height above the ground [m], the top's 0 among them. */
  public SortedMap<Double, Double> known() {
    return Collections.unmodifiableSortedMap(known);
  }

  /** Diameter inside the bark [m], at that height above the ground [m]. */
  public double insideBarkM(double heightM) {
    return Allowances.BARK_RATIO.value() * overBarkM(heightM);
  }

  /** Volume over bark from the ground to the top [m³]: the exact sum of the cone stumps. */
  public double volumeM3() {
    double volume = 0;
    double z = 0;
    double d = overBarkM(0);
    for (Map.Entry<Double, Double> next : known.entrySet()) {
      double e = next.getValue();
      volume += Math.PI / 12 * (next.getKey() - z) * (d * d + d * e + e * e);
      z = next.getKey();
      d = e;
    }
    return volume;
  }
}
