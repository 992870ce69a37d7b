package org.fallwright.core.zones;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import org.locationtech.jts.geom.Coordinate;
import org.locationtech.jts.geom.Envelope;
import org.locationtech.jts.geom.Geometry;
import org.locationtech.jts.geom.GeometryComponentFilter;
import org.locationtech.jts.geom.LineString;

/**
 * The edges of an outline, ready for the many distance questions of a search. Plain loops over
 * numbers: outlines here have tens of edges, for which the library's indexed distances cost more to
 * set up than they save.
 */
final class Edges {
  private final double[] ax;
  private final double[] ay;
  private final double[] bx;
  private final double[] by;
  private final Envelope envelope;
  private final boolean area;
  private final double[][] corners;

  /** Boxes about each {@link #CHUNK} edges, least and greatest x and y. */
  private final double[] boxes;

  private static final int CHUNK = 8;

  Edges(Geometry geometry) {
    List<Coordinate[]> lines = new ArrayList<>();
    geometry.apply(
        (GeometryComponentFilter)
            part -> {
              if (part instanceof LineString line) {
                lines.add(line.getCoordinates());
              }
            });
    int n = lines.stream().mapToInt(c -> c.length - 1).sum();
    ax = new double[n];
    ay = new double[n];
    bx = new double[n];
    by = new double[n];
    int at = 0;
    List<double[]> all = new ArrayList<>();
    for (Coordinate[] c : lines) {
      for (int i = c[0].equals2D(c[c.length - 1]) ? 1 : 0; i < c.length; i++) {
        all.add(new double[] {c[i].x, c[i].y});
      }
      for (int i = 1; i < c.length; i++, at++) {
        ax[at] = c[i - 1].x;
        ay[at] = c[i - 1].y;
        bx[at] = c[i].x;
        by[at] = c[i].y;
      }
    }
    corners = all.toArray(double[][]::new);
    envelope = geometry.getEnvelopeInternal();
    area = geometry.getDimension() == 2;
    boxes = boxes();
  }

  /** A straight line. */
  Edges(double fromX, double fromY, double toX, double toY) {
    ax = new double[] {fromX};
    ay = new double[] {fromY};
    bx = new double[] {toX};
    by = new double[] {toY};
    corners = new double[][] {{fromX, fromY}, {toX, toY}};
    envelope = new Envelope(fromX, toX, fromY, toY);
    area = false;
    boxes = boxes();
  }

  /** An area within a closed ring of corners, the first not said again. */
  Edges(double[][] ring) {
    int n = ring.length;
    ax = new double[n];
    ay = new double[n];
    bx = new double[n];
    by = new double[n];
    envelope = new Envelope();
    for (int i = 0; i < n; i++) {
      double[] next = ring[(i + 1) % n];
      ax[i] = ring[i][0];
      ay[i] = ring[i][1];
      bx[i] = next[0];
      by[i] = next[1];
      envelope.expandToInclude(ring[i][0], ring[i][1]);
    }
    corners = ring;
    area = true;
    boxes = boxes();
  }

  /** The convex hull of outlines. */
  static Edges hull(List<Edges> outlines) {
    List<double[]> all = new ArrayList<>();
    for (Edges e : outlines) {
      all.addAll(Arrays.asList(e.corners));
    }
    all.sort((p, q) -> p[0] != q[0] ? Double.compare(p[0], q[0]) : Double.compare(p[1], q[1]));
    double[][] ring = new double[2 * all.size()][];
    int n = 0;
    for (int i = 0; i < all.size(); i++) {
      n = turn(ring, n, 0, all.get(i));
    }
    int lower = n;
    for (int i = all.size() - 2; i >= 0; i--) {
      n = turn(ring, n, lower - 1, all.get(i));
    }
    return new Edges(Arrays.copyOf(ring, n - 1));
  }

  /** Adds a corner to a chain that turns left; corners that it makes needless are dropped. */
  private static int turn(double[][] ring, int n, int first, double[] p) {
    int count = n;
    while (count > first + 1) {
      double[] a = ring[count - 2];
      double[] b = ring[count - 1];
      if ((b[0] - a[0]) * (p[1] - a[1]) - (b[1] - a[1]) * (p[0] - a[0]) > 0) {
        break;
      }
      count--;
    }
    ring[count] = p;
    return count + 1;
  }

