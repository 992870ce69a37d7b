package org.fallwright.core.plan;

import java.util.ArrayList;
import java.util.List;
import java.util.function.Supplier;
import org.fallwright.core.pull.PullOffer;
import org.fallwright.core.pull.PullOffer.Standing;
import org.fallwright.core.pull.PullOffer.Where;
import org.fallwright.core.reference.Allowances;
import org.fallwright.core.rules.RuleSet;
import org.fallwright.core.site.Position;
import org.fallwright.core.site.Site;
import org.fallwright.core.site.ZoneChoices;
import org.fallwright.core.statics.TreeSide;
import org.fallwright.core.units.DisplayUnits;
import org.fallwright.core.zones.Bight;
import org.fallwright.core.zones.OperatorPlace;
import org.fallwright.core.zones.OperatorStand;

/** Whether those who work the source can stand clear, and what holds the line they pull. */
final class People {
  private final Site site;
  private final RuleSet rules;
  private final DisplayUnits in;
  private final Grade grade;

  People(Site site, RuleSet rules, DisplayUnits in, Grade grade) {
    this.site = site;
    this.rules = rules;
    this.in = in;
    this.grade = grade;
  }

  /** Where the source is worked; null: nobody works it. */
  OperatorStand stand(Setup setup, Route route, PullOffer offer) {
    if (offer.operators() == 0) {
      return null;
    }
    boolean spot = site.spot(at(setup)).isPresent();
    if (spot || !offer.captured()) {
      return OperatorStand.atEnd(route.path(), spot && offer.powered());
    }
    return OperatorStand.besideWinch(
        route.path(),
        Allowances.WINCH_BEFORE_ANCHOR.value(),
        offer.powered()
            ? rules.operatorBesideWinchM().value()
            : Allowances.BESIDE_HAND_WINCH.value());
  }

  private static String at(Setup setup) {
    return setup.driver() == null ? setup.place() : setup.driver().place();
  }

  void check(
      Setup setup,
      Route route,
      OperatorStand stand,
      Landing.Zones zones,
      PullOffer offer,
      TreeSide tree) {
    if (stand != null) {
      // whoever works the source stands at a corner of its last angle, and of its own anchor's
      List<Bight> others = new ArrayList<>();
      List<Bight> bights = zones.angles().bights();
      others.addAll(bights.subList(0, Math.max(0, bights.size() - 1)));
      zones.angles().bridles().stream()
          .filter(b -> !b.id().equals(at(setup)))
          .forEach(b -> others.add(b.inside()));
      OperatorPlace o =
          worst(
              places(setup, route, stand, offer).stream()
                  .map(p -> OperatorPlace.of(p, zones.footprint(), others, zones.angles().recoil()))
                  .toList());
      double height = site.tree().heightM().value();
      double asked = rules.operatorRadiusFactor().value() * height;
      boolean far = rules.operatorRadiusFactor().metBy(o.fromStumpM(), height);
      Supplier<String> stands =
          () ->
              "Who works the source stands "
                  + in.length(o.fromStumpM())
                  + " from the stump; "
                  + in.length(asked)
                  + " are asked";
      if (!far && rules.teamException().yes()) {
        grade.tightAtBest(
            "operator distance",
            o.fromStumpM(),
            asked,
            "m",
            stand.at(),
            () -> stands.get() + ": only as one of the team, named on the sheet with the reason.");
      } else {
        grade.rule(
            "operator distance",
            o.fromStumpM(),
            asked,
            "m",
            far
                ? Math.max(1, o.fromStumpM() / asked)
                : Math.min(o.fromStumpM() / asked, Math.nextDown(1.0)),
            stand.at(),
            () -> stands.get() + (far ? "." : ", and these rules know no exception."));
      }
      boolean clear = o.outsideFootprint() && o.outsideBights();
      grade.rule(
          "operator clear",
          clear ? 1 : 0,
          1,
          "",
          clear ? Double.POSITIVE_INFINITY : 0,
          stand.at(),
          () ->
              clear
                  ? "Who works the source stands outside the footprint and every other angle of the"
                      + " line."
                  : "Who works the source would stand "
                      + (o.outsideFootprint()
                          ? "inside an angle of the line."
                          : "where the tree can fall."));
    }
    if (stand != null && tree.movable()) {
      onTheLine(stand, tree);
    }
    if (stand != null && !offer.captured() && !offer.powered()) {
      boolean refused = rules.freeHand() == RuleSet.FreeHand.REFUSED;
      String why =
          "People pull with nothing that holds the line"
              + (refused
                  ? "; these rules refuse that."
                  : ": a swaying pull rocks the tree while it is cut. Use a device that holds.");
      if (refused) {
        grade.factored("free hand", 0, 1, "", 0, stand.at(), () -> why);
      } else {
        grade.tightAtBest("free hand", 0, 1, "", stand.at(), () -> why);
      }
    }
  }

