package org.fallwright.core.pull;

import com.fasterxml.jackson.databind.node.ObjectNode;
import org.fallwright.core.reference.Surface;
import org.fallwright.core.units.Range;

/**
 * What a pull source is asked.
 *
 * @param parameters the source's own parameters
 * @param mode one of its modes
 * @param ground the ground it stands on; null on an anchor
 * @param lineRiseRad rise of the line from the horizontal at the source, positive where the line
 *     rises towards the tree [rad]
 * @param uphillRad slope of the ground along the line, positive where it rises away from the tree
 *     [rad]
 * @param offHeadingRad angle on the plan between the pull away from the tree and the heading of the
 *     spot, never negative [rad]; null where the spot has none
 * @param pathStiffness stiffness of line and stem seen at the tree [N/m]; 0: none
 * @param travelRatio metres at this source's line end for a metre of line at the tree
 * @param takeUpM line to be taken in at the tree [m]
 * @param runOutM clear way ahead of the spot [m]; null: not stated
 * @param driver what the driving source gives at this source's haul end; null where none is needed
 */
public record PullRequest(
    ObjectNode parameters,
    String mode,
    Surface ground,
    double lineRiseRad,
    double uphillRad,
    Double offHeadingRad,
    double pathStiffness,
    double travelRatio,
    double takeUpM,
    Double runOutM,
    PullOffer driver) {
  public PullRequest {
    Range.present("parameters", parameters);
    Range.present("mode", mode);
    Range.check("line_rise_rad", lineRiseRad, -Math.PI / 2, Math.PI / 2, "rad");
    Range.check("uphill_rad", uphillRad, -Math.PI / 2, Math.PI / 2, "rad");
    Range.checkOrNull("off_heading_rad", offHeadingRad, 0, Math.PI, "rad");
    Range.check("path_stiffness", pathStiffness, 0, 1e12, "N/m");
    Range.check("travel_ratio", travelRatio, 1e-3, 1e4, "");
    Range.check("take_up_m", takeUpM, 0, 1e4, "m");
  }
}
