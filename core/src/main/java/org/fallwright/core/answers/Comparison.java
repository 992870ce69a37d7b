package org.fallwright.core.answers;

import java.util.ArrayList;
import java.util.List;
import org.fallwright.core.plan.Check;
import org.fallwright.core.plan.Figures;
import org.fallwright.core.plan.Judge;
import org.fallwright.core.plan.Judged;
import org.fallwright.core.plan.Plan;
import org.fallwright.core.pull.PullSources;
import org.fallwright.core.site.Site;
import org.fallwright.core.units.DisplayUnits;
import org.fallwright.core.units.Range;

/**
 * Two setups of a plan beside each other: only what differs, and two sentences.
 *
 * @param firstRank rank of the first
 * @param secondRank rank of the second
 * @param rows the figures that differ
 * @param saves what each spares against the other, in one sentence
 * @param leansOn what each leans on, in one sentence
 */
public record Comparison(
    int firstRank, int secondRank, List<FigureRow> rows, String saves, String leansOn) {
  /** Margins closer than this count as alike in the sentence; planning allowance. */
  private static final double ALIKE = 0.05;

  /** Lengths closer than this count as alike in the sentence [m]; planning allowance. */
  private static final double ALIKE_M = 0.5;

  public Comparison {
    rows = List.copyOf(rows);
  }

  /**
   * Compares two ranked setups.
   *
   * @throws IllegalArgumentException one sentence, where the plan has no such rank
   */
  public static Comparison of(Site site, PullSources sources, Plan plan, int first, int second) {
    int most = plan.ranked().size();
    if (most == 0) {
      throw new IllegalArgumentException("the plan has no setup; nothing on the site can pull");
    }
    Range.check("rank", first, 1, most, "");
    Range.check("rank", second, 1, most, "");
    Judge judge = new Judge(site, sources);
    Judged a = judge.judge(plan.ranked().get(first - 1).setup());
    Judged b = judge.judge(plan.ranked().get(second - 1).setup());
    DisplayUnits in = site.display().units();
    return new Comparison(
        first,
        second,
        FigureRow.differing(in, judge, a, judge, b),
        saves(in, judge, a, b, first, second),
        leansOn(a, b, first, second));
  }

  private static String saves(
      DisplayUnits in, Judge judge, Judged a, Judged b, int first, int second) {
    List<String> ofA = spared(in, judge, a, b);
    List<String> ofB = spared(in, judge, b, a);
    if (ofA.isEmpty() && ofB.isEmpty()) {
      return "Setups " + first + " and " + second + " ask for the same kit and give alike.";
    }
    List<String> said = new ArrayList<>();
    if (!ofA.isEmpty()) {
      said.add("setup " + first + " has " + listed(ofA));
    }
    if (!ofB.isEmpty()) {
      said.add("setup " + second + " has " + listed(ofB));
    }
    String text = String.join("; ", said);
    return Character.toUpperCase(text.charAt(0)) + text.substring(1) + ".";
  }

  /** In what the first is better off than the second. */
  private static List<String> spared(DisplayUnits in, Judge judge, Judged own, Judged other) {
    List<String> said = new ArrayList<>();
    Figures f = own.figures();
    Figures g = other.figures();
    if (f.pullMargin() > g.pullMargin() + ALIKE) {
      said.add(
          "more pull to spare ("
              + DisplayUnits.ratio(f.pullMargin())
              + " against "
              + DisplayUnits.ratio(g.pullMargin())
              + ")");
    }
    if (f.clearanceM() > g.clearanceM() + ALIKE_M) {
      said.add("more room, " + in.length(f.clearanceM()) + " against " + in.length(g.clearanceM()));
    }
    if (g.lineLengthM() > f.lineLengthM() + ALIKE_M) {
      said.add("less line, by " + in.length(g.lineLengthM() - f.lineLengthM()));
    }
    int parts = other.loads().size() - own.loads().size();
    if (parts > 0) {
      said.add(parts + " fewer loaded parts");
    }
    int people = FigureRow.people(judge, other) - FigureRow.people(judge, own);
    if (people > 0) {
      said.add(people + " fewer at the source");
    }
    return said;
  }

  private static String leansOn(Judged a, Judged b, int first, int second) {
    String one = leans(a);
    String two = leans(b);
    return one.equals(two)
        ? "Both lean on " + one + "."
        : "Setup " + first + " leans on " + one + "; setup " + second + " on " + two + ".";
  }

  private static String leans(Judged j) {
    Check w = j.weakest();
    String much =
        Double.isNaN(w.ratio())
            ? "not known"
            : Double.isInfinite(w.ratio())
                ? "nothing near its limit"
                : DisplayUnits.ratio(w.ratio());
    return w.id()
        + " ("
        + much
        + ")"
        + (j.figures().leansOnStopReading() ? " and on somebody who reads the load cell" : "");
  }

  private static String listed(List<String> all) {
    return all.size() == 1
        ? all.get(0)
        : String.join(", ", all.subList(0, all.size() - 1)) + " and " + all.get(all.size() - 1);
  }
}
