package org.fallwright.core.plan;

import java.util.List;
import java.util.Locale;
import org.fallwright.core.line.LegLoads;
import org.fallwright.core.line.PathFit;
import org.fallwright.core.pull.PullOffer;
import org.fallwright.core.reference.Allowances;
import org.fallwright.core.site.Gear;
import org.fallwright.core.site.Site;
import org.fallwright.core.statics.TreeSide;
import org.fallwright.core.units.DisplayUnits;

/** Whether the kit reaches: line and wire long enough, no joint through a block, enough gear. */
final class KitChecks {
  private final Site site;
  private final DisplayUnits in;
  private final Grade grade;

  KitChecks(Site site, DisplayUnits in, Grade grade) {
    this.site = site;
    this.in = in;
    this.grade = grade;
  }

  /**
   * @param t what the tree asks; null: the take-up is of no account here
   */
  void check(Setup setup, Route route, TreeSide t, PullOffer offer, GearParts gear) {
    Gear.Line line = GearParts.line(site, setup);
    double takeUp = t != null && t.movable() ? t.takeUpM() : 0;
    PathFit fit =
        PathFit.of(
            route.loads().legs().stream().map(LegLoads.Leg::lengthM).toList(),
            line.lengthM(),
            Allowances.LINE_SPARE.value(),
            offer.wireM(),
            takeUp);
    boolean reaches = fit.neededM() <= fit.availableM();
    grade.rule(
        "line length",
        fit.availableM(),
        fit.neededM(),
        "m",
        fit.availableM() / fit.neededM(),
        null,
        () ->
            "Line "
                + line.id()
                + (offer.wireM() > 0 ? " and the source's wire reach " : " reaches ")
                + in.length(fit.availableM())
                + "; the path with wraps and tails needs "
                + in.length(fit.neededM())
                + (reaches
                    ? "."
                    : ": stand " + in.length(fit.neededM() - fit.availableM()) + " nearer."));
    if (reaches && !fit.fits()) {
      grade.rule("joint", 0, 1, "", 0, null, () -> sentence(fit.shortOf()));
    }
    haulLine(route, takeUp);
    enough("blocks", site.gear().blocks().size(), setup.redirects().size());
    enough(
        "slings", site.gear().slings().stream().mapToInt(Gear.Sling::count).sum(), gear.slings());
    enough(
        "connectors",
        site.gear().connectors().stream().mapToInt(Gear.Connector::count).sum(),
        gear.connectors());
  }

  /** The line of a block system: its parts over the take-up, its haul leg, wraps and tails. */
  private void haulLine(Route route, double takeUp) {
    if (route.haulLine() == null) {
      return;
    }
    double there = route.haulLine().lengthM();
    double needed =
        route.haulLine().parts() * Math.max(takeUp, Allowances.BLOCKS_APART.value())
            + route.haulLegM()
            + Allowances.LINE_SPARE.value();
    grade.rule(
        "haul line",
        there,
        needed,
        "m",
        there / needed,
        null,
        () ->
            "The block system's line is "
                + in.length(there)
                + "; its parts, its haul and tails need "
                + in.length(needed)
                + ".");
  }

  private void enough(String what, int there, int needed) {
    if (needed > 0) {
      grade.rule(
          what,
          there,
          needed,
          "",
          there >= needed ? Double.POSITIVE_INFINITY : (double) there / needed,
          null,
          () -> String.format(Locale.ROOT, "%d %s needed, %d in the kit.", needed, what, there));
    }
  }

  private static String sentence(List<String> parts) {
    String s = String.join("; ", parts);
    return Character.toUpperCase(s.charAt(0)) + s.substring(1) + ".";
  }
}
