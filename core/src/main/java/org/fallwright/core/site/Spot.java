package org.fallwright.core.site;

import org.fallwright.core.units.Range;

/**
 * A place where a vehicle, a machine or people can stand and pull.
 *
 * @param id its name on the plan
 * @param place where it is
 * @param headingDeg the way a vehicle there faces [degrees from true north]; null: free
 * @param surface key of the surface table
 * @param wet whether the surface is wet
 * @param gradeDeg slope of the ground along the line, positive where it rises away from the tree
 *     [degrees]
 * @param runOutM clear way ahead [m]; null: not stated
 * @param land whose land it is; null: not stated
 */
public record Spot(
    String id,
    Place place,
    Double headingDeg,
    String surface,
    boolean wet,
    double gradeDeg,
    Double runOutM,
    String land) {
  public Spot {
    Range.text("id", id);
    Range.present("place", place);
    Range.checkOrNull("heading_deg", headingDeg, 0, 360, "degrees");
    Range.text("surface", surface);
    Range.check("grade_deg", gradeDeg, -30, 30, "degrees");
    Range.checkOrNull("run_out_m", runOutM, 0, 1000, "m");
  }
}
