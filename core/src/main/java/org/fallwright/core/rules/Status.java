package org.fallwright.core.rules;

/** How well the text of a rule was read. */
public enum Status {
  /** Read in a copy of the named text. */
  READ("read"),
  /** Read in a copy that stops in mid-text. */
  READ_IN_PART("read in part"),
  /** Read on a page that restates it. */
  SECONDARY("secondary"),
  /** Not read. */
  FROM_MEMORY("from memory, verify"),
  /** No rule: the program's own choice. */
  OWN("the program's own");

  private final String words;

  Status(String words) {
    this.words = words;
  }

  /** In words. */
  public String words() {
    return words;
  }
}
