package org.fallwright.core.statics;

import java.util.Comparator;
import java.util.List;
import java.util.stream.Stream;
import org.fallwright.core.site.StemDiameter;

/**
 * Stem diameter along the height: straight lines between what is known, which is Ds/0.94 over bark
 * at the cut, DBH at 1.3 m, further diameters, and 0 at the top.
 */
final class StemTaperLine {
  /** Diameter inside the bark over diameter over it, where not known (planning allowance). */
  static final double BARK = 0.94;

  private static final double BREAST_HEIGHT = 1.3;

  private final double[] height;
  private final double[] diameter;
  private final Double shellM;

  StemTaperLine(TreeBody tree) {
    shellM = tree.shellM();
    List<StemDiameter> known =
        Stream.concat(
                Stream.of(
                    new StemDiameter(tree.cutHeightM(), tree.stumpDiameterM() / BARK),
                    new StemDiameter(BREAST_HEIGHT, tree.dbhM())),
                tree.diameters().stream())
            .sorted(Comparator.comparingDouble(StemDiameter::heightM))
            .toList();
    int n = known.size();
    height = new double[n + 1];
    diameter = new double[n + 1];
    for (int i = 0; i < n; i++) {
      height[i] = known.get(i).heightM();
      diameter[i] = known.get(i).diameterM();
    }
    height[n] = tree.heightM();
    diameter[n] = 0;
  }

  /** Diameter over bark at a height above the ground [m]. */
  double overBark(double h) {
    if (h <= height[0]) {
      return diameter[0];
    }
    for (int i = 1; i < height.length; i++) {
      if (h <= height[i]) {
        double span = height[i] - height[i - 1];
        double share = span == 0 ? 1 : (h - height[i - 1]) / span;
        return diameter[i - 1] + share * (diameter[i] - diameter[i - 1]);
      }
    }
    return 0;
  }

  /** Diameter inside the bark [m]. */
  double insideBark(double h) {
    return BARK * overBark(h);
  }

  /** Share of the section's stiffness and strength that a cavity takes: (inner/outer)⁴. */
  double loss(double insideBarkDiameter) {
    if (shellM == null || insideBarkDiameter <= 2 * shellM) {
      return 0;
    }
    return Math.pow((insideBarkDiameter - 2 * shellM) / insideBarkDiameter, 4);
  }
}
