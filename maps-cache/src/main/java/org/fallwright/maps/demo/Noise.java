package org.fallwright.maps.demo;

/** Coherent value noise: a smooth, repeatable field without a visible grid. */
final class Noise {
  private Noise() {}

  /** A number from 0 to 1 that depends on the three whole numbers and on nothing else. */
  static double hash(int x, int y, int seed) {
    int h = x * 0x27d4eb2d ^ y * 0x165667b1 ^ seed * 0x9e3779b1;
    h = (h ^ h >>> 15) * 0x85ebca6b;
    h = (h ^ h >>> 13) * 0xc2b2ae35;
    h ^= h >>> 16;
    return (h >>> 8) / (double) (1 << 24);
  }

  /** Noise from -1 to 1 whose features are about {@code size} metres across. */
  static double at(double e, double n, double size, int seed) {
    // turned, so that the lattice never runs along walls and fences
    double c = 0.8290 / size;
    double s = 0.5592 / size;
    double x = e * c - n * s + seed * 17.31;
    double y = e * s + n * c - seed * 9.77;
    int i = (int) Math.floor(x);
    int j = (int) Math.floor(y);
    double u = smooth(x - i);
    double v = smooth(y - j);
    double low = hash(i, j, seed) * (1 - u) + hash(i + 1, j, seed) * u;
    double high = hash(i, j + 1, seed) * (1 - u) + hash(i + 1, j + 1, seed) * u;
    return 2 * (low * (1 - v) + high * v) - 1;
  }

  /** Sum of noises, each half as large and half as strong as the one before; about -1 to 1. */
  static double sum(double e, double n, double size, int octaves, int seed) {
    double sum = 0;
    double strength = 1;
    double all = 0;
    for (int k = 0; k < octaves; k++) {
      sum += strength * at(e, n, size, seed + 31 * k);
      all += strength;
      size /= 2;
      strength /= 2;
    }
    return 1.4 * sum / all;
  }

  /** Rounded heaps about {@code size} metres across with creases between, -1 to 1. */
  static double heaps(double e, double n, double size, int seed) {
    double x = e / size;
    double y = n / size;
    int i = (int) Math.floor(x);
    int j = (int) Math.floor(y);
    double nearest = 4;
    for (int a = i - 1; a <= i + 1; a++) {
      for (int b = j - 1; b <= j + 1; b++) {
        double dx = a + hash(a, b, seed) - x;
        double dy = b + hash(a, b, seed + 7919) - y;
        nearest = Math.min(nearest, dx * dx + dy * dy);
      }
    }
    return Math.max(-1, 1 - 1.9 * nearest);
  }

  /** 0 below {@code from}, 1 above {@code to}, smooth between. */
  static double step(double from, double to, double x) {
    return smooth(Math.max(0, Math.min(1, (x - from) / (to - from))));
  }

  private static double smooth(double t) {
    return t * t * t * (t * (6 * t - 15) + 10);
  }
}
