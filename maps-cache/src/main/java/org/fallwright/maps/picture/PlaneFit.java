package org.fallwright.maps.picture;

import java.awt.geom.AffineTransform;
import java.awt.geom.Point2D;
import java.util.ArrayList;
import java.util.List;
import java.util.OptionalInt;
import org.fallwright.core.units.Range;

/**
 * How a plain picture lies on the site's plane.
 *
 * <p>Of one scale (similarity): with u = x and v = −y, a pixel lies at
 *
 * <pre>
 * east  = a u − b v + e0
 * north = b u + a v + n0
 * </pre>
 *
 * a and b [m per pixel] such that the squares of the misses at the points are least: with
 * coordinates from their means, a = Σ(u·east + v·north) / Σ(u² + v²), b = Σ(u·north − v·east) /
 * Σ(u² + v²). Two points make it fit exactly whatever they are. With leave to stretch (affine) east
 * and north each are a plane over x and y, by least squares; for a picture taken or scanned askew,
 * from three points, which it then fits exactly.
 *
 * <p>It does not know of bent paper, of a lens, or of ground that is not level: a picture taken at
 * a slant fits nowhere but at its points.
 *
 * @param pixelToPlane from pixels to metres east and north
 * @param misses distance of each control point from where the fit has it [m]
 * @param errorM the fit's error, from what the points have to spare: √(Σ miss² / (2 points − 4, or
 *     6 where stretched)) [m]; NaN: nothing to spare, so it is not known
 * @param suspect index of the one point without which the others fit far better
 */
