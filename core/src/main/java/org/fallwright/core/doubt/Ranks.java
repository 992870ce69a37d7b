package org.fallwright.core.doubt;

import java.util.Arrays;
import java.util.Comparator;

/** Ranks of values, and how far two rankings go together (Spearman's rank correlation). */
final class Ranks {
  /** A squared correlation below this is what chance brings among 4,096 trials. */
  static final double NOISE = 0.001;

  private Ranks() {}

  /** Rank of every value; equal values share the middle of their ranks. */
  static double[] of(double[] values) {
    Integer[] order = new Integer[values.length];
    Arrays.setAll(order, i -> i);
    Arrays.sort(order, Comparator.comparingDouble(i -> values[i]));
    double[] ranks = new double[values.length];
    int from = 0;
    for (int i = 1; i <= order.length; i++) {
      if (i == order.length || values[order[i]] != values[order[from]]) {
        for (int j = from; j < i; j++) {
          ranks[order[j]] = (from + i - 1) / 2.0;
        }
        from = i;
      }
    }
    return ranks;
  }

  /** Correlation of two lists of ranks, −1 to 1; 0 where one of them is all alike. */
  static double correlation(double[] a, double[] b) {
    double mean = (a.length - 1) / 2.0;
    double ab = 0;
    double aa = 0;
    double bb = 0;
    for (int i = 0; i < a.length; i++) {
      ab += (a[i] - mean) * (b[i] - mean);
      aa += (a[i] - mean) * (a[i] - mean);
      bb += (b[i] - mean) * (b[i] - mean);
    }
    return aa == 0 || bb == 0 ? 0 : ab / Math.sqrt(aa * bb);
  }

  /**
   * A percentile of values in order, by linear interpolation.
   *
   * @param share 0 to 1
   */
  static double percentile(double[] sorted, double share) {
    double at = share * (sorted.length - 1);
    int below = (int) at;
    int above = Math.min(below + 1, sorted.length - 1);
    double part = at - below;
    return part == 0 || sorted[below] == sorted[above]
        ? sorted[below]
        : sorted[below] + part * (sorted[above] - sorted[below]);
  }
}
