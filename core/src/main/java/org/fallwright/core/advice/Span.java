package org.fallwright.core.advice;

import org.fallwright.core.plan.Check;

/**
 * An unbroken run of settings that are all good enough.
 *
 * @param lowest lowest setting that was judged good enough, in {@code unit}
 * @param highest highest, in {@code unit}
 * @param unit SI unit of both
 * @param below weakest check one step below; null: the looking ended there
 * @param above weakest check one step above; null: the looking ended there
 */
public record Span(double lowest, double highest, String unit, Check below, Check above) {
  /** Whether that setting lies in it. */
  public boolean holds(double setting) {
    return setting >= lowest && setting <= highest;
  }
}
