package org.fallwright.core.advice;

import org.fallwright.core.plan.Judge;
import org.fallwright.core.plan.Judged;
import org.fallwright.core.plan.Setup;
import org.fallwright.core.plan.Verdict;
import org.fallwright.core.reference.Allowances;
import org.fallwright.core.reference.SpeciesTable;
import org.fallwright.core.site.Site;
import org.fallwright.core.tree.StemTaper;
import org.fallwright.core.tree.TreeFigures;

/**
 * Where on the stem the line may sit: between too low to pull and too thin to hold.
 *
 * <p>Every quarter of a metre from 1 m up is judged, to where the stem inside the bark is thinner
 * than 0.10 m or to 0.8 of the tree's height, whichever comes first. Whether a branch or fork is
 * there to hold the line is for the climber or the throw line to find out.
 *
 * @param plannedM height of the setup [m]
 * @param lookedFromM lowest height looked at [m]
 * @param lookedToM highest height looked at [m]
 * @param topReason why nothing higher was looked at
 * @param bestM the best height by verdict, then standing [m]; NaN: no height fits this stem
 * @param bestVerdict verdict there; null: no height fits
 * @param workable heights at which it is workable; null: none
 * @param tight heights at which it is workable or tight; null: none
 * @param sentence the advice in one sentence
 */
public record LineHeightRange(
    double plannedM,
    double lookedFromM,
    double lookedToM,
    String topReason,
    double bestM,
    Verdict bestVerdict,
    Span workable,
    Span tight,
    String sentence) {
  private static final double STEP = 0.25;

  /** Lowest height above the ground looked at [m]; planning allowance. */
  private static final double LEAST = 1;

  /** Thinnest stem that a line is put on [m]; common practice from memory, no standard read. */
  static final double THINNEST = 0.10;

  /** Highest share of the tree's height; planning allowance. */
  static final double HIGHEST_SHARE = 0.8;

  /** The range of the setup's line height. */
  public static LineHeightRange of(Site site, Judge judge, Setup setup) {
    Stem stem = Stem.of(site);
    Inward in = new Inward(site.display().units());
    int from = (int) Math.ceil(Math.max(LEAST, stem.lowestM() + 1e-6) / STEP);
    int to = (int) Math.floor(stem.highestM() / STEP + 1e-9);
    if (to < from) {
      return new LineHeightRange(
          setup.attachHeightM(),
          from * STEP,
          to * STEP,
          stem.reason(),
          Double.NaN,
          null,
          null,
          null,
          "No height on this stem takes a line: " + stem.reason() + ".");
    }
    Scan scan = new Scan(STEP, "m", from, to, 1, h -> judge.judge(setup.withAttachHeight(h)));
    int best = scan.best(setup.attachHeightM());
    Judged there = scan.at(best);
    Span workable = scan.around(best, Verdict.WORKABLE).orElse(null);
    Span tight = scan.around(best, Verdict.TIGHT).orElse(null);
    return new LineHeightRange(
        setup.attachHeightM(),
        scan.first(),
        scan.last(),
        stem.reason(),
        scan.setting(best),
        there.verdict(),
        workable,
        tight,
        sentence(in, stem, setup, scan.setting(best), there, workable, tight));
  }

  private static String sentence(
      Inward in, Stem stem, Setup setup, double best, Judged there, Span workable, Span tight) {
    if (tight == null) {
      return there.verdict() == Verdict.CANNOT_JUDGE
          ? "No line height can be advised yet: " + there.weakest().why()
          : "No line height will do; " + there.weakest().id() + " stands in the way.";
    }
    Span keep = workable != null ? workable : tight;
    return (workable != null ? "Workable" : "Never workable (" + there.weakest().id() + "), tight")
        + " with the line from "
        + in.lengthFrom(keep.lowest())
        + " to "
        + in.lengthTo(keep.highest())
        + " above the ground, best at "
        + in.lengthTo(best)
        + (keep.below() == null ? "" : "; lower, the limit is " + keep.below().id())
        + "; higher, "
        + (keep.above() == null ? stem.reason() : keep.above().id())
        + (keep.holds(setup.attachHeightM())
            ? "."
            : "; the planned " + in.lengthTo(setup.attachHeightM()) + " lies outside.");
  }

  /**
   * Between what heights above the ground a line may sit.
   *
   * @param lowestM above this [m]
   * @param highestM up to this [m]
   * @param reason why not higher
   */
  public record Stem(double lowestM, double highestM, String reason) {
    /** Of the site's tree. */
    public static Stem of(Site site) {
      StemTaper taper =
          TreeFigures.of(site.tree(), site.cut(), SpeciesTable.of(site.tree().species())).taper();
      double top = HIGHEST_SHARE * site.tree().heightM().value();
      double low = site.cut().heightM() + Allowances.ATTACH_LEAST.value();
      String thin = "the stem is thinner than " + smallest(site);
      for (double h = STEP * Math.ceil(low / STEP); h <= top; h += STEP) {
        if (taper.insideBarkM(h) < THINNEST) {
          return new Stem(low, h - STEP, thin);
        }
      }
      return new Stem(low, top, "it would be above eight tenths of the tree");
    }

    private static String smallest(Site site) {
      return site.display().units().both(u -> u.smallLength(THINNEST));
    }

    /** Whether a line may sit at that height above the ground [m]. */
    public boolean takes(double heightM) {
      return heightM > lowestM && heightM <= highestM + 1e-9;
    }
  }
}
