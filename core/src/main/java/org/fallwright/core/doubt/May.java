package org.fallwright.core.doubt;

import org.fallwright.core.reference.Allowances;
import org.fallwright.core.site.How;
import org.fallwright.core.site.Quantity;

/**
 * What an input may be: normal about its mean, or anything between two ends alike. Where it lies is
 * said in standard deviations, of an even one as a share of its width.
 *
 * @param mean middle
 * @param spread standard deviation; of an even one half its width
 * @param even whether it is even
 */
record May(double mean, double spread, boolean even) {
  private static final double Z = Allowances.PERCENTILE_SDS.value();
  private static final double TAIL = 0.05;

  static May normal(double mean, double sd) {
    return new May(mean, sd, false);
  }

  static May between(double low, double high) {
    return new May((low + high) / 2, (high - low) / 2, true);
  }

  /** A quantity by its standard deviation; one with a range is even over it. */
  static May of(Quantity q, double sd) {
    return q.how() == How.RANGE ? between(q.low(), q.high()) : normal(q.value(), sd);
  }

  /** The value at a place. */
  double at(double place) {
    return even ? mean + spread * (2 * place - 1) : mean + spread * place;
  }

  /** Its place by the share of values below. */
  double place(double share) {
    return even ? share : Points.normal(share);
  }

  /** Place of a value. */
  double placeOf(double value) {
    return even ? ((value - mean) / spread + 1) / 2 : (value - mean) / spread;
  }

  /** Place of the 5th percentile. */
  double low() {
    return even ? TAIL : -Z;
  }

  /** Place of the 95th percentile. */
  double high() {
    return even ? 1 - TAIL : Z;
  }

  /** Place of the middle. */
  double middle() {
    return even ? 0.5 : 0;
  }
}
