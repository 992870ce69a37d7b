package org.fallwright.core.plan;

import org.fallwright.core.units.DisplayUnits;

/** The one sentence that says how a setup stands. */
final class Sentence {
  private Sentence() {}

  static String of(Verdict verdict, Check weakest, Figures f, String source, DisplayUnits in) {
    String head = verdict.word();
    head = Character.toUpperCase(head.charAt(0)) + head.substring(1) + ". ";
    if (verdict != Verdict.WORKABLE) {
      return head + weakest.why();
    }
    if (f.pullPlanN() == 0) {
      return head + "No pull is needed for this lay; beware of a stem that splits.";
    }
    String link =
        Double.isInfinite(weakest.ratio())
            ? "nothing is near its limit"
            : weakest.id() + ", " + DisplayUnits.ratio(weakest.ratio()) + " times what is asked";
    return head
        + "Plan for "
        + in.both(u -> u.forceAtLeast(f.pullPlanN()))
        + " on the line at the tree; "
        + source
        + " gives "
        + in.both(u -> u.forceAtMost(f.sourceLowN()))
        + ". Weakest link: "
        + link
        + ".";
  }
}
