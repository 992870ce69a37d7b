package org.fallwright.core.answers;

import com.fasterxml.jackson.annotation.JsonValue;
import java.util.List;
import java.util.regex.Pattern;

/**
 * The seven questions a person asks of a setup, always in this order. Every check belongs to one of
 * them.
 */
public enum Rung {
  USABLE("usable", "usable .+", "known .+"),
  LAY(
      "lay lands clear",
      "clear of .+",
      "hang-up in .+",
      "inside .+",
      "wire .+ in the lay",
      "wire .+ in reach",
      "voltage of .+",
      "wires looked for"),
  LINE("line runs clear", "line clear of .+", "bridle .+ clear of .+", "wire .+ from .+"),
  KIT(
      "kit reaches",
      "line length",
      "joint",
      "sheave",
      "take-up of the source",
      "haul line",
      "blocks",
      "slings",
      "connectors",
      "run-out",
      "heading"),
  ANCHOR(
      "anchor holds", "(anchor|rated point of|sling at|connector at|block at) .+ at (plan|high)"),
  PULL(
      "source pulls and holds",
      "hinge lets go",
      "lever",
      "face opening",
      "pull",
      "tension window",
      "hold",
      "hold stability",
      "start",
      "steering",
      "hinge turning",
      "hinge crushing",
      "stop reading",
      "free hand",
      "(stem|line (?!clear of ).+|load cell .+|tow point|tackle .+) at (plan|high)"),
  PEOPLE(
      "people can stand clear",
      "ways out",
      "operator distance",
      "operator clear",
      "operator off the line",
      "stored energy",
      "people indoors");

  private final String word;
  private final List<Pattern> checks;

  Rung(String word, String... checks) {
    this.word = word;
    this.checks = java.util.Arrays.stream(checks).map(Pattern::compile).toList();
  }

  /** What it is called. */
  @JsonValue
  public String word() {
    return word;
  }

  /** Whether a check of that id is known to belong to it. */
  boolean holds(String checkId) {
    return checks.stream().anyMatch(p -> p.matcher(checkId).matches());
  }

  /** The rungs that know a check of that id: one, or none where only a pull source knows it. */
  public static List<Rung> known(String checkId) {
    return java.util.Arrays.stream(values()).filter(r -> r.holds(checkId)).toList();
  }

  /**
   * The rung of a check. What only a pull source knows, a check or a part of its own, belongs to
   * the source.
   */
  public static Rung of(String checkId) {
    for (Rung r : values()) {
      if (r.holds(checkId)) {
        return r;
      }
    }
    return PULL;
  }
}
