package org.fallwright.ui.cli;

import org.fallwright.core.plan.Plan;
import org.fallwright.core.plan.Verdict;

/** Exit statuses. */
final class Exit {
  /** Something is workable or tight; or what was asked is done. */
  static final int DONE = 0;

  /** A fault of the program. */
  static final int FAULT = 1;

  /** Bad input, or a file that cannot be read or written. */
  static final int BAD_INPUT = 2;

  /** Nothing is workable, or it cannot be judged yet. */
  static final int NOTHING_WORKABLE = 3;

  private Exit() {}

  static int of(Verdict verdict) {
    return verdict == Verdict.WORKABLE || verdict == Verdict.TIGHT ? DONE : NOTHING_WORKABLE;
  }

  /** How a plan as a whole stands: its best setup decides. */
  static Verdict standing(Plan plan) {
    for (Verdict v : new Verdict[] {Verdict.WORKABLE, Verdict.TIGHT, Verdict.CANNOT_JUDGE}) {
      if (plan.byVerdict().getOrDefault(v, 0) > 0) {
        return v;
      }
    }
    return Verdict.NOT_WORKABLE;
  }
}
