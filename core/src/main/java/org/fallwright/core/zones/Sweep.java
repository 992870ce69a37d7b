package org.fallwright.core.zones;

import java.util.ArrayList;
import java.util.Collections;
import java.util.List;
import org.fallwright.core.site.Position;
import org.fallwright.core.site.Shape;
import org.locationtech.jts.geom.Coordinate;
import org.locationtech.jts.geom.Polygon;

/**
 * The ground that a piece of a felled tree's outline covers while it turns about the stump by a
 * half-angle to each side.
 *
 * <p>A piece is given by s along the lay and r to its right [m]. The boundary of the swept ground
 * consists of the piece's right flank turned to the right, its left flank turned to the left, and
 * arcs about the stump at its farthest and nearest points. Where a flank dips back towards the
 * stump and out again, the turning piece fills the dip, so an arc bridges it. Outer arcs are drawn
 * around the circle and inner arcs inside it, so the polygon is never smaller than the sweep.
 */
final class Sweep {
  private static final double ARC_STEP = Math.toRadians(3);
  private static final int CROWN_CORNERS = 64;

  private final Position stump;
  private final double halfAngle;
  private final Turn left;
  private final Turn right;

  Sweep(Position stump, double layDeg, double halfAngleDeg) {
    this.stump = stump;
    this.halfAngle = Math.toRadians(halfAngleDeg);
    this.left = new Turn(Math.toRadians(layDeg - halfAngleDeg));
    this.right = new Turn(Math.toRadians(layDeg + halfAngleDeg));
  }

  /** From (r, s) to east and north of the stump, s pointing along an azimuth. */
  private record Turn(double sin, double cos) {
    Turn(double azimuth) {
      this(Math.sin(azimuth), Math.cos(azimuth));
    }

    Coordinate of(double[] p) {
      return new Coordinate(p[0] * cos + p[1] * sin, p[1] * cos - p[0] * sin);
    }
  }

  /**
   * The swept stem.
   *
   * @param halfWidthM half the stem's width, across r [m]
   * @param frontM its length ahead of the stump [m]
   * @param buttM its length behind the stump [m]; counts as at least half the width, so that the
   *     flanks meet
   * @param push shift to the right per metre of s
   */
  Polygon strip(double halfWidthM, double frontM, double buttM, double push) {
    double back = Math.max(buttM, halfWidthM);
    // Front and back flank of one side cross where both, turned apart, are equally far out.
    double notch = halfWidthM / Math.hypot(1, push) / Math.cos(halfAngle);
    double across = Math.hypot(1, push);
    double[] side = {notch / across, -notch * push / across};
    List<Coordinate> ring = new ArrayList<>();
    Turn lay = new Turn(Math.atan2(left.sin + right.sin, left.cos + right.cos));
    ring.add(lay.of(side));
    double[] farRight = {halfWidthM + push * frontM, frontM};
    double[] farLeft = {-halfWidthM + push * frontM, frontM};
    end(ring, List.of(farRight, farLeft));
    ring.add(lay.of(new double[] {-side[0], -side[1]}));
    // Seen from the stump towards the butt, right and left change sides.
    double[] buttLeft = {-halfWidthM - push * back, -back};
    double[] buttRight = {halfWidthM - push * back, -back};
    end(ring, List.of(buttLeft, buttRight));
    return close(ring);
  }

  /**
   * The swept crown.
   *
   * @param corners its outline as felled, r and s of each corner, anticlockwise with s upwards, no
   *     edge bent inwards
   * @param slideM how far it slides on along the lay [m]
   * @param push shift to the right per metre of s
   */
  Polygon crown(List<double[]> corners, double slideM, double push) {
    List<double[]> p = new ArrayList<>(corners.size() + 2);
    for (double[] c : drawnOut(corners, slideM)) {
      // wholly ahead of the stump, so that a near and a far side can be told
      double s = Math.max(c[1], 1e-6);
      p.add(new double[] {c[0] + push * s, s});
    }
    int n = p.size();
    // Corners run anticlockwise: an edge seen from outside by the stump belongs to the far side.
    boolean[] far = new boolean[n];
    for (int i = 0; i < n; i++) {
      double[] q = p.get((i + 1) % n);
      far[i] = p.get(i)[0] * q[1] - p.get(i)[1] * q[0] > 0;
    }
    int first = 0;
    while (!(far[first] && !far[(first + n - 1) % n])) {
      first++;
    }
    List<double[]> outer = new ArrayList<>();
    List<double[]> inner = new ArrayList<>();
    int i = first;
    for (; far[i % n]; i++) {
      outer.add(p.get(i % n));
    }
    outer.add(p.get(i % n));
    for (; i <= first + n; i++) {
      inner.add(p.get(i % n));
    }
    List<Coordinate> ring = new ArrayList<>();
    end(ring, outer);
    near(ring, inner);
    return close(ring);
  }

