package org.fallwright.core.site;

import org.fallwright.core.units.Range;

/**
 * Where a thing stands.
 *
 * @param at position on the site plane
 * @param groundM elevation of the ground there above the site's height datum [m]
 * @param fix how the point was set
 * @param statedErrorM the person's own position error [m], or null for the usual one of the fix
 */
public record Place(Position at, double groundM, Fix fix, Double statedErrorM) {
  public Place {
    Range.present("at", at);
    Range.check("ground_m", groundM, -500, 9000, "m");
    Range.present("fix", fix);
    Range.checkOrNull("stated_error_m", statedErrorM, 0, 100, "m");
  }

  /** Position error [m]. */
  public double errorM() {
    return statedErrorM != null ? statedErrorM : fix.errorM();
  }
}
