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

  /**
   * The least distance to another piece, inside both or at one of the four ends.
   *
   * @param distanceM the distance [m]
   * @param at share of the way along this piece
   */
  record Nearest(double distanceM, double at) {}

  Nearest nearest(Segment3 o) {
    double a0 = nearestTo(o.ax, o.ay, o.az);
    double a1 = nearestTo(o.bx, o.by, o.bz);
    Nearest best = new Nearest(Double.POSITIVE_INFINITY, 0);
    for (double t : new double[] {0, 1, a0, a1, crossing(o)}) {
      double[] p = at(t);
      double d = o.distanceTo(p[0], p[1], p[2]);
      best = d < best.distanceM ? new Nearest(d, t) : best;
    }
    return best;
  }

  double distanceTo(Segment3 o) {
    return nearest(o).distanceM;
  }

  /** Where the whole lines come nearest, cut to this piece; 0 where they are parallel. */
  private double crossing(Segment3 o) {
    double[] u = {bx - ax, by - ay, bz - az};
    double[] v = {o.bx - o.ax, o.by - o.ay, o.bz - o.az};
    double[] w = {ax - o.ax, ay - o.ay, az - o.az};
    double a = dot(u, u);
    double b = dot(u, v);
    double c = dot(v, v);
    double den = a * c - b * b;
    double s = den > 1e-12 * a * c ? (b * dot(v, w) - c * dot(u, w)) / den : 0;
    return Math.min(1, Math.max(0, s));
  }

  private static double dot(double[] p, double[] q) {
    return p[0] * q[0] + p[1] * q[1] + p[2] * q[2];
  }

  private static double length(double x, double y, double z) {
    return Math.sqrt(x * x + y * y + z * z);
  }
}
