package org.fallwright.plugins.handline;

import java.util.Comparator;
import java.util.EnumMap;
import java.util.List;
import java.util.Map;
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

  /**
   * What people of different pulls give together [N]: the best over n of the group factor of n
   * times the sum of the n strongest, n at most 7. Of equal people it is {@link #persons}; a weak
   * one who would cost the others more than he brings stands by, so that one more never means less.
   */
  static double pullN(List<PersonPull> people) {
    double[] strongestFirst =
        people.stream()
            .map(PersonPull::leastN)
            .sorted(Comparator.reverseOrder())
            .mapToDouble(Double::doubleValue)
            .toArray();
    double best = 0;
    double sum = 0;
    for (int n = 1; n <= Math.min(strongestFirst.length, MOST_COUNTED); n++) {
      sum += strongestFirst[n - 1];
      best = Math.max(best, sum * factor(n));
    }
    return best;
  }

  /** What limits most of them; of equally many the first in the order of {@link Limit}. */
  static Limit limit(List<PersonPull> people) {
    Map<Limit, Integer> counted = new EnumMap<>(Limit.class);
    people.forEach(p -> counted.merge(p.limit(), 1, Integer::sum));
    return counted.entrySet().stream()
        .max(
            Map.Entry.<Limit, Integer>comparingByValue()
                .thenComparing(Map.Entry.comparingByKey(Comparator.reverseOrder())))
        .orElseThrow()
        .getKey();
  }
}
