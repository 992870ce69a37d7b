package org.fallwright.core.site;

import org.fallwright.core.units.Range;

/**
 * A named case: what is otherwise on another day than was entered. What is null stays as entered.
 *
 * @param id what it is called, such as "wet morning"
 * @param ground wet or dry ground at every spot, parked vehicle and picket
 * @param anchorSoil wet: saturated soil at every anchor tree and stump; dry: at none
 * @param inLeaf whether the crown is in leaf
 * @param iceOrWet whether ice, wet snow or rain loads the crown
 * @param gustMps gust at crown height [m/s]
 * @param windTowardDeg direction the wind blows towards [degrees]
 * @param finishBy time of day by which the tree must be down, such as "16:40"; nothing is judged by
 *     it
 */
public record Case(
    String id,
    Wetness ground,
    Wetness anchorSoil,
    Boolean inLeaf,
    Boolean iceOrWet,
    Quantity gustMps,
    Double windTowardDeg,
    String finishBy) {
  public Case {
    Range.text("id", id);
    if (gustMps != null) {
      gustMps.within("gust_mps", 0, 40, "m/s");
    }
    Range.checkOrNull("wind_toward_deg", windTowardDeg, 0, 360, "degrees");
    if (finishBy != null && !finishBy.matches("([01][0-9]|2[0-3]):[0-5][0-9]")) {
      throw new IllegalArgumentException(
          "finish_by is \"" + finishBy + "\"; it must be a time of day such as \"16:40\", or null");
    }
  }
}
