package org.fallwright.core.statics;

import java.util.List;
import java.util.function.DoubleUnaryOperator;

/**
 * A result with every entered quantity at its mean, and with each one alone at its 5th and at its
 * 95th percentile, in the order of {@link Draw#NAMES}.
 *
 * @param atMean the result at the means
 * @param atLow the result with one quantity at its 5th percentile
 * @param atHigh the result with one quantity at its 95th percentile
 */
public record Varied(double atMean, List<Double> atLow, List<Double> atHigh) {
  public Varied {
    atLow = List.copyOf(atLow);
    atHigh = List.copyOf(atHigh);
  }

  /** Greater rise that quantity {@code i} alone brings, 0 where it brings none. */
  public double rise(int i) {
    return Math.max(0, Math.max(atLow.get(i) - atMean, atHigh.get(i) - atMean));
  }

  /** Greater fall that quantity {@code i} alone brings, 0 where it brings none. */
  public double fall(int i) {
    return Math.max(0, Math.max(atMean - atLow.get(i), atMean - atHigh.get(i)));
  }

  /** The result at the means and the root of the squares of all rises. */
  public double p95() {
    double sum = 0;
    for (int i = 0; i < atLow.size(); i++) {
      sum += rise(i) * rise(i);
    }
    return atMean + Math.sqrt(sum);
  }

  /** The same in another unit; {@code f} must not turn the order round. */
  public Varied in(DoubleUnaryOperator f) {
    return new Varied(
        f.applyAsDouble(atMean),
        atLow.stream().map(f::applyAsDouble).toList(),
        atHigh.stream().map(f::applyAsDouble).toList());
  }
}
