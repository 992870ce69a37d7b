package org.fallwright.core.doubt;

import java.util.List;
import java.util.stream.IntStream;
import org.fallwright.core.plan.Judge;
import org.fallwright.core.plan.Reckoned;
import org.fallwright.core.plan.Setup;

/**
 * What the source of a setup gives at the tree at its least, by how well the ground grips: asked at
 * a few grips, on straight lines between. A stop at the ceiling holds at every grip.
 *
 * @param lowsN at equal steps from the least grip to the most [N]
 * @param ceilingN most that is counted on [N]; infinite where nobody stops it
 */
record Pull(List<Double> lowsN, double ceilingN) {
  private static final int STEPS = 4;

  static Pull of(Judge judge, Setup setup, Reckoned r) {
    List<Double> grips = IntStream.rangeClosed(0, STEPS).mapToObj(i -> (double) i / STEPS).toList();
    boolean stops = r.judged().figures().leansOnStopReading();
    return new Pull(
        judge.lowsByGrip(setup, grips),
        stops ? r.ratios().ceiling().tensionN() : Double.POSITIVE_INFINITY);
  }

  /**
   * The pull at a grip [N].
   *
   * @param grip share of the way from the least to the most
   */
  double atN(double grip) {
    double at = Math.max(0, Math.min(1, grip)) * STEPS;
    int below = Math.min(STEPS - 1, (int) at);
    double from = lowsN.get(below);
    return Math.min(ceilingN, from + (at - below) * (lowsN.get(below + 1) - from));
  }

  /** The pull at the least grip [N]. */
  double leastN() {
    return atN(0);
  }
}
