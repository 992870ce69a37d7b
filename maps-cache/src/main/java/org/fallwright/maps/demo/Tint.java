package org.fallwright.maps.demo;

/** A colour being mixed: shares of red, green and blue light, 0 to 1. */
final class Tint {
  double r;
  double g;
  double b;

  void set(double red, double green, double blue) {
    r = red;
    g = green;
    b = blue;
  }

  /** Lays a colour over this one, covering the given share of it. */
  void cover(double red, double green, double blue, double share) {
    double a = Math.max(0, Math.min(1, share));
    r += (red - r) * a;
    g += (green - g) * a;
    b += (blue - b) * a;
  }

  /** Makes it brighter or darker. */
  void light(double by) {
    r *= by;
    g *= by;
    b *= by;
  }

  /** Lays it in shade, which is bluer than sunlight. */
  void shade(double share) {
    double a = Math.max(0, Math.min(1, share));
    r *= 1 - 0.61 * a;
    g *= 1 - 0.57 * a;
    b *= 1 - 0.47 * a;
  }
}
