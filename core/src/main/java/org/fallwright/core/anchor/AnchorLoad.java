package org.fallwright.core.anchor;

import org.fallwright.core.reference.Allowances;
import org.fallwright.core.units.Range;

/**
 * Direction of the resultant load on an anchor.
 *
 * @param upliftDeg its angle above the horizontal, negative where it pulls downwards [degrees]
 * @param downhill whether it pulls downwards by more than {@link #DOWNHILL_DEG}
 */
public record AnchorLoad(double upliftDeg, boolean downhill) {
  /** Pull below the horizontal past which a root plate counts for less [degrees]; allowance. */
  public static final double DOWNHILL_DEG = Allowances.DOWNHILL_SLOPE.value();

  public AnchorLoad {
    Range.check("uplift_deg", upliftDeg, -90, 90, "degrees");
  }

  /** The direction of a force with these components to the east, to the north and upwards [N]. */
  public static AnchorLoad of(double eastN, double northN, double upN) {
    double uplift = Math.toDegrees(Math.atan2(upN, Math.hypot(eastN, northN)));
    return new AnchorLoad(uplift, uplift < -DOWNHILL_DEG);
  }
}
