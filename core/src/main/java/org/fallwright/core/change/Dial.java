package org.fallwright.core.change;

import java.util.Optional;
import java.util.function.IntFunction;
import java.util.function.Predicate;

/**
 * One thing that can be changed by more and more: its steps from 1 up, each an edit or, past what
 * is possible, null.
 *
 * @param most last step
 * @param stride steps from one look to the next; between two looks the first step that will do is
 *     found by halving
 * @param at the edit of a step; null: not possible
 */
record Dial(int most, int stride, IntFunction<Edit> at) {
  static Dial once(IntFunction<Edit> at) {
    return new Dial(1, 1, at);
  }

  /** The edit of a step; null where a record refuses it. */
  Edit edit(int step) {
    try {
      return at.apply(step);
    } catch (IllegalArgumentException e) {
      // beyond what a site may hold: the dial ends here
      return null;
    }
  }

  /**
   * The smallest edit that will do, as far as looks a stride apart show it; the edit returned was
   * itself found good.
   */
  Optional<Edit> smallest(Predicate<Edit> good) {
    int bad = 0;
    int step = 0;
    while (step < most) {
      step = Math.min(most, step + (bad == 0 ? 1 : stride));
      Edit e = edit(step);
      if (e == null && step > bad + 1) {
        // the last possible step lies between
        step = bad + 1;
        e = edit(step);
      }
      if (e == null) {
        return Optional.empty();
      }
      if (good.test(e)) {
        return Optional.of(halved(bad, step, e, good));
      }
      bad = step;
    }
    return Optional.empty();
  }

  private Edit halved(int bad, int step, Edit found, Predicate<Edit> good) {
    int low = bad;
    int high = step;
    Edit best = found;
    while (high - low > 1) {
      int mid = (low + high) / 2;
      Edit e = edit(mid);
      if (e != null && good.test(e)) {
        high = mid;
        best = e;
      } else {
        low = mid;
      }
    }
    return best;
  }
}
