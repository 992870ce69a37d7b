package org.fallwright.core.site;

import org.fallwright.core.units.Range;

/**
 * A distance taped on the ground between two things, to hold their drawing against.
 *
 * @param from id of a thing on the site
 * @param fromAt point of it that was taped to; null: its own point (stump, anchor, spot, middle of
 *     a round target)
 * @param to id of another thing
 * @param toAt point of that one; null: its own point
 * @param distanceM level distance read [m]
 * @param statedErrorM error of the reading [m]; null: the usual one of tapes
 */
public record TapeTie(
    String from, Position fromAt, String to, Position toAt, double distanceM, Double statedErrorM) {
  public TapeTie {
    Range.text("from", from);
    Range.text("to", to);
    if (from.equals(to)) {
      throw new IllegalArgumentException(
          "to is \"" + to + "\", as from; a tape tie must join two things");
    }
    Range.check("distance_m", distanceM, 0.1, 500, "m");
    Range.checkOrNull("stated_error_m", statedErrorM, 0, 10, "m");
  }

  /** Error of the reading [m]. */
  public double errorM() {
    return statedErrorM != null ? statedErrorM : Fix.TAPES.errorM();
  }
}