public record PlaneFit(
    AffineTransform pixelToPlane, List<Double> misses, double errorM, OptionalInt suspect) {
  /** Fewest and most control points. */
  public static final int FEWEST = 2;

  public static final int MOST = 6;

  /** How much better the others must fit for a point to be suspected; planning allowance. */
  private static final double FAR_BETTER = 4;

  /** A miss that is of no account for a plan [m]; planning allowance. */
  private static final double NO_ACCOUNT = 0.3;

  /** By control points. */
  public static PlaneFit of(List<ControlPoint> points, boolean stretched) {
    int fewest = stretched ? 3 : FEWEST;
    Range.check("number of control points", points.size(), fewest, MOST, "");
    PlaneFit all = fit(points, stretched);
    int suspect = -1;
    double worst = all.worstM();
    if (worst > NO_ACCOUNT && points.size() > fewest + 1) {
      double best = worst / FAR_BETTER;
      for (int i = 0; i < points.size(); i++) {
        List<ControlPoint> others = new ArrayList<>(points);
        others.remove(i);
        double left = spread(others, stretched) ? fit(others, stretched).worstM() : worst;
        if (left < best) {
          best = left;
          suspect = i;
        }
      }
    }
    return new PlaneFit(
        all.pixelToPlane,
        all.misses,
        all.errorM,
        suspect < 0 ? OptionalInt.empty() : OptionalInt.of(suspect));
  }

  /**
   * By a known length, a north, and one place.
   *
   * @param a one end of the length [pixels]
   * @param b its other end
   * @param lengthM the length on the ground [m]
   * @param northDeg where true north points in the picture: degrees clockwise from its upper edge
   * @param tie a pixel whose place is known
   */
  public static PlaneFit ofLength(
      Point2D a, Point2D b, double lengthM, double northDeg, ControlPoint tie) {
    Range.check("length", lengthM, 0.1, 10_000, "m");
    Range.check("north", northDeg, -360, 360, "degrees");
    double pixels = a.distance(b);
    Range.check("pixels between the ends of the length", pixels, 2, 1e7, "pixels");
    double scale = lengthM / pixels;
    double cos = scale * Math.cos(Math.toRadians(northDeg));
    double sin = scale * Math.sin(Math.toRadians(northDeg));
    AffineTransform t = similar(cos, sin, tie.x(), -tie.y(), tie.at().eastM(), tie.at().northM());
    return new PlaneFit(t, List.of(), Double.NaN, OptionalInt.empty());
  }

  /** The greatest miss [m]; 0 without control points. */
  public double worstM() {
    return misses.stream().mapToDouble(Double::doubleValue).max().orElse(0);
  }

  /** Ground length of a pixel [m]. */
  public double metresPerPixel() {
    return Math.sqrt(Math.abs(pixelToPlane.getDeterminant()));
  }

  /** Where true north points in the picture: degrees clockwise from its upper edge. */
  public double northDeg() {
    // the picture's own "up" as a bearing is the other way round
    Point2D up = pixelToPlane.deltaTransform(new Point2D.Double(0, -1), null);
    return Math.toDegrees(Math.atan2(-up.getX(), up.getY()));
  }

  private static PlaneFit fit(List<ControlPoint> points, boolean stretched) {
    if (!spread(points, stretched)) {
      throw new IllegalArgumentException(
          stretched
              ? "the control points lie on one line; one must lie off it"
              : "the control points are one point; they must lie apart, in the picture and on the"
                  + " ground");
    }
    AffineTransform t = stretched ? affine(points) : similar(points);
    if (Math.abs(t.getDeterminant()) < 1e-12) {
      throw new IllegalArgumentException("the control points give the picture no size");
    }
    List<Double> misses = new ArrayList<>();
    double sum = 0;
    for (ControlPoint p : points) {
      Point2D got = t.transform(new Point2D.Double(p.x(), p.y()), null);
      double miss = got.distance(p.at().eastM(), p.at().northM());
      misses.add(miss);
      sum += miss * miss;
    }
    int spare = 2 * points.size() - (stretched ? 6 : 4);
    return new PlaneFit(
        t,
        List.copyOf(misses),
        spare > 0 ? Math.sqrt(sum / spare) : Double.NaN,
        OptionalInt.empty());
  }

  private static AffineTransform similar(List<ControlPoint> points) {
    Means m = Means.of(points);
    double a = 0;
    double b = 0;
    double square = 0;
    for (ControlPoint p : points) {
      double u = p.x() - m.x;
      double v = m.y - p.y();
      double e = p.at().eastM() - m.east;
      double n = p.at().northM() - m.north;
      a += u * e + v * n;
      b += u * n - v * e;
      square += u * u + v * v;
    }
    return similar(a / square, b / square, m.x, -m.y, m.east, m.north);
  }

  /** The similarity with these factors that takes (u0, v0) to (east, north). */
  private static AffineTransform similar(
      double a, double b, double u0, double v0, double east, double north) {
    // columns: what one pixel to the right and one pixel down are on the ground
    return new AffineTransform(a, b, b, -a, east - (a * u0 - b * v0), north - (b * u0 + a * v0));
  }

  private static AffineTransform affine(List<ControlPoint> points) {
    Means m = Means.of(points);
    double[] s = new double[7];
    for (ControlPoint p : points) {
      double x = p.x() - m.x;
      double y = p.y() - m.y;
      double e = p.at().eastM() - m.east;
      double n = p.at().northM() - m.north;
      s[0] += x * x;
      s[1] += x * y;
      s[2] += y * y;
      s[3] += x * e;
      s[4] += y * e;
      s[5] += x * n;
      s[6] += y * n;
    }
    double d = s[0] * s[2] - s[1] * s[1];
    double ex = (s[3] * s[2] - s[4] * s[1]) / d;
    double ey = (s[4] * s[0] - s[3] * s[1]) / d;
    double nx = (s[5] * s[2] - s[6] * s[1]) / d;
    double ny = (s[6] * s[0] - s[5] * s[1]) / d;
    return new AffineTransform(
        ex, nx, ey, ny, m.east - ex * m.x - ey * m.y, m.north - nx * m.x - ny * m.y);
  }

  /** Whether the points lie apart enough to fix anything: 2 pixels, and off one line by 2. */
  private static boolean spread(List<ControlPoint> points, boolean stretched) {
    double farthest = 0;
    ControlPoint a = points.get(0);
    ControlPoint b = a;
    double ground = 0;
    for (ControlPoint p : points) {
      for (ControlPoint q : points) {
        double d = Math.hypot(p.x() - q.x(), p.y() - q.y());
        ground = Math.max(ground, p.at().distanceTo(q.at()));
        if (d > farthest) {
          farthest = d;
          a = p;
          b = q;
        }
      }
    }
    if (farthest < 2 || ground < 0.1) {
      return false;
    }
    double off = 0;
    for (ControlPoint p : points) {
      double cross = (b.x() - a.x()) * (p.y() - a.y()) - (b.y() - a.y()) * (p.x() - a.x());
      off = Math.max(off, Math.abs(cross) / farthest);
    }
    return !stretched || off > 2;
  }

  private record Means(double x, double y, double east, double north) {
    static Means of(List<ControlPoint> points) {
      return new Means(
          points.stream().mapToDouble(ControlPoint::x).average().orElseThrow(),
          points.stream().mapToDouble(ControlPoint::y).average().orElseThrow(),
          points.stream().mapToDouble(p -> p.at().eastM()).average().orElseThrow(),
          points.stream().mapToDouble(p -> p.at().northM()).average().orElseThrow());
    }
  }
}
