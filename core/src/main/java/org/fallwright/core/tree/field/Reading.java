package org.fallwright.core.tree.field;

import org.fallwright.core.units.Range;
import org.fallwright.core.units.Units;

/**
 * What a clinometer showed, with the scale it was read on. Degrees and per cent look alike and
 * differ by 1.7 times at small angles (6 % is 3.4 degrees), so the scale is never guessed.
 *
 * @param value the number read; up or to the right is positive [degrees or per cent, as the scale]
 * @param scale the scale it was read on
 */
public record Reading(double value, Scale scale) {
  /** Scales of a clinometer. */
  public enum Scale {
    /** Angle from the level, 360 to a full turn. */
    DEGREES("degrees", 89.9),
    /** Rise for a hundred of level distance. */
    PERCENT("%", 60_000);

    private final String unit;
    private final double most;

    Scale(String unit, double most) {
      this.unit = unit;
      this.most = most;
    }
  }

  public Reading {
    Range.present("scale", scale);
    Range.check("reading", value, -scale.most, scale.most, scale.unit);
  }

  public static Reading degrees(double value) {
    return new Reading(value, Scale.DEGREES);
  }

  public static Reading percent(double value) {
    return new Reading(value, Scale.PERCENT);
  }

  /** Rise over level distance. */
  public double tangent() {
    return scale == Scale.PERCENT ? value / 100 : Math.tan(Math.toRadians(value));
  }

  /** The angle [degrees]. */
  public double deg() {
    return scale == Scale.PERCENT ? Units.degreesOfPercent(value) : value;
  }
}
