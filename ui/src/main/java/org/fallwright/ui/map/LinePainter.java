package org.fallwright.ui.map;

import java.awt.Color;
import java.awt.Shape;
import java.awt.geom.Ellipse2D;
import java.awt.geom.Line2D;
import java.awt.geom.Path2D;
import java.awt.geom.Point2D;
import java.awt.geom.Rectangle2D;
import java.util.List;
import org.fallwright.core.plan.Judged;
import org.fallwright.core.plan.LinePoint;
import org.fallwright.core.plan.Setup;
import org.fallwright.core.site.Position;
import org.fallwright.core.site.Site;
import org.fallwright.core.site.Spot;
import org.fallwright.ui.text.Messages;

/**
 * The chosen setup: the lay with the point the tip is aimed at, the legs of the line with an arrow
 * the way the pull goes and a post at each end, blocks, and the source by the kind of place it is
 * at.
 */
final class LinePainter {
  /** Outline of a middling pick-up for the source's symbol: length and width [m]. */
  private static final double VEHICLE_LENGTH_M = 5.4;

  private static final double VEHICLE_WIDTH_M = 2.1;

  private LinePainter() {}

  static void setup(Canvas c, Judged chosen) {
    lay(c, chosen);
    Color ink = c.palette().line();
    List<LinePoint> line = chosen.line();
    for (int i = 1; i < line.size(); i++) {
      leg(c, line.get(i - 1), line.get(i), ink, 3);
    }
    for (int i = 1; i < chosen.haul().size(); i++) {
      leg(c, chosen.haul().get(i - 1), chosen.haul().get(i), ink, 1.7);
    }
    Setup s = chosen.setup();
    for (LinePoint p : line) {
      point(c, p, ink);
    }
    if (s.driver() != null && !chosen.haul().isEmpty()) {
      source(c, s.driver().place(), last(chosen.haul()).at(), ink);
    }
    recoil(c, line, ink);
  }

  private static void lay(Canvas c, Judged chosen) {
    Site site = c.scene().site();
    Position stump = site.tree().stump().at();
    double lay = chosen.setup().layDeg();
    Position aim =
        chosen.ground() == null
            ? stump.along(lay, site.tree().heightM().value())
            : chosen.ground().tip();
    Point2D from = c.at(stump);
    Point2D to = c.at(aim);
    Point2D way = c.view().direction(lay);
    Color ink = c.palette().lay();
    Pen pen = c.pen();
    Point2D neck =
        new Point2D.Double(
            to.getX() - way.getX() * 10 * c.unit(), to.getY() - way.getY() * 10 * c.unit());
    // hollow and wider than the line, so that both show where they coincide
    pen.stroke(new Line2D.Double(from, neck), ink, 8);
    pen.plain(new Line2D.Double(from, neck), Palette.clear(c.palette().halo(), 255), 5.2);
    pen.solid(pen.fullHead(neck, way, 20), ink, ink, 1);
    c.keepFree(from, to);
    pen.stroke(pen.disc(to, 5), ink, 1.6);
    double r = 8 * c.unit();
    pen.stroke(new Line2D.Double(to.getX() - r, to.getY(), to.getX() + r, to.getY()), ink, 1.2);
    pen.stroke(new Line2D.Double(to.getX(), to.getY() - r, to.getX(), to.getY() + r), ink, 1.2);
    c.labels().keepFree(to, r);
    c.must(
        Messages.text(
            "plan.lay",
            c.scene().amounts().azimuth(lay),
            c.scene().amounts().length(stump.distanceTo(aim))),
        to,
        10,
        1,
        ink);
  }

  private static void leg(Canvas c, LinePoint a, LinePoint b, Color ink, double width) {
    Point2D from = c.at(a.at());
    Point2D to = c.at(b.at());
    double d = from.distance(to);
    if (d < 1e-6) {
      return;
    }
    Pen pen = c.pen();
    pen.stroke(new Line2D.Double(from, to), ink, width);
    Point2D way = new Point2D.Double((to.getX() - from.getX()) / d, (to.getY() - from.getY()) / d);
    double at = 0.58;
    Point2D mid =
        new Point2D.Double(
            from.getX() + (to.getX() - from.getX()) * at,
            from.getY() + (to.getY() - from.getY()) * at);
    pen.solid(pen.fullHead(mid, way, 6 + 2 * width), ink, ink, 0.8);
    double metres = Math.hypot(a.at().distanceTo(b.at()), b.elevationM() - a.elevationM());
    if (d > 40 * c.unit()) {
      c.label(c.scene().amounts().length(metres), mid, 7, 4, ink);
    }
    c.keepFree(from, to);
  }

