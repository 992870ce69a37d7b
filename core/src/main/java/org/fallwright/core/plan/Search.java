package org.fallwright.core.plan;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.concurrent.CancellationException;
import java.util.concurrent.atomic.AtomicInteger;
import java.util.concurrent.atomic.AtomicReference;
import java.util.function.BooleanSupplier;
import java.util.function.Consumer;
import java.util.function.DoubleConsumer;
import java.util.stream.IntStream;
import org.fallwright.core.line.Point3;
import org.fallwright.core.pull.PullSources;
import org.fallwright.core.pull.SourceFault;
import org.fallwright.core.site.Site;

/**
 * One quick search.
 *
 * <p>What several setups have in common is worked out once: of each lay over each first support
 * where the tree lands and what it asks ({@link Fall}), of each leg what it passes, of each way
 * what bears it ({@link Run}). A setup is asked the cheap questions first and let go at the first
 * that it misses; only one that misses none of them is judged in full. Of the ways that do not work
 * at all those that may yet be among the best are then looked at in the order of what they can be
 * at best, until no bound is better than what is known.
 */
final class Search {
  /** Shares of the work told as progress. */
  private static final double FALLS = 0.3;

  private static final double WAYS = 0.6;

  /** More than there are lines and pairs of them. */
  private static final long MOST_LINES = 1 << 16;

  private final PullSources sources;
  private final LeftOut out;
  private final Judge judge;
  private final Ways ways;
  private final double[] lays;
  private final Run.Shared shared;
  private final Verdict failed;
  private final int most;
  private final Top top;
  private final DoubleConsumer progress;
  private final BooleanSupplier cancelled;
  private final Map<Support, Fall[]> falls = new HashMap<>();
  private final AtomicReference<SourceFault> fault = new AtomicReference<>();

  /** A first support: all that a fall hangs on beside its lay. */
  private record Support(double attachM, double hingeM, Point3 bearing, double errorM) {
    static Support of(Ways.End end, Route route) {
      return new Support(
          end.attachHeightM(), end.hingeThicknessM(), route.points().get(1), route.bearingErrorM());
    }
  }

  /** One end and one group of its redirect paths: what one thread does at a time. */
  private final class Unit {
    private final Ways.End end;
    private final int group;
    private final long firstWay;
    private final Tally tally = new Tally();
    private final List<Run.Known> known = new ArrayList<>();
    private final List<long[]> looked = new ArrayList<>();
    private final List<AtBest> hopes = new ArrayList<>();

    Unit(Ways.End end, int group, long firstWay) {
      this.end = end;
      this.group = group;
      this.firstWay = firstWay;
    }

    /** Calls for each way. */
    void each(Each each) {
      long way = firstWay;
      int at = 0;
      for (List<String> path : ways.paths(end, group)) {
        if (cancelled.getAsBoolean()) {
          throw new CancellationException();
        }
        if (fault.get() != null) {
          return;
        }
        Route route = Run.route(judge, end, end.way(path, ""));
        Fall[] over = falls.get(Support.of(end, route));
        List<String> lines = ways.lines(end, path, route);
        for (int l = 0; l < lines.size(); l++) {
          each.way(new Way(this, at++, way, l, end.way(path, lines.get(l)), route, over));
        }
        way++;
      }
    }
  }

  private interface Each {
    void way(Way way);
  }

  /**
   * A way as the search goes through it.
   *
   * @param at its number in its unit
   * @param number its number among all, whatever its line
   * @param line number of its line
   */
  private record Way(
      Unit unit, int at, long number, int line, Setup setup, Route route, Fall[] falls) {}

  /**
   * @param out sources that failed
   * @param most how many ways are shown at most
   */
  Search(
      Site given,
      PullSources sources,
      LeftOut out,
      int most,
      DoubleConsumer progress,
      BooleanSupplier cancelled) {
    this.most = most;
    top = new Top(most);
    this.sources = sources;
    this.out = out;
    judge = new Judge(given, sources);
    ways = new Ways(judge.site(), sources, out);
    lays = ways.lays();
    shared = new Run.Shared(judge);
    failed = Verdict.NOT_WORKABLE.worse(shared.known().verdict());
    this.progress = progress;
    this.cancelled = cancelled;
  }

  /** Searches. */
  Answer answer() {
    falls();
    List<Unit> units = units();
    AtomicInteger done = new AtomicInteger();
    asking(
        units,
        u -> {
          u.each(way -> first(way));
          progress.accept(FALLS + WAYS * done.incrementAndGet() / units.size());
        });
    Tally tally = new Tally();
    units.forEach(u -> tally.merge(u.tally));
    top.tighten();
    nearest(units);
    asking(units, u -> u.each(this::rest));
    progress.accept(1);
    return new Answer(judge, ways, out, tally, top);
  }

  /**
   * Does pieces of work that ask sources, side by side. Once a source has failed nothing more is
   * asked of any, for all begins again without it.
   */
  private <T> void asking(List<T> pieces, Consumer<T> work) {
    pieces.parallelStream()
        .forEach(
            piece -> {
              if (fault.get() == null) {
                try {
                  sources.asking(
                      () -> {
                        work.accept(piece);
                        return null;
                      });
                } catch (SourceFault failed) {
                  fault.compareAndSet(null, failed);
                }
              }
            });
    if (fault.get() != null) {
      throw fault.get();
    }
  }

