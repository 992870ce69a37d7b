package org.fallwright.core.line;

/**
 * A point or vector in space.
 *
 * @param e metres east
 * @param n metres north
 * @param up metres up
 */
public record Point3(double e, double n, double up) {
  public Point3 minus(Point3 o) {
    return new Point3(e - o.e, n - o.n, up - o.up);
  }

  public double length() {
    return Math.sqrt(e * e + n * n + up * up);
  }
}
