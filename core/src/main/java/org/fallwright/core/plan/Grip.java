package org.fallwright.core.plan;

import org.fallwright.core.reference.Surface;
import org.fallwright.core.reference.SurfaceTable;

/**
 * The same ground where tyres and boots happen to grip better than at their least. Dry ground goes
 * up to the most that was read for it; wet ground only up to the least of the same ground dry, for
 * no source says how good it may be. What a person can pull is left at its least.
 */
final class Grip {
  private Grip() {}

  /**
   * @param least the ground as the plan takes it
   * @param share of the way from the least grip to the most, 0 to 1
   */
  static Surface of(Surface least, double share) {
    Surface dry = least.wet() ? SurfaceTable.of(least.key(), false) : least;
    double tyre = least.wet() ? dry.tyreLow() : least.tyreHigh();
    double boot = least.wet() ? dry.bootLow() : least.bootHigh();
    return new Surface(
        least.key(),
        least.wet(),
        least.name(),
        between(least.tyreLow(), tyre, share),
        least.tyreHigh(),
        least.rolling(),
        between(least.bootLow(), boot, share),
        least.bootHigh(),
        least.personLowN(),
        least.personHighN());
  }

  private static double between(double from, double to, double share) {
    return from + share * Math.max(0, to - from);
  }
}
