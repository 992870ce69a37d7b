package org.fallwright.core.site;

import java.util.List;
import org.fallwright.core.units.Range;

/**
 * What the planner may choose from, besides the gear and its places.
 *
 * @param attachHeightsM heights of the line above the ground at the stump [m]
 * @param attachHow how well the height is known
 * @param layStepDeg step of the grid of lays [degrees]
 * @param laysDeg further lays to try [degrees]
 * @param redirects most redirect blocks in the line, 0 to 2
 * @param attachRange further heights of the line above the ground at the stump; null: none
 * @param hingeRange further hinge thicknesses; null: none
 */
public record Offer(
    List<Double> attachHeightsM,
    How attachHow,
    double layStepDeg,
    List<Double> laysDeg,
    int redirects,
    Steps attachRange,
    Steps hingeRange) {
  public Offer {
    attachHeightsM = List.copyOf(Range.present("attach_heights_m", attachHeightsM));
    if (attachHeightsM.isEmpty()) {
      throw new IllegalArgumentException("attach_heights_m is empty; it must have at least one");
    }
    attachHeightsM.forEach(h -> Range.check("attach_heights_m", h, 0.5, 100, "m"));
    Range.present("attach_how", attachHow).usualOnly("attach_how");
    Range.check("lay_step_deg", layStepDeg, 0.25, 90, "degrees");
    laysDeg = List.copyOf(Range.present("lays_deg", laysDeg));
    laysDeg.forEach(l -> Range.check("lays_deg", l, 0, 360, "degrees"));
    Range.check("redirects", redirects, 0, 2, "");
    if (attachRange != null) {
      Range.check("attach_range", attachRange.fromM(), 0.5, 100, "m");
    }
    if (hingeRange != null) {
      Range.check("hinge_range", hingeRange.fromM(), 0.005, 0.5, "m");
      Range.check("hinge_range", hingeRange.toM(), 0.005, 0.5, "m");
    }
  }

  /** Every height of the line on offer, above the ground at the stump [m]. */
  public List<Double> attachHeights() {
    return Steps.with(attachHeightsM, attachRange);
  }
}
