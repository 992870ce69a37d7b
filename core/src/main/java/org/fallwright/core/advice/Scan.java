package org.fallwright.core.advice;

import java.util.Comparator;
import java.util.Map;
import java.util.NavigableSet;
import java.util.Optional;
import java.util.TreeMap;
import java.util.TreeSet;
import java.util.function.DoubleFunction;
import org.fallwright.core.plan.Check;
import org.fallwright.core.plan.Judged;
import org.fallwright.core.plan.Verdict;

/**
 * Looks along one setting for the run of values at which a setup is judged no worse than a verdict.
 *
 * <p>Settings are whole steps of a unit, so that an end is a round value that was itself judged. A
 * coarse grid is judged first, then each end is narrowed down by halving to one step: the end
 * itself passes and its neighbour fails. Between two grid values that pass, a hole narrower than
 * the grid would not be seen; with a stride of 1 there is none.
 */
final class Scan {
  /** As setups are ranked: verdict, fewer failing checks, stronger weakest link. */
  private static final Comparator<Judged> BEST_FIRST =
      Comparator.comparing(Judged::verdict)
          .thenComparingInt(Judged::failing)
          .thenComparing(Comparator.comparingDouble(Judged::standing).reversed());

  private final double step;
  private final String unit;
  private final DoubleFunction<Judged> judge;
  private final Map<Integer, Judged> seen = new TreeMap<>();
  private final NavigableSet<Integer> grid = new TreeSet<>();

  /**
   * @param step one step, in {@code unit}
   * @param from first step of the grid
   * @param to last step of the grid, itself on it
   * @param stride steps from one grid value to the next
   * @param judge judges the setting
   */
  Scan(double step, String unit, int from, int to, int stride, DoubleFunction<Judged> judge) {
    this.step = step;
    this.unit = unit;
    this.judge = judge;
    for (int i = from; i <= to; i += stride) {
      grid.add(i);
    }
    grid.add(Math.max(from, to));
  }

  /** The step nearest to a setting, within the grid's ends. */
  private int nearest(double setting) {
    return Math.max(grid.first(), Math.min(grid.last(), (int) Math.round(setting / step)));
  }

  double setting(int i) {
    return i * step;
  }

  double first() {
    return setting(grid.first());
  }

  double last() {
    return setting(grid.last());
  }

  Judged at(int i) {
    return seen.computeIfAbsent(i, s -> judge.apply(setting(s)));
  }

  /** The best step of the grid, of equals the one nearest to {@code wanted}. */
  int best(double wanted) {
    return grid.stream()
        .min(
            Comparator.<Integer, Judged>comparing(this::at, BEST_FIRST)
                .thenComparingInt(i -> Math.abs(i - nearest(wanted))))
        .orElseThrow();
  }

  /**
   * The run around the planned setting or, where that is not good enough, around the best one;
   * empty where none is.
   */
  Optional<Span> run(double planned, Verdict worst) {
    Optional<Span> own = around(nearest(planned), worst);
    return own.isPresent() ? own : around(best(planned), worst);
  }

  /** The run around a step; empty where that step itself is not good enough. */
  Optional<Span> around(int middle, Verdict worst) {
    if (!good(middle, worst)) {
      return Optional.empty();
    }
    int low = end(middle, worst, -1);
    int high = end(middle, worst, 1);
    return Optional.of(
        new Span(setting(low), setting(high), unit, beyond(low, -1), beyond(high, 1)));
  }

  private boolean good(int i, Verdict worst) {
    return at(i).verdict().compareTo(worst) <= 0;
  }

  private int end(int middle, Verdict worst, int way) {
    int in = middle;
    Integer next = next(in, way);
    while (next != null && good(next, worst)) {
      in = next;
      next = next(in, way);
    }
    if (next == null) {
      return in;
    }
    int out = next;
    while (Math.abs(out - in) > 1) {
      int mid = in + (out - in) / 2;
      if (good(mid, worst)) {
        in = mid;
      } else {
        out = mid;
      }
    }
    return in;
  }

  private Integer next(int i, int way) {
    return way < 0 ? grid.lower(i) : grid.higher(i);
  }

  private Check beyond(int i, int way) {
    int out = i + way;
    return out < grid.first() || out > grid.last() ? null : at(out).weakest();
  }
}
