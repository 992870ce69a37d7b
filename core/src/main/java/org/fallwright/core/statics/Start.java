package org.fallwright.core.statics;

/**
 * Whether the tree starts by itself once it is held at the hold tension and the hinge comes down.
 */
public enum Start {
  /** It stays until more is pulled. */
  NO("no"),
  /** It moves a little and stops. */
  STOPS("stops"),
  /** It goes as soon as the hinge is ready. */
  RUNS("runs");

  private final String word;

  Start(String word) {
    this.word = word;
  }

  public String word() {
    return word;
  }
}
