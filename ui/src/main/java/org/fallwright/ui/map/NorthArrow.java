package org.fallwright.ui.map;

import java.awt.Color;
import java.awt.geom.Line2D;
import java.awt.geom.Path2D;
import java.awt.geom.Point2D;
import org.fallwright.ui.text.Messages;

/** True north as a half-filled needle and, where the declination is known, magnetic north thin. */
public final class NorthArrow {
  private NorthArrow() {}

  /**
   * @param centre middle of the arrow [pixels]
   * @param length length of the needle [units of the pen]
   * @param declinationDeg magnetic declination, east positive [degrees]; null: not stated
   */
  public static void paint(
      Pen pen,
      Viewport view,
      Double declinationDeg,
      Palette palette,
      Point2D centre,
      double length) {
    Color ink = palette.ink();
    if (declinationDeg != null) {
      Point2D m = view.direction(declinationDeg);
      Point2D tip = off(centre, m, length * 0.75 * pen.unit());
      pen.stroke(new Line2D.Double(off(centre, m, -length * 0.4 * pen.unit()), tip), ink, 1, 3, 2);
      pen.stroke(pen.head(tip, m, 5), ink, 1);
      Point2D word = off(centre, m, (length * 0.75 + 2) * pen.unit());
      double aside = (declinationDeg < 0 ? -1 : 1) * 25 * pen.unit();
      pen.textAround(
          Messages.text("plan.north.magnetic"),
          word.getX() - m.getY() * aside,
          word.getY() + m.getX() * aside,
          ink);
    }
    Point2D north = view.direction(0);
    double turn = Math.atan2(north.getX(), -north.getY());
    double h = length / 2;
    Path2D left = new Path2D.Double();
    left.moveTo(0, -h);
    left.lineTo(-h * 0.36, h);
    left.lineTo(0, h * 0.62);
    left.closePath();
    Path2D right = new Path2D.Double();
    right.moveTo(0, -h);
    right.lineTo(h * 0.36, h);
    right.lineTo(0, h * 0.62);
    right.closePath();
    pen.solid(pen.put(left, centre, turn), palette.halo(), ink, 1.2);
    pen.solid(pen.put(right, centre, turn), ink, ink, 1.2);
    Point2D word = off(centre, north, (h + 8) * pen.unit());
    pen.textAround(Messages.text("plan.north.true"), word.getX(), word.getY(), ink);
  }

  private static Point2D off(Point2D p, Point2D way, double d) {
    return new Point2D.Double(p.getX() + way.getX() * d, p.getY() + way.getY() * d);
  }
}
