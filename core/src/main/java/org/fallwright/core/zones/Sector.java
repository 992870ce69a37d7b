package org.fallwright.core.zones;

import org.fallwright.core.site.Position;
import org.fallwright.core.site.Shape;
import org.fallwright.core.units.Range;
import org.locationtech.jts.geom.Coordinate;
import org.locationtech.jts.geom.Geometry;

/**
 * A fan of ground.
 *
 * @param apex its point
 * @param azimuthDeg its middle direction [degrees]
 * @param halfAngleDeg half its opening [degrees], up to 90
 * @param radiusM its length [m]
 */
record Sector(Position apex, double azimuthDeg, double halfAngleDeg, double radiusM) {
  private static final double STEP_DEG = 3;

  Sector {
    Range.check("azimuth_deg", azimuthDeg, -720, 1080, "degrees");
    Range.check("half_angle_deg", halfAngleDeg, 1, 90, "degrees");
    Range.check("radius_m", radiusM, 0.01, 2 * Position.FARTHEST, "m");
  }

  boolean contains(Position p) {
    // most points are ruled out by a square in which the fan lies
    if (Math.abs(p.eastM() - apex.eastM()) > radiusM
        || Math.abs(p.northM() - apex.northM()) > radiusM) {
      return false;
    }
    double d = apex.distanceTo(p);
    return d == 0 || d <= radiusM && offDeg(p) <= halfAngleDeg;
  }

  /** Distance from a point to the fan, 0 inside [m]. */
  double distanceTo(Position p) {
    double d = apex.distanceTo(p);
    double beyond = Math.toRadians(offDeg(p) - halfAngleDeg);
    if (d == 0 || beyond <= 0) {
      return Math.max(0, d - radiusM);
    }
    // To the nearer of the two straight sides.
    double along = Math.min(radiusM, Math.max(0, d * Math.cos(beyond)));
    return Math.sqrt(d * d + along * along - 2 * d * along * Math.cos(beyond));
  }

  private double offDeg(Position p) {
    return Math.abs(Math.IEEEremainder(apex.azimuthTo(p) - azimuthDeg, 360));
  }

  /** Its outline, the arc drawn around the circle. */
  Geometry geometry() {
    int steps = (int) Math.ceil(2 * halfAngleDeg / STEP_DEG);
    double step = 2 * halfAngleDeg / steps;
    double around = radiusM / Math.cos(Math.toRadians(step / 2));
    Coordinate[] c = new Coordinate[steps + 4];
    c[0] = at(0, 0);
    c[1] = at(-halfAngleDeg, radiusM);
    for (int i = 0; i < steps; i++) {
      c[i + 2] = at(-halfAngleDeg + (i + 0.5) * step, around);
    }
    c[steps + 2] = at(halfAngleDeg, radiusM);
    c[steps + 3] = c[0].copy();
    return Shape.FACTORY.createPolygon(c);
  }

  private Coordinate at(double offDeg, double distanceM) {
    double a = Math.toRadians(azimuthDeg + offDeg);
    return new Coordinate(
        apex.eastM() + distanceM * Math.sin(a), apex.northM() + distanceM * Math.cos(a));
  }
}
