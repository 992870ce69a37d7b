package org.fallwright.core.tree.field;

import org.fallwright.core.units.Range;

/**
 * Height of a tree from a tape and a clinometer:
 *
 * <p>H = d·(tan θ_top − tan θ_base)
 *
 * <p>with d the level distance from the eye to the middle of the stump [m] and the angles from the
 * level, up positive. It takes the tip to stand over the stump. A tip that leans towards the viewer
 * is nearer than the stump and is read too high, one that leans away too low:
 *
 * <p>H_read = e + (H − e)·d/(d − H·tan λ_v)
 *
 * <p>with e the eye above the tree's base and λ_v the lean towards the viewer, negative when it
 * leans away. So view it square to the lean, where what is left out is small: the tip is then
 * farther by the root of d² and its offset squared, and the tree is read low by less than 1 %. For
 * a round crown the top that is seen may be a branch on the near side: stand off by a tree's height
 * or more.
 *
 * @param distanceM level distance from the eye to the middle of the stump [m]
 * @param top reading at the tip
 * @param base reading at the base, negative where the eye is above it
 */
public record TapedHeight(double distanceM, Reading top, Reading base) {
  public TapedHeight {
    Range.check("distance_m", distanceM, 1, 300, "m");
    if (Range.present("top", top).tangent() <= Range.present("base", base).tangent()) {
      throw new IllegalArgumentException(
          "top is " + deg(top) + " degrees; it must be above base, " + deg(base) + " degrees");
    }
  }

  /** Height of the tip above the base [m], as if the tip stood over the stump. */
  public double heightM() {
    return distanceM * (top.tangent() - base.tangent());
  }

  /** Height of the eye above the tree's base [m]; negative where it is below. */
  public double eyeM() {
    return -distanceM * base.tangent();
  }

  /**
   * Height of the tip above the base [m] of a tree that leans towards the viewer, the formula above
   * solved for H: d·H_read/(d + (H_read − e)·tan λ_v).
   *
   * @param towardsViewerDeg part of its lean towards the viewer, negative away [degrees]
   */
  public double heightOfLeanerM(double towardsViewerDeg) {
    double lean = Math.tan(Math.toRadians(lean(towardsViewerDeg)));
    double nearer = distanceM + (heightM() - eyeM()) * lean;
    if (nearer <= 0) {
      throw new IllegalArgumentException(
          "towards_viewer_deg is "
              + towardsViewerDeg
              + " degrees; seen from there no tree of that lean gives these readings");
    }
    return distanceM * heightM() / nearer;
  }

  /**
   * Height of the tip above the base [m] of a tree that leans square to the view. Its tip is
   * farther off than its stump: H − e = tan θ_top·√(d² + (H·tan λ)²), solved for H.
   *
   * @param leanDeg its lean, either way [degrees]
   */
  public double heightSquareToLeanM(double leanDeg) {
    double up = top.tangent();
    double e = eyeM();
    double aside =
        up * Math.tan(Math.toRadians(Range.check("lean_deg", leanDeg, -45, 45, "degrees")));
    double a = 1 - aside * aside;
    double root = e * e - a * (e * e - up * up * distanceM * distanceM);
    if (a <= 0) {
      throw new IllegalArgumentException(
          "lean_deg is "
              + leanDeg
              + " degrees; seen from there no tree of that lean gives these readings");
    }
    return (e + Math.signum(up) * Math.sqrt(root)) / a;
  }

  /**
   * Height that would be read [m] for a tree of that height.
   *
   * @param heightM height of the tip above the base [m]
   * @param towardsViewerDeg part of its lean towards the viewer, negative away [degrees]
   * @param distanceM level distance from the eye to the middle of the stump [m]
   * @param eyeM height of the eye above the tree's base [m]
   */
  public static double readM(
      double heightM, double towardsViewerDeg, double distanceM, double eyeM) {
    double tipAt = distanceM - heightM * Math.tan(Math.toRadians(lean(towardsViewerDeg)));
    Range.check("distance_m from the eye to below the tip", tipAt, 0.1, 1000, "m");
    return eyeM + (heightM - eyeM) * distanceM / tipAt;
  }

  private static double lean(double deg) {
    return Range.check("towards_viewer_deg", deg, -45, 45, "degrees");
  }

  private static double deg(Reading r) {
    return Math.rint(10 * r.deg()) / 10;
  }
}
