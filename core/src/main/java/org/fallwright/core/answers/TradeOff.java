package org.fallwright.core.answers;

import java.util.ArrayList;
import java.util.List;
import org.fallwright.core.plan.Judged;
import org.fallwright.core.plan.Plan;
import org.fallwright.core.plan.Setup;
import org.fallwright.core.plan.Verdict;

/**
 * Clearance against pull: the setups that are workable or tight and that no other such setup beats
 * in one without being worse in the other; and setups that are near twins, as one group each.
 *
 * @param front the setups between which there is a choice, most pull margin first
 * @param groups all setups that are workable or tight, near twins together, best group first
 */
public record TradeOff(List<Choice> front, List<Group> groups) {
  /** Twins use the same source, mode, places and redirects, and lay this close [degrees]; ours. */
  public static final double TWIN_LAY_DEG = 3;

  /** and have the line this close in height [m]; ours. */
  public static final double TWIN_HEIGHT_M = 1;

  /**
   * One setup of the front.
   *
   * @param rank its rank in the plan
   * @param clearanceM least clearance [m]; infinite: nothing must be missed
   * @param pullMargin its pull margin; infinite: no pull is needed
   */
  public record Choice(int rank, Verdict verdict, double clearanceM, double pullMargin) {}

  /**
   * Near twins.
   *
   * @param ranks their ranks, the best first, who stands for all
   * @param words what they have in common
   */
  public record Group(List<Integer> ranks, String words) {
    public Group {
      ranks = List.copyOf(ranks);
    }
  }

  public TradeOff {
    front = List.copyOf(front);
    groups = List.copyOf(groups);
  }

  /** Of a plan. */
  public static TradeOff of(Plan plan) {
    List<Choice> all = new ArrayList<>();
    List<List<Integer>> groups = new ArrayList<>();
    for (int i = 0; i < plan.ranked().size(); i++) {
      Judged j = plan.ranked().get(i);
      if (j.verdict().compareTo(Verdict.TIGHT) > 0) {
        continue;
      }
      double clear = j.figures().clearanceM();
      all.add(
          new Choice(
              i + 1,
              j.verdict(),
              Double.isNaN(clear) ? Double.POSITIVE_INFINITY : clear,
              j.figures().pullMargin()));
      group(plan, groups, i);
    }
    List<Choice> front =
        all.stream()
            .filter(c -> all.stream().noneMatch(o -> beats(o, c)))
            .sorted((a, b) -> Double.compare(b.pullMargin(), a.pullMargin()))
            .toList();
    return new TradeOff(
        front,
        groups.stream()
            .map(g -> new Group(g, Uses.words(plan.ranked().get(g.get(0) - 1).setup())))
            .toList());
  }

  private static void group(Plan plan, List<List<Integer>> groups, int index) {
    Setup s = plan.ranked().get(index).setup();
    for (List<Integer> g : groups) {
      if (twins(plan.ranked().get(g.get(0) - 1).setup(), s)) {
        g.add(index + 1);
        return;
      }
    }
    groups.add(new ArrayList<>(List.of(index + 1)));
  }

  /** Whether two setups are so alike that one of them stands for both. */
  public static boolean twins(Setup a, Setup b) {
    double turn = Math.abs(a.layDeg() - b.layDeg()) % 360;
    return Uses.words(a).equals(Uses.words(b))
        && Math.min(turn, 360 - turn) <= TWIN_LAY_DEG + 1e-9
        && Math.abs(a.attachHeightM() - b.attachHeightM()) <= TWIN_HEIGHT_M + 1e-9;
  }

  /** Whether the first is no worse in either and better in one. */
  static boolean beats(Choice a, Choice b) {
    return a.clearanceM() >= b.clearanceM()
        && a.pullMargin() >= b.pullMargin()
        && (a.clearanceM() > b.clearanceM() || a.pullMargin() > b.pullMargin());
  }
}
