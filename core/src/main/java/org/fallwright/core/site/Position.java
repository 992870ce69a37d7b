package org.fallwright.core.site;

import com.fasterxml.jackson.annotation.JsonCreator;
import com.fasterxml.jackson.annotation.JsonValue;
import org.fallwright.core.units.Range;

/**
 * A point of the site plane; written in the site file as {@code [east, north]}.
 *
 * @param eastM metres east of the site's origin
 * @param northM metres north of the site's origin
 */
public record Position(double eastM, double northM) {
  /** Farthest a point may lie from the origin along either axis [m]. */
  public static final double FARTHEST = 5000;

  public Position {
    Range.check("east", eastM, -FARTHEST, FARTHEST, "m");
    Range.check("north", northM, -FARTHEST, FARTHEST, "m");
  }

  @JsonCreator
  public static Position of(double[] pair) {
    if (pair == null || pair.length != 2) {
      throw new IllegalArgumentException("a position must be [east, north], two numbers in metres");
    }
    return new Position(pair[0], pair[1]);
  }

  @JsonValue
  public double[] pair() {
    return new double[] {eastM, northM};
  }

  /** Distance on the plane [m]. */
  public double distanceTo(Position other) {
    return Math.hypot(other.eastM - eastM, other.northM - northM);
  }

  /** Azimuth towards the other point [degrees clockwise from true north, 0 to 360). */
  public double azimuthTo(Position other) {
    double deg = Math.toDegrees(Math.atan2(other.eastM - eastM, other.northM - northM));
    return deg < 0 ? deg + 360 : deg;
  }

  /** The point at a distance [m] along an azimuth [degrees]. */
  public Position along(double azimuthDeg, double distanceM) {
    double a = Math.toRadians(azimuthDeg);
    return new Position(eastM + distanceM * Math.sin(a), northM + distanceM * Math.cos(a));
  }
}
