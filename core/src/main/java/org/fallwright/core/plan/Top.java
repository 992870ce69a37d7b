package org.fallwright.core.plan;

import java.util.Comparator;
import java.util.HashMap;
import java.util.List;
import java.util.Map;

/**
 * The best setup of each of the best ways. Ways that differ in the pull line alone are one here:
 * the better line is kept, or of equals the first. May be filled by several threads; what is in it
 * at the end does not hang on the order.
 */
final class Top {
  private final int most;
  private final Map<Long, Entry> byWay = new HashMap<>();
  private volatile Look cut;

  /**
   * @param way number of the way among all, whatever its line
   * @param line number of the line among those tried
   * @param setup what was looked at
   */
  record Entry(long way, int line, Setup setup, Look look) {
    private static final Comparator<Entry> BEST_FIRST =
        Comparator.comparing(Entry::look, Look.BEST_FIRST).thenComparingLong(Entry::way);
  }

  Top(int most) {
    this.most = most;
  }

  /** Takes a setup in if it is among the best so far. */
  void offer(long way, int line, Setup setup, double layDeg, Look look) {
    Look least = cut;
    if (least != null && Look.BEST_FIRST.compare(look, least) > 0) {
      return;
    }
    synchronized (this) {
      Entry known = byWay.get(way);
      int c = known == null ? -1 : Look.BEST_FIRST.compare(look, known.look);
      if (c < 0 || c == 0 && line < known.line) {
        byWay.put(way, new Entry(way, line, setup.withLay(layDeg), look));
        if (byWay.size() >= 2 * most) {
          prune();
        }
      }
    }
  }

  private void prune() {
    List<Entry> best = best();
    byWay.clear();
    best.forEach(e -> byWay.put(e.way, e));
    if (best.size() == most) {
      cut = best.get(most - 1).look;
    }
  }

  /** Draws the line below which a setup is not among the best, as far as is known. */
  synchronized void tighten() {
    prune();
  }

  /** Whether a setup of a way that is no better than that may be among the best. */
  boolean open(long way, Verdict verdict, int failing, double standing) {
    Look least = cut;
    if (least != null && !least.mayYieldTo(verdict, failing, standing)) {
      return false;
    }
    Entry known;
    synchronized (this) {
      known = byWay.get(way);
    }
    return known == null || known.look.mayYieldTo(verdict, failing, standing);
  }

  /** The best, best first. */
  synchronized List<Entry> best() {
    return byWay.values().stream().sorted(Entry.BEST_FIRST).limit(most).toList();
  }
}
