package org.fallwright.ui.setups;

import java.util.List;
import org.fallwright.core.advice.NotByPulling;
import org.fallwright.core.plan.Check;
import org.fallwright.core.plan.Figures;
import org.fallwright.core.plan.Judged;
import org.fallwright.core.plan.Plan;
import org.fallwright.core.plan.Verdict;
import org.fallwright.ui.text.Amounts;
import org.fallwright.ui.text.Messages;

/**
 * What the answer strip says of a setup.
 *
 * @param verdict its mark; null while there is nothing to judge
 * @param word the verdict's word
 * @param sentence one sentence
 * @param cells the figures beside it, always the same ones in the same order
 */
public record Answer(Verdict verdict, String word, String sentence, List<Cell> cells) {
  /**
   * One figure of the strip.
   *
   * @param key which it is, a key of the bundle
   * @param value the figure, or a dash
   * @param note what it stands for, short
   */
  public record Cell(String key, String value, String note) {}

  private static final String NONE = "–";

  /** The answer without a site, or while the plan is on its way. */
  public static Answer empty(String word, String sentence) {
    return new Answer(
        null,
        word,
        sentence,
        List.of(
            new Cell("needs", NONE, ""),
            new Cell("gives", NONE, ""),
            new Cell("clears", NONE, ""),
            new Cell("weakest", NONE, "")));
  }

  /** Nothing could be ranked. */
  public static Answer nothing(Plan plan) {
    return empty(
        Verdict.NOT_WORKABLE.word(),
        plan.judged() == 0
            ? Messages.text("answer.no-setup")
            : Messages.text("answer.none-works", String.valueOf(plan.judged())));
  }

  public static Answer of(Judged j, Amounts amounts) {
    return new Answer(
        j.verdict(),
        j.verdict().word(),
        sentence(j, amounts),
        List.of(needs(j, amounts), gives(j, amounts), clears(j, amounts), weakest(j, amounts)));
  }

  /** The same, led by the advice that pulling is not the method where the whole plan fails. */
  public Answer inPlan(Plan plan) {
    return NotByPulling.of(plan)
        .map(
            n ->
                new Answer(
                    verdict,
                    word,
                    Messages.text("answer.not-by-pulling", String.valueOf(n.judged()), sentence),
                    cells))
        .orElse(this);
  }

  /** The way, then what was found of it; the verdict's word stands beside the mark already. */
  private static String sentence(Judged j, Amounts amounts) {
    String word = Way.name(j.verdict().word()) + ". ";
    String found =
        j.sentence().startsWith(word) ? j.sentence().substring(word.length()) : j.sentence();
    return Messages.text(
        "answer.sentence",
        Way.name(Way.title(j.setup())),
        amounts.azimuth(j.setup().layDeg()),
        found);
  }

  private static Cell needs(Judged j, Amounts amounts) {
    Figures f = j.figures();
    if (f == null || !Double.isFinite(f.pullPlanN())) {
      return new Cell("needs", NONE, "");
    }
    return new Cell(
        "needs",
        amounts.forceNeeded(f.pullPlanN()),
        Messages.text("answer.needs.note", amounts.forceNeeded(f.pullNeededN())));
  }

  private static Cell gives(Judged j, Amounts amounts) {
    Figures f = j.figures();
    return f == null || !Double.isFinite(f.sourceLowN())
        ? new Cell("gives", NONE, "")
        : new Cell(
            "gives",
            amounts.forceGiven(f.sourceLowN()),
            Messages.text("answer.gives.note", amounts.ratio(f.pullMargin())));
  }

  private static Cell clears(Judged j, Amounts amounts) {
    Figures f = j.figures();
    return f == null || f.clearanceTarget() == null || Double.isNaN(f.clearanceM())
        ? new Cell("clears", NONE, Messages.text("answer.clears.none"))
        : new Cell("clears", amounts.length(f.clearanceM()), f.clearanceTarget());
  }

  private static Cell weakest(Judged j, Amounts amounts) {
    Check w = j.weakest();
    return w == null
        ? new Cell("weakest", NONE, "")
        : new Cell("weakest", amounts.ratio(w.ratio()), w.id());
  }
}
