package org.fallwright.maps.demo;

/** What stands with a roof: house, shed and the car C1; also whether they shade a point. */
final class Roofs {
  private static final double EAVES = 5.0;
  private static final double PITCH = 0.70;
  private static final double LEAN_TO = 0.12;
  private static final double REACH = 8;

  private Roofs() {}

  /** Height of the roof over a point [m]; 0 beside. */
  static double height(double e, double n) {
    if (e > 5 && e < 28 && n > 1 && n < 16.5) {
      return house(e, n);
    }
    if (e >= 26.5 && e <= 30.5 && n >= 34 && n <= 37.5) {
      return 2.2 + 0.4 * (n - 34) / 3.5;
    }
    return car(e, n);
  }

  /** Whether a roof stands between the sun and a point at a height [m] over the ground. */
  static boolean shades(double e, double n, double height) {
    boolean nearHouse = e > -1 && e < 32 && n > -1 && n < 24;
    boolean nearShed = e > 23 && e < 33 && n > 32 && n < 41;
    boolean nearCar = e > 20 && e < 25 && n > 54 && n < 62;
    if (!nearHouse && !nearShed && !nearCar) {
      return false;
    }
    for (double s = 0.12; s < REACH; s += 0.12) {
      if (height(e + s * Sun.EAST, n + s * Sun.NORTH) > height + s * Sun.RISE + 0.02) {
        return true;
      }
    }
    return false;
  }

  /** Colours a point of a roof; {@code height} is that of {@link #height} there, above 0. */
  static void paint(double e, double n, double height, Tint t) {
    double d = 0.12;
    double light =
        Sun.on(
            (height(e + d, n) - height(e - d, n)) / (2 * d),
            (height(e, n + d) - height(e, n - d)) / (2 * d));
    double grime = Noise.sum(e, n, 2.2, 3, 41);
    if (n > 50) {
      paintCar(e, n, t);
      t.light(0.55 + 0.5 * light);
      return;
    }
    if (n > 30) {
      double rib = Math.sin(2 * Math.PI * e / 0.5);
      t.set(0.50, 0.53, 0.52);
      t.light((0.45 + 0.65 * light) * (1 + 0.05 * rib + 0.05 * grime));
      return;
    }
    if (n > 13) {
      t.set(0.55, 0.55, 0.56);
      double seam = Math.abs(Math.IEEEremainder(e - 6, 0.7));
      t.light((0.35 + 0.70 * light) * (1 + 0.05 * grime - 0.10 * Noise.step(0.09, 0.03, seam)));
      return;
    }
    t.set(0.575, 0.375, 0.305);
    if (chimney(e, n)) {
      t.set(0.50, 0.42, 0.38);
      if (Math.abs(e - 12) < 0.22 && Math.abs(n - 8.6) < 0.16) {
        t.set(0.12, 0.11, 0.11);
      }
      return;
    }
    double course = Math.sin(2 * Math.PI * (n - 7.5) / 0.36);
    double tile = Noise.at(Math.floor(e / 0.3) * 0.3, Math.floor((n - 7.5) / 0.36) * 0.36, 0.4, 42);
    t.cover(0.43, 0.37, 0.29, 0.35 * Noise.step(0.1, 0.9, grime));
    t.light((0.28 + 0.78 * light) * (1 + 0.04 * course + 0.05 * tile + 0.05 * grime));
    t.cover(0.66, 0.50, 0.43, 0.7 * Noise.step(0.17, 0.10, Math.abs(n - 7.5)));
    boolean window = Math.abs(n - 4.8) < 0.55 && (Math.abs(e - 10) < 0.4 || Math.abs(e - 22) < 0.4);
    if (window) {
      t.set(0.30, 0.36, 0.43);
    }
  }

  private static double house(double e, double n) {
    if (chimney(e, n)) {
      return 10.1;
    }
    if (e >= 6 && e <= 27 && n >= 2 && n <= 13) {
      return EAVES + PITCH * (5.5 - Math.abs(n - 7.5));
    }
    if (e >= 6 && e <= 20 && n > 13 && n <= 15.5) {
      return EAVES + LEAN_TO * (15.5 - n);
    }
    return 0;
  }

  private static boolean chimney(double e, double n) {
    return Math.abs(e - 12) < 0.5 && Math.abs(n - 8.6) < 0.4;
  }

  /** C1: 1.8 m by 4.6 m about (22.6, 57.5), nose to the north. */
  private static double car(double e, double n) {
    double x = Math.abs(e - 22.6);
    double y = n - 57.5;
    if (x > 0.9
        || Math.abs(y) > 2.3
        || Math.hypot(Math.max(0, x - 0.5), Math.max(0, Math.abs(y) - 1.9)) > 0.42) {
      return 0;
    }
    double cabin = Math.min(Noise.step(1.1, 0.3, y), Noise.step(-2.2, -1.5, y));
    return 0.85 + 0.6 * cabin * Noise.step(0.9, 0.6, x);
  }

  private static void paintCar(double e, double n, Tint t) {
    double x = Math.abs(e - 22.6);
    double y = n - 57.5;
    t.set(0.62, 0.66, 0.72);
    boolean windscreen = y > 0.25 && y < 0.95 && x < 0.72;
    boolean rear = y > -1.95 && y < -1.5 && x < 0.68;
    boolean side = x > 0.68 && x < 0.8 && y > -1.3 && y < 0.3;
    if (windscreen || rear || side) {
      t.set(0.16, 0.19, 0.22);
    }
  }
}
