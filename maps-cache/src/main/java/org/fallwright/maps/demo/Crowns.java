package org.fallwright.maps.demo;

/** What has a crown: the site's trees, garden shrubs, and the woods beyond the site. */
final class Crowns {
  /**
   * A crown seen from above.
   *
   * @param e metres east of its middle
   * @param n metres north of its middle
   * @param radius [m]
   * @param base height of its lowest leaves [m]
   * @param top height of its tip [m]
   * @param pointed whether it is a conifer's
   * @param hue 0 dark green to 1 light, yellowish green
   * @param seed of its unevenness
   */
  private record Crown(
      double e,
      double n,
      double radius,
      double base,
      double top,
      boolean pointed,
      double hue,
      int seed) {}

  /**
   * T1's crown hangs over by its lean: 5 degrees towards 188 at 11.75 m, the crown's mid height.
   */
  private static final Crown[] SITE = {
    new Crown(16.0 - 0.14, 24.0 - 1.02, 4.5, 6.0, 17.5, false, 0.42, 101),
    new Crown(17.5, 53.0, 5.0, 6.0, 19.0, false, 0.30, 102),
    new Crown(7.5, 51.0, 2.0, 3.0, 13.0, false, 0.80, 103),
    new Crown(-9.0, 54.5, 3.1, 1.0, 23.0, true, 0.1, 104),
    new Crown(9.0, 40.0, 1.5, 0.8, 4.2, false, 0.15, 105),
    new Crown(29.3, 0.6, 1.1, 0.1, 1.8, false, 0.5, 106),
    new Crown(31.4, 2.3, 0.8, 0.1, 1.3, false, 0.9, 107),
    new Crown(4.9, 0.4, 0.9, 0.1, 1.6, false, 0.3, 108),
    new Crown(23.2, 0.9, 0.7, 0.1, 1.2, false, 0.7, 109),
    new Crown(36.4, -6.5, 1.7, 0.6, 3.5, false, 0.6, 110),
    new Crown(31.0, -9.0, 1.6, 0.6, 3.3, false, 0.5, 111),
  };

  private static final double CELL = 5.6;

  /** Cells of the woods on each side of the origin: 840 m. */
  private static final int REACH = 150;

  private static final Crown[][] WOODS = planted();

  private Crowns() {}

  /** Share of the sun a crown takes from a point at a height [m] over the ground, 0 to 1. */
  static double shade(double e, double n, double height) {
    double light = 1;
    for (Crown c : SITE) {
      light *= 1 - shade(c, e, n, height);
    }
    if (woods(e, n, 14) > 0) {
      int i = (int) Math.floor(e / CELL);
      int j = (int) Math.floor(n / CELL);
      for (int a = -1; a <= 3; a++) {
        for (int b = -4; b <= 1; b++) {
          Crown c = wood(i + a, j + b);
          light *= c == null ? 1 : 1 - shade(c, e, n, height);
        }
      }
    }
    return 1 - light;
  }

  /** Colours a point if a crown lies over it that is higher than {@code over} [m]. */
  static void paint(double e, double n, double over, Tint t) {
    Crown highest = null;
    double height = over;
    for (Crown c : SITE) {
      double h = height(c, e, n);
      if (h > height) {
        highest = c;
        height = h;
      }
    }
    if (woods(e, n, 6) > 0) {
      int i = (int) Math.floor(e / CELL);
      int j = (int) Math.floor(n / CELL);
      for (int a = -1; a <= 1; a++) {
        for (int b = -1; b <= 1; b++) {
          Crown c = wood(i + a, j + b);
          double h = c == null ? 0 : height(c, e, n);
          if (h > height) {
            highest = c;
            height = h;
          }
        }
      }
    }
    if (highest != null) {
      leaves(highest, e, n, t);
    }
  }

  private static void leaves(Crown c, double e, double n, Tint t) {
    double d = 0.14;
    double east = (height(c, e + d, n) - height(c, e - d, n)) / (2 * d);
    double north = (height(c, e, n + d) - height(c, e, n - d)) / (2 * d);
    double light = Sun.on(limit(east), limit(north));
    double deep = 0.5 + 0.5 * lumps(c, e, n);
    if (c.pointed) {
      t.set(0.20, 0.285, 0.20);
    } else {
      t.set(0.24 + 0.15 * c.hue, 0.345 + 0.10 * c.hue, 0.165 + 0.045 * c.hue);
    }
    t.light((0.30 + 0.95 * light) * (0.55 + 0.65 * deep));
    // leaf tops take the colour of the sun
    t.cover(0.56, 0.58, 0.31, 0.35 * Noise.step(0.75, 1.0, light) * deep);
  }

  private static double limit(double rise) {
    return Math.max(-2.2, Math.min(2.2, rise));
  }

  /** Height of the leaves over a point [m]; 0 beside. */
  private static double height(Crown c, double e, double n) {
    double de = e - c.e;
    double dn = n - c.n;
    double away = Math.hypot(de, dn);
    if (away > 1.2 * c.radius) {
      return 0;
    }
    double d = away / (c.radius * outline(c, e, n, de, dn, away));
    if (d >= 1) {
      return 0;
    }
    double lump = lumps(c, e, n);
    if (c.pointed) {
      return c.base + (c.top - c.base) * (1 - d) * 0.32 + 0.55 * lump + 4;
    }
    double dome = 0.35 + 0.65 * Math.sqrt(1 - d * d);
    double size = Math.min(1, c.radius / 4);
    return c.base + Math.min(c.top - c.base, 1.7 * c.radius) * dome * 0.62 + 1.25 * size * lump;
  }