  /** Where everybody stands who is within reach of the line. */
  private List<Position> places(Setup setup, Route route, OperatorStand stand, PullOffer offer) {
    return offer.people().stream()
        .filter(s -> s.where() != Where.AWAY)
        .map(s -> place(s, setup, route, stand))
        .toList();
  }

  private Position place(Standing who, Setup setup, Route route, OperatorStand stand) {
    return switch (who.where()) {
      case AT_SOURCE, AWAY -> stand.at();
      case AT_CAPTURE -> Route.place(site, setup.place()).at();
      case BESIDE_LINE -> {
        List<Position> path = route.path();
        Position end = path.get(path.size() - 1);
        Position before = path.get(path.size() - 2);
        double nearer = Math.min(who.nearerM(), end.distanceTo(before));
        yield nearer == 0 ? end : end.along(end.azimuthTo(before), nearer);
      }
    };
  }

  /** Of several places the worst of each kind. */
  private static OperatorPlace worst(List<OperatorPlace> all) {
    return new OperatorPlace(
        all.stream().allMatch(OperatorPlace::outsideFootprint),
        all.stream().allMatch(OperatorPlace::outsideBights),
        all.stream().allMatch(OperatorPlace::offAxis),
        all.stream().mapToDouble(OperatorPlace::fromStumpM).min().orElseThrow());
  }

  /**
   * What the loaded line stores, ½·T²/K, and whether whoever works the source has accepted it by
   * name; and whether that person is off the line's axis. A vehicle's cab lies on the axis and is
   * no shelter by itself, so there it rests on the acceptance alone.
   */
  private void onTheLine(OperatorStand stand, TreeSide tree) {
    double energy = storedJ(tree);
    ZoneChoices.AcceptedEnergy accepted = site.zones().energy();
    boolean met = energy == 0 || accepted != null && energy <= accepted.upToJ();
    boolean clear =
        switch (stand.shelter()) {
          case OFF_AXIS -> true;
          case IN_VEHICLE -> met;
          case ON_AXIS -> false;
        };
    String where =
        switch (stand.shelter()) {
          case OFF_AXIS -> "Who works the source stands beside the line, off its axis.";
          case IN_VEHICLE ->
              "Who drives sits on the line's axis"
                  + (met ? ", and accepts what it stores." : "; a cab is no shelter by itself.");
          case ON_AXIS -> "Who hauls stands on the line's axis: haul round a block, off the line.";
        };
    if (clear) {
      grade.rule(
          "operator off the line", 1, 1, "", Double.POSITIVE_INFINITY, stand.at(), () -> where);
    } else {
      grade.tightAtBest("operator off the line", 0, 1, "", stand.at(), () -> where);
    }
    Supplier<String> stores = () -> "The loaded line stores " + in.energy(energy);
    double limit = accepted == null ? 0 : accepted.upToJ();
    if (met) {
      grade.rule(
          "stored energy",
          energy,
          limit,
          "J",
          Double.POSITIVE_INFINITY,
          stand.at(),
          () ->
              accepted == null
                  ? stores.get() + "."
                  : stores.get()
                      + "; accepted to "
                      + in.energy(limit)
                      + " by "
                      + accepted.by()
                      + ", "
                      + accepted.when()
                      + ".");
    } else {
      grade.tightAtBest(
          "stored energy",
          energy,
          limit,
          "J",
          stand.at(),
          () ->
              stores.get()
                  + (accepted == null
                      ? "; nobody at the source has accepted that by name."
                      : "; "
                          + accepted.by()
                          + " accepted only "
                          + in.energy(limit)
                          + ", "
                          + accepted.when()
                          + "."));
    }
  }

  /** Energy that the line stores at the working tension [J]; 0 where no pull is asked. */
  private static double storedJ(TreeSide tree) {
    return tree.workingN() > 0 ? tree.workingN() * tree.workingN() / (2 * tree.lineNPerM()) : 0;
  }
}
