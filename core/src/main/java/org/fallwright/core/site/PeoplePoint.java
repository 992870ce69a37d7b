package org.fallwright.core.site;

import org.fallwright.core.units.Range;

/**
 * A point where people come out or where somebody may be: to be seen to before the work.
 *
 * @param id its name on the plan
 * @param kind what it is
 * @param at where it is
 * @param fix how the point was set
 * @param statedErrorM own position error [m], or null for that of the fix
 * @param of id of the target that a door belongs to; null: none drawn
 */
public record PeoplePoint(
    String id, Kind kind, Position at, Fix fix, Double statedErrorM, String of) {
  /** Kinds of point. */
  public enum Kind {
    DOOR,
    /** Where somebody usually is: a bench, a neighbour at work, a gate that children use. */
    PERSON
  }

  public PeoplePoint {
    Range.text("id", id);
    Range.present("kind", kind);
    Range.present("at", at);
    Range.present("fix", fix);
    Range.checkOrNull("stated_error_m", statedErrorM, 0, 100, "m");
  }

  /** Position error [m]. */
  public double errorM() {
    return statedErrorM != null ? statedErrorM : fix.errorM();
  }
}