  /** The crown seen from above as a circle, stretched along the lay: an ellipse, drawn around. */
  static List<double[]> ellipse(double baseM, double tipM, double radiusM) {
    double grow = 1 / Math.cos(Math.PI / CROWN_CORNERS);
    double middle = (baseM + tipM) / 2;
    double half = (tipM - baseM) / 2;
    List<double[]> p = new ArrayList<>(CROWN_CORNERS);
    for (int i = 0; i < CROWN_CORNERS; i++) {
      double a = 2 * Math.PI * i / CROWN_CORNERS;
      p.add(new double[] {grow * radiusM * Math.cos(a), middle + grow * half * Math.sin(a)});
    }
    return p;
  }

  /**
   * The crown as drawn from above, stretched along the lay like the circle: its hindmost corner
   * comes to the crown's base, its foremost to the tip; what lies aside stays as far aside.
   *
   * @param about corners east and north of the stem's axis, anticlockwise
   */
  static List<double[]> stretched(List<Position> about, double layDeg, double baseM, double tipM) {
    Turn back = new Turn(Math.toRadians(layDeg));
    List<double[]> p = new ArrayList<>(about.size());
    double hind = Double.POSITIVE_INFINITY;
    double fore = Double.NEGATIVE_INFINITY;
    for (Position c : about) {
      double s = c.eastM() * back.sin + c.northM() * back.cos;
      p.add(new double[] {c.eastM() * back.cos - c.northM() * back.sin, s});
      hind = Math.min(hind, s);
      fore = Math.max(fore, s);
    }
    double stretch = (tipM - baseM) / (fore - hind);
    for (double[] c : p) {
      c[1] = baseM + (c[1] - hind) * stretch;
    }
    return p;
  }

  /** The ground covered while a crown slides on along the lay: its front half is drawn out. */
  private static List<double[]> drawnOut(List<double[]> corners, double slideM) {
    if (slideM <= 0) {
      return corners;
    }
    int n = corners.size();
    List<double[]> p = new ArrayList<>(n + 2);
    for (int i = 0; i < n; i++) {
      double[] c = corners.get(i);
      // an edge that runs to the left is on the far side, and slides on with its corners
      boolean before = corners.get((i + n - 1) % n)[0] > c[0];
      boolean after = c[0] > corners.get((i + 1) % n)[0];
      double[] on = {c[0], c[1] + slideM};
      if (before && after) {
        p.add(on);
      } else if (before || after) {
        p.add(before ? on : c);
        p.add(before ? c : on);
      } else {
        p.add(c);
      }
    }
    return p;
  }

  /** The far side: its corners are given from right to left. */
  private void end(List<Coordinate> ring, List<double[]> corners) {
    int farthest = 0;
    for (int i = 1; i < corners.size(); i++) {
      if (radius(corners.get(i)) > radius(corners.get(farthest))) {
        farthest = i;
      }
    }
    List<double[]> rightFlank = corners.subList(0, farthest + 1);
    List<double[]> leftFlank = new ArrayList<>(corners.subList(farthest, corners.size()));
    Collections.reverse(leftFlank);
    List<Coordinate> back = flank(leftFlank, left);
    ring.addAll(flank(rightFlank, right));
    arc(ring, ring.get(ring.size() - 1), back.get(back.size() - 1), true);
    Collections.reverse(back);
    ring.addAll(back);
  }

