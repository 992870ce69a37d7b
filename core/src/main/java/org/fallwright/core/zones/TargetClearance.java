package org.fallwright.core.zones;

import org.fallwright.core.site.Position;

/**
 * How a target stands to a footprint.
 *
 * @param targetId the target
 * @param clearanceM distance when apart; minus the greatest depth of its part inside the footprint
 *     when they overlap or touch [m]
 * @param askedM distance asked, the position errors of stump and target included; 0 where the
 *     target asks for none [m]
 * @param overlapAmount how much of it lies inside, in {@code overlapUnit}
 * @param overlapUnit m² for an area, m for a line
 * @param nearest the target's nearest point, or its deepest when they overlap
 * @param mayBeHit whether it may be hit: then it is named and never judged
 */
public record TargetClearance(
    String targetId,
    double clearanceM,
    double askedM,
    double overlapAmount,
    String overlapUnit,
    Position nearest,
    boolean mayBeHit) {

  /** Whether the tree can come to lie on it. */
  public boolean overlaps() {
    return clearanceM <= 0;
  }

  /** Clearance over asked; 0 when they overlap; infinite where nothing limits. */
  public double ratio() {
    if (mayBeHit) {
      return Double.POSITIVE_INFINITY;
    }
    if (overlaps()) {
      return 0;
    }
    return askedM > 0 ? clearanceM / askedM : Double.POSITIVE_INFINITY;
  }
}
