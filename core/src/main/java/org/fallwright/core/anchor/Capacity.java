package org.fallwright.core.anchor;

import org.fallwright.core.reference.Allowances;
import org.fallwright.core.units.Range;

/**
 * What an anchor holds.
 *
 * @param strengthN ultimate strength; 0 where it is refused [N]
 * @param designFactor factor asked at the planned load
 * @param lastFactor factor asked at the most the source can do
 * @param mode what gives way first
 * @param refused whether it must not be used
 * @param why one sentence: what decides, or why it is refused
 */
public record Capacity(
    double strengthN,
    double designFactor,
    double lastFactor,
    String mode,
    boolean refused,
    String why) {
  /** Factor asked of an anchor at the planned load; planning allowance. */
  public static final double DESIGN_FACTOR = Allowances.ANCHOR_FACTOR.value();

  /** Factor asked of an anchor at the most the source can do; planning allowance. */
  public static final double LAST_FACTOR = Allowances.ANCHOR_LAST_FACTOR.value();

  public Capacity {
    Range.check("strength_N", strengthN, 0, 1e9, "N");
    Range.check("design_factor", designFactor, 1, 20, "");
    Range.check("last_factor", lastFactor, 1, 20, "");
    Range.text("mode", mode);
    Range.text("why", why);
  }

  /** Of a point that holds nothing by itself: its legs' anchors do, each a part of its own. */
  public static Capacity shared() {
    return new Capacity(
        0, DESIGN_FACTOR, LAST_FACTOR, "legs", false, "the anchors of its legs share its load");
  }

  static Capacity holds(double strengthN, String mode, String why) {
    return new Capacity(strengthN, DESIGN_FACTOR, LAST_FACTOR, mode, false, why);
  }

  /** Refused, with the reason. */
  public static Capacity refuse(String why) {
    return new Capacity(0, DESIGN_FACTOR, LAST_FACTOR, "refused", true, why);
  }
}