  private double[] boxes() {
    int n = (ax.length + CHUNK - 1) / CHUNK;
    double[] all = new double[4 * n];
    for (int c = 0; c < n; c++) {
      double minX = Double.POSITIVE_INFINITY;
      double maxX = Double.NEGATIVE_INFINITY;
      double minY = Double.POSITIVE_INFINITY;
      double maxY = Double.NEGATIVE_INFINITY;
      for (int i = c * CHUNK; i < Math.min(ax.length, (c + 1) * CHUNK); i++) {
        minX = Math.min(minX, Math.min(ax[i], bx[i]));
        maxX = Math.max(maxX, Math.max(ax[i], bx[i]));
        minY = Math.min(minY, Math.min(ay[i], by[i]));
        maxY = Math.max(maxY, Math.max(ay[i], by[i]));
      }
      all[4 * c] = minX;
      all[4 * c + 1] = maxX;
      all[4 * c + 2] = minY;
      all[4 * c + 3] = maxY;
    }
    return all;
  }

  /** Square of the distance from a point to the box about a chunk of edges [m²]. */
  private double toChunk(double x, double y, int c) {
    double dx = Math.max(0, Math.max(boxes[4 * c] - x, x - boxes[4 * c + 1]));
    double dy = Math.max(0, Math.max(boxes[4 * c + 2] - y, y - boxes[4 * c + 3]));
    return dx * dx + dy * dy;
  }

  /**
   * The least distance between two outlines, 0 where they meet or one holds the other.
   *
   * @param onOther the other's nearest point; where they meet, a point at which they do
   */
  record Gap(double distanceM, Coordinate onOther) {}

  int size() {
    return ax.length;
  }

  Coordinate from(int edge) {
    return new Coordinate(ax[edge], ay[edge]);
  }

  Coordinate to(int edge) {
    return new Coordinate(bx[edge], by[edge]);
  }

  Envelope envelope() {
    return envelope;
  }

  boolean isArea() {
    return area;
  }

  /** Whether this is an area and the point lies in it. */
  boolean contains(Coordinate p) {
    return contains(p.x, p.y);
  }

  /** The same. */
  boolean contains(double x, double y) {
    if (!area || !envelope.covers(x, y)) {
      return false;
    }
    boolean in = false;
    for (int i = 0; i < ax.length; i++) {
      if (ay[i] > y != by[i] > y) {
        double cross = (bx[i] - ax[i]) * (y - ay[i]) - (x - ax[i]) * (by[i] - ay[i]);
        if (cross > 0 == by[i] > ay[i]) {
          in = !in;
        }
      }
    }
    return in;
  }

  /** Distance from a point to the nearest edge [m]. */
  double toEdge(Coordinate p) {
    double best = Double.POSITIVE_INFINITY;
    for (int c = 0; 4 * c < boxes.length; c++) {
      if (toChunk(p.x, p.y, c) < best) {
        for (int i = c * CHUNK; i < Math.min(ax.length, (c + 1) * CHUNK); i++) {
          best = Math.min(best, squared(p.x, p.y, i));
        }
      }
    }
    return Math.sqrt(best);
  }

  /** Distance from a point to one edge [m]. */
  double toEdge(Coordinate p, int edge) {
    return Math.sqrt(squared(p.x, p.y, edge));
  }

  /** Distance from a point to this, 0 inside an area [m]. */
  double distanceTo(Coordinate p) {
    return contains(p) ? 0 : toEdge(p);
  }

  private double squared(double x, double y, int i) {
    double t = share(x, y, i);
    double dx = ax[i] + t * (bx[i] - ax[i]) - x;
    double dy = ay[i] + t * (by[i] - ay[i]) - y;
    return dx * dx + dy * dy;
  }

  /** Share of the way along an edge at which it is nearest to a point, 0 to 1. */
  private double share(double x, double y, int i) {
    double dx = bx[i] - ax[i];
    double dy = by[i] - ay[i];
    double dot = (x - ax[i]) * dx + (y - ay[i]) * dy;
    if (dot <= 0) {
      return 0;
    }
    double l2 = dx * dx + dy * dy;
    return dot >= l2 ? 1 : dot / l2;
  }

  /** The gap between this and another outline. */
  Gap gapTo(Edges other) {
    return gapTo(other, Double.POSITIVE_INFINITY);
  }

