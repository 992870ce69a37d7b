package org.fallwright.core.answers;

import java.util.ArrayList;
import java.util.List;
import org.fallwright.core.plan.Judge;
import org.fallwright.core.plan.Judged;
import org.fallwright.core.plan.Setup;
import org.fallwright.core.plan.Verdict;
import org.fallwright.core.pull.PullSources;
import org.fallwright.core.site.Entry;
import org.fallwright.core.site.How;
import org.fallwright.core.site.Quantity;
import org.fallwright.core.site.Site;
import org.fallwright.core.units.DisplayUnits;

/**
 * How a setup stands between the ends of every range that was entered: the best and the worst
 * verdict, the least and the greatest need.
 *
 * <p>Up to {@value #TOGETHER} ranges are put at all their ends together; of more each by itself.
 * The setup as planned is among what is looked at, so the worst is never better than its verdict.
 *
 * @param ranges names of what was entered as a range; empty: nothing was
 * @param best best verdict at any of the ends
 * @param worst worst verdict
 * @param needFromN least pull needed at the tree [N]
 * @param needToN greatest [N]; NaN: at some end the tree cannot be moved so
 * @param sentence the answer in one sentence
 */
public record Between(
    List<String> ranges,
    Verdict best,
    Verdict worst,
    double needFromN,
    double needToN,
    String sentence) {
  private static final int TOGETHER = 4;

  public Between {
    ranges = List.copyOf(ranges);
  }

  /** For a setup of that site. */
  public static Between of(Site site, PullSources sources, Setup setup) {
    List<Entry> ranges =
        Entry.of(site).stream().filter(e -> e.quantity().how() == How.RANGE).toList();
    List<Site> ends = ranges.size() <= TOGETHER ? together(site, ranges) : alone(site, ranges);
    Verdict best = Verdict.CANNOT_JUDGE;
    Verdict worst = Verdict.WORKABLE;
    double from = Double.POSITIVE_INFINITY;
    double to = Double.NEGATIVE_INFINITY;
    for (Site s : ends) {
      Judged j = new Judge(s, sources).quick(setup);
      best = j.verdict().compareTo(best) < 0 ? j.verdict() : best;
      worst = worst.worse(j.verdict());
      double need = j.figures().pullNeededN();
      from = Double.isNaN(need) ? from : Math.min(from, need);
      to = Double.isNaN(need) || Double.isNaN(to) ? Double.NaN : Math.max(to, need);
    }
    from = Double.isInfinite(from) ? Double.NaN : from;
    return new Between(
        ranges.stream().map(Entry::name).toList(),
        best,
        worst,
        from,
        to,
        sentence(site.display().units(), ranges, best, worst, from, to));
  }

  private static List<Site> together(Site site, List<Entry> ranges) {
    List<Site> all = new ArrayList<>();
    all.add(site);
    List<Site> corners = List.of(site);
    for (Entry e : ranges) {
      List<Site> next = new ArrayList<>();
      for (Site s : corners) {
        next.add(e.put(s, at(e.quantity().low())));
        next.add(e.put(s, at(e.quantity().high())));
      }
      corners = next;
    }
    all.addAll(corners);
    return all;
  }

  private static List<Site> alone(Site site, List<Entry> ranges) {
    List<Site> all = new ArrayList<>();
    all.add(site);
    for (Entry e : ranges) {
      all.add(e.put(site, at(e.quantity().low())));
      all.add(e.put(site, at(e.quantity().high())));
    }
    return all;
  }

  /** An end of a range, with nothing to either side. */
  private static Quantity at(double end) {
    return new Quantity(end, How.RANGE, 0.0);
  }

  private static String sentence(
      DisplayUnits in, List<Entry> ranges, Verdict best, Verdict worst, double from, double to) {
    if (ranges.isEmpty()) {
      return "Nothing was entered as a range.";
    }
    String need =
        Double.isNaN(to)
            ? "; at some end the tree cannot be moved so"
            : "; pull needed "
                + in.both(u -> u.forceAtLeast(from))
                + " to "
                + in.both(u -> u.forceAtLeast(to));
    return (best == worst
            ? "At every end of the ranges " + best.word()
            : "Between the ends of the ranges from " + best.word() + " to " + worst.word())
        + need
        + ".";
  }
}
