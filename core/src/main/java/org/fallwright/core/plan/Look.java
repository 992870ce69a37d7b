package org.fallwright.core.plan;

import java.util.Arrays;
import java.util.Comparator;

/**
 * A setup looked at by every check, without a sentence: what it takes to rank it.
 *
 * <p>Better verdict first, then fewer checks that fail, then the higher standing of the weakest
 * link, then fewer parts, then the stronger next-weakest link and so on, then the lower lay.
 */
final class Look {
  static final Comparator<Look> BEST_FIRST = Look::compare;

  private final Verdict verdict;
  private final int failing;
  private final double standing;
  private final int parts;
  private final double layDeg;
  private final Slice[] slices;
  private double[] standings;

  /**
   * @param layDeg its lay [degrees]
   * @param parts how many parts bear the line
   * @param notMade how many checks could not be made; they count as failing
   * @param slices all its checks, in their order
   */
  Look(double layDeg, int parts, int notMade, Slice... slices) {
    this.layDeg = layDeg;
    this.parts = parts;
    this.slices = slices;
    Verdict worst = Verdict.WORKABLE;
    int fails = notMade;
    for (Slice s : slices) {
      worst = worst.worse(s.verdict());
      fails += s.failing();
    }
    double least = Double.POSITIVE_INFINITY;
    for (Slice s : slices) {
      least = Math.min(least, s.least(worst));
    }
    verdict = worst;
    failing = fails;
    standing = least;
  }

  Verdict verdict() {
    return verdict;
  }

  int failing() {
    return failing;
  }

  /** Lowest standing among the checks of the worst verdict. */
  double standing() {
    return standing;
  }

  double layDeg() {
    return layDeg;
  }

  /** The slice of the first check that is not workable; null: none is. */
  Slice missed() {
    for (Slice s : slices) {
      if (!s.passes()) {
        return s;
      }
    }
    return null;
  }

  /** The finite standings of all checks, lowest first. */
  double[] standings() {
    if (standings == null) {
      int n = 0;
      for (Slice s : slices) {
        n += s.standings().length;
      }
      double[] all = new double[n];
      n = 0;
      for (Slice s : slices) {
        System.arraycopy(s.standings(), 0, all, n, s.standings().length);
        n += s.standings().length;
      }
      Arrays.sort(all);
      standings = all;
    }
    return standings;
  }

  /**
   * Whether a setup of which only this is known may rank before this one.
   *
   * @param of its verdict
   * @param fails at least so many of its checks fail
   * @param stands its standing is at most this
   */
  boolean mayYieldTo(Verdict of, int fails, double stands) {
    int c = verdict.compareTo(of);
    if (c == 0) {
      c = Integer.compare(failing, fails);
    }
    return c > 0 || c == 0 && stands >= standing;
  }

  private static int compare(Look a, Look b) {
    int c = a.verdict.compareTo(b.verdict);
    if (c == 0) {
      c = Integer.compare(a.failing, b.failing);
    }
    if (c == 0) {
      c = Double.compare(b.standing, a.standing);
    }
    if (c == 0) {
      c = Integer.compare(a.parts, b.parts);
    }
    if (c == 0 && a != b) {
      c = nextWeakest(a.standings(), b.standings());
    }
    return c == 0 ? Double.compare(a.layDeg, b.layDeg) : c;
  }

  /** Of two that are alike so far, the one whose next weakest link is stronger comes first. */
  private static int nextWeakest(double[] a, double[] b) {
    for (int i = 0; i < Math.min(a.length, b.length); i++) {
      int c = Double.compare(b[i], a[i]);
      if (c != 0) {
        return c;
      }
    }
    return Integer.compare(a.length, b.length);
  }
}
