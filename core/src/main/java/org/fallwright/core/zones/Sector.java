package org.fallwright.core.zones;

import org.fallwright.core.site.Position;
import org.fallwright.core.site.Shape;
import org.fallwright.core.units.Range;
import org.locationtech.jts.geom.Coordinate;
import org.locationtech.jts.geom.Geometry;

/** A fan of ground. */
final class Sector {
  private static final double STEP_DEG = 3;

  private final Position apex;
  private final double azimuthDeg;
  private final double halfAngleDeg;
  private final double radiusM;
  private final double sin;
  private final double cos;
  private final double cosHalfSquared;

  /**
   * @param apex its point
   * @param azimuthDeg its middle direction [degrees]
   * @param halfAngleDeg half its opening [degrees], up to 90
   * @param radiusM its length [m]
   */
  Sector(Position apex, double azimuthDeg, double halfAngleDeg, double radiusM) {
    this.apex = apex;
    this.azimuthDeg = Range.check("azimuth_deg", azimuthDeg, -720, 1080, "degrees");
    this.halfAngleDeg = Range.check("half_angle_deg", halfAngleDeg, 1, 90, "degrees");
    this.radiusM = Range.check("radius_m", radiusM, 0.01, 2 * Position.FARTHEST, "m");
    sin = Math.sin(Math.toRadians(azimuthDeg));
    cos = Math.cos(Math.toRadians(azimuthDeg));
    double half = Math.cos(Math.toRadians(halfAngleDeg));
    cosHalfSquared = half * half;
  }

  boolean contains(Position p) {
    // Most points lie plainly on one side, which needs no angle; a hair is left to the exact
    // question.
    double e = p.eastM() - apex.eastM();
    double n = p.northM() - apex.northM();
    double square = e * e + n * n;
    if (square > radiusM * radiusM * (1 + HAIR)) {
      return false;
    }
    double along = e * sin + n * cos;
    double reach = square * cosHalfSquared;
    if (along < 0 || along * along < reach * (1 - HAIR)) {
      if (along < -HAIR * radiusM || along * along < reach * (1 - HAIR) - HAIR * HAIR) {
        return false;
      }
    } else if (along * along > reach * (1 + HAIR) && square < radiusM * radiusM * (1 - HAIR)) {
      return true;
    }
    double d = apex.distanceTo(p);
    return d == 0 || d <= radiusM && offDeg(p) <= halfAngleDeg;
  }

  /** Rounding that is left to the exact question. */
  private static final double HAIR = 1e-9;

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
