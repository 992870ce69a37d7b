package org.fallwright.core.advice;

import java.util.Comparator;
import java.util.List;
import java.util.stream.Collectors;
import org.fallwright.core.plan.Judge;
import org.fallwright.core.plan.Judged;
import org.fallwright.core.site.Site;
import org.fallwright.core.units.DisplayUnits;

/**
 * Which parts reach their ultimate strength first as the tension at the tree rises.
 *
 * <p>T = B / q, B the ultimate strength [N], q the load on the part per newton at the tree, the
 * greater of hauling and holding. No factor is in it: it says what breaks, not what may be used;
 * that is the ceiling. The strengths are least ones, so a part may stand more than said.
 *
 * @param parts the first three, weakest first; empty where the tree cannot be moved
 * @param sourceHighN the most the source can put on the line at the tree [N]
 * @param ceilingN ceiling of the setup at the tree [N]
 * @param sentence the advice in one sentence
 */
public record FirstToGive(
    List<Giving> parts, double sourceHighN, double ceilingN, String sentence) {
  private static final int SHOWN = 3;

  /**
   * A part at its strength.
   *
   * @param part what it is called
   * @param tensionN tension at the tree at which it reaches its strength [N]
   * @param strengthN its ultimate strength [N]
   */
  public record Giving(String part, double tensionN, double strengthN) {}

  public FirstToGive {
    parts = List.copyOf(parts);
  }

  /** The order for a judged setup. */
  public static FirstToGive of(Site site, Judge judge, Judged judged) {
    List<Giving> parts =
        judge.parts(judged.setup()).stream()
            .filter(p -> p.atPlan() > 0)
            .map(p -> new Giving(p.name(), p.strengthN() / p.atPlan(), p.strengthN()))
            .sorted(Comparator.comparingDouble(Giving::tensionN))
            .limit(SHOWN)
            .toList();
    double high = judged.figures().sourceHighN();
    return new FirstToGive(
        parts, high, judged.figures().ceilingN(), sentence(site.display().units(), parts, high));
  }

  private static String sentence(DisplayUnits in, List<Giving> parts, double high) {
    if (parts.isEmpty()) {
      return "The tree cannot be moved by this setup, so no part is loaded.";
    }
    Giving first = parts.get(0);
    String rest =
        parts.stream()
            .skip(1)
            .map(g -> g.part() + " at " + in.both(u -> u.forceAtMost(g.tensionN())))
            .collect(Collectors.joining(", "));
    return "If the pull goes on rising, "
        + first.part()
        + " gives first, at "
        + in.both(u -> u.forceAtMost(first.tensionN()))
        + " at the tree"
        + (rest.isEmpty() ? "" : ", then " + rest)
        + "; the source can put on "
        + in.both(u -> u.forceAtLeast(high))
        + (high >= first.tensionN() ? ", enough to break it." : ".");
  }
}
