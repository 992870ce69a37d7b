package org.fallwright.core.plan;

import java.util.Comparator;
import java.util.List;
import java.util.function.BooleanSupplier;
import java.util.function.DoubleConsumer;
import org.fallwright.core.pull.PullSources;
import org.fallwright.core.site.Site;

/**
 * Finds the best setups of a site: the quick search.
 *
 * <p>The answer is that of {@link Exhaustive}, to the last figure: the best lay of each way, best
 * way first, the best {@link Plan#MOST_WAYS} of them; how many setups have each verdict; and by
 * which check they are ruled out. Better verdict first, then fewer checks that fail, then the
 * higher standing of the weakest link, then fewer parts, then the stronger next-weakest link and so
 * on, then the lower lay and the candidates' own order, so that the answer is the same on every
 * run. A source that fails while it is asked is left out with its reason; the rest is planned
 * without it.
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
    return LeftOut.without(
        site,
        out -> {
          try {
            return new Search(site, sources, out, Plan.MOST_WAYS, progress, cancelled)
                .answer()
                .plan();
          } catch (Run.Differs e) {
            // a source that does not keep to its contract can only be asked again and again
            return new Exhaustive(sources)
                .answer(site, out, Plan.MOST_WAYS, progress, cancelled)
                .plan();
          }
        });
  }
}
