package org.fallwright.ui.map;

import java.awt.BasicStroke;
import java.awt.Color;
import java.awt.Font;
import java.awt.Graphics2D;
import java.awt.RenderingHints;
import java.awt.Shape;
import java.awt.geom.AffineTransform;
import java.awt.geom.Ellipse2D;
import java.awt.geom.Line2D;
import java.awt.geom.Path2D;
import java.awt.geom.Point2D;
import java.awt.geom.Rectangle2D;
import java.awt.geom.RoundRectangle2D;

/**
 * Strokes, hatches and text with a halo, so that they stand out on grass, roof and snow alike. All
 * widths are in units of a twelfth of the text's size: a plan drawn with larger text has stronger
 * strokes too.
 */
public final class Pen {
  private final Graphics2D g;
  private final Color halo;
  private final double unit;

  /** A pen for a drawing whose font is set; the caller's graphics should be a copy. */
  public Pen(Graphics2D g, Color halo) {
    this.g = g;
    this.halo = halo;
    unit = g.getFont().getSize2D() / 12;
    g.setRenderingHint(RenderingHints.KEY_ANTIALIASING, RenderingHints.VALUE_ANTIALIAS_ON);
    g.setRenderingHint(
        RenderingHints.KEY_TEXT_ANTIALIASING, RenderingHints.VALUE_TEXT_ANTIALIAS_ON);
    g.setRenderingHint(RenderingHints.KEY_STROKE_CONTROL, RenderingHints.VALUE_STROKE_PURE);
  }

  /** The graphics drawn into. */
  public Graphics2D graphics() {
    return g;
  }

  /** A twelfth of the text's size [pixels]. */
  public double unit() {
    return unit;
  }

  /** Draws an outline in a colour over its halo; the dash is in units, none for a solid line. */
  public void stroke(Shape s, Color c, double width, double... dash) {
    g.setColor(halo);
    g.setStroke(strokeOf(width + 2.4));
    g.draw(s);
    plain(s, c, width, dash);
  }

  /** Draws an outline without a halo. */
  public void plain(Shape s, Color c, double width, double... dash) {
    g.setColor(c);
    g.setStroke(strokeOf(width, dash));
    g.draw(s);
  }

  /** Fills with a colour and draws the outline over its halo. */
  public void solid(Shape s, Color fill, Color edge, double width) {
    stroke(s, edge, width);
    g.setColor(fill);
    g.fill(s);
    plain(s, edge, width);
  }

  public void fill(Shape s, Color c) {
    g.setColor(c);
    g.fill(s);
  }

  /**
   * Hatches an area with parallel lines.
   *
   * @param spacing distance of the lines [units]
   * @param angleDeg their angle to the drawing's x axis, downwards positive [degrees]
   */
  public void hatch(Shape area, Color c, double spacing, double width, double angleDeg) {
    Rectangle2D b = visible(area);
    if (b.isEmpty()) {
      return;
    }
    double step = spacing * unit;
    double a = Math.toRadians(angleDeg);
    double reach = Math.hypot(b.getWidth(), b.getHeight()) / 2 + step;
    // lines are counted from the drawing's own origin, so that hatches of neighbours line up
    double across = -b.getCenterX() * Math.sin(a) + b.getCenterY() * Math.cos(a);
    double along = b.getCenterX() * Math.cos(a) + b.getCenterY() * Math.sin(a);
    Path2D lines = new Path2D.Double();
    for (double v = Math.ceil((across - reach) / step) * step; v <= across + reach; v += step) {
      Point2D from = turned(along - reach, v, a);
      Point2D to = turned(along + reach, v, a);
      lines.append(new Line2D.Double(from, to), false);
    }
    within(area, () -> plain(lines, c, width));
  }

  /** Sparse dots over an area, their rows set off by half a step. */
  public void dots(Shape area, Color c, double spacing, double size) {
    Rectangle2D b = visible(area);
    double step = spacing * unit;
    double d = size * unit;
    Path2D all = new Path2D.Double();
    long row = (long) Math.floor(b.getMinY() / step);
    for (; row * step <= b.getMaxY(); row++) {
      double shift = Math.floorMod(row, 2L) == 0 ? 0 : step / 2;
      for (double x = Math.floor(b.getMinX() / step) * step + shift; x <= b.getMaxX(); x += step) {
        all.append(new Ellipse2D.Double(x - d / 2, row * step - d / 2, d, d), false);
      }
    }
    within(area, () -> fill(all, c));
  }

