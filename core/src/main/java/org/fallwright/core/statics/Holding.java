package org.fallwright.core.statics;

/**
 * How the tree behaves at the hold tension.
 *
 * @param stability hold stability s_h
 * @param pretensionTopN top of the pretension window [N]
 * @param start whether it starts by itself
 */
public record Holding(double stability, double pretensionTopN, Start start) {
  /**
   * The tension that can come if the line was slack or misread by pretension {@code t0} and the
   * hinge lets go: T_0 + 2·(hold − T_0)·s_h/(s_h − 1) [N]; infinite where s_h is not above 1.
   */
  public double peakN(double t0, double holdN) {
    return stability <= 1
        ? Double.POSITIVE_INFINITY
        : t0 + 2 * (holdN - t0) * stability / (stability - 1);
  }
}
