package org.fallwright.core.advice;

import java.util.Locale;
import org.fallwright.core.plan.Check;
import org.fallwright.core.plan.Judge;
import org.fallwright.core.plan.Judged;
import org.fallwright.core.plan.Setup;
import org.fallwright.core.plan.Verdict;
import org.fallwright.core.pull.PullSources;
import org.fallwright.core.site.Site;

/**
 * The highest gust in which a setup stays workable, and the highest in which it is not yet out of
 * the question.
 *
 * <p>The gust at crown height is raised from calm, direction and doubt as entered, and the whole
 * site judged at each; what counts is the first gust that fails. Found to 0.1 m/s, up to 40 m/s.
 *
 * @param plannedMps gust of the site [m/s]
 * @param towardDeg direction it blows towards [degrees]; null: not known, so all of it counts
 *     against the lay and all of it aside
 * @param workable gusts from calm up at which it is workable; null: not even in calm air
 * @param tight gusts from calm up at which it is workable or tight; null: not even in calm air
 * @param limit what stands in the way in calm air; null where it is workable there
 * @param sentence the advice in one sentence
 */
public record WindLimit(
    double plannedMps, Double towardDeg, Span workable, Span tight, Check limit, String sentence) {
  private static final double STEP = 0.1;
  private static final double MOST = 40;
  private static final int STRIDE = 10;

  /** The limits of the setup on that site. */
  public static WindLimit of(Site site, PullSources sources, Setup setup) {
    Scan scan =
        new Scan(
            STEP,
            "m/s",
            0,
            (int) Math.round(MOST / STEP),
            STRIDE,
            v -> new Judge(Altered.gust(site, v), sources).judge(setup));
    Span workable = scan.around(0, Verdict.WORKABLE).orElse(null);
    Span tight = scan.around(0, Verdict.TIGHT).orElse(null);
    Judged calm = scan.at(0);
    return new WindLimit(
        site.conditions().gustMps().value(),
        site.conditions().windTowardDeg(),
        workable,
        tight,
        workable == null ? calm.weakest() : null,
        sentence(site, workable, tight, calm));
  }

  private static String sentence(Site site, Span workable, Span tight, Judged calm) {
    Inward in = new Inward(site.display().units());
    if (tight == null) {
      return calm.verdict() == Verdict.CANNOT_JUDGE
          ? "No wind limit can be given yet: " + calm.weakest().why()
          : "Not even in calm air; " + calm.weakest().id() + " stands in the way.";
    }
    Double toward = site.conditions().windTowardDeg();
    String wind =
        toward == null
            ? ", wind from any side"
            : String.format(Locale.ROOT, ", wind blowing towards %.0f°", toward);
    String good =
        workable == null
            ? "Tight already in calm air (" + calm.weakest().id() + ")"
            : "Workable in gusts up to " + in.windTo(workable.highest()) + by(workable.above());
    String last =
        tight.above() == null
            ? "no gust looked at rules it out"
            : "never pull above " + in.windTo(tight.highest()) + by(tight.above());
    return good + "; " + last + wind + ".";
  }

  private static String by(Check above) {
    return above == null ? "" : " (then " + above.id() + ")";
  }
}