  /** Text with its left end and baseline at a point, over its halo. */
  public void text(String text, double x, double y, Color c) {
    Shape outline =
        g.getFont()
            .createGlyphVector(g.getFontRenderContext(), text)
            .getOutline((float) x, (float) y);
    g.setColor(halo);
    g.setStroke(strokeOf(3));
    g.draw(outline);
    g.setColor(c);
    g.drawString(text, (float) x, (float) y);
  }

  /** Text with its middle at a point. */
  public void textAround(String text, double x, double y, Color c) {
    Rectangle2D box = extent(text);
    text(text, x - box.getWidth() / 2, y - box.getHeight() / 2 - box.getY(), c);
  }

  /** A light plate to read a text on. */
  public void plate(Rectangle2D box) {
    double round = 5 * unit;
    fill(
        new RoundRectangle2D.Double(
            box.getX(), box.getY(), box.getWidth(), box.getHeight(), round, round),
        Palette.clear(halo, 185));
  }

  /** Room that a text takes; y from its baseline. */
  public Rectangle2D extent(String text) {
    Font f = g.getFont();
    Rectangle2D advance = f.getStringBounds(text, g.getFontRenderContext());
    double size = f.getSize2D();
    return new Rectangle2D.Double(0, -0.78 * size, advance.getWidth(), size);
  }

  /** An open arrow head with its tip at a point. */
  public Shape head(Point2D tip, Point2D direction, double length) {
    double l = length * unit;
    double dx = direction.getX() * l;
    double dy = direction.getY() * l;
    Path2D p = new Path2D.Double();
    p.moveTo(tip.getX() - dx - dy * 0.45, tip.getY() - dy + dx * 0.45);
    p.lineTo(tip.getX(), tip.getY());
    p.lineTo(tip.getX() - dx + dy * 0.45, tip.getY() - dy - dx * 0.45);
    return p;
  }

  /** A closed arrow head with its tip at a point. */
  public Shape fullHead(Point2D tip, Point2D direction, double length) {
    Path2D p = new Path2D.Double(head(tip, direction, length));
    p.closePath();
    return p;
  }

  /** A disc about a point, its radius in units. */
  public Shape disc(Point2D at, double radius) {
    double r = radius * unit;
    return new Ellipse2D.Double(at.getX() - r, at.getY() - r, 2 * r, 2 * r);
  }

  /** A shape given in units about the origin, put at a point and turned. */
  public Shape put(Shape s, Point2D at, double turnRad) {
    AffineTransform t = AffineTransform.getTranslateInstance(at.getX(), at.getY());
    t.rotate(turnRad);
    t.scale(unit, unit);
    return t.createTransformedShape(s);
  }

  private void within(Shape area, Runnable painting) {
    Shape before = g.getClip();
    g.clip(area);
    painting.run();
    g.setClip(before);
  }

  private Rectangle2D visible(Shape area) {
    Rectangle2D b = area.getBounds2D();
    Shape clip = g.getClip();
    return clip == null ? b : b.createIntersection(clip.getBounds2D());
  }

  private BasicStroke strokeOf(double width, double... dash) {
    float w = (float) (width * unit);
    if (dash.length == 0) {
      return new BasicStroke(w, BasicStroke.CAP_ROUND, BasicStroke.JOIN_ROUND);
    }
    float[] d = new float[dash.length];
    for (int i = 0; i < d.length; i++) {
      d[i] = (float) (dash[i] * unit);
    }
    return new BasicStroke(w, BasicStroke.CAP_BUTT, BasicStroke.JOIN_ROUND, 10, d, 0);
  }

  private static Point2D turned(double along, double across, double a) {
    return new Point2D.Double(
        along * Math.cos(a) - across * Math.sin(a), along * Math.sin(a) + across * Math.cos(a));
  }
}
