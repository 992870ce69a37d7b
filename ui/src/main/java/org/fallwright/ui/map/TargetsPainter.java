package org.fallwright.ui.map;

import java.awt.Color;
import java.awt.Shape;
import java.awt.geom.Line2D;
import java.awt.geom.Point2D;
import org.fallwright.core.site.DropZone;
import org.fallwright.core.site.Target;
import org.fallwright.ui.text.Messages;
import org.locationtech.jts.geom.Geometry;
import org.locationtech.jts.linearref.LengthIndexedLine;

/** Targets, told apart by kind, and drop zones. */
final class TargetsPainter {
  private TargetsPainter() {}

  static void dropZones(Canvas c) {
    for (DropZone z : c.scene().site().dropZones()) {
      Geometry m = z.shape().geometry();
      Shape s = c.view().toPixels(m);
      c.pen().stroke(s, c.palette().wayOut(), 1.4, 10, 3, 2, 3);
      Geometry edge = c.visible(m.getBoundary());
      c.labelOn(z.id(), edge, 6, false, c.palette().wayOut());
    }
  }

  static void targets(Canvas c) {
    for (Target t : c.scene().site().targets()) {
      Geometry m = t.shape().geometry();
      Shape s = c.view().toPixels(m);
      Color ink = c.palette().target();
      if (m.getDimension() == 2) {
        area(c, t, s, ink);
      } else {
        along(c, t, s, m, ink);
      }
      String words = t.mayBeHit() ? Messages.text("plan.may-be-hit", t.id()) : t.id();
      boolean must = !t.mayBeHit() && t.kind() != Target.Kind.ROAD;
      c.labelOn(words, m, t.occupied() ? 2 : 4, must, ink);
    }
  }

  private static void area(Canvas c, Target t, Shape s, Color ink) {
    Pen pen = c.pen();
    switch (t.kind()) {
      case STRUCTURE, CAR -> {
        pen.fill(s, Palette.clear(ink, 70));
        pen.stroke(s, ink, t.occupied() ? 2.6 : 1.8);
      }
      case PLANTING, TREE -> {
        pen.fill(s, Palette.clear(c.palette().tree(), 60));
        pen.stroke(s, c.palette().tree(), 1.2, 1.5, 3);
      }
      case BURIED -> {
        pen.stroke(s, ink, 1.2, 3, 3);
        pen.hatch(s, Palette.clear(ink, 150), 12, 0.7, 0);
      }
      case ROAD -> {
        pen.fill(s, Palette.clear(c.palette().earth(), 60));
        pen.stroke(s, c.palette().earth(), 1.1);
      }
      case PLACE_OF_PEOPLE -> {
        pen.stroke(s, ink, 1.6);
        pen.dots(s, ink, 9, 2.4);
      }
      default -> pen.stroke(s, ink, 1.4, 6, 2);
    }
  }

  private static void along(Canvas c, Target t, Shape s, Geometry m, Color ink) {
    switch (t.kind()) {
      case ROAD -> c.pen().stroke(s, c.palette().earth(), 3);
      case BURIED -> c.pen().stroke(s, ink, 1.4, 3, 3);
      default -> {
        c.pen().stroke(s, ink, 1.3);
        posts(c, m, ink);
      }
    }
  }

  /** Short cross strokes along a fence, some paces apart on the drawing. */
  private static void posts(Canvas c, Geometry m, Color ink) {
    var line = new LengthIndexedLine(m);
    double step = 16 * c.unit() / c.view().pixelsPerMetre();
    for (double at = step / 2; at < m.getLength(); at += step) {
      var p = line.extractPoint(at);
      var q = line.extractPoint(Math.min(at + 0.01, m.getLength()));
      Point2D a = c.view().toPixel(p.x, p.y);
      Point2D b = c.view().toPixel(q.x, q.y);
      double n = a.distance(b);
      if (n > 0 && c.view().frame().contains(a)) {
        double dx = (b.getX() - a.getX()) / n * 3 * c.unit();
        double dy = (b.getY() - a.getY()) / n * 3 * c.unit();
        c.pen()
            .plain(
                new Line2D.Double(a.getX() - dy, a.getY() + dx, a.getX() + dy, a.getY() - dx),
                ink,
                1.2);
      }
    }
  }
}
