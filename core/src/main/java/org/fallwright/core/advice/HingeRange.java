package org.fallwright.core.advice;

import org.fallwright.core.plan.Check;
import org.fallwright.core.plan.Judge;
import org.fallwright.core.plan.Judged;
import org.fallwright.core.plan.Setup;
import org.fallwright.core.plan.Verdict;
import org.fallwright.core.reference.Allowances;
import org.fallwright.core.site.Site;
import org.fallwright.core.tree.StemTaper;

/**
 * How thick and how thin the hinge of a setup may be.
 *
 * <p>A thicker hinge asks for more pull, a thinner one steers, turns and bears less. Every
 * thickness is judged with everything else as planned; the ends are found to half a millimetre.
 * Looked at: from 5 mm to a quarter of the stem's diameter at the cut. How evenly a hinge can be
 * sawn is in the judging, as the spread of the thickness.
 *
 * @param plannedM thickness of the setup [m]
 * @param usualM a tenth of the stem's diameter at breast height, the published rule [m]
 * @param workable thicknesses at which the setup is workable; null: none
 * @param tight thicknesses at which it is workable or tight; null: none
 * @param limit what stands in the way at the best thickness; null where some are workable
 * @param sentence the advice in one sentence
 */
public record HingeRange(
    double plannedM, double usualM, Span workable, Span tight, Check limit, String sentence) {
  /** Ends are found to this [m]. */
  private static final double STEP = 0.0005;

  /** Thinnest hinge looked at [m]: the least that a site may offer. */
  private static final double LEAST = 0.005;

  /** Thickest hinge that a site may offer [m]. */
  private static final double MOST = 0.5;

  /** Thickest hinge looked at, over the diameter at the cut; planning allowance. */
  private static final double MOST_SHARE = 0.25;

  private static final int STRIDE = 10;

  /** The range of the setup's hinge. */
  public static HingeRange of(Site site, Judge judge, Setup setup) {
    double most = Math.min(MOST, MOST_SHARE * StemTaper.stumpInsideBarkM(site.tree()));
    Scan scan =
        new Scan(
            STEP,
            "m",
            (int) Math.round(LEAST / STEP),
            (int) Math.floor(most / STEP),
            STRIDE,
            t -> judge.judge(setup.withHinge(t)));
    Span workable = scan.run(setup.hingeThicknessM(), Verdict.WORKABLE).orElse(null);
    Span tight = scan.run(setup.hingeThicknessM(), Verdict.TIGHT).orElse(null);
    Judged best = workable == null ? scan.at(scan.best(setup.hingeThicknessM())) : null;
    double usual = Allowances.HINGE_THICKNESS_SHARE.value() * site.tree().dbhM().value();
    return new HingeRange(
        setup.hingeThicknessM(),
        usual,
        workable,
        tight,
        best == null ? null : best.weakest(),
        sentence(new Inward(site.display().units()), setup, usual, workable, tight, best));
  }

  /** The range to keep to: where it is workable, else where it is tight; null: there is none. */
  public Span advised() {
    return workable != null ? workable : tight;
  }

  private static String sentence(
      Inward in, Setup setup, double usual, Span workable, Span tight, Judged best) {
    if (tight == null) {
      return best.verdict() == Verdict.CANNOT_JUDGE
          ? "No hinge can be advised yet: " + best.weakest().why()
          : "No hinge of any thickness will do; " + best.weakest().id() + " stands in the way.";
    }
    Span keep = workable != null ? workable : tight;
    StringBuilder s = new StringBuilder();
    if (workable == null) {
      s.append("Workable with no hinge (")
          .append(best.weakest().id())
          .append("), tight with one from ");
    } else {
      s.append("Workable with a hinge from ");
    }
    s.append(in.thicknessFrom(keep.lowest())).append(" to ").append(in.thicknessTo(keep.highest()));
    s.append(keep.below() == null ? "" : "; thinner, the limit is " + keep.below().id());
    s.append(keep.above() == null ? "" : "; thicker, " + keep.above().id());
    if (!keep.holds(setup.hingeThicknessM())) {
      s.append("; the planned ")
          .append(in.thicknessTo(setup.hingeThicknessM()))
          .append(" lies outside");
    }
    s.append("; the usual tenth of the stem, ").append(in.thicknessTo(usual));
    return s.append(keep.holds(usual) ? ", lies inside." : ", lies outside.").toString();
  }
}
