package org.fallwright.core.doubt;

import java.util.List;
import org.fallwright.core.plan.Setup;
import org.fallwright.core.plan.Verdict;
import org.fallwright.core.statics.BandPoint;

/**
 * How far the figures of one setup can be trusted.
 *
 * @param setup the setup
 * @param verdict its verdict, judged over the trials
 * @param sentence how often its pull is enough, in plain words
 * @param trials how many ways the site may be were tried
 * @param enough chance that the pull suffices, 0 to 1
 * @param enoughAtLeast the same with the source giving no more than its least
 * @param neverLetsGo chance that the hinge never lets go
 * @param margin source low over the pull to plan for, as the verdict has it; infinite where no pull
 *     is needed
 * @param marginAsEntered source low over the pull needed with all as entered: what a plain
 *     calculation would say
 * @param poorDayMargin 5th percentile of the margin, the grip being as it may
 * @param compared what one input at a time says, and what the trials say
 * @param fails chance that each check fails, the likeliest first; only those that can
 * @param failsFirst the check that fails first most often; where none can fail, the one nearest to
 *     it
 * @param shares what each input has in what is not known of the margin, the most first; all add up
 *     to 1
 * @param bars margin with each input at its low and high, in the order of the shares; none in a
 *     brief doubt
 * @param measure what to measure next, what decides most first; none in a brief doubt
 * @param margins percentiles of the margin from the 0th to the 100th
 * @param curve the pull as line is taken in, with its band
 */
public record Doubt(
    Setup setup,
    Verdict verdict,
    String sentence,
    int trials,
    double enough,
    double enoughAtLeast,
    double neverLetsGo,
    double margin,
    double marginAsEntered,
    double poorDayMargin,
    List<Compared> compared,
    List<Failing> fails,
    String failsFirst,
    List<Share> shares,
    List<Bar> bars,
    List<Measure> measure,
    List<Double> margins,
    List<BandPoint> curve) {
  public Doubt {
    compared = List.copyOf(compared);
    fails = List.copyOf(fails);
    shares = List.copyOf(shares);
    bars = List.copyOf(bars);
    measure = List.copyOf(measure);
    margins = List.copyOf(margins);
    curve = List.copyOf(curve);
  }

  /**
   * One figure both ways.
   *
   * @param name what it is
   * @param unit SI unit
   * @param oneAtATime one input at a time
   * @param sampled over the trials
   */
  public record Compared(String name, String unit, double oneAtATime, double sampled) {}

  /**
   * A check that can fail.
   *
   * @param check its id
   * @param chance how often it fails, 0 to 1
   * @param first how often it is the first to fail, 0 to 1
   */
  public record Failing(String check, double chance, double first) {}

  /**
   * What one input does to the margin, were it known.
   *
   * @param input the input
   * @param low its 5th percentile, in words
   * @param high its 95th percentile, in words
   * @param marginAtLow margin were it at its low
   * @param marginAtHigh margin were it at its high
   */
  public record Bar(
      Input input, String low, String high, double marginAtLow, double marginAtHigh) {}

  /**
   * How much of what is not known of the margin hangs on one input: its squared rank correlation
   * with the margin over the sum of all.
   *
   * @param share 0 to 1
   */
  public record Share(Input input, double share) {}

  /**
   * A thing to measure.
   *
   * @param input what is measured
   * @param sentence what to do, and what an error does to the margin
   * @param marginIfOff margin were it off by the step that the sentence names
   * @param poorDayIfHalved margin of the poor day were it known twice as well; by it the
   *     measurements rank
   */
  public record Measure(Input input, String sentence, double marginIfOff, double poorDayIfHalved) {}
}
