package org.fallwright.core.plan;

import java.util.Arrays;
import java.util.List;

/**
 * Some of a setup's checks in short, as far as ranking and counting need them. What several setups
 * have in common is checked once and its slice shared.
 */
final class Slice {
  private static final int VERDICTS = Verdict.values().length;

  private final Verdict verdict;
  private final int failing;
  private final double[] least;
  private final String missed;
  private final double missedRatio;
  private final double[] standings;

  private Slice(
      Verdict verdict,
      int failing,
      double[] least,
      String missed,
      double missedRatio,
      double[] standings) {
    this.verdict = verdict;
    this.failing = failing;
    this.least = least;
    this.missed = missed;
    this.missedRatio = missedRatio;
    this.standings = standings;
  }

  /**
   * @param checks the checks, in their order
   * @param all the standing of each
   */
  static Slice of(List<Check> checks, List<Double> all) {
    Verdict verdict = Verdict.WORKABLE;
    int failing = 0;
    double[] least = new double[VERDICTS];
    Arrays.fill(least, Double.POSITIVE_INFINITY);
    String missed = null;
    double missedRatio = Double.NaN;
    double[] finite = new double[checks.size()];
    int n = 0;
    for (int i = 0; i < checks.size(); i++) {
      Check c = checks.get(i);
      double standing = all.get(i);
      verdict = verdict.worse(c.verdict());
      int v = c.verdict().ordinal();
      least[v] = Math.min(least[v], standing);
      if (c.verdict() == Verdict.NOT_WORKABLE) {
        failing++;
        if (missed == null) {
          missed = c.id();
          missedRatio = c.ratio();
        }
      }
      if (Double.isFinite(standing)) {
        finite[n++] = standing;
      }
    }
    finite = Arrays.copyOf(finite, n);
    Arrays.sort(finite);
    return new Slice(verdict, failing, least, missed, missedRatio, finite);
  }

  /** Worst of the verdicts. */
  Verdict verdict() {
    return verdict;
  }

  /** How many are not workable. */
  int failing() {
    return failing;
  }

  /** Whether none is not workable. */
  boolean passes() {
    return failing == 0;
  }

  /** The lowest standing among those of a verdict; infinite: none has one. */
  double least(Verdict of) {
    return least[of.ordinal()];
  }

  /** Id of the first that is not workable; null: none is. */
  String missed() {
    return missed;
  }

  /** Its ratio. */
  double missedRatio() {
    return missedRatio;
  }

  /** The standings that are finite, lowest first; not to be changed. */
  double[] standings() {
    return standings;
  }
}
