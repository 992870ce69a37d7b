package org.fallwright.core.zones;

import org.fallwright.core.site.Position;
import org.fallwright.core.units.Range;

/**
 * Ground that people without a job in the felling keep out of: k tree heights about the stump, k by
 * the rule set.
 *
 * @param stump middle of the stump
 * @param radiusM k·H [m]
 */
public record PeopleZone(Position stump, double radiusM) {
  /**
   * @param factor k, tree heights
   * @param heightM height of the tree [m]
   */
  public static PeopleZone of(Position stump, double factor, double heightM) {
    Range.check("factor", factor, 0.5, 10, "");
    Range.check("height_m", heightM, 2, 120, "m");
    return new PeopleZone(stump, factor * heightM);
  }

  /** Whether a place lies inside; on the edge counts as inside. */
  public boolean contains(Position p) {
    return stump.distanceTo(p) <= radiusM;
  }
}
