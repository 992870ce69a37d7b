package org.fallwright.core.statics;

import java.util.Arrays;
import java.util.List;
import java.util.function.ToDoubleFunction;

/**
 * Percentiles over many trials, by linear interpolation between the ordered values: the p-th of n
 * values stands at p·(n − 1). A trial in which the line has lost its lever on the hinge counts as
 * the worst there is.
 */
final class Sampled implements Percentiles {
  private static final double HIGH = 0.95;
  private static final double LOW = 0.05;

  final Posture[] postures;
  private final boolean[] lost;

  Sampled(PullCase c, List<Trial> trials) {
    postures = new Posture[trials.size()];
    lost = new boolean[trials.size()];
    for (int i = 0; i < postures.length; i++) {
      Trial t = trials.get(i);
      postures[i] = new Posture(c, t.draw(c), t.crownShift());
      lost[i] = postures[i].lever(-postures[i].sitBack()) <= 0;
    }
  }

  /** Whether the line of a trial has no lever on the hinge. */
  boolean lost(int i) {
    return lost[i];
  }

  @Override
  public double p95(ToDoubleFunction<Posture> f) {
    return at(HIGH, f, Double.POSITIVE_INFINITY);
  }

  @Override
  public double p5(ToDoubleFunction<Posture> f) {
    return at(LOW, f, Double.NEGATIVE_INFINITY);
  }

  private double at(double share, ToDoubleFunction<Posture> f, double worst) {
    double[] all = new double[postures.length];
    for (int i = 0; i < all.length; i++) {
      all[i] = lost[i] ? worst : f.applyAsDouble(postures[i]);
    }
    Arrays.sort(all);
    return percentile(all, share);
  }

  /**
   * A percentile of values in order.
   *
   * @param share 0 to 1
   */
  static double percentile(double[] sorted, double share) {
    double at = share * (sorted.length - 1);
    int below = (int) at;
    double part = at - below;
    // not 0·∞ where it lies on a value
    return part == 0
        ? sorted[below]
        : sorted[below] == sorted[below + 1]
            ? sorted[below]
            : sorted[below] + part * (sorted[below + 1] - sorted[below]);
  }
}
