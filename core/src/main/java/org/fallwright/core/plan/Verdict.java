package org.fallwright.core.plan;

/** Verdict of a check or a setup, best first. */
public enum Verdict {
  WORKABLE("workable"),
  TIGHT("tight"),
  NOT_WORKABLE("not workable"),
  CANNOT_JUDGE("cannot judge yet");

  private final String word;

  Verdict(String word) {
    this.word = word;
  }

  /** The word on screen, paper and in the plan file. */
  public String word() {
    return word;
  }

  /** The worse of the two. */
  public Verdict worse(Verdict other) {
    return compareTo(other) >= 0 ? this : other;
  }
}
