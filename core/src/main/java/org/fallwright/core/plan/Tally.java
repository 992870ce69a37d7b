package org.fallwright.core.plan;

import java.util.Comparator;
import java.util.EnumMap;
import java.util.HashMap;
import java.util.Map;
import java.util.TreeMap;

/**
 * Counts setups by verdict, and those not workable by the first check they miss in the fixed order
 * of the checks; of each such check it keeps the setup that comes nearest to passing it.
 */
final class Tally {
  private final long[] byVerdict = new long[Verdict.values().length];
  private final Map<String, Missed> missed = new HashMap<>();

  /** Those that miss one check first, and the nearest of them. */
  private static final class Missed {
    private long count;
    private double ratio;
    private long order;
    private Setup nearest;
  }

  /** So many setups of one verdict that is not "not workable". */
  void count(Verdict verdict, long setups) {
    byVerdict[verdict.ordinal()] += setups;
  }

  /**
   * One that is not workable.
   *
   * @param by the checks among which is the first that it misses
   * @param way the way, whatever its lay
   * @param order its place among all setups
   */
  void miss(Slice by, Setup way, double layDeg, long order) {
    byVerdict[Verdict.NOT_WORKABLE.ordinal()]++;
    Missed m = missed.get(by.missed());
    if (m == null) {
      m = new Missed();
      missed.put(by.missed(), m);
    }
    m.count++;
    if (m.nearest == null || nearer(by.missedRatio(), order, m)) {
      m.ratio = by.missedRatio();
      m.order = order;
      m.nearest = way.withLay(layDeg);
    }
  }

  private static boolean nearer(double ratio, long order, Missed than) {
    int c = Double.compare(ratio, than.ratio);
    return c > 0 || c == 0 && order < than.order;
  }

  void merge(Tally other) {
    for (int i = 0; i < byVerdict.length; i++) {
      byVerdict[i] += other.byVerdict[i];
    }
    other.missed.forEach(
        (id, o) -> {
          Missed m = missed.putIfAbsent(id, o);
          if (m != null) {
            m.count += o.count;
            if (nearer(o.ratio, o.order, m)) {
              m.ratio = o.ratio;
              m.order = o.order;
              m.nearest = o.nearest;
            }
          }
        });
  }

  /** How many there were. */
  int all() {
    long all = 0;
    for (long n : byVerdict) {
      all += n;
    }
    return whole(all);
  }

  Map<Verdict, Integer> byVerdict() {
    Map<Verdict, Integer> by = new EnumMap<>(Verdict.class);
    for (Verdict v : Verdict.values()) {
      if (byVerdict[v.ordinal()] > 0) {
        by.put(v, whole(byVerdict[v.ordinal()]));
      }
    }
    return by;
  }

  Map<String, Integer> byMissed() {
    Map<String, Integer> by = new TreeMap<>();
    missed.forEach((id, m) -> by.put(id, whole(m.count)));
    return by;
  }

  /**
   * Of those that miss a check first, the one that comes nearest to passing it.
   *
   * @param most of how many checks, those that most miss first; of equals the first by their ids
   */
  Map<String, Setup> nearest(int most) {
    Map<String, Setup> by = new TreeMap<>();
    missed.entrySet().stream()
        .sorted(
            Comparator.<Map.Entry<String, Missed>>comparingLong(e -> -e.getValue().count)
                .thenComparing(Map.Entry.comparingByKey()))
        .limit(most)
        .forEach(e -> by.put(e.getKey(), e.getValue().nearest));
    return by;
  }

  private static int whole(long count) {
    if (count > Integer.MAX_VALUE) {
      throw new IllegalArgumentException(
          "offer, gear and places make "
              + count
              + " setups; at most "
              + Integer.MAX_VALUE
              + " can be planned");
    }
    return (int) count;
  }
}
