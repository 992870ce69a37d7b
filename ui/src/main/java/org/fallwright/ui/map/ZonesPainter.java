package org.fallwright.ui.map;

import java.awt.Shape;
import java.awt.geom.Line2D;
import java.awt.geom.Point2D;
import java.util.List;
import org.fallwright.core.plan.Judged;
import org.fallwright.core.site.Position;
import org.fallwright.ui.text.Messages;
import org.locationtech.jts.geom.Geometry;

/**
 * The zones of a setup, each told apart in grey: the fall footprint by a thick outline and sparse
 * dots, the sit-back by diagonal lines, the inside of the line's angle by crossed lines and its
 * word, the people ring by long dashes. Where a parted line flies is said in words by the line
 * itself.
 */
final class ZonesPainter {
  /** How much a zone lightens the picture under it, of 255. */
  private static final int LIGHTEN = 60;

  private ZonesPainter() {}

  static void sitBack(Canvas c, Judged chosen) {
    Geometry m = chosen.ground().sitBack();
    Shape s = c.view().toPixels(m);
    c.pen().fill(s, Palette.clear(c.palette().halo(), LIGHTEN));
    c.pen().hatch(s, Palette.clear(c.palette().sitBack(), 190), 13, 1, 45);
    c.pen().stroke(s, c.palette().sitBack(), 1.8);
    c.labelOn(Messages.text("plan.sit-back"), m, 3, true, c.palette().sitBack());
  }

  static void footprint(Canvas c, Judged chosen) {
    Geometry m = chosen.ground().footprint();
    Shape s = c.view().toPixels(m);
    c.pen().fill(s, Palette.clear(c.palette().halo(), LIGHTEN));
    c.pen().dots(s, c.palette().footprint(), 15, 2.2);
    c.pen().stroke(s, c.palette().footprint(), 3.2);
    if (chosen.ground().slide() != null) {
      slide(c, chosen.ground().slide());
    }
  }

  /** Where the felled tree may slide on: the dotted ground beyond, struck through across. */
  private static void slide(Canvas c, Geometry m) {
    Shape s = c.view().toPixels(m);
    c.pen().hatch(s, Palette.clear(c.palette().footprint(), 190), 9, 1, 0);
    c.labelOn(Messages.text("plan.slide"), m, 2, true, c.palette().footprint());
  }

  static void peopleRing(Canvas c, Judged chosen) {
    Position stump = c.scene().site().tree().stump().at();
    double r = chosen.ground().peopleRadiusM();
    c.pen().stroke(c.circle(stump, r), c.palette().ink(), 1.6, 22, 9);
    String words = Messages.text("plan.ring", c.scene().amounts().roundLength(r));
    for (double off : new double[] {90, -90, 60, -60, 120, -120, 30, -30, 150, -150, 180, 0}) {
      Point2D at = c.at(stump.along(chosen.setup().layDeg() + off, r));
      if (c.view().frame().contains(at)) {
        c.label(words, at, 4, 5, c.palette().ink());
        return;
      }
    }
  }

  static void bights(Canvas c, Judged chosen) {
    all(c, chosen.ground().bights());
    all(c, chosen.ground().bridles());
  }

  private static void all(Canvas c, List<Geometry> insides) {
    for (Geometry m : insides) {
      Shape s = c.view().toPixels(m);
      c.pen().fill(s, Palette.clear(c.palette().halo(), LIGHTEN));
      c.pen().hatch(s, Palette.clear(c.palette().bight(), 190), 14, 1, 25);
      c.pen().hatch(s, Palette.clear(c.palette().bight(), 190), 14, 1, 115);
      c.pen().stroke(s, c.palette().bight(), 1.6);
      c.labelOn(Messages.text("plan.bight"), m, 1, true, c.palette().bight());
    }
  }

  /** The ways out: the best two are drawn strong, further ones thin. */
  static void waysOut(Canvas c, Judged chosen) {
    if (chosen.ground() == null) {
      return;
    }
    Position stump = c.scene().site().tree().stump().at();
    Point2D from = c.at(stump);
    int n = 0;
    for (Position end : chosen.ground().escapes()) {
      Point2D to = c.at(end);
      double d = from.distance(to);
      if (d < 1 || n == 2) {
        continue;
      }
      Point2D way =
          new Point2D.Double((to.getX() - from.getX()) / d, (to.getY() - from.getY()) / d);
      double gap = Math.min(d / 3, 9 * c.unit());
      Line2D shaft =
          new Line2D.Double(
              from.getX() + way.getX() * gap, from.getY() + way.getY() * gap, to.getX(), to.getY());
      c.pen().stroke(shaft, c.palette().wayOut(), 2.2, 5, 3);
      c.pen().stroke(c.pen().head(to, way, 9), c.palette().wayOut(), 2.4);
      n++;
      c.keepFree(from, to);
      c.label(Messages.text("plan.way-out"), to, 5, 3, c.palette().wayOut());
    }
  }
}
