package org.fallwright.ui.map;

import java.awt.Color;
import java.awt.Shape;
import java.awt.geom.Path2D;
import java.awt.geom.Point2D;
import java.awt.geom.Rectangle2D;
import java.util.List;
import org.fallwright.core.site.Position;
import org.locationtech.jts.geom.Coordinate;
import org.locationtech.jts.geom.Envelope;
import org.locationtech.jts.geom.Geometry;
import org.locationtech.jts.geom.GeometryFactory;
import org.locationtech.jts.geom.Point;
import org.locationtech.jts.geom.util.LineStringExtracter;
import org.locationtech.jts.linearref.LengthIndexedLine;

/** What the painters of one drawing share: the scene, the view, the pen and the labels wanted. */
record Canvas(PlanScene scene, Viewport view, Pen pen, Labels labels) {
  private static final GeometryFactory FACTORY = new GeometryFactory();

  Palette palette() {
    return scene.palette();
  }

  double unit() {
    return pen.unit();
  }

  Point2D at(Position p) {
    return view.toPixel(p);
  }

  Shape circle(Position centre, double radiusM) {
    return view.toPixels(
        FACTORY.createPoint(new Coordinate(centre.eastM(), centre.northM())).buffer(radiusM, 24));
  }

  Path2D path(List<Position> points) {
    Path2D p = new Path2D.Double();
    for (Position q : points) {
      Point2D d = at(q);
      if (p.getCurrentPoint() == null) {
        p.moveTo(d.getX(), d.getY());
      } else {
        p.lineTo(d.getX(), d.getY());
      }
    }
    return p;
  }

  /** A label beside a point. */
  void label(String text, Point2D at, double clearanceUnits, int rank, Color c) {
    labels.want(new Labels.Wanted(text, at, clearanceUnits * unit(), rank, false, c));
  }

  /** A label beside a point that may never be left out. */
  void must(String text, Point2D at, double clearanceUnits, int rank, Color c) {
    labels.want(new Labels.Wanted(text, at, clearanceUnits * unit(), rank, true, c));
  }

  /** Keeps a straight stroke free of labels. */
  void keepFree(Point2D from, Point2D to) {
    double step = 5 * unit();
    int n = (int) Math.ceil(from.distance(to) / step);
    for (int i = 0; i <= n && n < 2000; i++) {
      Point2D p =
          new Point2D.Double(
              from.getX() + (to.getX() - from.getX()) * i / n,
              from.getY() + (to.getY() - from.getY()) * i / n);
      if (view.frame().contains(p)) {
        labels.keepFree(p, 2.5 * unit());
      }
    }
  }

  /** A label on the visible part of an area or line; none where nothing of it is visible. */
  void labelOn(String text, Geometry metres, int rank, boolean must, Color c) {
    Geometry seen = visible(metres);
    if (seen.isEmpty()) {
      return;
    }
    Point2D at;
    double clearance;
    if (seen.getDimension() == 2) {
      Point p = seen.getInteriorPoint();
      Point mid = seen.getCentroid();
      Point use = seen.contains(mid) ? mid : p;
      at = view.toPixel(use.getX(), use.getY());
      clearance = -1;
    } else {
      // what only touches the frame is a point, and not to be seen
      Geometry lines = LineStringExtracter.getGeometry(seen);
      if (lines.isEmpty()) {
        return;
      }
      Coordinate m = new LengthIndexedLine(lines).extractPoint(lines.getLength() / 2);
      at = view.toPixel(m.x, m.y);
      clearance = 5 * unit();
    }
    labels.want(new Labels.Wanted(text, at, clearance, rank, must, c));
  }

  /** The part of a geometry inside the frame [m]. */
  Geometry visible(Geometry metres) {
    Rectangle2D f = view.frame();
    Envelope box = new Envelope();
    Coordinate[] corners = new Coordinate[5];
    double[][] c = {
      {f.getMinX(), f.getMinY()},
      {f.getMaxX(), f.getMinY()},
      {f.getMaxX(), f.getMaxY()},
      {f.getMinX(), f.getMaxY()}
    };
    for (int i = 0; i < 4; i++) {
      Point2D m = view.toMetres(new Point2D.Double(c[i][0], c[i][1]));
      corners[i] = new Coordinate(m.getX(), m.getY());
      box.expandToInclude(corners[i]);
    }
    corners[4] = corners[0].copy();
    return box.intersects(metres.getEnvelopeInternal())
        ? FACTORY.createPolygon(corners).intersection(metres)
        : FACTORY.createGeometryCollection();
  }
}
