package org.fallwright.core.change;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import org.fallwright.core.advice.NotByPulling;
import org.fallwright.core.plan.Judged;
import org.fallwright.core.plan.Plan;
import org.fallwright.core.plan.Setup;
import org.fallwright.core.plan.Verdict;
import org.fallwright.core.pull.PullSources;
import org.fallwright.core.site.Site;

/**
 * The smallest changes that make anything on a site work, where nothing does: those of its leading
 * setups. Where no change is in reach, that pulling is not the method.
 *
 * @param binding how many setups each check rules out first, most first
 * @param remedies smallest first, each with the setup that it is for
 * @param sentence the answer in one sentence
 */
public record SiteRemedies(List<Binding> binding, List<For> remedies, String sentence) {
  /** How many leading setups are looked at. */
  private static final int LEADING = 6;

  /** For how many of them two changes together are tried, where none does alone. */
  private static final int PAIRED = 2;

  /** A check and how many setups it is the weakest link of. */
  public record Binding(String check, int setups) {}

  /** A change and the setup that it makes work. */
  public record For(Setup setup, Remedy remedy) {}

  public SiteRemedies {
    binding = List.copyOf(binding);
    remedies = List.copyOf(remedies);
  }

  /** Of a planned site; none where something is workable or tight. */
  public static SiteRemedies of(Site site, PullSources sources, Plan plan) {
    boolean works = plan.ranked().stream().anyMatch(j -> j.verdict().compareTo(Verdict.TIGHT) <= 0);
    List<Setup> leading =
        works ? List.of() : plan.ranked().stream().limit(LEADING).map(Judged::setup).toList();
    List<For> found = new ArrayList<>();
    for (int round = 0; round < 2 && found.isEmpty(); round++) {
      boolean pairs = round == 1;
      for (Setup s :
          leading.subList(0, pairs ? Math.min(PAIRED, leading.size()) : leading.size())) {
        for (Remedy r : Remedies.of(site, sources, s, pairs).remedies()) {
          found.add(new For(s, r));
        }
      }
    }
    found.sort((a, b) -> Remedies.SMALLEST_FIRST.compare(a.remedy(), b.remedy()));
    List<Binding> binding =
        plan.byBindingCheck().entrySet().stream()
            .sorted(
                Map.Entry.<String, Integer>comparingByValue()
                    .reversed()
                    .thenComparing(Map.Entry.comparingByKey()))
            .map(e -> new Binding(e.getKey(), e.getValue()))
            .toList();
    List<For> once = once(found);
    return new SiteRemedies(binding, once, sentence(plan, works, once));
  }

  /** The same change may help several setups: the first says it. */
  private static List<For> once(List<For> found) {
    Map<String, For> byWords = new LinkedHashMap<>();
    found.forEach(f -> byWords.putIfAbsent(f.remedy().sentence(), f));
    return List.copyOf(byWords.values());
  }

  private static String sentence(Plan plan, boolean works, List<For> found) {
    if (works) {
      return "Something on this site works as it is; ask for one setup by its rank.";
    }
    if (!found.isEmpty()) {
      return "Nothing works as it is. The smallest change: " + found.get(0).remedy().sentence();
    }
    return NotByPulling.of(plan)
        .map(n -> "No change looked at makes anything work. " + n.sentence())
        .orElse("No change looked at makes anything work.");
  }
}
