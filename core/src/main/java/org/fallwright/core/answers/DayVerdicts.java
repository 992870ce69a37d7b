package org.fallwright.core.answers;

import java.util.ArrayList;
import java.util.List;
import java.util.stream.Collectors;
import org.fallwright.core.change.DayOf;
import org.fallwright.core.plan.Judge;
import org.fallwright.core.plan.Judged;
import org.fallwright.core.plan.Setup;
import org.fallwright.core.plan.Verdict;
import org.fallwright.core.pull.PullSources;
import org.fallwright.core.site.Case;
import org.fallwright.core.site.Site;

/**
 * The named cases of a site, each with a verdict for a setup: works in this case, not in that.
 *
 * @param setup the setup
 * @param days its verdict in each case, in the order of the file; where the file has none, as
 *     entered
 * @param sentence the answer in one sentence
 */
public record DayVerdicts(Setup setup, List<Day> days, String sentence) {
  /**
   * One case.
   *
   * @param id what it is called
   * @param verdict verdict then
   * @param weakest id of the check that decides then
   * @param pullMargin pull margin then
   * @param finishBy when the tree must be down; null: not said
   * @param why the verdict in one sentence
   */
  public record Day(
      String id, Verdict verdict, String weakest, double pullMargin, String finishBy, String why) {}

  private static final Case AS_ENTERED =
      new Case("as entered", null, null, null, null, null, null, null);

  public DayVerdicts {
    days = List.copyOf(days);
  }

  /** For each of some setups; every case is judged by one judge. */
  public static List<DayVerdicts> of(Site site, PullSources sources, List<Setup> setups) {
    List<Case> cases = site.cases().isEmpty() ? List.of(AS_ENTERED) : site.cases();
    List<List<Day>> days = new ArrayList<>();
    setups.forEach(s -> days.add(new ArrayList<>()));
    for (Case c : cases) {
      Judge judge = new Judge(DayOf.the(c, site), sources);
      for (int i = 0; i < setups.size(); i++) {
        Judged j = judge.judge(setups.get(i));
        days.get(i)
            .add(
                new Day(
                    c.id(),
                    j.verdict(),
                    j.weakest().id(),
                    j.figures().pullMargin(),
                    c.finishBy(),
                    j.sentence()));
      }
    }
    List<DayVerdicts> all = new ArrayList<>();
    for (int i = 0; i < setups.size(); i++) {
      all.add(new DayVerdicts(setups.get(i), days.get(i), sentence(days.get(i))));
    }
    return all;
  }

  private static String sentence(List<Day> days) {
    List<String> said = new ArrayList<>();
    for (Verdict v : Verdict.values()) {
      String in =
          days.stream()
              .filter(d -> d.verdict() == v)
              .map(Day::id)
              .collect(Collectors.joining(", "));
      if (!in.isEmpty()) {
        said.add(v.word() + ": " + in);
      }
    }
    String text = String.join("; ", said);
    return Character.toUpperCase(text.charAt(0)) + text.substring(1) + ".";
  }
}
