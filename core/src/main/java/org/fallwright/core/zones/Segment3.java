package org.fallwright.core.zones;

import java.util.ArrayList;
import java.util.List;
import org.fallwright.core.site.Position;
import org.fallwright.core.site.Wire;
import org.locationtech.jts.geom.Coordinate;

/**
 * A straight piece between two points in space: east, north, elevation [m].
 *
 * <p>The library's own distance of two such pieces is not used: where both nearest points of the
 * whole lines lie beyond the ends it can answer too much, which would be the unsafe side.
 */
record Segment3(double ax, double ay, double az, double bx, double by, double bz) {
  private static final int PIECES = 32;

  static Segment3 between(Position a, double aElevationM, Position b, double bElevationM) {
    return new Segment3(a.eastM(), a.northM(), aElevationM, b.eastM(), b.northM(), bElevationM);
  }

  /**
   * The conductor of a wire as chords of its sagging spans, a parabola sag·4t(1 − t) below the
   * straight line between the fastenings; each chord lies at most sag/1024 above the curve and is
   * lowered by that.
   */
  static List<Segment3> conductor(Wire wire) {
    List<Segment3> all = new ArrayList<>();
    for (int i = 1; i < wire.poles().size(); i++) {
      Wire.Pole p = wire.poles().get(i - 1);
      Wire.Pole q = wire.poles().get(i);
      Segment3 straight =
          between(p.at(), p.groundM() + p.heightM(), q.at(), q.groundM() + q.heightM());
      for (int j = 0; j < PIECES; j++) {
        double[] a = straight.hanging((double) j / PIECES, wire.sagM());
        double[] b = straight.hanging((double) (j + 1) / PIECES, wire.sagM());
        all.add(new Segment3(a[0], a[1], a[2], b[0], b[1], b[2]));
      }
    }
    return all;
  }

  private double[] hanging(double t, double sagM) {
    double[] p = at(t);
    p[2] -= sagM * 4 * t * (1 - t) + sagM / (PIECES * PIECES);
    return p;
  }

  double[] at(double t) {
    return new double[] {ax + t * (bx - ax), ay + t * (by - ay), az + t * (bz - az)};
  }

  Position planAt(double t) {
    double[] p = at(t);
    return new Position(p[0], p[1]);
  }

  Coordinate planFrom() {
    return new Coordinate(ax, ay);
  }

  Coordinate planTo() {
    return new Coordinate(bx, by);
  }

  Segment3 part(double from, double to) {
    double[] a = at(from);
    double[] b = at(to);
    return new Segment3(a[0], a[1], a[2], b[0], b[1], b[2]);
  }

  /** Share of the way at which this comes nearest to a point, 0 to 1. */
  double nearestTo(double x, double y, double z) {
    double dx = bx - ax;
    double dy = by - ay;
    double dz = bz - az;
    double l2 = dx * dx + dy * dy + dz * dz;
    double t = l2 == 0 ? 0 : ((x - ax) * dx + (y - ay) * dy + (z - az) * dz) / l2;
    return Math.min(1, Math.max(0, t));
  }

  double distanceTo(double x, double y, double z) {
    double[] p = at(nearestTo(x, y, z));
    return length(p[0] - x, p[1] - y, p[2] - z);
  }

  /** Least distance to another piece: inside both, or at one of the four ends [m]. */
  double distanceTo(Segment3 o) {
    double best =
        Math.min(
            Math.min(distanceTo(o.ax, o.ay, o.az), distanceTo(o.bx, o.by, o.bz)),
            Math.min(o.distanceTo(ax, ay, az), o.distanceTo(bx, by, bz)));
    double[] u = {bx - ax, by - ay, bz - az};
    double[] v = {o.bx - o.ax, o.by - o.ay, o.bz - o.az};
    double[] w = {ax - o.ax, ay - o.ay, az - o.az};
    double a = dot(u, u);
    double b = dot(u, v);
    double c = dot(v, v);
    double d = dot(u, w);
    double e = dot(v, w);
    double den = a * c - b * b;
    if (den > 1e-12 * a * c) {
      double s = (b * e - c * d) / den;
      double t = (a * e - b * d) / den;
      if (s >= 0 && s <= 1 && t >= 0 && t <= 1) {
        double[] p = at(s);
        double[] q = o.at(t);
        best = Math.min(best, length(p[0] - q[0], p[1] - q[1], p[2] - q[2]));
      }
    }
    return best;
  }

  private static double dot(double[] p, double[] q) {
    return p[0] * q[0] + p[1] * q[1] + p[2] * q[2];
  }

  private static double length(double x, double y, double z) {
    return Math.sqrt(x * x + y * y + z * z);
  }
}
