package org.fallwright.core.plan;

import java.util.List;
import java.util.Map;
import org.fallwright.core.pull.SourceDescription;

/**
 * What the planner found.
 *
 * @param ranked the best lay of each way, best way first, at most {@link #MOST_WAYS}; rank 1 is the
 *     first. Ways that differ in the pull line alone are one
 * @param judged how many setups there are
 * @param byVerdict how many have each verdict
 * @param byBindingCheck of those not workable, how many miss each check first, in the fixed order
 *     of the checks
 * @param bestRejected of those that miss a check first, the one that comes nearest to passing it;
 *     of the {@link #MOST_REASONS} checks that most miss first
 * @param notes what was missing or left out, a sentence each: sources without a plugin, gear that
 *     cannot be used
 * @param sources what the sources of the site's gear say of themselves, by id
 */
public record Plan(
    List<Judged> ranked,
    int judged,
    Map<Verdict, Integer> byVerdict,
    Map<String, Integer> byBindingCheck,
    Map<String, Judged> bestRejected,
    List<String> notes,
    Map<String, SourceDescription> sources) {
  /** Most checks of which the nearest setup is shown: those that most setups miss first. */
  public static final int MOST_REASONS = 50;

  /** Most ways that a plan shows. */
  public static final int MOST_WAYS = 200;

  public Plan {
    ranked = List.copyOf(ranked);
    notes = List.copyOf(notes);
    sources = Map.copyOf(sources);
  }

  /** Without what the sources say of themselves. */
  public Plan(
      List<Judged> ranked,
      int judged,
      Map<Verdict, Integer> byVerdict,
      Map<String, Integer> byBindingCheck,
      Map<String, Judged> bestRejected,
      List<String> notes) {
    this(ranked, judged, byVerdict, byBindingCheck, bestRejected, notes, Map.of());
  }
}