  /** The same; null where the two are plainly as far apart as {@code unlessM} or farther [m]. */
  Gap gapTo(Edges other, double unlessM) {
    double dx =
        Math.max(
            0,
            Math.max(
                envelope.getMinX() - other.envelope.getMaxX(),
                other.envelope.getMinX() - envelope.getMaxX()));
    double dy =
        Math.max(
            0,
            Math.max(
                envelope.getMinY() - other.envelope.getMaxY(),
                other.envelope.getMinY() - envelope.getMaxY()));
    // a hair on the side of looking
    if (dx * dx + dy * dy > unlessM * unlessM * (1 + 1e-9)) {
      return null;
    }
    Coordinate meet = envelope.intersects(other.envelope) ? meeting(other) : null;
    if (meet != null) {
      return new Gap(0, meet);
    }
    // Apart, the nearest pair of places always has a corner of one of the two.
    double best = Double.POSITIVE_INFINITY;
    double x = 0;
    double y = 0;
    for (double[] c : other.corners) {
      for (int chunk = 0; 4 * chunk < boxes.length; chunk++) {
        if (toChunk(c[0], c[1], chunk) >= best) {
          continue;
        }
        for (int i = chunk * CHUNK; i < Math.min(ax.length, (chunk + 1) * CHUNK); i++) {
          double d = squared(c[0], c[1], i);
          if (d < best) {
            best = d;
            x = c[0];
            y = c[1];
          }
        }
      }
    }
    for (double[] c : corners) {
      if (boxSquared(c, other.envelope) >= best) {
        continue;
      }
      for (int i = 0; i < other.ax.length; i++) {
        double d = other.squared(c[0], c[1], i);
        if (d < best) {
          best = d;
          double t = other.share(c[0], c[1], i);
          x = other.ax[i] + t * (other.bx[i] - other.ax[i]);
          y = other.ay[i] + t * (other.by[i] - other.ay[i]);
        }
      }
    }
    return new Gap(Math.sqrt(best), new Coordinate(x, y));
  }

  private Coordinate meeting(Edges o) {
    Coordinate crossing = crossing(o);
    if (crossing != null) {
      return crossing;
    }
    if (contains(o.ax[0], o.ay[0])) {
      return o.from(0);
    }
    return o.contains(ax[0], ay[0]) ? from(0) : null;
  }

  /** Whether an edge of this and one of the other cross or touch. */
  boolean crosses(Edges other) {
    return crossing(other) != null;
  }

  private Coordinate crossing(Edges o) {
    for (int i = 0; i < ax.length; i++) {
      if (i % CHUNK == 0 && apart(4 * (i / CHUNK), o.envelope)) {
        i += CHUNK - 1;
        continue;
      }
      double minX = Math.min(ax[i], bx[i]);
      double maxX = Math.max(ax[i], bx[i]);
      double minY = Math.min(ay[i], by[i]);
      double maxY = Math.max(ay[i], by[i]);
      if (minX > o.envelope.getMaxX()
          || maxX < o.envelope.getMinX()
          || minY > o.envelope.getMaxY()
          || maxY < o.envelope.getMinY()) {
        continue;
      }
      for (int j = 0; j < o.ax.length; j++) {
        boolean boxes =
            Math.max(o.ax[j], o.bx[j]) >= minX
                && Math.min(o.ax[j], o.bx[j]) <= maxX
                && Math.max(o.ay[j], o.by[j]) >= minY
                && Math.min(o.ay[j], o.by[j]) <= maxY;
        if (boxes
            && side(i, o.ax[j], o.ay[j]) * side(i, o.bx[j], o.by[j]) <= 0
            && o.side(j, ax[i], ay[i]) * o.side(j, bx[i], by[i]) <= 0) {
          double a = o.side(j, ax[i], ay[i]);
          double b = o.side(j, bx[i], by[i]);
          double t = a == b ? 0 : a / (a - b);
          return new Coordinate(ax[i] + t * (bx[i] - ax[i]), ay[i] + t * (by[i] - ay[i]));
        }
      }
    }
    return null;
  }

  private boolean apart(int box, Envelope of) {
    return boxes[box] > of.getMaxX()
        || boxes[box + 1] < of.getMinX()
        || boxes[box + 2] > of.getMaxY()
        || boxes[box + 3] < of.getMinY();
  }

  private double side(int i, double x, double y) {
    return (bx[i] - ax[i]) * (y - ay[i]) - (by[i] - ay[i]) * (x - ax[i]);
  }

  private static double boxSquared(double[] c, Envelope box) {
    double dx = Math.max(0, Math.max(box.getMinX() - c[0], c[0] - box.getMaxX()));
    double dy = Math.max(0, Math.max(box.getMinY() - c[1], c[1] - box.getMaxY()));
    return dx * dx + dy * dy;
  }
}
