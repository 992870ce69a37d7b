package org.fallwright.ui.map;

import java.awt.Color;
import java.awt.Shape;
import java.awt.geom.Ellipse2D;
import java.awt.geom.Line2D;
import java.awt.geom.Path2D;
import java.awt.geom.Point2D;
import org.fallwright.core.site.Position;
import org.fallwright.core.site.SubjectTree;
import org.fallwright.ui.text.Messages;

/**
 * The tree to be felled: its crown where it hangs now, by its outline where one was drawn, its
 * stump, and the way it leans.
 */
final class TreePainter {
  private TreePainter() {}

  static void tree(Canvas c) {
    SubjectTree t = c.scene().site().tree();
    Color green = c.palette().tree();
    Position stump = t.stump().at();
    Pen pen = c.pen();
    Shape crown =
        t.crownOutline() == null
            ? lobes(c, crownCentre(t), t.crownRadiusM())
            : c.view().toPixels(t.crownOutline().geometry());
    pen.fill(crown, Palette.clear(green, 48));
    pen.stroke(crown, green, 1.8);
    Point2D s = c.at(stump);
    double radius =
        Math.max(
            3.4 * c.unit(),
            c.view()
                .pixels((t.stumpDiameterM() == null ? t.dbhM() : t.stumpDiameterM()).value() / 2));
    if (t.leanDeg().value() > 0) {
      Point2D top = c.at(top(t));
      Point2D way = c.view().direction(t.leanAzimuthDeg().value());
      double reach = Math.max(s.distance(top), radius + 22 * c.unit());
      Point2D tip =
          new Point2D.Double(s.getX() + way.getX() * reach, s.getY() + way.getY() * reach);
      pen.stroke(new Line2D.Double(s, tip), green, 2, 4, 2.5);
      pen.stroke(pen.head(tip, way, 8), green, 2.2);
      c.label(
          Messages.text(
              "plan.lean",
              c.scene().amounts().angle(t.leanDeg().value()),
              c.scene().amounts().azimuth(t.leanAzimuthDeg().value())),
          tip,
          3,
          2,
          green);
    }
    Ellipse2D disc =
        new Ellipse2D.Double(s.getX() - radius, s.getY() - radius, 2 * radius, 2 * radius);
    pen.solid(disc, c.palette().ink(), c.palette().ink(), 1);
    pen.plain(pen.disc(s, 1), c.palette().halo(), 1);
    c.labels().keepFree(s, radius + 2 * c.unit());
    c.must(t.id(), s, radius / c.unit() + 3, 0, green);
  }

  /** Middle of the crown on the plan, by the stem's lean and the crown's own offset [m]. */
  static Position crownCentre(SubjectTree t) {
    double middle = (t.crownBaseM() + t.heightM().value()) / 2;
    Position p = leaned(t, middle);
    return t.crownOffsetM() == null
        ? p
        : new Position(
            p.eastM() + t.crownOffsetM().eastM(), p.northM() + t.crownOffsetM().northM());
  }

  private static Position top(SubjectTree t) {
    return leaned(t, t.heightM().value());
  }

  private static Position leaned(SubjectTree t, double heightM) {
    return t.stump()
        .at()
        .along(t.leanAzimuthDeg().value(), heightM * Math.tan(Math.toRadians(t.leanDeg().value())));
  }

  /** A crown of nine shallow lobes. */
  private static Path2D lobes(Canvas c, Position centre, double radiusM) {
    int lobes = 9;
    Path2D p = new Path2D.Double();
    for (int i = 0; i <= lobes; i++) {
      Point2D on = c.at(centre.along(360.0 * i / lobes, radiusM * 0.94));
      if (i == 0) {
        p.moveTo(on.getX(), on.getY());
      } else {
        Point2D bulge = c.at(centre.along(360.0 * (i - 0.5) / lobes, radiusM * 1.12));
        p.quadTo(bulge.getX(), bulge.getY(), on.getX(), on.getY());
      }
    }
    p.closePath();
    return p;
  }
}
