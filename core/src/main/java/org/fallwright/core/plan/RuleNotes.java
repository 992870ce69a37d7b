package org.fallwright.core.plan;

import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import org.fallwright.core.rules.Rule;
import org.fallwright.core.rules.RuleSet;
import org.fallwright.core.site.Site;
import org.fallwright.core.site.Wire;
import org.fallwright.core.units.DisplayUnits;

/** What must be said of the rules that a plan was held to: gaps filled, tables used, figures. */
final class RuleNotes {
  private RuleNotes() {}

  static List<String> of(Site site, RuleSet rules, DisplayUnits in) {
    List<String> notes = new ArrayList<>();
    notes.add("Rules: " + rules.name() + ". Nobody has shown that they are kept.");
    fallback(notes, "the distance of who works the source", rules.operatorRadiusFactor());
    fallback(notes, "a team exception", rules.teamException());
    fallback(notes, "the length of a way out", rules.escapeLengthM());
    fallback(notes, "a way out past the crown", rules.escapeOutsideCrown());
    fallback(notes, "how far beside a winch to stand", rules.operatorBesideWinchM());
    fallback(notes, "the breaking load over the source's most", rules.lineTwiceSource());
    if (site.offer().redirects() > 0) {
      fallback(notes, "the gear at a redirect", rules.redirectGearOverSource());
      fallback(notes, "the anchor of a redirect", rules.redirectAnchorTwiceT());
    }
    for (Wire w : site.wires()) {
      rules.approachDistanceM(w.voltageKv()).ifPresent(r -> notes.add(wire(w, r, in)));
    }
    rules
        .windStopKmh()
        .filter(r -> !r.metBy(site.conditions().gustMps().value() * 3.6, 1))
        .ifPresent(
            r ->
                notes.add(
                    "The gust planned for is beyond what these rules name: "
                        + figure(r)
                        + " ("
                        + source(r)
                        + ")."));
    if (!site.cut().wedges()) {
      rules
          .wedgesOverDbhM()
          .filter(r -> r.metBy(site.tree().dbhM().value(), 1))
          .ifPresent(
              r ->
                  notes.add(
                      "Two wedges on hand: the stem is thicker than "
                          + in.smallLength(r.value())
                          + " ("
                          + source(r)
                          + ")."));
    }
    rules
        .pathLengthFactor()
        .ifPresent(
            r ->
                notes.add(
                    "These rules ask for a clear felling path of "
                        + in.length(r.value() * site.tree().heightM().value())
                        + " ("
                        + source(r)
                        + ")."));
    return notes;
  }

  private static void fallback(List<String> notes, String of, Rule r) {
    if (r.fallback()) {
      notes.add(
          "These rules say nothing on "
              + of
              + "; the strictest of all sets stands in: "
              + figure(r)
              + ", "
              + r.fallbackFrom()
              + " ("
              + source(r)
              + ").");
    }
  }

  private static String wire(Wire w, Rule r, DisplayUnits in) {
    return String.format(
        Locale.ROOT,
        "Line %s (%s kV between phases%s%s): keep %s, by %s (%s)%s.",
        w.id(),
        plain(w.voltageKv()),
        w.voltageSaidBy() == null ? "" : ", said by " + w.voltageSaidBy(),
        w.state() == Wire.State.DEAD_AND_EARTHED ? ", dead and earthed" : "",
        in.length(r.value()),
        r.citation(),
        r.status().words(),
        r.fallback() ? "; the table of " + r.fallbackFrom() + " is the stricter" : "");
  }

  private static String source(Rule r) {
    return r.citation() + "; " + r.status().words();
  }

  /** A rule's figure as said. */
  static String figure(Rule r) {
    if (r.unit().equals("yes/no")) {
      return r.yes() ? "yes" : "no";
    }
    String unit = r.unit().isEmpty() ? "" : " " + r.unit().replaceAll("^H$", "tree heights");
    return switch (r.comparison()) {
          case AT_LEAST -> "at least ";
          case MORE_THAN -> "more than ";
          case AT_MOST -> "at most ";
          case LESS_THAN -> "less than ";
        }
        + plain(r.value())
        + unit;
  }

  private static String plain(double value) {
    return new java.math.BigDecimal(value)
        .round(new java.math.MathContext(6))
        .stripTrailingZeros()
        .toPlainString();
  }
}