  /** Every lay over every first support. */
  private void falls() {
    List<Support> supports = new ArrayList<>();
    List<Ways.End> ends = new ArrayList<>();
    List<Route> routes = new ArrayList<>();
    for (Ways.End end : ways.ends()) {
      for (List<String> path : ways.paths(end, 0)) {
        Route route = Run.route(judge, end, end.way(path, ""));
        Support s = Support.of(end, route);
        if (falls.putIfAbsent(s, new Fall[lays.length]) == null) {
          supports.add(s);
          ends.add(end);
          routes.add(route);
        }
      }
    }
    AtomicInteger done = new AtomicInteger();
    IntStream.range(0, supports.size())
        .parallel()
        .forEach(
            i -> {
              Fall[] over = falls.get(supports.get(i));
              for (int lay = 0; lay < lays.length; lay++) {
                if (cancelled.getAsBoolean()) {
                  throw new CancellationException();
                }
                over[lay] = judge.fall(ends.get(i), routes.get(i), lays[lay]);
              }
              progress.accept(FALLS * done.incrementAndGet() / supports.size());
            });
  }

  private List<Unit> units() {
    List<Unit> units = new ArrayList<>();
    long way = 0;
    for (Ways.End end : ways.ends()) {
      for (int group = 0; group < ways.groups(); group++) {
        units.add(new Unit(end, group, way));
        way += ways.paths(end, group).size();
      }
    }
    return units;
  }

  /** Counts a way's setups, and looks in full at each that nothing cheap rules out. */
  private void first(Way way) {
    Unit unit = way.unit;
    Run run = new Run(shared, unit.end, way.setup, way.route);
    long[] looked = new long[(lays.length + 63) / 64];
    long order = (way.number * MOST_LINES + way.line) * lays.length;
    boolean judged = shared.known().verdict() != Verdict.CANNOT_JUDGE;
    for (int i = 0; i < lays.length; i++) {
      Fall fall = way.falls[i];
      Slice missed = run.missed(fall);
      Verdict verdict = Verdict.NOT_WORKABLE;
      if (missed == null) {
        looked[i >> 6] |= 1L << i;
        Look look = run.look(fall);
        top.offer(way.number, way.line, way.setup, lays[i], look);
        missed = look.missed();
        verdict = look.verdict();
      }
      if (!judged) {
        unit.tally.count(Verdict.CANNOT_JUDGE, 1);
      } else if (missed != null) {
        unit.tally.miss(missed, way.setup, lays[i], order + i);
      } else {
        unit.tally.count(verdict, 1);
      }
    }
    unit.known.add(run.known());
    unit.looked.add(looked);
  }

  private static boolean isLooked(long[] looked, int lay) {
    return (looked[lay >> 6] & 1L << lay) != 0;
  }

  /** A way at the best that it may be on a lay not yet looked at. */
  private record AtBest(Way way, int lay, int failing, double standing) {
    private static final Comparator<AtBest> BEST_FIRST =
        Comparator.comparingInt(AtBest::failing)
            .thenComparing(Comparator.comparingDouble(AtBest::standing).reversed());
  }

  /**
   * Looks at the lay of each way that may be its best, the most hopeful way first, until enough are
   * known that the rest cannot be among the best.
   */
  private void nearest(List<Unit> units) {
    if (!top.open(-1, failed, 0, Double.POSITIVE_INFINITY)) {
      return;
    }
    asking(
        units,
        u ->
            u.each(
                way -> {
                  AtBest best = atBest(way);
                  if (best != null) {
                    u.hopes.add(best);
                  }
                }));
    List<AtBest> hopes = new ArrayList<>();
    units.forEach(u -> hopes.addAll(u.hopes));
    hopes.sort(AtBest.BEST_FIRST);
    int batch = Math.max(64, most);
    for (int from = 0; from < hopes.size(); from += batch) {
      AtBest next = hopes.get(from);
      if (!top.open(-1, failed, next.failing, next.standing)) {
        return;
      }
      asking(
          hopes.subList(from, Math.min(from + batch, hopes.size())),
          h -> look(new Run(shared, h.way.unit.end, h.way.setup, h.way.route), h));
      top.tighten();
    }
  }

  private void look(Run run, AtBest hope) {
    Way way = hope.way;
    way.unit.looked.get(way.at)[hope.lay >> 6] |= 1L << hope.lay;
    top.offer(way.number, way.line, way.setup, lays[hope.lay], run.look(way.falls[hope.lay]));
  }

  /** The lay not yet looked at that may be best; null: none may be among the best. */
  private AtBest atBest(Way way) {
    Run.Known known = way.unit.known.get(way.at);
    long[] looked = way.unit.looked.get(way.at);
    Fall.Bound bound = new Fall.Bound();
    int best = -1;
    int failing = 0;
    double standing = 0;
    for (int i = 0; i < lays.length; i++) {
      if (isLooked(looked, i)) {
        continue;
      }
      way.falls[i].bound(bound, known);
      if (best < 0
          || bound.failing() < failing
          || bound.failing() == failing && bound.standing() > standing) {
        best = i;
        failing = bound.failing();
        standing = bound.standing();
      }
    }
    double stands = failed == Verdict.CANNOT_JUDGE ? Double.NEGATIVE_INFINITY : standing;
    return best >= 0 && top.open(way.number, failed, failing, stands)
        ? new AtBest(way, best, failing, stands)
        : null;
  }

  /** Looks at every further lay of a way that may be among the best. */
  private void rest(Way way) {
    Run run = null;
    for (AtBest next = atBest(way); next != null; next = atBest(way)) {
      run = run == null ? new Run(shared, way.unit.end, way.setup, way.route) : run;
      look(run, next);
    }
  }
}
