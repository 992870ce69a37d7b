package org.fallwright.ui.map;

import java.awt.Shape;
import java.awt.geom.AffineTransform;
import java.awt.geom.NoninvertibleTransformException;
import java.awt.geom.Point2D;
import java.awt.geom.Rectangle2D;
import org.fallwright.core.site.Position;
import org.fallwright.core.units.Range;
import org.locationtech.jts.awt.ShapeWriter;
import org.locationtech.jts.geom.Envelope;
import org.locationtech.jts.geom.Geometry;

/**
 * Metres of the site plane to pixels of a drawing and back. Pixels are those of the drawing's user
 * space: screen pixels before any scale of the display, or points (1/72 inch) on paper; x to the
 * right, y down.
 */
public final class Viewport {
  /** Points of paper in a metre of paper [1/m]. */
  private static final double POINTS_PER_METRE = 72 / 0.0254;

  private final AffineTransform toPixels;
  private final AffineTransform toMetres;
  private final Rectangle2D frame;
  private final double pixelsPerMetre;

  /**
   * @param toPixels metres (east, north) to pixels
   * @param frame the visible part [pixels]
   */
  public Viewport(AffineTransform toPixels, Rectangle2D frame) {
    this.toPixels = new AffineTransform(toPixels);
    this.frame = (Rectangle2D) frame.clone();
    try {
      toMetres = toPixels.createInverse();
    } catch (NoninvertibleTransformException e) {
      throw new IllegalArgumentException("a viewport must show both east and north", e);
    }
    pixelsPerMetre = Math.sqrt(Math.abs(toPixels.getDeterminant()));
  }

  /**
   * A view with a given centre and scale.
   *
   * @param upAzimuthDeg azimuth that points up on the drawing [degrees from true north]; 0: north
   *     up
   */
  public static Viewport centred(
      Position centre, double pixelsPerMetre, double upAzimuthDeg, Rectangle2D frame) {
    Range.check("pixels_per_metre", pixelsPerMetre, 1e-6, 1e6, "1/m");
    AffineTransform t = new AffineTransform();
    t.translate(frame.getCenterX(), frame.getCenterY());
    t.rotate(-Math.toRadians(upAzimuthDeg));
    t.scale(pixelsPerMetre, -pixelsPerMetre);
    t.translate(-centre.eastM(), -centre.northM());
    return new Viewport(t, frame);
  }

  /** A view that shows all of an area, as large as the frame lets it. */
  public static Viewport fitting(Envelope metres, double upAzimuthDeg, Rectangle2D frame) {
    double a = Math.toRadians(upAzimuthDeg);
    double c = Math.abs(Math.cos(a));
    double s = Math.abs(Math.sin(a));
    double across = Math.max(1, metres.getWidth() * c + metres.getHeight() * s);
    double up = Math.max(1, metres.getWidth() * s + metres.getHeight() * c);
    return centred(
        new Position(metres.centre().x, metres.centre().y),
        Math.min(frame.getWidth() / across, frame.getHeight() / up),
        upAzimuthDeg,
        frame);
  }

  /**
   * A view true to scale on paper: one metre of paper is {@code denominator} metres of ground. The
   * frame is in points.
   */
  public static Viewport onPaper(
      Position centre, double denominator, double upAzimuthDeg, Rectangle2D frame) {
    Range.check("scale", denominator, 1, 100_000, "");
    return centred(centre, POINTS_PER_METRE / denominator, upAzimuthDeg, frame);
  }

  /**
   * A view through three points whose pixels are known: that of the site's origin, of the point
   * {@code spanM} east of it and of the point {@code spanM} north of it.
   */
  public static Viewport through(
      Point2D origin, Point2D east, Point2D north, double spanM, Rectangle2D frame) {
    return new Viewport(
        new AffineTransform(
            (east.getX() - origin.getX()) / spanM,
            (east.getY() - origin.getY()) / spanM,
            (north.getX() - origin.getX()) / spanM,
            (north.getY() - origin.getY()) / spanM,
            origin.getX(),
            origin.getY()),
        frame);
  }

  /** Metres to pixels; a copy. */
  public AffineTransform transform() {
    return new AffineTransform(toPixels);
  }

  /** The visible part [pixels]; a copy. */
  public Rectangle2D frame() {
    return (Rectangle2D) frame.clone();
  }

  /** The visible part as a shape on the site plane: a turned view makes a turned rectangle. */
  public Shape visibleMetres() {
    return toMetres.createTransformedShape(frame);
  }

  public Point2D toPixel(double eastM, double northM) {
    return toPixels.transform(new Point2D.Double(eastM, northM), null);
  }

  public Point2D toPixel(Position p) {
    return toPixel(p.eastM(), p.northM());
  }

  /**
   * East and north of a pixel [m]; a point, as a pixel may lie farther out than any site reaches.
   */
  public Point2D toMetres(Point2D pixel) {
    return toMetres.transform(pixel, null);
  }

  public Shape toPixels(Geometry metres) {
    return toPixels.createTransformedShape(new ShapeWriter().toShape(metres));
  }

  /** A length on the ground in pixels. */
  public double pixels(double metres) {
    return metres * pixelsPerMetre;
  }

  public double pixelsPerMetre() {
    return pixelsPerMetre;
  }

  /** Unit step on the drawing along an azimuth [degrees from true north]. */
  public Point2D direction(double azimuthDeg) {
    double a = Math.toRadians(azimuthDeg);
    Point2D d = toPixels.deltaTransform(new Point2D.Double(Math.sin(a), Math.cos(a)), null);
    double n = d.distance(0, 0);
    return new Point2D.Double(d.getX() / n, d.getY() / n);
  }

  /** Paper scale denominator, the frame being in points. */
  public double paperScale() {
    return POINTS_PER_METRE / pixelsPerMetre;
  }
}
