package org.fallwright.core.doubt;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import java.util.concurrent.CancellationException;
import java.util.function.BooleanSupplier;
import java.util.function.DoubleConsumer;
import java.util.stream.Stream;
import org.fallwright.core.plan.Judge;
import org.fallwright.core.plan.Judged;
import org.fallwright.core.plan.Plan;
import org.fallwright.core.plan.Planner;
import org.fallwright.core.pull.PullSources;
import org.fallwright.core.pull.SourceFault;
import org.fallwright.core.site.Site;

/**
 * THE way to a plan: the search with its quick spreads, then the leading setups judged again over
 * the trials, which decide. A setup that falls back by it lets the next one up, until all that lead
 * are judged over the trials; each says itself which way it was.
 */
public final class Doubted {
  /** How many setups at the head of a plan are judged over the trials. */
  public static final int LEADING = 12;

  /** Share of the work that the search is. */
  private static final double SEARCH = 0.9;

  private Doubted() {}

  /** Plans without telling anybody how far it is. */
  public static Plan plan(Site site, PullSources sources) {
    return plan(site, sources, share -> {}, () -> false);
  }

  /**
   * Plans a site.
   *
   * @param progress told the share that is done, 0 to 1, from any thread
   * @param cancelled asked often; once it says yes the work stops
   * @throws CancellationException where it was cancelled
   * @throws IllegalArgumentException one sentence, where the site names what is not known
   */
  public static Plan plan(
      Site site, PullSources sources, DoubleConsumer progress, BooleanSupplier cancelled) {
    Plan searched =
        new Planner(sources).plan(site, share -> progress.accept(SEARCH * share), cancelled);
    Plan plan = decided(site, sources, searched, cancelled);
    progress.accept(1);
    return plan;
  }

  /** A searched plan with its leading setups judged over the trials. */
  static Plan decided(Site site, PullSources sources, Plan plan, BooleanSupplier cancelled) {
    if (plan.ranked().isEmpty()) {
      return plan;
    }
    Doubts doubts = new Doubts(site, sources);
    List<Judged> ranked = new ArrayList<>(plan.ranked());
    List<String> faults = new ArrayList<>();
    int first = undecided(ranked);
    while (first >= 0) {
      if (cancelled.getAsBoolean()) {
        throw new CancellationException();
      }
      try {
        ranked.set(first, doubts.judge(ranked.get(first).setup()));
      } catch (SourceFault fault) {
        leaveOut(site, ranked, fault);
        faults.add(fault.getMessage() + " Its setups are left out.");
      }
      first = undecided(ranked);
      if (first < 0) {
        ranked.sort(Planner.BEST_FIRST);
        first = undecided(ranked);
      }
    }
    return new Plan(
        ranked,
        plan.judged(),
        plan.byVerdict(),
        plan.byBindingCheck(),
        plan.bestRejected(),
        Stream.of(plan.notes(), faults, List.of(said(ranked.size())))
            .flatMap(List::stream)
            .toList(),
        plan.sources());
  }

  /** Takes out the setups of a source that failed only now, when the search was over. */
  private static void leaveOut(Site site, List<Judged> ranked, SourceFault fault) {
    boolean any =
        ranked.removeIf(
            j ->
                is(site, j.setup().source(), fault)
                    || j.setup().driver() != null && is(site, j.setup().driver().source(), fault));
    if (!any) {
      throw fault;
    }
  }

  private static boolean is(Site site, String source, SourceFault fault) {
    return site.source(source).orElseThrow().plugin().equals(fault.sourceId());
  }

  private static String said(int ranked) {
    return String.format(
        Locale.ROOT,
        "The first %d setups are judged over %,d ways the site may be, all inputs at once; the"
            + " search and the others go by one input at a time, which is a little less strict.",
        Math.min(LEADING, ranked),
        Sampler.TRIALS);
  }

  /** A plan judged again for its words, each setup the way it was; no search. */
  public static Plan again(Site site, PullSources sources, Plan plan) {
    Doubts doubts = new Doubts(site, sources);
    Judge quick = new Judge(site, sources);
    Map<String, Judged> rejected = new LinkedHashMap<>();
    plan.bestRejected().forEach((id, j) -> rejected.put(id, quick.judge(j.setup())));
    return new Plan(
        plan.ranked().stream()
            .map(j -> j.figures().sampled() ? doubts.judge(j.setup()) : quick.judge(j.setup()))
            .toList(),
        plan.judged(),
        plan.byVerdict(),
        plan.byBindingCheck(),
        rejected,
        plan.notes(),
        plan.sources());
  }

  /** The first of the leading setups that is not judged over the trials; −1: all are. */
  private static int undecided(List<Judged> ranked) {
    for (int i = 0; i < Math.min(LEADING, ranked.size()); i++) {
      if (!ranked.get(i).figures().sampled()) {
        return i;
      }
    }
    return -1;
  }
}
