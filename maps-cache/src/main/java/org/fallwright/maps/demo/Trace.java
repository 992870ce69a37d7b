package org.fallwright.maps.demo;

import java.util.ArrayList;
import java.util.List;

/** A line on the ground through given points: how far a point lies from it, and where along it. */
final class Trace {
  private final double[][] points;
  private final double[] start;
  private final double west;
  private final double east;
  private final double south;
  private final double north;

  Trace(double[]... points) {
    this.points = points;
    start = new double[points.length];
    double[] box = {points[0][0], points[0][0], points[0][1], points[0][1]};
    for (int i = 0; i < points.length; i++) {
      if (i > 0) {
        start[i] =
            start[i - 1]
                + Math.hypot(points[i][0] - points[i - 1][0], points[i][1] - points[i - 1][1]);
      }
      box[0] = Math.min(box[0], points[i][0]);
      box[1] = Math.max(box[1], points[i][0]);
      box[2] = Math.min(box[2], points[i][1]);
      box[3] = Math.max(box[3], points[i][1]);
    }
    west = box[0];
    east = box[1];
    south = box[2];
    north = box[3];
  }

  /** The line bent smoothly through its points. */
  static Trace smooth(double[]... p) {
    List<double[]> bent = new ArrayList<>();
    for (int i = 0; i + 1 < p.length; i++) {
      double[] before = p[Math.max(0, i - 1)];
      double[] after = p[Math.min(p.length - 1, i + 2)];
      for (double t = 0; t < 1; t += 0.125) {
        bent.add(
            new double[] {
              bend(before[0], p[i][0], p[i + 1][0], after[0], t),
              bend(before[1], p[i][1], p[i + 1][1], after[1], t)
            });
      }
    }
    bent.add(p[p.length - 1]);
    return new Trace(bent.toArray(new double[0][]));
  }

  double length() {
    return start[start.length - 1];
  }

  /**
   * Distance from the line, positive on its left [m], and the length along it to the nearest point
   * [m]; null if the point lies farther than {@code within} from the line's bounding box.
   */
  double[] beside(double e, double n, double within) {
    if (e < west - within || e > east + within || n < south - within || n > north + within) {
      return null;
    }
    double[] best = {Double.MAX_VALUE, 0};
    for (int i = 0; i + 1 < points.length; i++) {
      double de = points[i + 1][0] - points[i][0];
      double dn = points[i + 1][1] - points[i][1];
      double pe = e - points[i][0];
      double pn = n - points[i][1];
      double t = Math.max(0, Math.min(1, (pe * de + pn * dn) / (de * de + dn * dn)));
      double away = Math.hypot(pe - t * de, pn - t * dn);
      if (away < Math.abs(best[0])) {
        best[0] = de * pn - dn * pe >= 0 ? away : -away;
        best[1] = start[i] + t * Math.hypot(de, dn);
      }
    }
    return best;
  }

  /** The point a length along the line [m]. */
  double[] at(double along) {
    int i = 0;
    while (i + 2 < points.length && start[i + 1] < along) {
      i++;
    }
    double t = (along - start[i]) / (start[i + 1] - start[i]);
    return new double[] {
      points[i][0] + t * (points[i + 1][0] - points[i][0]),
      points[i][1] + t * (points[i + 1][1] - points[i][1])
    };
  }

  /** Catmull-Rom curve through b and c. */
  private static double bend(double a, double b, double c, double d, double t) {
    return 0.5
        * (2 * b
            + (c - a) * t
            + (2 * a - 5 * b + 4 * c - d) * t * t
            + (3 * b - a - 3 * c + d) * t * t * t);
  }
}
