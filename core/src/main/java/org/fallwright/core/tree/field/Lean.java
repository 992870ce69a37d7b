package org.fallwright.core.tree.field;

import org.fallwright.core.units.Range;

/**
 * Lean of a stem and the way it leans, by the means a person has at the tree. All of them see the
 * stem; where the crown is one-sided its weight leans otherwise, and that is entered apart.
 *
 * @param deg lean from the vertical [degrees]
 * @param azimuthDeg direction it leans towards [degrees from true north]
 */
public record Lean(double deg, double azimuthDeg) {
  /** Least sine of the angle between two views: 60 degrees to 120. */
  private static final double APART = Math.sin(Math.toRadians(60)) - 1e-12;

  public Lean {
    Range.check("lean_deg", deg, 0, 45, "degrees");
    Range.check("lean_azimuth_deg", azimuthDeg, 0, 360, "degrees");
  }

  /**
   * From a plumb line let down from the stem: tan λ = offset ÷ height.
   *
   * @param offsetM level distance from where the line comes down to the same side of the stem at
   *     its foot [m]
   * @param heightM height that the line hangs from above that foot [m]
   * @param azimuthDeg direction it leans towards [degrees from true north]
   */
  public static Lean byPlumb(double offsetM, double heightM, double azimuthDeg) {
    Range.check("plumb_offset_m", offsetM, 0, 60, "m");
    Range.check("plumb_height_m", heightM, 0.5, 60, "m");
    return new Lean(Math.toDegrees(Math.atan(offsetM / heightM)), azimuthDeg);
  }

  /**
   * From a clinometer laid along the stem, on the side it leans towards or the one it leans from,
   * that reads from the level: 90 degrees less the reading. It sees the one place it lies on; a
   * swept or flared stem leans otherwise higher up.
   */
  public static Lean byStem(Reading fromLevel, double azimuthDeg) {
    return new Lean(90 - fromLevel.deg(), azimuthDeg);
  }

  /**
   * From two looks at the stem from sides that are square to each other, or nearly so: with n the
   * unit vector to a viewer's right, tan λ times the direction of the lean has the part
   * tan(reading) along each n. Taken from far off: from near by a stem that comes towards the
   * viewer looks more aslant than it is.
   */
  public static Lean byTwoViews(SideView one, SideView other) {
    double a = Math.toRadians(one.azimuthDeg());
    double b = Math.toRadians(other.azimuthDeg());
    double apart = Math.sin(a - b);
    if (Math.abs(apart) < APART) {
      throw new IllegalArgumentException(
          "the views look along "
              + one.azimuthDeg()
              + " and "
              + other.azimuthDeg()
              + " degrees; they must be from 60 to 120 degrees apart");
    }
    double p = one.toTheRight().tangent();
    double q = other.toTheRight().tangent();
    // p = e·cos a − n·sin a and q = e·cos b − n·sin b
    double east = (q * Math.sin(a) - p * Math.sin(b)) / apart;
    double north = (q * Math.cos(a) - p * Math.cos(b)) / apart;
    double towards = Math.toDegrees(Math.atan2(east, north));
    return new Lean(
        Math.toDegrees(Math.atan(Math.hypot(east, north))), towards < 0 ? towards + 360 : towards);
  }

  /**
   * Part of the lean along a direction [degrees], negative the other way: atan(tan λ·cos Δ).
   *
   * @param alongDeg the direction [degrees from true north]
   */
  public double partDeg(double alongDeg) {
    double cos = Math.cos(Math.toRadians(alongDeg - azimuthDeg));
    return Math.toDegrees(Math.atan(Math.tan(Math.toRadians(deg)) * cos));
  }

  /**
   * Azimuth from true north of a compass bearing [degrees].
   *
   * @param magneticDeg bearing from magnetic north [degrees]
   * @param declinationDeg magnetic declination, east positive [degrees]
   */
  public static double trueDeg(double magneticDeg, double declinationDeg) {
    Range.check("magnetic_deg", magneticDeg, 0, 360, "degrees");
    Range.check("declination_deg", declinationDeg, -180, 180, "degrees");
    return (magneticDeg + declinationDeg + 360) % 360;
  }
}
