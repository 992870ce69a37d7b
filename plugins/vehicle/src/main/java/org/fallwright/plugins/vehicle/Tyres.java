package org.fallwright.plugins.vehicle;

import java.util.Arrays;

/**
 * What tyres and chains change of a ground's grip.
 *
 * <p>The low gives no tyre any credit over the ground's row: no factor was read in a source, and a
 * cold-regions test (US Army CRREL Report 83-27, abstract) found no advantage of tread on ice. The
 * high, which loads the parts, does. All factors are planning allowances.
 */
enum Tyres {
  NOT_STATED("", 1, 1, 1),
  ROAD("road", 1, 1, 1),
  WORN("worn", 0.8, 0.8, 1),
  ALL_TERRAIN("all-terrain", 1, 1, 1.15),
  FIELD_LUGS("field-lugs", 1, 0.9, 1.3),
  CHAINS("chains", 1, 0.8, 1.5);

  /** Grip beyond which no tyre is counted. */
  private static final double MOST = 1.5;

  /** How it is written among the parameters. */
  final String key;

  private final double low;
  private final double lowPaved;
  private final double high;

  Tyres(String key, double low, double lowPaved, double high) {
    this.key = key;
    this.low = low;
    this.lowPaved = lowPaved;
    this.high = high;
  }

  /** Grip taken where it helps. */
  double lowOf(double grip, boolean paved) {
    return grip * (paved ? lowPaved : low);
  }

  /** Grip taken where more of it loads the parts. */
  double highOf(double grip) {
    return Math.min(MOST, grip * high);
  }

  static Tyres of(String key) {
    return Arrays.stream(values()).filter(t -> t.key.equals(key)).findFirst().orElseThrow();
  }
}
