package org.fallwright.core.statics;

import java.util.List;
import org.fallwright.core.line.Point3;

/**
 * The pull line as it is set.
 *
 * @param attachHeightM attachment on the stem axis, above the hinge [m]
 * @param points first bearing point, then blocks, then the source; metres from the stump's centre
 *     at hinge level
 * @param legStiffnessN softest axial stiffness EA of each leg [N], one per leg
 * @param base further loaded leg at the tree, or null
 * @param slackM slack and sag to take in [m]
 * @param sourceNPerM stiffness of the source itself, behind the last leg [N/m]; null: rigid
 */
public record LineSet(
    double attachHeightM,
    List<Point3> points,
    List<Double> legStiffnessN,
    BaseLeg base,
    double slackM,
    Double sourceNPerM) {
  /** With a rigid source. */
  public LineSet(
      double attachHeightM,
      List<Point3> points,
      List<Double> legStiffnessN,
      BaseLeg base,
      double slackM) {
    this(attachHeightM, points, legStiffnessN, base, slackM, null);
  }

  /**
   * A further loaded leg, such as the base leg of a line over a fork.
   *
   * @param lengthM [m]
   * @param stiffnessN EA [N]
   * @param ratio its tension over the tension at the tree
   */
  public record BaseLeg(double lengthM, double stiffnessN, double ratio) {}

  public Point3 bearing() {
    return points.get(0);
  }
}
