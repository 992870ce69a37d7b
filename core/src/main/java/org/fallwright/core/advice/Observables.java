package org.fallwright.core.advice;

import org.fallwright.core.cut.HingeShape;
import org.fallwright.core.plan.Figures;
import org.fallwright.core.plan.Judged;
import org.fallwright.core.plan.Setup;
import org.fallwright.core.pull.PullSources;
import org.fallwright.core.site.CutPlan;
import org.fallwright.core.site.Gear;
import org.fallwright.core.site.Site;
import org.fallwright.core.site.SubjectTree;
import org.fallwright.core.tree.StemTaper;
import org.fallwright.core.units.DisplayUnits;

/**
 * What the crew can see of the angle at which the tree goes: line taken in, strokes or travel, gape
 * of the back cut, movement of the tip.
 *
 * <p>Line from slack: slack + shortening of the first leg from sat back to the commit angle φ_c;
 * the line's stretch comes on top of it. Gape: kerf + (Ds − a − t)·φ_c, void where the butt slides.
 * Tip, along the lay from where it stood: u·cos φ + w·sin φ − u, u the tip's offset from the middle
 * of the hinge along the lay, w its height above the hinge, on the leaning stem axis. Nothing here
 * is rounded; what is said is rounded down, so that nobody waits for more than comes.
 *
 * @param lineInAtCommitM line in from slack when it goes, without the line's stretch [m]
 * @param lineInAtEndM all the line to take in, stretch included, to the end of the movement [m]
 * @param travelAtCommitM travel of the drum, wheels or hands when it goes [m]
 * @param strokeM travel a stroke brings [m]; NaN: the source is not worked in strokes
 * @param strokesAtCommit strokes when it goes; NaN: the same
 * @param gapeAtCommitM gape of the back cut when it goes [m]
 * @param tipAtCommitM how far the tip has moved along the lay when it goes [m]
 * @param tipAtEndM the same at the end of the movement [m]
 * @param onStretch whether the line's own stretch carries the tree to where it goes
 * @param sentence the advice in one sentence
 */
public record Observables(
    double lineInAtCommitM,
    double lineInAtEndM,
    double travelAtCommitM,
    double strokeM,
    double strokesAtCommit,
    double gapeAtCommitM,
    double tipAtCommitM,
    double tipAtEndM,
    boolean onStretch,
    String sentence) {
  /** Parameter by which a source worked by hand says how much a stroke takes in. */
  private static final String STROKE = "stroke_m";

  /** What can be seen of a judged setup; figures are NaN where the tree cannot be moved. */
  public static Observables of(Site site, PullSources sources, Judged judged) {
    Figures f = judged.figures();
    double travel = f.lineInAtCommitM() * f.sourceTravelM() / f.takeUpM();
    double stroke = stroke(site, sources, judged.setup());
    double commit = Math.toRadians(f.commitDeg());
    double end = Math.toRadians(f.movementEndDeg());
    double tip = tip(site, judged.setup(), commit);
    return new Observables(
        f.lineInAtCommitM(),
        f.takeUpM(),
        travel,
        stroke,
        travel / stroke,
        f.gapeM(),
        tip,
        tip(site, judged.setup(), end),
        f.runsOnStretch(),
        sentence(site, f, travel, travel / stroke, tip));
  }

  /** Only a source that has the parameter among its own is worked in strokes. */
  private static double stroke(Site site, PullSources sources, Setup s) {
    String mover = s.driver() == null ? s.source() : s.driver().source();
    Gear.Source gear = site.source(mover).orElseThrow();
    boolean strokes =
        sources.byId(gear.plugin()).stream()
            .flatMap(p -> p.describe().parameters().stream())
            .anyMatch(p -> p.key().equals(STROKE));
    return strokes && gear.parameters().path(STROKE).isNumber()
        ? gear.parameters().path(STROKE).asDouble()
        : Double.NaN;
  }

  private static double tip(Site site, Setup s, double phi) {
    SubjectTree t = site.tree();
    CutPlan cut = site.cut();
    double hingeAhead =
        HingeShape.of(
                StemTaper.stumpInsideBarkM(t),
                cut.faceFraction(),
                s.hingeThicknessM(),
                cut.hingeWidthM(),
                t.shellM(),
                t.deadOrDecayed(),
                cut.kerfM(),
                cut.wedges())
            .offsetM();
    double up = t.heightM().value() - cut.heightM();
    double off = up * Math.tan(Math.toRadians(t.leanDeg().value()));
    double ahead =
        off * Math.cos(Math.toRadians(t.leanAzimuthDeg().value() - s.layDeg())) - hingeAhead;
    return ahead * Math.cos(phi) + up * Math.sin(phi) - ahead;
  }

  private static String sentence(Site site, Figures f, double travel, double strokes, double tip) {
    if (Double.isNaN(f.pullPlanN())) {
      return "The tree cannot be moved by this setup, so there is nothing to see.";
    }
    DisplayUnits units = site.display().units();
    Inward in = new Inward(units);
    String moved =
        Double.isNaN(strokes)
            ? travel == f.lineInAtCommitM() ? "" : " (" + in.lengthTo(travel) + " at the source)"
            : String.format(java.util.Locale.ROOT, " (about %.0f strokes)", Math.floor(strokes));
    return "It goes when "
        + in.lengthTo(f.lineInAtCommitM())
        + " of line is in from slack"
        + moved
        + (f.runsOnStretch() ? ", much of it by the line's own stretch, which tells little" : "")
        + ", the back cut gapes "
        + in.thicknessTo(f.gapeM())
        + " (void if the butt slides) and the tip has moved "
        + in.lengthTo(tip)
        + ".";
  }
}
