package org.fallwright.core.line;

import java.util.Arrays;
import org.fallwright.core.reference.Hardware;
import org.fallwright.core.reference.Kind;
import org.fallwright.core.units.Range;

/**
 * What a bend leaves of a wire rope's strength, by the ratio of the bend's diameter to the rope's,
 * at rest. Straight lines between the points of the Wire Rope Technical Board's curve, from memory.
 * Below a ratio of 1 nothing is known and it is refused.
 */
public final class WireBend {
  /** What stands behind the curve. */
  public static final Kind KIND = Kind.FROM_MEMORY;

  private static final int[] RATIO = {1, 2, 4, 6, 8, 10, 15, 20, 30, 40};
  private static final double[] KEEPS =
      Arrays.stream(RATIO).mapToDouble(r -> Hardware.value("wire.bend." + r)).toArray();

  private WireBend() {}

  /** Share kept at a ratio of diameters; above the curve's end the share of its end. */
  public static double keeps(double ratio) {
    Range.check("bend ratio", ratio, 1, 1e4, "");
    for (int i = 1; i < RATIO.length; i++) {
      if (ratio <= RATIO[i]) {
        double t = (ratio - RATIO[i - 1]) / (RATIO[i] - RATIO[i - 1]);
        return KEEPS[i - 1] + t * (KEEPS[i] - KEEPS[i - 1]);
      }
    }
    return KEEPS[KEEPS.length - 1];
  }
}
