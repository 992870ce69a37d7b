package org.fallwright.core.zones;

import java.util.ArrayList;
import java.util.List;
import org.fallwright.core.reference.Allowances;
import org.fallwright.core.site.Position;
import org.fallwright.core.site.Shape;
import org.fallwright.core.units.Range;
import org.locationtech.jts.geom.Coordinate;
import org.locationtech.jts.geom.Geometry;
import org.locationtech.jts.operation.union.UnaryUnionOp;

/**
 * Where the ends of a parted line and broken fittings fly.
 *
 * <p>For each end of each leg: a fan of half-angle 20° along the leg from its other end, as long as
 * the leg, for a rope that flies back along itself; and a like fan onward from the end, for it
 * flies as far again past the point that it is fixed to. About each block a disc as large as the
 * shorter leg there.
 *
 * <p>Source: that a parted rope flies past its fixing nearly as far as the length left, widening as
 * it goes, is published (ship insurers' notes on mooring lines); the angle and the disc are
 * planning allowances. The whole neighbourhood of a loaded line is dangerous: this is where nobody
 * may be planned to stand, not a border of safety.
 */
public final class Recoil {
  /** Half-angle of the fans [degrees]: planning allowance. */
  static final double HALF_ANGLE_DEG = Allowances.RECOIL_ANGLE.value();

  private static final int QUARTER = 24;
  private static final double LEAST_LEG_M = 0.05;

  private final List<Sector> fans = new ArrayList<>();
  private final List<Sector> lastFans;
  private final List<Disc> discs = new ArrayList<>();

  private record Disc(Position at, double radiusM) {
    boolean contains(Position p) {
      double e = p.eastM() - at.eastM();
      double n = p.northM() - at.northM();
      return e * e + n * n <= radiusM * radiusM;
    }

    Geometry geometry() {
      return Shape.FACTORY
          .createPoint(new Coordinate(at.eastM(), at.northM()))
          .buffer(radiusM / Math.cos(Math.PI / (4 * QUARTER)), QUARTER);
    }
  }

  /**
   * @param path the line's points in plan, from the tree through its blocks to the source; at least
   *     two
   */
  public Recoil(List<Position> path) {
    this(path, List.of());
  }

  /**
   * @param path as above
   * @param others further loaded paths, as the two legs of an anchor, each from end to end
   */
  public Recoil(List<Position> path, List<List<Position>> others) {
    int lastLeg = add(path);
    lastFans = List.copyOf(fans.subList(lastLeg, fans.size()));
    others.forEach(this::add);
  }

  /** Adds a path; answers at which fan its last leg begins. */
  private int add(List<Position> path) {
    if (path.size() < 2) {
      throw new IllegalArgumentException(
          "a line has " + path.size() + " points; it must have at least 2");
    }
    int lastLeg = 0;
    for (int i = 1; i < path.size(); i++) {
      Position a = path.get(i - 1);
      Position b = path.get(i);
      double length = a.distanceTo(b);
      Range.check("leg_m", length, LEAST_LEG_M, 2 * Position.FARTHEST, "m");
      lastLeg = fans.size();
      for (Position apex : List.of(a, b)) {
        double on = apex.equals(a) ? a.azimuthTo(b) : b.azimuthTo(a);
        fans.add(new Sector(apex, on, HALF_ANGLE_DEG, length));
        fans.add(new Sector(apex, on + 180, HALF_ANGLE_DEG, length));
      }
      if (i + 1 < path.size()) {
        discs.add(new Disc(b, Math.min(length, b.distanceTo(path.get(i + 1)))));
      }
    }
    return lastLeg;
  }

  public boolean contains(Position p) {
    for (Sector f : fans) {
      if (f.contains(p)) {
        return true;
      }
    }
    for (Disc d : discs) {
      if (d.contains(p)) {
        return true;
      }
    }
    return false;
  }

  /**
   * How far along a straight way the disc reaches in which a place on it plainly lies [m]; 0: it
   * lies plainly in none.
   *
   * @param sin sine of the way's azimuth
   * @param cos its cosine
   * @param atM how far along the way the place is [m]
   */
  double discUntil(Position from, double sin, double cos, double atM) {
    for (Disc d : discs) {
      double e = d.at.eastM() - from.eastM();
      double n = d.at.northM() - from.northM();
      double middle = e * sin + n * cos;
      double square = d.radiusM * d.radiusM - (e * e + n * n - middle * middle);
      if (square > 0) {
        double half = Math.sqrt(square) - HAIR_M;
        if (Math.abs(atM - middle) < half) {
          return middle + half;
        }
      }
    }
    return 0;
  }

  /** Rounding that is left to the exact question [m]. */
  private static final double HAIR_M = 1e-6;

  /** Whether a place lies on the axis of the last leg: in one of its fans. */
  public boolean onLastLeg(Position p) {
    return lastFans.stream().anyMatch(f -> f.contains(p));
  }

  public Geometry geometry() {
    List<Geometry> parts = new ArrayList<>();
    fans.forEach(f -> parts.add(f.geometry()));
    discs.forEach(d -> parts.add(d.geometry()));
    return UnaryUnionOp.union(parts);
  }
}
