package org.fallwright.core.doubt;

import java.util.Random;
import org.hipparchus.distribution.continuous.NormalDistribution;
import org.hipparchus.random.SobolSequenceGenerator;

/**
 * Points that fill the unit cube evenly: Sobol's, each coordinate shifted in binary by a number of
 * its own from a fixed seed, so that none lies on an edge and every machine has the same ones.
 *
 * <p>Directions of Joe and Kuo 2008, by the numerics library.
 */
final class Points {
  /** Standard deviations at which a normal quantity is cut: what lies beyond is put there. */
  static final double CUT = 2.5;

  private static final long SEED = 20_260_101;
  private static final int BITS = 52;
  private static final double STEPS = 0x1p52;
  private static final NormalDistribution NORMAL = new NormalDistribution();

  private Points() {}

  /** Coordinates by input and trial, each above 0 and below 1. */
  static double[][] of(int count) {
    int inputs = Input.values().length;
    SobolSequenceGenerator sobol = new SobolSequenceGenerator(inputs);
    Random shifts = new Random(SEED);
    long[] shift = new long[inputs];
    for (int j = 0; j < inputs; j++) {
      shift[j] = shifts.nextLong() >>> (Long.SIZE - BITS);
    }
    double[][] points = new double[inputs][count];
    for (int i = 0; i < count; i++) {
      double[] at = sobol.nextVector();
      for (int j = 0; j < inputs; j++) {
        points[j][i] = (((long) (at[j] * STEPS) ^ shift[j]) + 0.5) / STEPS;
      }
    }
    return points;
  }

  /** Standard deviations off the mean of a normal quantity, by its share of the values below. */
  static double normal(double share) {
    return Math.max(-CUT, Math.min(CUT, NORMAL.inverseCumulativeProbability(share)));
  }
}
