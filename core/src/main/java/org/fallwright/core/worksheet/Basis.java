package org.fallwright.core.worksheet;

import org.fallwright.core.reference.Kind;
import org.fallwright.core.site.How;

/** What stands behind a line of a worksheet. */
public enum Basis {
  MEASURED("entered, measured"),
  ESTIMATED("entered, estimated"),
  GUESSED("entered, guessed"),
  RANGE("entered, the middle of a range"),
  UNKNOWN("not known, stands in"),
  ENTERED("entered"),
  CHOSEN("chosen in this setup"),
  SOURCE("stated by the pull source"),
  PUBLISHED("published"),
  COMMON_PRACTICE("common practice"),
  PLANNING_ALLOWANCE("planning allowance"),
  FROM_MEMORY("published, carried from memory"),
  GEOMETRY("geometry"),
  STATICS("statics"),
  BEAM_THEORY("beam theory"),
  SPREAD("first-order spread"),
  RULE_SET("asked by the rule set"),
  RULE("rule of this program");

  private final String word;

  Basis(String word) {
    this.word = word;
  }

  /** The words on paper. */
  public String word() {
    return word;
  }

  static Basis of(How how) {
    return switch (how) {
      case MEASURED -> MEASURED;
      case ESTIMATED -> ESTIMATED;
      case GUESSED -> GUESSED;
      case RANGE -> RANGE;
      case UNKNOWN -> UNKNOWN;
    };
  }

  static Basis of(Kind kind) {
    return switch (kind) {
      case PUBLISHED -> PUBLISHED;
      case COMMON_PRACTICE -> COMMON_PRACTICE;
      case PLANNING_ALLOWANCE -> PLANNING_ALLOWANCE;
      case FROM_MEMORY -> FROM_MEMORY;
    };
  }
}
