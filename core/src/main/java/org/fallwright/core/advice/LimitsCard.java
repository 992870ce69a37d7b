package org.fallwright.core.advice;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.Map;
import org.fallwright.core.plan.Judge;
import org.fallwright.core.plan.Judged;
import org.fallwright.core.plan.Setup;
import org.fallwright.core.plan.Verdict;
import org.fallwright.core.pull.PullSources;
import org.fallwright.core.site.Site;

/**
 * How the setup stands where the line seats higher or lower than planned and the tree turns out
 * heavier or leans more: a table for the paper, to be read with the laptop shut.
 *
 * <p>Every cell is the whole setup judged on the changed site, so its mark is the worst of all
 * checks. A height that this stem does not take has no row.
 *
 * @param rows from the highest line to the lowest
 * @param sentence how to use it, in one sentence
 */
public record LimitsCard(List<Row> rows, String sentence) {
  /** How the tree differs from what was entered. */
  public enum Tree {
    AS_PLANNED("as planned", 1, 0),
    A_FIFTH_HEAVIER("20 % heavier", 1.2, 0),
    TWO_FIFTHS_HEAVIER("40 % heavier", 1.4, 0),
    LEANING_MORE("lean +3°", 1, 3),
    LEANING_MORE_AND_HEAVIER("lean +3°, 20 % heavier", 1.2, 3);

    private final String word;
    private final double mass;
    private final double leanDeg;

    Tree(String word, double mass, double leanDeg) {
      this.word = word;
      this.mass = mass;
      this.leanDeg = leanDeg;
    }

    /** What the column is called. */
    public String word() {
      return word;
    }

    Site on(Site site) {
      Site leaning = leanDeg == 0 ? site : Altered.leaningMore(site, leanDeg);
      return mass == 1 ? leaning : Altered.heavier(leaning, mass);
    }
  }

  /** Heights of the rows beside the planned one [m]; planning allowance. */
  private static final List<Double> BESIDE = List.of(1.5, 0.0, -1.5, -3.0);

  /** Steepest lean that a site may have [degrees]. */
  private static final double STEEPEST = 45;

  /**
   * One height.
   *
   * @param heightM of the line above the ground at the stump [m]
   * @param cells one for each kind of tree, in their order; none for a tree steeper than any site
   *     may have
   */
  public record Row(double heightM, List<Cell> cells) {
    public Row {
      cells = List.copyOf(cells);
    }
  }

  /**
   * One answer.
   *
   * @param tree how the tree differs
   * @param verdict worst of all checks
   * @param weakest id of the check that decides
   * @param pullPlanN pull to plan for at the tree [N]; NaN: the tree cannot be moved so
   * @param pullMargin source low over that; infinite: no pull is needed
   */
  public record Cell(
      Tree tree, Verdict verdict, String weakest, double pullPlanN, double pullMargin) {}

  public LimitsCard {
    rows = List.copyOf(rows);
  }

  /** The card of a setup. */
  public static LimitsCard of(Site site, PullSources sources, Setup setup) {
    Map<Tree, Judge> judges = new java.util.EnumMap<>(Tree.class);
    Arrays.stream(Tree.values())
        .filter(t -> site.tree().leanDeg().value() + t.leanDeg <= STEEPEST)
        .forEach(t -> judges.put(t, new Judge(t.on(site), sources)));
    LineHeightRange.Stem stem = LineHeightRange.Stem.of(site);
    List<Row> rows = new ArrayList<>();
    for (double beside : BESIDE) {
      double height = setup.attachHeightM() + beside;
      if (beside == 0 || stem.takes(height)) {
        Setup there = setup.withAttachHeight(height);
        List<Cell> cells = new ArrayList<>();
        judges.forEach((t, judge) -> cells.add(cell(t, judge.judge(there))));
        rows.add(new Row(height, cells));
      }
    }
    long held =
        rows.stream()
            .flatMap(r -> r.cells().stream())
            .filter(c -> c.verdict().compareTo(Verdict.TIGHT) <= 0)
            .count();
    long all = rows.stream().mapToLong(r -> r.cells().size()).sum();
    return new LimitsCard(
        rows,
        held
            + " of the "
            + all
            + " cases on the card are workable or tight; in any other case, and off the card, stop"
            + " and plan again.");
  }

  private static Cell cell(Tree tree, Judged j) {
    return new Cell(
        tree, j.verdict(), j.weakest().id(), j.figures().pullPlanN(), j.figures().pullMargin());
  }
}
