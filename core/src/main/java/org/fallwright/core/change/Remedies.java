package org.fallwright.core.change;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.Optional;
import java.util.function.Predicate;
import java.util.stream.Stream;
import org.fallwright.core.plan.Check;
import org.fallwright.core.plan.Judge;
import org.fallwright.core.plan.Judged;
import org.fallwright.core.plan.Setup;
import org.fallwright.core.plan.Verdict;
import org.fallwright.core.pull.PullSources;
import org.fallwright.core.site.Copy;
import org.fallwright.core.site.CutPlan;
import org.fallwright.core.site.Site;

/**
 * The smallest changes that make a setup work, each verified by judging the changed site. A setup
 * that is not workable is to become at least tight, one that is tight workable.
 *
 * <p>Each thing that can be changed is turned by itself, further and further, until it will do;
 * where no single change does, two are tried together, the first at the setting that helps most and
 * then taken back as far as the second allows. Single changes come first, then by {@link Kind},
 * then the smaller. Between two looks that fail a change that would do may be missed, never the
 * other way.
 *
 * @param setup the setup as planned
 * @param verdict its verdict
 * @param stops ids of the checks that stop it
 * @param remedies what would make it work, smallest first; empty: nothing within reach
 * @param sentence the answer in one sentence
 */
public record Remedies(
    Setup setup, Verdict verdict, List<String> stops, List<Remedy> remedies, String sentence) {
  /** How many first changes are tried in a pair. */
  private static final int FIRSTS = 4;

  private static final Comparator<Judged> BEST_FIRST =
      Comparator.comparing(Judged::verdict)
          .thenComparingInt(Judged::failing)
          .thenComparing(Comparator.comparingDouble(Judged::standing).reversed());

  static final Comparator<Remedy> SMALLEST_FIRST =
      Comparator.<Remedy>comparingInt(r -> r.edits().size())
          .thenComparing(
              r -> r.edits().stream().map(Edit::kind).max(Comparator.naturalOrder()).orElseThrow())
          .thenComparingDouble(r -> r.edits().stream().mapToDouble(Edit::amount).sum());

  public Remedies {
    stops = List.copyOf(stops);
    remedies = List.copyOf(remedies);
  }

  /** The changes for a setup of that site; none where it is workable already. */
  public static Remedies of(Site site, PullSources sources, Setup setup) {
    return of(site, sources, setup, true);
  }

  /** The same; pairs of changes are tried only where asked for, for they take long. */
  static Remedies of(Site site, PullSources sources, Setup setup, boolean pairs) {
    Judged before = new Judge(site, sources).judge(setup);
    Verdict goal = before.verdict() == Verdict.TIGHT ? Verdict.WORKABLE : Verdict.TIGHT;
    List<Remedy> found = new ArrayList<>();
    if (before.verdict() != Verdict.WORKABLE) {
      Search search = new Search(site, sources);
      Edits edits = new Edits(site, setup, sources);
      for (Dial d : edits.dials()) {
        search.smallest(d, goal).ifPresent(e -> found.addAll(search.toBetter(d, e)));
      }
      if (found.isEmpty() && pairs) {
        found.addAll(search.pairs(edits, before, goal));
      }
      found.sort(SMALLEST_FIRST);
    }
    List<String> stops =
        before.checks().stream()
            .filter(c -> c.verdict().compareTo(goal) > 0)
            .map(Check::id)
            .toList();
    return new Remedies(setup, before.verdict(), stops, found, sentence(before, found));
  }

  private static String sentence(Judged before, List<Remedy> found) {
    if (before.verdict() == Verdict.WORKABLE) {
      return "Workable as it is; nothing needs to be changed.";
    }
    if (found.isEmpty()) {
      return "No change within reach makes this setup "
          + (before.verdict() == Verdict.TIGHT ? "workable" : "work")
          + "; as planned, "
          + before.weakest().id()
          + " stands in the way.";
    }
    return "The smallest change: " + found.get(0).sentence();
  }

  /** Judges edits, one judge for each site. */
  private static final class Search {
    private final PullSources sources;
    private Site last;
    private Judge judge;

    Search(Site site, PullSources sources) {
      this.sources = sources;
      last = site;
      judge = new Judge(site, sources);
    }

    /** What a plan of the site may choose from is no matter to a judge, who is told the setup. */
    private Judge judge(Site changed) {
      CutPlan cut = Copy.with(changed.cut(), "hingeThicknessesM", last.cut().hingeThicknessesM());
      Site site = Copy.with(Copy.with(changed, "offer", last.offer()), "cut", cut);
      if (!site.equals(last)) {
        last = site;
        judge = new Judge(site, sources);
      }
      return judge;
    }

    Judged quick(Edit e) {
      return judge(e.site()).quick(e.setup());
    }

    Remedy remedy(List<Edit> edits) {
      Edit e = edits.get(edits.size() - 1);
      return Remedy.of(edits, judge(e.site()).judge(e.setup()));
    }

    Optional<Edit> smallest(Dial d, Verdict goal) {
      Predicate<Edit> good = e -> quick(e).verdict().compareTo(goal) <= 0;
      return d.smallest(good);
    }

    /** The change, and where it only makes the setup tight the greater one that does it. */
    List<Remedy> toBetter(Dial d, Edit e) {
      Remedy first = remedy(List.of(e));
      return first.verdict() == Verdict.WORKABLE
          ? List.of(first)
          : Stream.concat(
                  Stream.of(first),
                  smallest(d, Verdict.WORKABLE).map(b -> remedy(List.of(b))).stream())
              .toList();
    }

    /** Pairs: the firsts that help most, each with the smallest second. */
    List<Remedy> pairs(Edits edits, Judged before, Verdict goal) {
      record Helps(Dial dial, int step, Edit edit, Judged after) {}
      List<Helps> firsts = new ArrayList<>();
      for (Dial d : edits.dials()) {
        Helps best = null;
        for (int n = 1; n <= d.most(); n += d.stride()) {
          Edit e = d.edit(n);
          if (e == null) {
            break;
          }
          Helps h = new Helps(d, n, e, quick(e));
          best = best == null || BEST_FIRST.compare(h.after, best.after) < 0 ? h : best;
        }
        if (best != null && BEST_FIRST.compare(best.after, before) < 0) {
          firsts.add(best);
        }
      }
      firsts.sort((a, b) -> BEST_FIRST.compare(a.after, b.after));
      List<Remedy> found = new ArrayList<>();
      for (Helps first : firsts.subList(0, Math.min(FIRSTS, firsts.size()))) {
        Edit one = first.edit;
        List<Dial> seconds = new Edits(one.site(), one.setup(), edits.sources).dials();
        for (int i = 0; i < seconds.size(); i++) {
          Edit two = smallest(seconds.get(i), goal).orElse(null);
          if (two != null && two.kind() != one.kind()) {
            found.add(remedy(List.of(one, two)));
          }
        }
      }
      return found;
    }
  }
}
