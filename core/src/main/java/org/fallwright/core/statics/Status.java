package org.fallwright.core.statics;

/** What kind of pull this is. */
public enum Status {
  BACK_LEANER("back-leaner"),
  HINGE_NEVER_LETS_GO("hinge never lets go"),
  LEVER_LOST("lever lost"),
  NO_PULL_NEEDED("no pull needed");

  private final String word;

  Status(String word) {
    this.word = word;
  }

  public String word() {
    return word;
  }
}
