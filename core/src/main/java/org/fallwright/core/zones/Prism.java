package org.fallwright.core.zones;

import org.fallwright.core.site.Position;
import org.fallwright.core.site.Shape;
import org.fallwright.core.site.Target;
import org.locationtech.jts.geom.Coordinate;
import org.locationtech.jts.geom.Geometry;
import org.locationtech.jts.operation.overlayng.OverlayNG;
import org.locationtech.jts.operation.overlayng.OverlayNGRobust;

/**
 * A thing that stands from the ground to a level top. The part of a leg below the top counts in
 * plan; the part above counts to the top face: straight down over it, else to its rim. A leg that
 * cuts into it has minus the most by which it would have to be raised.
 */
final class Prism implements LegCheck.Obstacle {
  private final Target target;
  private final Geometry geometry;
  private final Edges edges;
  private final double topM;

  Prism(Target target) {
    this.target = target;
    this.geometry = target.shape().geometry();
    this.edges = new Edges(geometry);
    this.topM = target.groundM() + target.heightM();
  }

  @Override
  public String id() {
    return target.id();
  }

  @Override
  public double errorM() {
    return target.errorM();
  }

  @Override
  public LegCheck.Near near(Leg leg) {
    if (leg.fastenedTo().contains(target.id())) {
      return null;
    }
    Segment3 s = leg.segment();
    double rise = s.bz() - s.az();
    double cut = rise == 0 ? 2 : (topM - s.az()) / rise;
    if (cut <= 0 || cut >= 1) {
      return (s.az() + s.bz()) / 2 <= topM ? below(s) : above(s);
    }
    Segment3 first = s.part(0, cut);
    Segment3 second = s.part(cut, 1);
    return nearer(rise > 0 ? below(first) : above(first), rise > 0 ? above(second) : below(second));
  }

  private static LegCheck.Near nearer(LegCheck.Near a, LegCheck.Near b) {
    return a.clearanceM() <= b.clearanceM() ? a : b;
  }

  private LegCheck.Near below(Segment3 s) {
    Edges.Gap gap = new Edges(plan(s)).gapTo(edges);
    if (gap.distanceM() > 0) {
      return new LegCheck.Near(gap.distanceM(), LegCheck.position(gap.onOther()));
    }
    return lowestOver(s, LegCheck.position(gap.onOther()));
  }

  private LegCheck.Near above(Segment3 s) {
    LegCheck.Near best = lowestOver(s, null);
    for (int i = 0; i < edges.size(); i++) {
      Coordinate a = edges.from(i);
      Coordinate b = edges.to(i);
      Segment3 rim = new Segment3(a.x, a.y, topM, b.x, b.y, topM);
      double d = s.distanceTo(rim);
      if (d < best.clearanceM()) {
        best = new LegCheck.Near(d, new Position((a.x + b.x) / 2, (a.y + b.y) / 2));
      }
    }
    return best;
  }

  /** Least height above the top over the thing itself; infinite where the leg is not over it. */
  private LegCheck.Near lowestOver(Segment3 s, Position otherwise) {
    LegCheck.Near best =
        new LegCheck.Near(otherwise == null ? Double.POSITIVE_INFINITY : 0, otherwise);
    Geometry over = OverlayNGRobust.overlay(plan(s), geometry, OverlayNG.INTERSECTION);
    for (Coordinate c : over.getCoordinates()) {
      double z = s.at(planShare(s, c))[2];
      if (z - topM < best.clearanceM()) {
        best = new LegCheck.Near(z - topM, LegCheck.position(c));
      }
    }
    return best;
  }

  private static double planShare(Segment3 s, Coordinate c) {
    return new Segment3(s.ax(), s.ay(), 0, s.bx(), s.by(), 0).nearestTo(c.x, c.y, 0);
  }

  private static Geometry plan(Segment3 s) {
    return Shape.FACTORY.createLineString(new Coordinate[] {s.planFrom(), s.planTo()});
  }
}
