package org.fallwright.maps.demo;

/**
 * What is thin: fences F1 and F2 with their gates, the posts of gate G2, the line's poles and
 * wires.
 */
final class Fences {
  private static final double FENCE_HEIGHT = 1.2;
  private static final double POLE_HEIGHT = 9.5;
  private static final double POST_EVERY = 2.5;

  private static final Trace F1 =
      new Trace(new double[] {3, 10}, new double[] {3, 44}, new double[] {-14, 44});
  private static final Trace F2_SOUTH = new Trace(new double[] {19, 60}, new double[] {19, 72});
  private static final Trace F2_NORTH = new Trace(new double[] {19, 73.98}, new double[] {19, 90});
  private static final Trace G1 = new Trace(new double[] {19, 72.06}, new double[] {19, 73.92});
  private static final Trace G2 = new Trace(new double[] {-14, 58.06}, new double[] {-14, 61.54});
  private static final Trace[] FENCES = {F1, F2_SOUTH, F2_NORTH};
  private static final Trace[] GATES = {G1, G2};
  private static final double WIRES_EAST = 42.5;
  private static final double[] POLES = {-105, -55, -5, 45, 95, 145};

  private Fences() {}

  /** Share of the sun taken from a point of the ground, 0 to 1. */
  static double shade(double e, double n) {
    double share = 0;
    for (Trace fence : FENCES) {
      share = Math.max(share, shade(fence, e, n, POST_EVERY, 0.5));
    }
    for (Trace gate : GATES) {
      share = Math.max(share, shade(gate, e, n, gate.length(), 0.6));
    }
    if (Math.abs(e - WIRES_EAST) < 8) {
      for (double pole : POLES) {
        share = Math.max(share, upright(e - WIRES_EAST, n - pole, POLE_HEIGHT, 0.15));
      }
      double top = POLE_HEIGHT / Sun.RISE;
      double shadowOf = e - WIRES_EAST + top * Sun.EAST;
      double wire = Math.min(Math.abs(Math.abs(shadowOf) - 0.8), Math.abs(shadowOf));
      share = Math.max(share, 0.22 * Noise.step(0.12, 0.04, wire));
    }
    return share;
  }

  /** Colours a point that lies on a post, a rail, a pole or a wire. */
  static void paint(double e, double n, Tint t) {
    for (Trace fence : FENCES) {
      rails(fence, e, n, t, POST_EVERY, 0.60, 0.55, 0.47);
    }
    for (Trace gate : GATES) {
      rails(gate, e, n, t, gate.length(), 0.72, 0.73, 0.74);
    }
    double off = e - WIRES_EAST;
    if (Math.abs(off) < 1.4) {
      double wire = Math.min(Math.abs(Math.abs(off) - 0.8), Math.abs(off));
      t.cover(0.70, 0.70, 0.70, 0.30 * Noise.step(0.08, 0.03, wire));
      for (double pole : POLES) {
        boolean arm = Math.abs(off) < 1.05 && Math.abs(n - pole) < 0.08;
        boolean head = Math.hypot(off, n - pole) < 0.17;
        if (arm || head) {
          t.set(0.50, 0.44, 0.37);
        }
      }
    }
    double stump = Math.hypot(e - 37, n - 50);
    if (stump < 0.5) {
      t.cover(0.62, 0.53, 0.38, 0.6 * Noise.step(0.5, 0.25, stump));
      t.cover(0.74, 0.62, 0.44, Noise.step(0.22, 0.18, stump));
    }
  }

  private static void rails(
      Trace line, double e, double n, Tint t, double postEvery, double r, double g, double b) {
    double[] at = line.beside(e, n, 0.3);
    if (at == null) {
      return;
    }
    t.cover(r, g, b, 0.85 * Noise.step(0.09, 0.04, Math.abs(at[0])));
    double[] post = nearestPost(line, at[1], postEvery);
    t.cover(0.50, 0.44, 0.36, Noise.step(0.15, 0.09, Math.hypot(e - post[0], n - post[1])));
  }

  private static double shade(Trace line, double e, double n, double postEvery, double rail) {
    double[] near = line.beside(e, n, 1.2);
    if (near == null) {
      return 0;
    }
    double share = 0;
    for (double height : new double[] {FENCE_HEIGHT, FENCE_HEIGHT / 2}) {
      double s = height / Sun.RISE;
      double[] at = line.beside(e + s * Sun.EAST, n + s * Sun.NORTH, 1);
      if (at != null) {
        share = Math.max(share, rail * Noise.step(0.10, 0.03, Math.abs(at[0])));
      }
    }
    for (double back = 0; back <= postEvery; back += postEvery) {
      double[] post = nearestPost(line, near[1] - back, postEvery);
      share = Math.max(share, upright(e - post[0], n - post[1], FENCE_HEIGHT + 0.15, 0.08));
    }
    return share;
  }

  private static double[] nearestPost(Trace line, double along, double every) {
    double at = Math.round(along / every) * every;
    return line.at(Math.max(0, Math.min(line.length(), at)));
  }

  /** Shade of an upright at the origin of the offsets. */
  private static double upright(double de, double dn, double height, double half) {
    double along = -(de * Sun.EAST + dn * Sun.NORTH);
    double aside = Math.abs(de * Sun.NORTH - dn * Sun.EAST);
    if (along < 0 || along * Sun.RISE > height) {
      return 0;
    }
    return 0.85 * Noise.step(half + 0.05, half - 0.05, aside);
  }
}
