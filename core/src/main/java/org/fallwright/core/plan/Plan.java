package org.fallwright.core.plan;

import java.util.List;
import java.util.Map;
import org.fallwright.core.pull.SourceDescription;

/**
 * What the planner found.
 *
 * @param ranked the setups worth showing, best first; rank 1 is the first
 * @param judged how many setups were judged
 * @param byVerdict how many had each verdict
 * @param byBindingCheck of those not workable, how many fail first by each check
 * @param bestRejected the best setup that each binding check rejects
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
