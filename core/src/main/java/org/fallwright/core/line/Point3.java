package org.fallwright.core.line;

import org.fallwright.core.units.Range;

/**
 * A point, or a vector, in space.
 *
 * @param e to the east [m]
 * @param n to the north [m]
 * @param up upwards [m]
 */
public record Point3(double e, double n, double up) {
  public Point3 {
    Range.check("east", e, -1e6, 1e6, "m");
    Range.check("north", n, -1e6, 1e6, "m");
    Range.check("up", up, -1e6, 1e6, "m");
  }

  /** Sum of this and the other. */
  public Point3 plus(Point3 other) {
    return new Point3(e + other.e, n + other.n, up + other.up);
  }

  /** This less the other. */
  public Point3 minus(Point3 other) {
    return new Point3(e - other.e, n - other.n, up - other.up);
  }

  /** This times a factor. */
  public Point3 times(double factor) {
    return new Point3(factor * e, factor * n, factor * up);
  }

  /** Scalar product with the other as vectors. */
  public double dot(Point3 other) {
    return e * other.e + n * other.n + up * other.up;
  }

  /** Length as a vector. */
  public double length() {
    return Math.sqrt(e * e + n * n + up * up);
  }

  /** Angle above the horizontal as a vector [degrees]. */
  public double riseDeg() {
    return Math.toDegrees(Math.atan2(up, Math.hypot(e, n)));
  }

  /** Angle between this and the other as vectors [degrees, 0 to 180]. */
  public double angleDeg(Point3 other) {
    double ce = n * other.up - up * other.n;
    double cn = up * other.e - e * other.up;
    double cu = e * other.n - n * other.e;
    return Math.toDegrees(Math.atan2(Math.sqrt(ce * ce + cn * cn + cu * cu), dot(other)));
  }
}
