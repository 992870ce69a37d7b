package org.fallwright.core.tree.field;

import org.fallwright.core.units.Range;

/**
 * Stem diameter from a tape round the stem: girth over π, as if the stem were round; a stem that is
 * not is given a little too thick.
 *
 * <p>Where the tape goes: 1.3 m (4 ft 3 in) from the ground, measured along the stem and not
 * upright. On a slope from the uphill side; on a leaning stem along its underside, the side it
 * leans towards. The tape lies square to the stem, not level: a level tape round a leaning stem
 * reads too much. Over a bulge or a fork the thinnest place below it counts. (Common practice, no
 * source.)
 */
public final class Girth {
  private Girth() {}

  /** Diameter [m] of a stem of that girth [m]. */
  public static double diameterM(double girthM) {
    return Range.check("girth_m", girthM, 0.03, 16, "m") / Math.PI;
  }
}
