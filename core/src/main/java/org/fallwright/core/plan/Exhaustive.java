package org.fallwright.core.plan;

import java.util.List;
import java.util.concurrent.CancellationException;
import java.util.function.BooleanSupplier;
import java.util.function.DoubleConsumer;
import org.fallwright.core.pull.PullSources;
import org.fallwright.core.site.Site;

/**
 * Looks at every setup of a site by every check: the slow search, to which the quick one of {@link
 * Planner} is held.
 */
public final class Exhaustive {
  private final PullSources sources;

  public Exhaustive(PullSources sources) {
    this.sources = sources;
  }

  /** Plans a site; the same answer as {@link Planner#plan(Site)}. */
  public Plan plan(Site site) {
    return plan(site, share -> {}, () -> false);
  }

  Plan plan(Site site, DoubleConsumer progress, BooleanSupplier cancelled) {
    return LeftOut.without(
        site, out -> answer(site, out, Plan.MOST_WAYS, progress, cancelled).plan());
  }

  /**
   * @param out sources that failed
   * @param most how many ways are shown at most
   */
  Answer answer(
      Site given, LeftOut out, int most, DoubleConsumer progress, BooleanSupplier cancelled) {
    Judge judge = new Judge(given, sources);
    Ways ways = new Ways(judge.site(), sources, out);
    double[] lays = ways.lays();
    Tally tally = new Tally();
    Top top = new Top(most);
    long way = 0;
    long order = 0;
    int done = 0;
    for (Ways.End end : ways.ends()) {
      for (int group = 0; group < ways.groups(); group++) {
        for (List<String> path : ways.paths(end, group)) {
          Route route = Run.route(judge, end, end.way(path, ""));
          List<String> lines = ways.lines(end, path, route);
          for (int l = 0; l < lines.size(); l++) {
            Setup setup = end.way(path, lines.get(l));
            for (double lay : lays) {
              if (cancelled.getAsBoolean()) {
                throw new CancellationException();
              }
              Look look = judge.look(setup.withLay(lay));
              if (look.verdict() == Verdict.NOT_WORKABLE) {
                tally.miss(look.missed(), setup, lay, order++);
              } else {
                tally.count(look.verdict(), 1);
                order++;
              }
              top.offer(way, l, setup, lay, look);
            }
          }
          way++;
        }
      }
      progress.accept((double) ++done / ways.ends().size());
    }
    return new Answer(judge, ways, out, tally, top);
  }
}
