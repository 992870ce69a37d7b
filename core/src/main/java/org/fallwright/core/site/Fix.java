package org.fallwright.core.site;

/**
 * How a point was set on the plan, with its usual position error [m] (planning allowance).
 *
 * @see org.fallwright.core.site.Place#errorM()
 */
public enum Fix {
  PICTURE(3.0),
  PHONE(8.0),
  TAPES(0.2),
  SURVEY(0.05);

  private final double errorM;

  Fix(double errorM) {
    this.errorM = errorM;
  }

  /** Usual position error [m]. */
  public double errorM() {
    return errorM;
  }
}
