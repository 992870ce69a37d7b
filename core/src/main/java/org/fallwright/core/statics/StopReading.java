package org.fallwright.core.statics;

import org.fallwright.core.reference.Allowances;

/**
 * What a stop at the ceiling leaves of a source.
 *
 * <p>Reader: high = min(high, ceiling + 2·K_p·overrun), twice because a stiff line overshoots more;
 * low = min(low, ceiling). Device set at the ceiling: high at most 1.1, low and what it holds at
 * most 0.9 of it (planning allowance: its tolerance).
 */
final class StopReading {
  private static final double DEVICE_HIGH = Allowances.DEVICE_HIGH.value();
  private static final double DEVICE_LOW = Allowances.DEVICE_LOW.value();

  private StopReading() {}

  static SourceAtTree apply(SourceAtTree s, double ceilingN, double pathNPerM) {
    return switch (s.stop()) {
      case NONE -> s;
      case READER ->
          new SourceAtTree(
              Math.min(s.lowN(), ceilingN),
              s.holdN(),
              Math.min(s.highN(), ceilingN + 2 * pathNPerM * s.overrunM()),
              s.captured(),
              s.stop(),
              s.overrunM());
      case DEVICE ->
          new SourceAtTree(
              Math.min(s.lowN(), DEVICE_LOW * ceilingN),
              Math.min(s.holdN(), DEVICE_LOW * ceilingN),
              Math.min(s.highN(), DEVICE_HIGH * ceilingN),
              s.captured(),
              s.stop(),
              s.overrunM());
    };
  }
}