  private static void point(Canvas c, LinePoint p, Color ink) {
    Point2D at = c.at(p.at());
    Pen pen = c.pen();
    switch (p.role()) {
      case ATTACHMENT -> pen.solid(pen.disc(at, 3), c.palette().halo(), ink, 1.8);
      case REDIRECT -> block(c, at, ink, 1);
      case BLOCK_SYSTEM -> block(c, at, ink, 2);
      case SOURCE -> source(c, p.id(), p.at(), ink);
    }
  }

  /** A sheave in its cheeks; a block system shows two sheaves. */
  private static void block(Canvas c, Point2D at, Color ink, int sheaves) {
    Pen pen = c.pen();
    for (int i = sheaves - 1; i >= 0; i--) {
      Point2D to = new Point2D.Double(at.getX() + i * 7 * c.unit(), at.getY());
      pen.solid(pen.disc(to, 8), c.palette().halo(), ink, 2.4);
      pen.plain(pen.disc(to, 4.4), ink, 1.6);
      pen.fill(pen.disc(to, 1.6), ink);
    }
  }

  private static void source(Canvas c, String place, Position at, Color ink) {
    Spot spot = c.scene().site().spot(place).orElse(null);
    Point2D p = c.at(at);
    Pen pen = c.pen();
    if (spot == null) {
      // a device on an anchor: drum, frame and handle
      Shape drum = pen.put(new Rectangle2D.Double(-9, -6, 18, 12), p, 0);
      pen.solid(drum, c.palette().halo(), ink, 2.4);
      for (double x : new double[] {-4.5, 0, 4.5}) {
        pen.plain(pen.put(new Line2D.Double(x, -6, x, 6), p, 0), ink, 1.3);
      }
      pen.stroke(pen.put(new Line2D.Double(9, 0, 15, -6), p, 0), ink, 2.2);
    } else if (spot.headingDeg() != null) {
      vehicle(c, spot, p, ink);
    } else {
      people(c, p, ink);
    }
    c.labels().keepFree(p, 10 * c.unit());
  }

  /** A vehicle to scale with the nose the way it faces and the hitch at the place of the pull. */
  private static void vehicle(Canvas c, Spot spot, Point2D p, Color ink) {
    double l = Math.max(c.view().pixels(VEHICLE_LENGTH_M) / c.unit(), 16);
    double w = Math.max(c.view().pixels(VEHICLE_WIDTH_M) / c.unit(), 8);
    Point2D way = c.view().direction(spot.headingDeg());
    double turn = Math.atan2(way.getY(), way.getX());
    Path2D body = new Path2D.Double();
    body.moveTo(0, -w / 2);
    body.lineTo(l * 0.85, -w / 2);
    body.quadTo(l, -w / 2, l, 0);
    body.quadTo(l, w / 2, l * 0.85, w / 2);
    body.lineTo(0, w / 2);
    body.closePath();
    c.pen().solid(c.pen().put(body, p, turn), c.palette().halo(), ink, 2);
    Path2D cab = new Path2D.Double(new Rectangle2D.Double(l * 0.42, -w * 0.42, l * 0.28, w * 0.84));
    c.pen().plain(c.pen().put(cab, p, turn), ink, 1.5);
    c.pen().fill(c.pen().disc(p, 2.6), ink);
  }

  private static void people(Canvas c, Point2D p, Color ink) {
    double[][] heads = {{-7, 3}, {0, -2}, {7, 3}};
    for (double[] h : heads) {
      Path2D body = new Path2D.Double();
      body.moveTo(h[0] - 4, h[1] + 8);
      body.quadTo(h[0] - 4, h[1] + 2, h[0], h[1] + 2);
      body.quadTo(h[0] + 4, h[1] + 2, h[0] + 4, h[1] + 8);
      body.closePath();
      c.pen().solid(c.pen().put(body, p, 0), ink, ink, 0.6);
      c.pen()
          .solid(
              c.pen().put(new Ellipse2D.Double(h[0] - 2.4, h[1] - 3.6, 4.8, 4.8), p, 0),
              ink,
              ink,
              0.6);
    }
  }

  /** Recoil is named beside the longest leg, never painted as a narrow wedge. */
  private static void recoil(Canvas c, List<LinePoint> line, Color ink) {
    Point2D best = null;
    double longest = 0;
    for (int i = 1; i < line.size(); i++) {
      Position a = line.get(i - 1).at();
      Position b = line.get(i).at();
      if (a.distanceTo(b) > longest) {
        longest = a.distanceTo(b);
        Point2D p = c.at(a);
        Point2D q = c.at(b);
        best = new Point2D.Double(p.getX() * 0.2 + q.getX() * 0.8, p.getY() * 0.2 + q.getY() * 0.8);
      }
    }
    if (best != null) {
      c.must(Messages.text("plan.recoil"), best, 7, 3, ink);
    }
  }

  private static LinePoint last(List<LinePoint> line) {
    return line.get(line.size() - 1);
  }
}
