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
 * @param wind the same with more lean and a stronger gust, from the least lean to the greatest
 */
public record LimitsCard(List<Row> rows, String sentence, List<WindRow> wind) {
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

  /** What the gust is raised by in the columns of the wind table [m/s]; planning allowance. */
  private static final List<Double> STRONGER_MPS = List.of(0.0, 2.0, 4.0, 6.0, 8.0);

  /** What the lean is raised by in its rows [degrees]; planning allowance. */
  private static final List<Double> FARTHER_DEG = List.of(0.0, 1.5, 3.0);

  /** Strongest gust that a site may have [m/s]. */
  private static final double STRONGEST = 40;

  /**
   * One lean.
   *
   * @param leanDeg lean of the stem [degrees]
   * @param cells one for each gust, from the planned one up
   */
  public record WindRow(double leanDeg, List<WindCell> cells) {
    public WindRow {
      cells = List.copyOf(cells);
    }
  }

  /**
   * One answer.
   *
   * @param gustMps the gust [m/s]
   * @param verdict worst of all checks
   * @param weakest id of the check that decides
   * @param pullPlanN pull to plan for at the tree [N]; NaN: the tree cannot be moved so
   * @param pullMargin source low over that; infinite: no pull is needed
   */
  public record WindCell(
      double gustMps, Verdict verdict, String weakest, double pullPlanN, double pullMargin) {}

  public LimitsCard {
    rows = List.copyOf(rows);
    wind = List.copyOf(wind);
  }

  /** The card of a setup. */
  public static LimitsCard of(Site site, PullSources sources, Setup setup) {
    Map<Tree, Judge> judges = new java.util.EnumMap<>(Tree.class);
    Arrays.stream(Tree.values())
        .filter(t -> site.tree().leanDeg().high() + t.leanDeg <= STEEPEST)
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
            + " and plan again.",
        wind(site, sources, setup));
  }

  private static List<WindRow> wind(Site site, PullSources sources, Setup setup) {
    double lean = site.tree().leanDeg().value();
    double gust = site.conditions().gustMps().value();
    List<WindRow> rows = new ArrayList<>();
    for (double farther : FARTHER_DEG) {
      if (site.tree().leanDeg().high() + farther > STEEPEST) {
        continue;
      }
      Site leaning = farther == 0 ? site : Altered.leaningMore(site, farther);
      List<WindCell> cells = new ArrayList<>();
      for (double stronger : STRONGER_MPS) {
        if (gust + stronger <= STRONGEST) {
          Site there = stronger == 0 ? leaning : Altered.gust(leaning, gust + stronger);
          Judged j = new Judge(there, sources).judge(setup);
          cells.add(
              new WindCell(
                  gust + stronger,
                  j.verdict(),
                  j.weakest().id(),
                  j.figures().pullPlanN(),
                  j.figures().pullMargin()));
        }
      }
      rows.add(new WindRow(lean + farther, cells));
    }
    return rows;
  }

  private static Cell cell(Tree tree, Judged j) {
    return new Cell(
        tree, j.verdict(), j.weakest().id(), j.figures().pullPlanN(), j.figures().pullMargin());
  }
}
