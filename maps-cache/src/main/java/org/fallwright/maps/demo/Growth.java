package org.fallwright.maps.demo;

/** What grows on the open ground: meadow, lawn, paddock, wet corner, field and fallow. */
final class Growth {
  private Growth() {}

  /** Colours a point of bare or grown ground. */
  static void paint(double e, double n, Tint t) {
    double broad = Noise.sum(e, n, 26, 3, 1);
    double patch = Noise.sum(e, n, 5, 3, 2);
    double tuft = Noise.sum(e, n, 1.1, 2, 3);
    meadow(t, broad, patch, tuft);
    fields(e, n, t, broad, patch, tuft);
    paddock(e, n, t, patch, tuft);
    lawn(e, n, t, broad, tuft);
    wet(e, n, t, patch, tuft);
    septic(e, n, t, patch);
    double blade = Noise.at(e, n, 0.33, 4) + 0.7 * Noise.at(e, n, 0.62, 5);
    t.light(1 + 0.055 * blade);
    t.r *= 1 + 0.05 * Noise.at(e, n, 1.7, 6);
  }

  private static void meadow(Tint t, double broad, double patch, double tuft) {
    t.set(0.375, 0.435, 0.225);
    t.cover(0.50, 0.50, 0.29, 0.55 * Noise.step(-0.1, 0.8, broad + 0.4 * patch));
    t.cover(0.27, 0.36, 0.17, 0.6 * Noise.step(0.0, 0.9, -broad + 0.7 * patch));
    t.light(1 + 0.10 * tuft + 0.05 * patch);
  }

  /** Beyond the site: cropped ground west of the farm track, stubble north of the road. */
  private static void fields(double e, double n, Tint t, double broad, double patch, double tuft) {
    double crop = Noise.step(-21, -22.5, e + 0.3 * tuft);
    if (crop > 0) {
      double rows = Math.sin(2 * Math.PI * (e + 0.04 * n) / 0.9);
      double tramline = Math.abs(Math.IEEEremainder(e + 0.04 * n + 3, 18));
      double wheel = Noise.step(0.45, 0.2, Math.abs(tramline - 0.9));
      t.cover(0.40 + 0.05 * broad, 0.465 + 0.03 * broad, 0.265, crop);
      t.light(1 + crop * (0.06 * rows + 0.06 * tuft + 0.05 * patch));
      t.cover(0.50, 0.45, 0.33, crop * 0.6 * wheel);
    }
    double stubble = Noise.step(98.5, 100, n + 0.04 * e + 0.4 * tuft);
    if (stubble > 0) {
      double swath = Math.sin(2 * Math.PI * (n + 0.04 * e) / 6);
      t.cover(0.66 + 0.03 * swath, 0.58 + 0.03 * swath, 0.38, 0.92 * stubble);
      t.light(1 + stubble * (0.05 * tuft + 0.06 * patch));
    }
  }

  /** Grazed ground west of fence F1, worn along the fence and bare in spots. */
  private static void paddock(double e, double n, Tint t, double patch, double tuft) {
    double inside =
        Noise.step(3.05, 2.9, e)
            * Noise.step(44.05, 43.9, n)
            * Noise.step(-14.6, -13.6, e + 0.3 * tuft)
            * Noise.step(-19, -16, n + patch);
    if (inside <= 0) {
      return;
    }
    t.cover(0.45, 0.475, 0.265, 0.75 * inside);
    t.light(1 + inside * (0.06 * tuft + 0.09 * patch));
    double worn = Math.min(Math.abs(e - 1.7), Math.abs(n - 42.7));
    if (n < 9) {
      worn = Math.abs(n - 42.7);
    }
    double bare = Noise.step(0.75, 0.25, worn + 0.5 * patch + 0.2 * tuft);
    double spot = Noise.step(0.62, 1.0, Noise.sum(e, n, 8, 3, 9));
    t.cover(0.56, 0.50, 0.37, inside * Math.max(0.55 * bare, 0.7 * spot));
    double dung = Noise.step(0.80, 0.95, Noise.at(e, n, 1.3, 10));
    t.cover(0.25, 0.33, 0.15, 0.5 * inside * dung);
  }

  /** Mown ground about the house, in stripes. */
  private static void lawn(double e, double n, Tint t, double broad, double tuft) {
    double edge = 0.35 * tuft + 0.5 * Noise.at(e, n, 3.5, 11);
    double mown =
        Noise.step(3.9, 4.3, e + 0.3 * edge)
            * Noise.step(39.5, 39.1, e + edge)
            * Noise.step(-13.5, -13.1, n + edge)
            * Noise.step(32.2, 31.8, n - 0.12 * (e - 16) + edge);
    if (mown <= 0) {
      return;
    }
    double stripe = Noise.step(-0.25, 0.25, Math.sin(2 * Math.PI * (e + 0.05 * n) / 2.6));
    t.cover(0.375 + 0.03 * broad, 0.455 + 0.02 * broad, 0.245, 0.9 * mown);
    t.light(1 + mown * (0.075 * (stripe - 0.5) + 0.025 * tuft));
    double dry = Noise.step(0.45, 1.0, Noise.sum(e, n, 4, 2, 12));
    t.cover(0.50, 0.50, 0.29, 0.4 * mown * dry);
    // vegetable beds south of the house
    if (e > 7 && e < 12.5 && n > -10 && n < -4) {
      double bed = Math.abs(Math.IEEEremainder(n + 4.75, 1.5));
      double soil = Noise.step(0.56, 0.46, bed + 0.03 * tuft);
      t.cover(0.36, 0.29, 0.22, soil);
      double plant = Noise.step(0.0, 0.5, Noise.at(e, n, 0.5, 13)) * Noise.step(0.4, 0.2, bed);
      t.cover(0.27, 0.42, 0.18, 0.8 * plant * soil);
    }
  }

  /** Wet corner about the birch: rushes, dark ground, a little open water. */
  private static void wet(double e, double n, Tint t, double patch, double tuft) {
    double d = Math.hypot((e - 6.6) / 6.2, (n - 50.4) / 4.3) + 0.16 * patch + 0.06 * tuft;
    double wet = Noise.step(1.1, 0.65, d);
    if (wet <= 0) {
      return;
    }
    t.cover(0.255, 0.335, 0.165, 0.85 * wet);
    double rush = Noise.step(0.1, 0.7, Noise.at(e, n, 0.8, 14));
    t.cover(0.36, 0.42, 0.22, 0.5 * wet * rush);
    double water = Noise.step(0.25, 0.5, Noise.sum(e, n, 2.6, 2, 15)) * Noise.step(0.75, 0.4, d);
    t.cover(0.20, 0.215, 0.20, 0.8 * water);
  }

  /** Grass over the septic field is a shade greener. */
  private static void septic(double e, double n, Tint t, double patch) {
    double green = Noise.step(3.4, 2.4, Math.hypot(e - 4, n - 60) + 0.5 * patch);
    t.cover(0.30, 0.46, 0.19, 0.5 * green);
    t.cover(0.62, 0.61, 0.58, Noise.step(0.4, 0.3, Math.hypot(e - 4.4, n - 58.2)));
  }
}