  private static double outline(Crown c, double e, double n, double de, double dn, double away) {
    if (c.pointed) {
      double spoke = Math.cos(9 * Math.atan2(dn, de) + 1.3 * Noise.at(e, n, 2, c.seed));
      return 0.90 + 0.10 * spoke;
    }
    double s = c.radius / Math.max(0.01, away);
    double limb = Noise.at(c.e + de * s, c.n + dn * s, 0.55 * c.radius + 0.5, c.seed);
    return 0.96 + 0.11 * limb + 0.07 * Noise.at(e, n, 0.7, c.seed + 1);
  }

  /** Bunches of leaves, -1 to 1: rounded tops with dark gaps between. */
  private static double lumps(Crown c, double e, double n) {
    double size = Math.max(0.45, Math.min(1, c.radius / 4.5));
    double limb = Noise.heaps(e, n, 2.1 * size, c.seed + 2);
    double bunch = Noise.heaps(e, n, 0.95 * size, c.seed + 3);
    double leaf = Noise.at(e, n, 0.4, c.seed + 4);
    return 0.46 * limb + 0.36 * bunch + 0.18 * leaf;
  }

  /** A ray towards the sun through the crown, taken as an ellipsoid, and past the stem. */
  private static double shade(Crown c, double e, double n, double height) {
    double up = (c.base + c.top) / 2 - height;
    double tall = (c.top - c.base) / 2;
    double farthest = (c.top - height) / Sun.RISE + 1.2 * c.radius;
    double de = e - c.e;
    double dn = n - c.n;
    if (up < 0 || de * de + dn * dn > farthest * farthest) {
      return 0;
    }
    double along = -(de * Sun.EAST + dn * Sun.NORTH);
    double aside = Math.abs(de * Sun.NORTH - dn * Sun.EAST);
    double share = 0;
    if (along > -0.2 && along * Sun.RISE + height < c.base + tall && c.top > 6) {
      share = Noise.step(0.30, 0.16, aside);
    }
    double r = c.radius;
    if (c.pointed) {
      // a cone: as wide at each height as is left to its tip
      double z = along * Sun.RISE + height;
      double wide = r * (c.top - z) / (c.top - c.base);
      return z < c.base
          ? share
          : Math.max(
              share,
              Noise.step(0.3, -0.3, aside - wide * (0.95 + 0.2 * Noise.at(e, n, 0.9, c.seed))));
    }
    // least of ((aside² + (s - along)²)/r² + (s RISE - up)²/tall²) over s
    double k = Sun.RISE;
    double s = (along / (r * r) + k * up / (tall * tall)) / (1 / (r * r) + k * k / (tall * tall));
    double q =
        (aside * aside + (s - along) * (s - along)) / (r * r)
            + (s * k - up) * (s * k - up) / (tall * tall);
    double uneven = 0.16 * Noise.sum(e, n, 1.3, 2, c.seed + 5);
    double dense = 0.93 + 0.07 * Noise.at(e, n, 0.6, c.seed + 6);
    return Math.max(share, dense * Noise.step(1.02, 0.86, q + uneven));
  }

  /** The tree of a cell of the woods; null: none. */
  private static Crown wood(int i, int j) {
    boolean known = Math.abs(i) < REACH && Math.abs(j) < REACH;
    return known ? WOODS[i + REACH][j + REACH] : null;
  }

  private static Crown[][] planted() {
    Crown[][] woods = new Crown[2 * REACH][2 * REACH];
    for (int i = -REACH; i < REACH; i++) {
      for (int j = -REACH; j < REACH; j++) {
        woods[i + REACH][j + REACH] = tree(i, j);
      }
    }
    return woods;
  }

  private static Crown tree(int i, int j) {
    double e = (i + 0.15 + 0.7 * Noise.hash(i, j, 61)) * CELL;
    double n = (j + 0.15 + 0.7 * Noise.hash(i, j, 62)) * CELL;
    if (Noise.hash(i, j, 63) > 0.9 || woods(e, n, 0) < 0.5) {
      return null;
    }
    double size = Noise.hash(i, j, 64);
    boolean pointed = Noise.hash(i, j, 65) < 0.14;
    double radius = pointed ? 2.2 + size : 2.5 + 2.2 * size;
    return new Crown(
        e, n, radius, 3, 10 + 8 * size, pointed, Noise.hash(i, j, 66), 200 + (i * 31 + j) % 997);
  }

  /** Whether woods stand at a point, or within a distance [m] of it: 1 inside, 0 outside. */
  private static double woods(double e, double n, double within) {
    double wave = 9 * Noise.at(e, n, 60, 67) + 4 * Noise.at(e, n, 18, 68);
    double east = Math.min(e - 60 + wave, 86 - 0.04 * e - n + 0.3 * wave);
    double south = Math.min(-34 - n + wave, e + 12 + 0.4 * wave);
    double west = -72 - e + 2 * wave;
    double north = Math.min(n - 150 + wave, e - 40 + 3 * wave);
    double in = Math.max(Math.max(east, north), Math.max(south, west));
    return in + within * 1.6 > 0 ? 1 : 0;
  }
}
