package org.fallwright.core.plan;

import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import java.util.Optional;
import java.util.stream.Stream;
import org.fallwright.core.line.LegLoads;
import org.fallwright.core.line.LineFigures;
import org.fallwright.core.line.PathFit;
import org.fallwright.core.line.Point3;
import org.fallwright.core.pull.PullOffer;
import org.fallwright.core.reference.Allowances;
import org.fallwright.core.site.Gear;
import org.fallwright.core.site.Site;
import org.fallwright.core.statics.TreeSide;
import org.fallwright.core.units.DisplayUnits;

/**
 * Whether the kit reaches: line and wire long enough, no joint through a block, enough gear. What
 * is short is said with the least that would mend it.
 */
final class KitChecks {
  private final Site site;
  private final Spares spares;
  private final DisplayUnits in;
  private final Grade grade;

  /**
   * @param site the site with the gear at hand alone
   * @param spares what is left behind
   */
  KitChecks(Site site, Spares spares, DisplayUnits in, Grade grade) {
    this.site = site;
    this.spares = spares;
    this.in = in;
    this.grade = grade;
  }

  /**
   * @param t what the tree asks; null: the take-up is of no account here
   */
  void check(Setup setup, Route route, TreeSide t, PullOffer offer, GearParts gear) {
    Gear.Line line = GearParts.line(site, setup);
    double takeUp = t != null && t.movable() ? t.takeUpM() : 0;
    List<Double> legs = route.loads().legs().stream().map(LegLoads.Leg::lengthM).toList();
    List<Gear.Line> joined = JoinedLines.parts(site, setup.line());
    PathFit fit = fit(legs, joined, offer, takeUp);
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
                    : longer(
                        nearer(setup.place(), route.points(), fit.neededM() - fit.availableM()),
                        spares.line(l -> fit(legs, List.of(l), offer, takeUp).fits()),
                        fit.neededM() - fit.availableM())));
    if (reaches && !fit.fits()) {
      grade.rule(
          "joint",
          0,
          1,
          "",
          0,
          null,
          () ->
              sentence(fit.shortOf())
                  + least(spares.line(l -> fit(legs, List.of(l), offer, takeUp).fits())));
    }
    overBlock(setup);
    haulLine(setup, route, takeUp);
    takenIn(offer.travel().mostM(), takeUp);
    enough(
        "blocks", "block", site.gear().blocks(), spares.all().blocks(), setup.redirects().size());
    enough("slings", "sling", site.gear().slings(), spares.all().slings(), gear.slings());
    enough(
        "connectors",
        "connector",
        site.gear().connectors(),
        spares.all().connectors(),
        gear.connectors());
  }

  /** Whether the line can run over the block at all: no chain does, nor a rope thicker than it. */
  private void overBlock(Setup setup) {
    if (!setup.redirects().isEmpty()) {
      JoinedLines.parts(site, setup.line()).forEach(this::overBlock);
    }
  }

  private void overBlock(Gear.Line line) {
    Double sheave = Route.block(site).sheaveDiameterM();
    if (line.material().chain()) {
      grade.rule(
          "sheave",
          0,
          1,
          "",
          0,
          null,
          () -> "Line " + line.id() + " is a chain: it does not run over a block.");
    } else if (sheave != null && sheave < LineFigures.LEAST_RATIO * line.diameterM()) {
      grade.rule(
          "sheave",
          sheave,
          LineFigures.LEAST_RATIO * line.diameterM(),
          "m",
          0,
          null,
          () ->
              "The sheave of block "
                  + Route.block(site).id()
                  + " is thinner than line "
                  + line.id()
                  + ": what so sharp a bend leaves is not known.");
    }
  }

  private static PathFit fit(
      List<Double> legs, List<Gear.Line> lines, PullOffer offer, double takeUp) {
    return PathFit.of(
        legs,
        lines.stream().map(Gear.Line::lengthM).toList(),
        Allowances.LINE_SPARE.value(),
        offer.wireM(),
        takeUp);
  }

  /** Standing nearer at a spot; at an anchor nothing can be moved. */
  private Optional<String> nearer(String place, List<Point3> points, double shorterM) {
    int end = points.size() - 1;
    return site.spot(place)
        .flatMap(s -> Nearer.by(points.get(end - 1).minus(points.get(end)), shorterM, in));
  }

  /** The line of a block system: its parts over the take-up, its haul leg, wraps and tails. */
  private void haulLine(Setup setup, Route route, double takeUp) {
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
                + (there >= needed
                    ? "."
                    : longer(
                        nearer(setup.driver().place(), route.haul(), needed - there),
                        Optional.empty(),
                        needed - there)));
  }

  /** What a source that comes to an end of its way can take in. */
  private void takenIn(Double most, double takeUp) {
    if (most == null) {
      return;
    }
    grade.rule(
        "take-up of the source",
        most,
        takeUp,
        "m",
        takeUp == 0 ? Double.POSITIVE_INFINITY : most / takeUp,
        null,
        () ->
            "The source can take in "
                + in.length(most)
                + " of line; the movement asks for "
                + in.length(takeUp)
                + ".");
  }

  private void enough(
      String what,
      String one,
      List<? extends Gear.Item> atHand,
      List<? extends Gear.Item> all,
      int needed) {
    int there = atHand.stream().mapToInt(Gear.Item::count).sum();
    if (needed > 0) {
      grade.rule(
          what,
          there,
          needed,
          "",
          there >= needed ? Double.POSITIVE_INFINITY : (double) there / needed,
          null,
          () ->
              String.format(Locale.ROOT, "%d %s needed, %d at hand", needed, what, there)
                  + (there >= needed ? "." : least(mend(one, what, all, needed - there))));
    }
  }

  private Optional<String> mend(
      String one, String many, List<? extends Gear.Item> all, int missing) {
    return Optional.of(
        spares.things(all, missing).orElse(missing + " more " + (missing == 1 ? one : many)));
  }

  /** What mends a line that is too short; where nothing at hand does, how much more is needed. */
  private String longer(Optional<String> nearer, Optional<String> other, double missingM) {
    return nearer.isPresent() || other.isPresent()
        ? least(nearer, other)
        : least(Optional.of("it takes " + Nearer.up(missingM, in) + " more of line"));
  }

  /** Closes a sentence with what would mend it, each by itself. */
  @SafeVarargs
  private static String least(Optional<String>... changes) {
    List<String> all = new ArrayList<>();
    Stream.of(changes).flatMap(Optional::stream).forEach(all::add);
    return all.isEmpty() ? "." : ": " + String.join(", or ", all) + ".";
  }

  private static String sentence(List<String> parts) {
    String s = String.join("; ", parts);
    return Character.toUpperCase(s.charAt(0)) + s.substring(1);
  }
}
