package org.fallwright.core.advice;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.stream.Stream;
import org.fallwright.core.plan.Figures;
import org.fallwright.core.plan.Judged;
import org.fallwright.core.plan.Setup;
import org.fallwright.core.plan.Verdict;
import org.fallwright.core.reference.Allowances;
import org.fallwright.core.reference.SpeciesTable;
import org.fallwright.core.site.Anchor;
import org.fallwright.core.site.Site;
import org.fallwright.core.tree.StemTaper;
import org.fallwright.core.units.DisplayUnits;

/**
 * The one test of anchors, slings, grip and roots that a crew can make: the uncut tree is pulled to
 * the pull to plan for before any cut, looked at, and let slack again. Common practice, no source.
 *
 * <p>The pulled tree's own roots are not among the checks. Beside the proof pull stands what a root
 * plate of its stem mass bears by the least published constant, M = C·m with m = volume by taper
 * times the least green density, and what the pull puts on it, T·ℓ, ℓ the lever on the hinge; the
 * tree's own back lean, which works against the pull, is left out.
 *
 * @param treeN proof pull at the tree [N]
 * @param sourceEndN its reading at the source end while the line comes in [N]
 * @param gentleTiltDeg tilt of a root plate at which careful tests stop [degrees]
 * @param mostTiltDeg tilt that published non-destructive tests do not pass [degrees]
 * @param rootPlateNm what the pulled tree's root plate bears [N·m]
 * @param momentNm what the proof pull puts on it [N·m]
 * @param watch what to watch, a few words each
 * @param sentence the advice in one sentence
 */
public record ProofPull(
    double treeN,
    double sourceEndN,
    double gentleTiltDeg,
    double mostTiltDeg,
    double rootPlateNm,
    double momentNm,
    List<String> watch,
    String sentence) {
  /**
   * Tilt of a root plate at which a pulling test stops [degrees]. Published: chapter on the pulling
   * test in a thesis on tree anchorage; field advice, no check.
   */
  public static final double GENTLE_TILT_DEG = 0.2;

  /**
   * Tilt that pulling tests do not pass, so that the roots stay whole [degrees]. Published:
   * "Experimental test of non-destructive methods to assess the anchorage of trees", Forests 14(3),
   * 533, 2023 (abstract and tables); field advice, no check.
   */
  public static final double MOST_TILT_DEG = 0.25;

  public ProofPull {
    watch = List.copyOf(watch);
  }

  /** The proof pull of a judged setup; empty where it needs no pull or is not to be made. */
  public static Optional<ProofPull> of(Site site, Judged judged) {
    Figures f = judged.figures();
    if (judged.verdict().compareTo(Verdict.TIGHT) > 0 || f.pullPlanN() == 0) {
      return Optional.empty();
    }
    DisplayUnits in = site.display().units();
    double end = f.pullPlanN() * f.sourceEndPerTree();
    double plate =
        Allowances.ROOT_PLATE_LEAST.value()
            * StemTaper.of(site.tree(), site.cut()).volumeM3()
            * SpeciesTable.of(site.tree().species()).densityLow();
    return Optional.of(
        new ProofPull(
            f.pullPlanN(),
            end,
            GENTLE_TILT_DEG,
            MOST_TILT_DEG,
            plate,
            f.pullPlanN() * f.leverM(),
            watch(site, judged.setup()),
            "Before any cut pull to "
                + in.both(u -> u.forceAtLeast(f.pullPlanN()))
                + " at the tree"
                + (f.sourceEndPerTree() > 1
                    ? ", which reads "
                        + in.both(u -> u.forceAtLeast(end))
                        + " at the source end while the line comes in"
                    : "")
                + "; look, and let it slack again; stop where a level on a root flare turns by more"
                + " than "
                + slope(in)
                + ", a tilt of 0.2°, and never pass 0.25°."));
  }

  /** A tilt of 0.2 degrees as a level shows it: 3.5 mm in a metre, an eighth of an inch in 3 ft. */
  private static String slope(DisplayUnits in) {
    return in == DisplayUnits.US ? "1/8 in in 3 ft" : "3 mm in 1 m";
  }

  private static List<String> watch(Site site, Setup s) {
    List<String> watch = new ArrayList<>();
    Stream.concat(
            s.redirects().stream(),
            s.driver() == null ? Stream.of(s.place()) : Stream.of(s.place(), s.driver().place()))
        .forEach(
            id -> {
              Anchor a = site.anchor(id).orElse(null);
              if (a instanceof Anchor.StandingTree || a instanceof Anchor.Stump) {
                watch.add(id + ": soil that lifts or cracks, a level on its root flare");
                watch.add(id + ": the sling, that it neither slips nor cuts in");
              } else if (a != null) {
                watch.add(id + ": that it does not shift, and its sling");
              } else {
                watch.add(id + ": that wheels or feet do not slip");
              }
            });
    watch.add(site.tree().id() + ": its root flare and the soil on both sides, a level on it");
    watch.add(site.tree().id() + ": the stem below the line, for cracks");
    watch.add("the line where it bears, its ends and every connector");
    return watch;
  }
}
