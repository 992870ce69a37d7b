package org.fallwright.ui.map;

import java.awt.BasicStroke;
import java.awt.Color;
import java.awt.Shape;
import java.awt.geom.AffineTransform;
import java.awt.geom.Area;
import java.awt.geom.Ellipse2D;
import java.awt.geom.Path2D;
import java.awt.geom.Point2D;
import java.awt.geom.Rectangle2D;
import org.fallwright.core.plan.Verdict;

/**
 * The mark of a verdict, told apart by shape alone: workable a filled square, tight a plus, not
 * workable a cross, cannot judge yet an open ring with a question mark.
 */
public final class VerdictMark {
  private VerdictMark() {}

  /** Outline of a mark to be filled, in a box from -6 to 6 about the origin. */
  public static Shape shape(Verdict verdict) {
    return switch (verdict) {
      case WORKABLE -> new Rectangle2D.Double(-5, -5, 10, 10);
      case TIGHT -> bars(0, -6, 0, 6, -6, 0, 6, 0);
      case NOT_WORKABLE -> bars(-4.6, -4.6, 4.6, 4.6, -4.6, 4.6, 4.6, -4.6);
      case CANNOT_JUDGE -> ring();
    };
  }

  /** Paints a mark; size 1 makes it 12 units high. */
  public static void paint(Pen pen, Verdict verdict, double x, double y, double size, Color c) {
    Path2D scaled = new Path2D.Double(shape(verdict));
    scaled.transform(AffineTransform.getScaleInstance(size, size));
    Shape s = pen.put(scaled, new Point2D.Double(x, y), 0);
    pen.stroke(s, c, 0.4);
    pen.fill(s, c);
  }

  private static Shape bars(double... ends) {
    Path2D p = new Path2D.Double();
    for (int i = 0; i < ends.length; i += 4) {
      p.moveTo(ends[i], ends[i + 1]);
      p.lineTo(ends[i + 2], ends[i + 3]);
    }
    return new Area(
        new BasicStroke(3.2f, BasicStroke.CAP_BUTT, BasicStroke.JOIN_MITER).createStrokedShape(p));
  }

  private static Shape ring() {
    Path2D p = new Path2D.Double(Path2D.WIND_NON_ZERO);
    p.append(
        new BasicStroke(1.5f).createStrokedShape(new Ellipse2D.Double(-5.6, -5.6, 11.2, 11.2)),
        false);
    Path2D q = new Path2D.Double();
    q.moveTo(-1.9, -1.4);
    q.curveTo(-1.9, -3.9, 1.9, -3.9, 1.9, -1.4);
    q.curveTo(1.9, -0.2, 0, -0.1, 0, 1.5);
    p.append(
        new BasicStroke(1.5f, BasicStroke.CAP_BUTT, BasicStroke.JOIN_ROUND).createStrokedShape(q),
        false);
    p.append(new Ellipse2D.Double(-0.9, 2.5, 1.8, 1.8), false);
    return p;
  }
}
