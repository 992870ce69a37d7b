package org.fallwright.plugins.handline;

import org.fallwright.core.reference.Allowances;

/** What a crew pulls together: less than its people would one by one. */
final class Crew {
  /**
   * Loss for each further person. Published: a straight fit to Ringelmann's figures for untrained
   * people, within 0.02 of the factors 0.93 of two, 0.85 of three and 248 of 8 × 63 kgf of eight;
   * trained teams lose less.
   */
  private static final double LOSS_A_PERSON = Allowances.GROUP_LOSS.value();

  /** The fitted total hardly grows beyond seven and falls beyond eight: more count as seven. */
  private static final int MOST_COUNTED = (int) Allowances.GROUP_MOST.value();

  private Crew() {}

  /**
   * What the crew's total is, in single persons' pulls: n (1 − 0.07 (n − 1)), n at most 7.
   *
   * @param people n, 1 or more
   */
  static double persons(int people) {
    int counted = Math.min(people, MOST_COUNTED);
    return counted * factor(counted);
  }

  /** The group factor, 1 − 0.07 (n − 1). */
  static double factor(int people) {
    return 1 - LOSS_A_PERSON * (people - 1);
  }
}
