package org.fallwright.ui.setups;

import java.util.ArrayList;
import java.util.List;
import org.fallwright.core.plan.Judged;
import org.fallwright.core.plan.Plan;
import org.fallwright.core.plan.Verdict;
import org.fallwright.ui.text.Amounts;
import org.fallwright.ui.text.Messages;

/**
 * What the list of ways says.
 *
 * @param summary how many setups were judged, and how many of them work
 * @param ranked the setups worth showing, best first
 * @param ruledOut what rules the others out, most often first, each with the setup that comes
 *     nearest to passing it
 * @param notes what was left out
 */
public record Ways(String summary, List<Row> ranked, List<Row> ruledOut, List<String> notes) {
  /** Ways that do not work are shown up to this many; the reasons under them stand for the rest. */
  private static final int NOT_WORKABLE_SHOWN = 12;

  /**
   * A line of the list.
   *
   * @param setup what it stands for; null: nothing to look at
   * @param lead rank, or how many setups fail by the reason
   * @param margin at the right end
   */
  public record Row(
      Judged setup, Verdict verdict, String lead, String title, String detail, String margin) {}

  public static Ways of(Plan plan, Amounts amounts) {
    List<Row> ranked = new ArrayList<>();
    int failing = 0;
    for (Judged j : plan.ranked()) {
      if (j.verdict() == Verdict.NOT_WORKABLE && ++failing > NOT_WORKABLE_SHOWN) {
        break;
      }
      ranked.add(
          new Row(
              j,
              j.verdict(),
              String.valueOf(ranked.size() + 1),
              Way.name(Way.title(j.setup())),
              Way.detail(j, amounts),
              j.weakest() == null ? "" : amounts.ratio(j.weakest().ratio())));
    }
    List<Row> out = new ArrayList<>();
    plan.byBindingCheck().entrySet().stream()
        .sorted((a, b) -> b.getValue() - a.getValue())
        .forEach(
            e -> {
              Judged best = plan.bestRejected().get(e.getKey());
              out.add(
                  new Row(
                      best,
                      best == null ? Verdict.NOT_WORKABLE : best.verdict(),
                      "",
                      Messages.text("ways.reason", Way.name(e.getKey()), e.getValue().toString()),
                      best == null
                          ? ""
                          : Messages.text(
                              "ways.nearest",
                              Way.title(best.setup()),
                              amounts.azimuth(best.setup().layDeg())),
                      best == null ? "" : amounts.ratio(best.check(e.getKey()).ratio())));
            });
    return new Ways(summary(plan), ranked, out, plan.notes());
  }

  private static String summary(Plan plan) {
    return Messages.text(
        "ways.summary",
        String.valueOf(plan.judged()),
        count(plan, Verdict.WORKABLE),
        count(plan, Verdict.TIGHT));
  }

  private static String count(Plan plan, Verdict v) {
    return String.valueOf(plan.byVerdict().getOrDefault(v, 0));
  }
}
