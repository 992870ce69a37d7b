package org.fallwright.core.zones;

import java.util.ArrayList;
import java.util.List;
import org.locationtech.jts.algorithm.Distance;
import org.locationtech.jts.algorithm.RayCrossingCounter;
import org.locationtech.jts.geom.Coordinate;
import org.locationtech.jts.geom.Envelope;
import org.locationtech.jts.geom.Geometry;
import org.locationtech.jts.geom.GeometryComponentFilter;
import org.locationtech.jts.geom.LineSegment;
import org.locationtech.jts.geom.LineString;
import org.locationtech.jts.geom.Location;

/**
 * The edges of an outline, ready for many distance questions. Plain loops: outlines here have tens
 * of edges, for which building an index costs more than it saves.
 */
final class Edges {
  private final Coordinate[] from;
  private final Coordinate[] to;
  private final Envelope envelope;
  private final boolean area;

  Edges(Geometry geometry) {
    List<Coordinate> a = new ArrayList<>();
    List<Coordinate> b = new ArrayList<>();
    geometry.apply(
        (GeometryComponentFilter)
            part -> {
              if (part instanceof LineString line) {
                Coordinate[] c = line.getCoordinates();
                for (int i = 1; i < c.length; i++) {
                  a.add(c[i - 1]);
                  b.add(c[i]);
                }
              }
            });
    from = a.toArray(Coordinate[]::new);
    to = b.toArray(Coordinate[]::new);
    envelope = geometry.getEnvelopeInternal();
    area = geometry.getDimension() == 2;
  }

  /** Least distance to another outline, 0 where they meet or one holds the other. */
  record Gap(double distanceM, Coordinate onOther) {}

  int size() {
    return from.length;
  }

  Coordinate from(int edge) {
    return from[edge];
  }

  Coordinate to(int edge) {
    return to[edge];
  }

  Envelope envelope() {
    return envelope;
  }

  /** Whether this is an area and the point lies in it or on its edge. */
  boolean contains(Coordinate p) {
    if (!area || !envelope.covers(p)) {
      return false;
    }
    RayCrossingCounter counter = new RayCrossingCounter(p);
    for (int i = 0; i < from.length; i++) {
      counter.countSegment(from[i], to[i]);
    }
    return counter.getLocation() != Location.EXTERIOR;
  }

  /** Distance from a point to the nearest edge [m]. */
  double toEdge(Coordinate p) {
    double best = Double.POSITIVE_INFINITY;
    for (int i = 0; i < from.length; i++) {
      best = Math.min(best, Distance.pointToSegment(p, from[i], to[i]));
    }
    return best;
  }

  /** Distance from a point to this, 0 inside an area [m]. */
  double distanceTo(Coordinate p) {
    return contains(p) ? 0 : toEdge(p);
  }

  /** The gap between this and another outline, with the other's nearest point. */
  Gap gapTo(Edges other) {
    double best = Double.POSITIVE_INFINITY;
    int mine = 0;
    int theirs = 0;
    for (int i = 0; i < from.length; i++) {
      if (boxDistance(from[i], to[i], other.envelope) >= best) {
        continue;
      }
      for (int j = 0; j < other.from.length; j++) {
        double d = Distance.segmentToSegment(from[i], to[i], other.from[j], other.to[j]);
        if (d < best) {
          best = d;
          mine = i;
          theirs = j;
        }
      }
    }
    if (best > 0 && contains(other.from[0])) {
      return new Gap(0, other.from[0]);
    }
    if (best > 0 && other.contains(from[0])) {
      return new Gap(0, from[0]);
    }
    LineSegment a = new LineSegment(from[mine], to[mine]);
    return new Gap(best, a.closestPoints(new LineSegment(other.from[theirs], other.to[theirs]))[1]);
  }

  private static double boxDistance(Coordinate a, Coordinate b, Envelope box) {
    double dx = Math.max(box.getMinX() - Math.max(a.x, b.x), Math.min(a.x, b.x) - box.getMaxX());
    double dy = Math.max(box.getMinY() - Math.max(a.y, b.y), Math.min(a.y, b.y) - box.getMaxY());
    dx = Math.max(0, dx);
    dy = Math.max(0, dy);
    return Math.sqrt(dx * dx + dy * dy);
  }
}
