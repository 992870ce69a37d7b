package org.fallwright.ui.map;

import java.awt.geom.Path2D;
import java.awt.geom.Point2D;
import java.util.List;
import org.fallwright.core.site.Position;
import org.fallwright.core.site.Wire;
import org.fallwright.ui.text.Messages;
import org.locationtech.jts.geom.Coordinate;
import org.locationtech.jts.geom.Geometry;
import org.locationtech.jts.operation.distance.DistanceOp;

/**
 * Overhead lines: dash-dot with a bolt, the poles as ringed dots, voltage and distance in words.
 */
final class WiresPainter {
  private WiresPainter() {}

  static void wires(Canvas c) {
    Position stump = c.scene().site().tree().stump().at();
    for (Wire w : c.scene().site().wires()) {
      List<Position> points = w.poles().stream().map(Wire.Pole::at).toList();
      c.pen().stroke(c.path(points), c.palette().wire(), 2, 14, 4, 2, 4);
      for (Position p : points) {
        Point2D at = c.at(p);
        c.pen().solid(c.pen().disc(at, 3.2), c.palette().halo(), c.palette().wire(), 1.4);
        c.pen().fill(c.pen().disc(at, 1.2), c.palette().wire());
      }
      Geometry seen = c.visible(new org.fallwright.core.site.Shape.Line(points).geometry());
      if (!seen.isEmpty()) {
        Geometry from =
            seen.getFactory().createPoint(new Coordinate(stump.eastM(), stump.northM()));
        Geometry whole = new org.fallwright.core.site.Shape.Line(points).geometry();
        double distance = from.distance(whole);
        Coordinate near = DistanceOp.nearestPoints(seen, from)[0];
        Point2D at = c.view().toPixel(near.x, near.y);
        bolt(c, at);
        c.must(words(c, w, distance), at, 9, 0, c.palette().wire());
      }
    }
    reach(c, stump);
  }

  private static String words(Canvas c, Wire w, double distance) {
    String away = c.scene().amounts().length(distance);
    if (w.state() == Wire.State.DEAD_AND_EARTHED) {
      return Messages.text("plan.wire.dead", w.id(), away);
    }
    return w.voltageKv() == null
        ? Messages.text("plan.wire.unknown", w.id(), away)
        : Messages.text("plan.wire.known", w.id(), String.valueOf(w.voltageKv()), away);
  }

  /** The circle within which any wire stops the work, where a wire comes into it. */
  private static void reach(Canvas c, Position stump) {
    var chosen = c.scene().chosen();
    if (chosen == null || chosen.ground() == null) {
      return;
    }
    double r = chosen.ground().wireReachM();
    Geometry from =
        org.fallwright.core.site.Shape.FACTORY.createPoint(
            new Coordinate(stump.eastM(), stump.northM()));
    boolean inside =
        c.scene().site().wires().stream()
            .map(w -> w.poles().stream().map(Wire.Pole::at).toList())
            .anyMatch(
                p -> new org.fallwright.core.site.Shape.Line(p).geometry().distance(from) < r);
    if (inside) {
      c.pen().stroke(c.circle(stump, r), c.palette().wire(), 1.4, 2, 4);
    }
  }

  private static void bolt(Canvas c, Point2D at) {
    Path2D p = new Path2D.Double();
    p.moveTo(2, -7);
    p.lineTo(-3.5, 1);
    p.lineTo(-0.4, 1);
    p.lineTo(-2, 7);
    p.lineTo(3.5, -1.4);
    p.lineTo(0.4, -1.4);
    p.closePath();
    c.pen().fill(c.pen().disc(at, 9), c.palette().halo());
    c.pen().plain(c.pen().disc(at, 9), c.palette().wire(), 1.4);
    c.pen().fill(c.pen().put(p, at, 0), c.palette().wire());
    c.labels().keepFree(at, 9 * c.unit());
  }
}
