package org.fallwright.maps.demo;

/** What is driven and walked on: driveway, road, farm track, the way through gate G2, paving. */
final class Ways {
  /** Half the driveway's width [m]. */
  private static final double DRIVE = 1.6;

  /**
   * From the road gate past V1 to the bend, then round the shed to the gravelled place by the
   * house.
   */
  private static final Trace DRIVEWAY =
      Trace.smooth(
          new double[] {23.2, 92.5},
          new double[] {23, 90},
          new double[] {22.2, 78},
          new double[] {21.5, 66},
          new double[] {22.1, 58},
          new double[] {23, 52},
          new double[] {26.2, 46.3},
          new double[] {31.2, 42},
          new double[] {33.8, 36.5},
          new double[] {34, 26},
          new double[] {34, 14});

  private static final Trace ROAD = new Trace(new double[] {-700, 121.3}, new double[] {700, 65.3});

  private static final Trace TRACK =
      Trace.smooth(
          new double[] {-18, -400},
          new double[] {-17, -60},
          new double[] {-17, 30},
          new double[] {-17, 80},
          new double[] {-17, 92.5});

  private static final Trace THROUGH_G2 =
      Trace.smooth(
          new double[] {-17, 52},
          new double[] {-16.4, 56.5},
          new double[] {-14, 59.8},
          new double[] {-8.5, 61.5},
          new double[] {-3, 62.5});

  private Ways() {}

  static void paint(double e, double n, Tint t) {
    double rough = Noise.sum(e, n, 1.2, 2, 21);
    double grit = Noise.at(e, n, 0.3, 22);
    ruts(TRACK.beside(e, n, 3), t, rough, grit, 0.9);
    ruts(THROUGH_G2.beside(e, n, 3), t, rough, grit, 0.45);
    double[] at = ROAD.beside(e, n, 6);
    double off = Math.abs(at == null ? 99 : at[0]);
    t.cover(0.57, 0.54, 0.45, 0.7 * Noise.step(2.75, 2.1, off + 0.35 * rough));
    driveway(e, n, t, rough, grit);
    if (off < 2.5) {
      road(e, n, t, off, rough, grit);
    }
    paving(e, n, t, rough, grit);
  }

  private static void driveway(double e, double n, Tint t, double rough, double grit) {
    double pad = Math.max(Math.abs(e - 34.2) - 3.4, Math.abs(n - 13.2) - 4.4);
    double on = Noise.step(0.15, -0.15, pad + 0.15 * rough);
    double[] at = DRIVEWAY.beside(e, n, 3);
    double lane = 0;
    if (at != null) {
      lane = Math.abs(at[0]);
      on = Math.max(on, Noise.step(DRIVE + 0.12, DRIVE - 0.12, lane + 0.14 * rough));
    }
    if (on <= 0) {
      return;
    }
    t.cover(0.665, 0.63, 0.56, 0.96 * on);
    t.light(1 + on * (0.045 * grit + 0.05 * Noise.at(e, n, 2.5, 23)));
    if (pad > 0) {
      double wheel = Noise.step(0.42, 0.15, Math.abs(lane - 0.78));
      double middle = Noise.step(0.45, 0.1, lane + 0.15 * rough);
      t.light(1 + on * 0.07 * wheel);
      t.cover(0.47, 0.48, 0.34, on * 0.45 * middle);
    }
  }

  private static void road(double e, double n, Tint t, double off, double rough, double grit) {
    double paved = Noise.step(2.06, 1.94, off + 0.06 * rough);
    t.cover(0.50, 0.50, 0.505, paved);
    t.light(1 + paved * (0.03 * grit + 0.05 * Noise.sum(e, n, 3, 2, 24)));
    t.light(1 - paved * 0.05 * Noise.step(0.4, 0.1, Math.abs(off - 0.85)));
    double repair = Noise.step(0.55, 0.60, Noise.at(e, n, 7, 25)) * Noise.step(1.7, 1.6, off);
    t.light(1 - 0.13 * repair);
  }

  private static void ruts(double[] at, Tint t, double rough, double grit, double strength) {
    if (at == null || Math.abs(at[0]) > 2) {
      return;
    }
    double off = Math.abs(at[0]);
    double rut = Noise.step(0.5, 0.22, Math.abs(off - 0.8) + 0.16 * rough);
    t.cover(0.57, 0.51, 0.40, strength * rut);
    t.light(1 + 0.04 * grit * rut);
    t.cover(0.40, 0.46, 0.24, 0.3 * strength * Noise.step(0.4, 0.2, off));
  }

  /** Terrace south of the house and the path from its east side to the driveway. */
  private static void paving(double e, double n, Tint t, double rough, double grit) {
    boolean terrace = e > 12 && e < 20.5 && n > -2.2 && n < 2;
    boolean path = e >= 27 && e < 31.5 && n > 8.6 && n < 9.8;
    if (!terrace && !path) {
      return;
    }
    double joint =
        Math.min(Math.abs(Math.IEEEremainder(e, 0.6)), Math.abs(Math.IEEEremainder(n, 0.6)));
    t.set(0.64, 0.61, 0.56);
    t.light(1 + 0.04 * rough + 0.03 * grit - 0.12 * Noise.step(0.06, 0.02, joint));
    // table and two benches
    boolean table = Math.abs(e - 16.5) < 0.9 && Math.abs(n + 0.3) < 0.42;
    boolean bench = Math.abs(e - 16.5) < 0.85 && Math.abs(Math.abs(n + 0.3) - 0.78) < 0.16;
    if (table || bench) {
      t.set(0.52, 0.42, 0.31);
    }
  }
}
