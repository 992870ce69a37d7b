package org.fallwright.core.revision;

import org.fallwright.core.site.Wetness;
import org.fallwright.core.units.Range;

/**
 * What is otherwise on the site than planned; what is null is as it was.
 *
 * @param lineAtM height at which the line seats above the ground at the stump [m]
 * @param line id of the line in the truck
 * @param at id of the spot or anchor that the source is at
 * @param redirect id of the anchor with the redirect block; "none": there is none
 * @param ground wet or dry ground
 * @param gustMps gust [m/s]
 */
public record Found(
    Double lineAtM, String line, String at, String redirect, Wetness ground, Double gustMps) {
  /** The word for no redirect. */
  public static final String NONE = "none";

  public Found {
    Range.checkOrNull("line-at", lineAtM, 0.5, 100, "m");
    Range.checkOrNull("gust", gustMps, 0, 40, "m/s");
    if (lineAtM == null
        && line == null
        && at == null
        && redirect == null
        && ground == null
        && gustMps == null) {
      throw new IllegalArgumentException("nothing is said to be otherwise than planned");
    }
  }
}
