package org.fallwright.core.doubt;

import com.fasterxml.jackson.annotation.JsonValue;

/**
 * Everything entered that has a spread; each is drawn once in a trial, whatever hangs on it. The
 * order is that of the points, the ones that usually decide first.
 */
public enum Input {
  MASS("mass", "weigh or count out the mass of the tree"),
  MASS_CENTRE("mass centre", "find the height of the mass centre again from the crown's shape"),
  LEAN("lean", "measure the lean again from the side"),
  LEAN_AZIMUTH("lean azimuth", "take the direction of the lean again, standing in line with it"),
  HINGE_FACTOR("hinge factor", null),
  RUPTURE("rupture strength", null),
  THICKNESS("hinge thickness", "gauge the hinge as it is cut, and stop at its thickness"),
  STUMP("stump diameter", "tape the stem at the cut, bark off"),
  GUST("gust", "read the wind at the hour of the pull"),
  DRAG("drag", null),
  ATTACH("attach height", "measure the height at which the line sits"),
  BEARING("bearing point", "tape in the point that the line runs to"),
  GRIP("grip", "try the grip: a pull against a fixed point, before any cut"),
  DBH("DBH", "tape the diameter at breast height again"),
  HEIGHT("height", "measure the height again, standing square to the lean"),
  DENSITY("green density", null);

  private final String word;
  private final String task;

  Input(String word, String task) {
    this.word = word;
    this.task = task;
  }

  /** What it is called. */
  @JsonValue
  public String word() {
    return word;
  }

  /** Whether a person on the site can know it better. */
  public boolean measurable() {
    return task != null;
  }

  /** What that person does, lower case; null where nothing helps. */
  public String task() {
    return task;
  }
}
