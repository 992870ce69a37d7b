package org.fallwright.core.plan;

import java.util.Optional;
import java.util.function.ToDoubleFunction;
import org.fallwright.core.rules.Rule;
import org.fallwright.core.rules.RuleSet;
import org.fallwright.core.site.Entry;
import org.fallwright.core.site.How;
import org.fallwright.core.site.Looked;
import org.fallwright.core.site.Site;
import org.fallwright.core.site.Wire;

/** What must be known before anything is judged: voltages, and what was looked for. */
final class Knowledge {
  private final Site site;
  private final RuleSet rules;

  Knowledge(Site site, RuleSet rules) {
    this.site = site;
    this.rules = rules;
  }

  /** Whether an approach distance can be had for every wire. */
  boolean ofWires() {
    return site.wires().stream().allMatch(w -> approach(w).isPresent());
  }

  /** Approach distance of a wire [m]; only where it can be had. */
  ToDoubleFunction<Wire> approach() {
    return w -> approach(w).orElseThrow().value();
  }

  private Optional<Rule> approach(Wire w) {
    return rules.approachDistanceM(w.voltageKv());
  }

  /**
   * Whether a line's owner has said, by name, that it is dead and earthed. It still counts as live
   * for every distance; only the full circle about the tree no longer forbids the work.
   */
  static boolean saidDead(Wire w) {
    return w.state() == Wire.State.DEAD_AND_EARTHED
        && w.voltageSaidBy() != null
        && !w.voltageSaidBy().isBlank();
  }

  void check(Grade grade) {
    for (Entry e : Entry.of(site)) {
      if (e.quantity().how() == How.UNKNOWN) {
        grade.unknown(
            "known " + e.name(),
            e.field().startsWith("tree.") ? site.tree().stump().at() : null,
            () ->
                "Nobody knows the "
                    + e.name()
                    + " yet, so no setup is judged. Find it out, or write the range that it lies in.");
      }
    }
    for (Wire w : site.wires()) {
      if (approach(w).isEmpty()) {
        grade.unknown(
            "voltage of " + w.id(),
            w.poles().get(0).at(),
            () ->
                "Line "
                    + w.id()
                    + ": voltage not given, so no setup is judged. Ask its owner; write the answer and"
                    + " who gave it.");
      }
    }
    if (site.found(Looked.What.WIRES) == Looked.Found.NOT_LOOKED) {
      grade.unknown(
          "wires looked for",
          null,
          () ->
              "Nobody has said whether there are wires, so no setup is judged. Look, and say none or"
                  + " draw them.");
    }
    if (site.found(Looked.What.PEOPLE_INDOORS) == Looked.Found.NOT_LOOKED) {
      grade.unknown(
          "people indoors",
          null,
          () ->
              "Nobody has said who is indoors, so no setup is judged. Ask at every door, and say so.");
    }
  }
}
