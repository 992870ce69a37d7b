package org.fallwright.ui.side;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import org.fallwright.core.site.Place;
import org.fallwright.core.site.Position;
import org.fallwright.core.site.Shape;
import org.fallwright.core.site.Site;
import org.fallwright.core.site.Target;
import org.fallwright.core.site.Wire;
import org.locationtech.jts.geom.Coordinate;
import org.locationtech.jts.geom.Geometry;

/**
 * What the vertical plane along a lay meets.
 *
 * @param layDeg the lay [degrees from true north]
 */
record LayPlane(Site site, double layDeg) {
  /** Known ground within this distance of the plane is drawn as its ground [m]. */
  private static final double NEAR_M = 8;

  /** A known height of the ground: s along the lay, z above the ground at the stump [m]. */
  record GroundPoint(double s, double z) {}

  /** A wire where it crosses the plane [m]. */
  record Crossing(Wire wire, double s, double z) {}

  /**
   * A target in the strip that the crown can sweep.
   *
   * @param from nearest to the butt along the lay [m]
   * @param to farthest [m]
   * @param aside least distance from the plane, 0 where the plane cuts it [m]
   */
  record Standing(Target target, double from, double to, double aside) {}

  private Position stump() {
    return site.tree().stump().at();
  }

  /** Distance along the lay [m]. */
  double s(Position p) {
    double a = Math.toRadians(layDeg);
    return (p.eastM() - stump().eastM()) * Math.sin(a)
        + (p.northM() - stump().northM()) * Math.cos(a);
  }

  /** Distance to the right of the lay [m]. */
  double r(Position p) {
    double a = Math.toRadians(layDeg);
    return (p.eastM() - stump().eastM()) * Math.cos(a)
        - (p.northM() - stump().northM()) * Math.sin(a);
  }

  /** Height above the ground at the stump [m]. */
  double z(double elevationM) {
    return elevationM - site.tree().stump().groundM();
  }

  /**
   * Known heights of the ground near the plane, in order along the lay; the stump is among them.
   */
  List<GroundPoint> ground() {
    List<GroundPoint> known = new ArrayList<>();
    known.add(new GroundPoint(0, 0));
    site.anchors().forEach(a -> near(known, a.place()));
    site.spots().forEach(p -> near(known, p.place()));
    known.sort(Comparator.comparingDouble(GroundPoint::s));
    List<GroundPoint> apart = new ArrayList<>();
    for (GroundPoint p : known) {
      // two heights at one distance would make a wall; the stump's own stays
      boolean close = !apart.isEmpty() && p.s() - apart.get(apart.size() - 1).s() < 1 && p.s() != 0;
      if (!close) {
        apart.add(p);
      }
    }
    return apart;
  }

  /** Height of the ground by straight lines between known heights, level beyond the outer ones. */
  double groundAt(double s) {
    List<GroundPoint> known = ground();
    GroundPoint before = known.get(0);
    if (s <= before.s()) {
      return before.z();
    }
    for (GroundPoint p : known.subList(1, known.size())) {
      if (s <= p.s()) {
        return before.z() + (p.z() - before.z()) * (s - before.s()) / (p.s() - before.s());
      }
      before = p;
    }
    return before.z();
  }

  /** Wires where they cross the plane between two distances, each with its sag there. */
  List<Crossing> wires(double from, double to) {
    List<Crossing> found = new ArrayList<>();
    for (Wire w : site.wires()) {
      for (int i = 1; i < w.poles().size(); i++) {
        Wire.Pole a = w.poles().get(i - 1);
        Wire.Pole b = w.poles().get(i);
        double ra = r(a.at());
        double rb = r(b.at());
        if (ra * rb > 0 || ra == rb) {
          continue;
        }
        double t = ra / (ra - rb);
        double s = s(a.at()) + t * (s(b.at()) - s(a.at()));
        double ends = (1 - t) * (a.groundM() + a.heightM()) + t * (b.groundM() + b.heightM());
        if (s >= from && s <= to) {
          found.add(new Crossing(w, s, z(ends - 4 * w.sagM() * t * (1 - t))));
        }
      }
    }
    return found;
  }

  /** Targets in the strip of a half-width about the plane between two distances. */
  List<Standing> targets(double from, double to, double halfWidthM) {
    Geometry strip = strip(from, to, halfWidthM);
    Geometry axis = new Shape.Line(List.of(at(from, 0), at(to, 0))).geometry();
    List<Standing> found = new ArrayList<>();
    for (Target t : site.targets()) {
      Geometry g = t.shape().geometry();
      Geometry inside = g.intersection(strip);
      if (inside.isEmpty()) {
        continue;
      }
      double least = Double.POSITIVE_INFINITY;
      double most = Double.NEGATIVE_INFINITY;
      for (Coordinate c : inside.getCoordinates()) {
        double s = s(new Position(c.x, c.y));
        least = Math.min(least, s);
        most = Math.max(most, s);
      }
      found.add(new Standing(t, least, most, g.distance(axis)));
    }
    return found;
  }

  private Position at(double s, double r) {
    return stump().along(layDeg, s).along(layDeg + 90, r);
  }

  private Geometry strip(double from, double to, double half) {
    return new Shape.Polygon(List.of(at(from, -half), at(from, half), at(to, half), at(to, -half)))
        .geometry();
  }

  private void near(List<GroundPoint> known, Place p) {
    if (Math.abs(r(p.at())) <= NEAR_M) {
      known.add(new GroundPoint(s(p.at()), z(p.groundM())));
    }
  }
}
