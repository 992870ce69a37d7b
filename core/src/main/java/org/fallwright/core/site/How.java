package org.fallwright.core.site;

/** How a quantity was got; decides its spread. */
public enum How {
  MEASURED,
  ESTIMATED,
  GUESSED,
  /** Somewhere between two ends that are held certain. */
  RANGE,
  /** Nobody knows; the value only stands in until somebody does, and nothing is judged by it. */
  UNKNOWN;

  /** Whether it says how well one value is known: measured, estimated or guessed. */
  public boolean usual() {
    return compareTo(GUESSED) <= 0;
  }

  /**
   * Lets only the usual ones through.
   *
   * @throws IllegalArgumentException naming the field
   */
  How usualOnly(String field) {
    if (!usual()) {
      throw new IllegalArgumentException(
          field
              + " is \""
              + name().toLowerCase(java.util.Locale.ROOT)
              + "\"; it must be one of \"measured\", \"estimated\", \"guessed\"");
    }
    return this;
  }
}
