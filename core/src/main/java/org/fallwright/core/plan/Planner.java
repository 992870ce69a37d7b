package org.fallwright.core.plan;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.EnumMap;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.TreeMap;
import java.util.concurrent.atomic.AtomicInteger;
import java.util.function.BooleanSupplier;
import java.util.function.DoubleConsumer;
import java.util.stream.IntStream;
import org.fallwright.core.pull.PullSources;
import org.fallwright.core.pull.SourceFault;
import org.fallwright.core.site.Site;

/**
 * Judges every candidate of a site and ranks them: the exhaustive search.
 *
 * <p>Better verdict first, then fewer checks that fail, then the higher standing of the weakest
 * link, then fewer parts, then the stronger next-weakest link and so on, then the lower lay and the
 * candidates' own order, so that the answer is the same on every run.
 */
public final class Planner {
  /** The order of a plan's setups. */
  public static final Comparator<Judged> BEST_FIRST =
      Comparator.comparing(Judged::verdict)
          .thenComparingInt(Judged::failing)
          .thenComparing(Comparator.comparingDouble(Judged::standing).reversed())
          .thenComparing(j -> j.loads().size())
          .thenComparing(Judged::standings, Planner::nextWeakest)
          .thenComparing(j -> j.setup().layDeg());

  /**
   * Of two lists of standings, lowest first, the one whose next weakest is stronger comes first.
   */
  private static int nextWeakest(List<Double> a, List<Double> b) {
    for (int i = 0; i < Math.min(a.size(), b.size()); i++) {
      int c = Double.compare(b.get(i), a.get(i));
      if (c != 0) {
        return c;
      }
    }
    return Integer.compare(a.size(), b.size());
  }

  private final PullSources sources;

  public Planner(PullSources sources) {
    this.sources = sources;
  }

  /** Plans without telling anybody how far it is. */
  public Plan plan(Site site) {
    return plan(site, share -> {}, () -> false);
  }

  /**
   * Plans a site.
   *
   * @param progress told the share that is done, 0 to 1, from any thread
   * @param cancelled asked often; once it says yes the search stops
   * @throws java.util.concurrent.CancellationException where it was cancelled
   * @throws IllegalArgumentException one sentence, where the site names what is not known
   */
  public Plan plan(Site site, DoubleConsumer progress, BooleanSupplier cancelled) {
    Judge judge = new Judge(site, sources);
    LeftOut out = new LeftOut(site);
    Ways ways = new Ways(site.atHand(), sources, out);
    List<Setup> all = ways.all();
    List<Double> lays = ways.lays();
    AtomicInteger done = new AtomicInteger();
    List<Tally> tallies =
        IntStream.range(0, all.size())
            .parallel()
            .mapToObj(
                i -> {
                  Tally tally = tally(judge, all.get(i), lays, out, cancelled);
                  progress.accept((double) done.incrementAndGet() / all.size());
                  return tally;
                })
            .toList();
    while (true) {
      try {
        return gathered(judge, ways, all, tallies, out);
      } catch (SourceFault fault) { // not before now: gather again without it
        if (!out.add(fault)) {
          throw fault;
        }
      }
    }
  }

  private Tally tally(
      Judge judge, Setup way, List<Double> lays, LeftOut out, BooleanSupplier cancelled) {
    try {
      return sources.asking(
          () -> {
            Tally tally = new Tally();
            for (double lay : lays) {
              if (cancelled.getAsBoolean()) {
                throw new java.util.concurrent.CancellationException();
              }
              if (out.uses(way)) {
                break;
              }
              tally.add(judge.quick(way.withLay(lay)));
            }
            return tally;
          });
    } catch (SourceFault fault) {
      out.add(fault);
      return new Tally();
    }
  }

  private static Plan gathered(
      Judge judge, Ways ways, List<Setup> all, List<Tally> tallies, LeftOut out) {
    Tally total = new Tally();
    List<Judged> best = new ArrayList<>();
    for (int i = 0; i < all.size(); i++) {
      if (!out.uses(all.get(i))) {
        best.add(tallies.get(i).best);
        total.merge(tallies.get(i));
      }
    }
    int judged = best.size() * ways.lays().size();
    best = shown(best, judge);
    total.bestRejected.replaceAll((id, j) -> judge.judge(j.setup()));
    List<String> notes = new ArrayList<>(ways.notes());
    notes.addAll(out.notes());
    notes.addAll(judge.notes());
    return new Plan(best, judged, total.byVerdict, total.byBinding, total.bestRejected, notes);
  }

  /**
   * The best lay of each way, best way first. Of ways that differ only in the pull line one is
   * kept: the better, or of equals the first, for lines are tried from the shortest.
   */
  private static List<Judged> shown(List<Judged> best, Judge judge) {
    Map<Setup, Judged> byWay = new LinkedHashMap<>();
    for (Judged j : best) {
      byWay.merge(
          j.setup().withLay(0).withLine(""), j, (a, b) -> BEST_FIRST.compare(b, a) < 0 ? b : a);
    }
    return byWay.values().stream().sorted(BEST_FIRST).map(j -> judge.judge(j.setup())).toList();
  }

  /** What one way brought over all its lays. */
  private static final class Tally {
    private Judged best;
    private final Map<Verdict, Integer> byVerdict = new EnumMap<>(Verdict.class);
    private final Map<String, Integer> byBinding = new TreeMap<>();
    private final Map<String, Judged> bestRejected = new TreeMap<>();

    void add(Judged j) {
      best = best == null || BEST_FIRST.compare(j, best) < 0 ? j : best;
      byVerdict.merge(j.verdict(), 1, Integer::sum);
      if (j.verdict() == Verdict.NOT_WORKABLE) {
        String id = j.weakest().id();
        byBinding.merge(id, 1, Integer::sum);
        bestRejected.merge(id, j, (a, b) -> BEST_FIRST.compare(b, a) < 0 ? b : a);
      }
    }

    void merge(Tally t) {
      t.byVerdict.forEach((k, v) -> byVerdict.merge(k, v, Integer::sum));
      t.byBinding.forEach((k, v) -> byBinding.merge(k, v, Integer::sum));
      t.bestRejected.forEach(
          (k, v) -> bestRejected.merge(k, v, (a, b) -> BEST_FIRST.compare(b, a) < 0 ? b : a));
    }
  }
}
