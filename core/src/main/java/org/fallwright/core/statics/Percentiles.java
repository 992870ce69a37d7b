package org.fallwright.core.statics;

import java.util.function.ToDoubleFunction;

/**
 * 95th and 5th percentile of a signed quantity, the entered quantities being as doubtful as they
 * are: one input at a time, or over many trials. The balance asks nothing else of a spread, so both
 * go through the same formulas.
 */
interface Percentiles {
  double p95(ToDoubleFunction<Posture> f);

  double p5(ToDoubleFunction<Posture> f);
}
