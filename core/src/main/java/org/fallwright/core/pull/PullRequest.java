package org.fallwright.core.pull;

import com.fasterxml.jackson.databind.node.ObjectNode;
import java.util.List;
import org.fallwright.core.reference.Surface;
import org.fallwright.core.units.Range;

/**
 * What a pull source is asked.
 *
 * @param parameters the source's own parameters, by key, in the units that it describes
 * @param mode one of its modes
 * @param stand where it stands and how the line comes to it
 * @param pull what it is to do
 * @param line the line that its line end is fastened to or runs through it; null: the haul part of
 *     another source's tackle
 * @param driver what the driving source gives at this source's haul end; null where none is needed
 */
public record PullRequest(
    ObjectNode parameters, String mode, Stand stand, Pull pull, Line line, PullOffer driver) {
  /**
   * Where it stands.
   *
   * @param ground the ground it stands on; null on an anchor
   * @param lineRiseRad rise of the line from the horizontal at the source, positive where the line
   *     rises towards the tree [rad]
   * @param uphillRad slope of the ground along the line, positive where it rises away from the tree
   *     [rad]; 0 on an anchor
   * @param offHeadingRad angle on the plan between the pull away from the tree and the heading of
   *     the spot, never negative [rad]; null where the spot has none
   * @param heightM height of its line end above the ground there [m]
   * @param legM length of the line's last leg: from its line end to the next point at which the
   *     line bears, a redirect or the tree; for a driver, the fixed block [m]
   * @param runOutM clear way from the spot away from the tree, to drive or walk [m]; null: not
   *     stated, or on an anchor
   */
  public record Stand(
      Surface ground,
      double lineRiseRad,
      double uphillRad,
      Double offHeadingRad,
      double heightM,
      double legM,
      Double runOutM) {
    /**
     * Checks every figure.
     *
     * @throws IllegalArgumentException naming the field, its value, its limits and its unit
     */
    public Stand {
      Range.check("line_rise_rad", lineRiseRad, -Math.PI / 2, Math.PI / 2, "rad");
      Range.check("uphill_rad", uphillRad, -Math.PI / 2, Math.PI / 2, "rad");
      Range.checkOrNull("off_heading_rad", offHeadingRad, 0, Math.PI, "rad");
      Range.check("height_m", heightM, 0, 100, "m");
      Range.check("leg_m", legM, 0, 1e4, "m");
      Range.checkOrNull("run_out_m", runOutM, 0, 1e4, "m");
    }
  }

  /**
   * What it is to do. Of a tree that cannot be moved stiffness and take-up are 0.
   *
   * @param pathStiffness stiffness of line and stem seen at the tree [N/m]
   * @param travelRatio metres at this source's line end for a metre of line at the tree [m/m]
   * @param takeUpM line to be taken in at the tree [m]
   * @param workingN tension that the plan asks at this source's line end [N]; null: not known yet,
   *     as for a driver. To tell hand forces by; low and high must not hang on it
   */
  public record Pull(double pathStiffness, double travelRatio, double takeUpM, Double workingN) {
    /**
     * Checks every figure.
     *
     * @throws IllegalArgumentException naming the field, its value, its limits and its unit
     */
    public Pull {
      Range.check("path_stiffness", pathStiffness, 0, 1e12, "N/m");
      Range.check("travel_ratio", travelRatio, 1e-3, 1e4, "");
      Range.check("take_up_m", takeUpM, 0, 1e4, "m");
      Range.checkOrNull("working_N", workingN, 0, 1e9, "N");
    }

    /**
     * Line to be taken in at this source's line end.
     *
     * @return so much line [m]
     */
    public double lineInM() {
      return takeUpM * travelRatio;
    }
  }

  /**
   * The line at its line end.
   *
   * @param wireRope whether it is wire rope, else fibre
   * @param diameterM its diameter [m]
   * @param breakingLoadN breaking load on its label [N]
   * @param lengthM its length [m]
   * @param pathM how much of it the path takes, from the tree to the source [m]
   */
  public record Line(
      boolean wireRope, double diameterM, double breakingLoadN, double lengthM, double pathM) {
    /**
     * Checks every figure.
     *
     * @throws IllegalArgumentException naming the field, its value, its limits and its unit
     */
    public Line {
      Range.check("diameter_m", diameterM, 0.001, 0.2, "m");
      Range.check("breaking_load_N", breakingLoadN, 1, 1e8, "N");
      Range.check("length_m", lengthM, 0.1, 1e4, "m");
      Range.check("path_m", pathM, 0, 1e5, "m");
    }
  }

  /**
   * Checks that all is there but line and driver, which may be null.
   *
   * @throws IllegalArgumentException naming the field and what is asked of it
   */
  public PullRequest {
    Range.present("parameters", parameters);
    Range.present("mode", mode);
    Range.present("stand", stand);
    Range.present("pull", pull);
  }

  /**
   * The same with other parameters.
   *
   * @param otherParameters what is asked instead, by key
   * @return a request that is alike in all else
   * @throws IllegalArgumentException naming the field and what is asked of it
   */
  public PullRequest with(ObjectNode otherParameters) {
    return new PullRequest(otherParameters, mode, stand, pull, line, driver);
  }

  /**
   * The mode, if it is one of these.
   *
   * @param modes modes that the source has
   * @return the mode asked for
   * @throws IllegalArgumentException if it is another, naming it and the modes there are
   */
  public String modeAmong(List<String> modes) {
    if (!modes.contains(mode)) {
      throw new IllegalArgumentException("mode is \"" + mode + "\"; it must be one of " + modes);
    }
    return mode;
  }
}