  /** One flank from its end to the farthest corner, dips filled. */
  private static List<Coordinate> flank(List<double[]> corners, Turn turn) {
    List<Coordinate> out = new ArrayList<>();
    Coordinate peak = turn.of(corners.get(0));
    out.add(peak);
    for (int i = 1; i < corners.size(); i++) {
      Coordinate from = turn.of(corners.get(i - 1));
      Coordinate to = turn.of(corners.get(i));
      double m = radius(peak);
      if (radius(to) <= m) {
        if (i == corners.size() - 1) {
          // The farthest corner ties with an earlier one.
          arc(out, peak, to, true);
          out.add(to);
        }
        continue;
      }
      Coordinate again = leaves(from, to, m);
      if (again.distance(peak) > 1e-9) {
        arc(out, peak, again, true);
        out.add(again);
      }
      out.add(to);
      peak = to;
    }
    return out;
  }

  /** Last point of an edge at the radius m; the edge ends farther out than that. */
  private static Coordinate leaves(Coordinate from, Coordinate to, double m) {
    double dx = to.x - from.x;
    double dy = to.y - from.y;
    double a = dx * dx + dy * dy;
    double b = from.x * dx + from.y * dy;
    double c = from.x * from.x + from.y * from.y - m * m;
    double root = b * b - a * c;
    double t = root <= 0 ? 0 : Math.min(1, Math.max(0, (-b + Math.sqrt(root)) / a));
    return new Coordinate(from.x + t * dx, from.y + t * dy);
  }

  /** The near side: its corners are given from left to right. */
  private void near(List<Coordinate> ring, List<double[]> corners) {
    double[] foot = corners.get(0);
    int edge = 0;
    for (int i = 0; i + 1 < corners.size(); i++) {
      double[] a = corners.get(i);
      double[] b = corners.get(i + 1);
      double dx = b[0] - a[0];
      double dy = b[1] - a[1];
      double t = -(a[0] * dx + a[1] * dy) / (dx * dx + dy * dy);
      t = Math.min(1, Math.max(0, t));
      double[] f = {a[0] + t * dx, a[1] + t * dy};
      if (radius(f) < radius(foot)) {
        foot = f;
        edge = i;
      }
    }
    for (int i = 0; i <= edge; i++) {
      ring.add(left.of(corners.get(i)));
    }
    Coordinate leftFoot = left.of(foot);
    Coordinate rightFoot = right.of(foot);
    ring.add(leftFoot);
    arc(ring, leftFoot, rightFoot, false);
    ring.add(rightFoot);
    for (int i = edge + 1; i < corners.size(); i++) {
      ring.add(right.of(corners.get(i)));
    }
  }

  /** Points of an arc about the stump between two points equally far from it, without the ends. */
  private static void arc(List<Coordinate> ring, Coordinate from, Coordinate to, boolean around) {
    double start = Math.atan2(from.y, from.x);
    double turn = Math.IEEEremainder(Math.atan2(to.y, to.x) - start, 2 * Math.PI);
    int steps = (int) Math.ceil(Math.abs(turn) / ARC_STEP);
    if (steps == 0) {
      return;
    }
    double step = turn / steps;
    double m = around ? radius(from) / Math.cos(step / 2) : radius(from);
    for (int i = around ? 0 : 1; i < steps; i++) {
      double a = start + step * (around ? i + 0.5 : i);
      ring.add(new Coordinate(m * Math.cos(a), m * Math.sin(a)));
    }
  }

  private Polygon close(List<Coordinate> ring) {
    List<Coordinate> placed = new ArrayList<>(ring.size() + 1);
    for (Coordinate c : ring) {
      c.setX(c.x + stump.eastM());
      c.setY(c.y + stump.northM());
      if (placed.isEmpty() || placed.get(placed.size() - 1).distance(c) > 1e-9) {
        placed.add(c);
      }
    }
    placed.add(placed.get(0).copy());
    return Shape.FACTORY.createPolygon(placed.toArray(Coordinate[]::new));
  }

  private static double radius(double[] p) {
    return Math.hypot(p[0], p[1]);
  }

  private static double radius(Coordinate c) {
    return Math.hypot(c.x, c.y);
  }
}
