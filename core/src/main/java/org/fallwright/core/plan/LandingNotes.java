package org.fallwright.core.plan;

import java.util.ArrayList;
import java.util.List;
import org.fallwright.core.reference.Allowances;
import org.fallwright.core.rules.RuleSet;
import org.fallwright.core.site.Position;
import org.fallwright.core.site.Shape;
import org.fallwright.core.site.Site;
import org.fallwright.core.site.Target;
import org.fallwright.core.site.Wire;
import org.fallwright.core.units.DisplayUnits;
import org.fallwright.core.zones.LayTargets;
import org.fallwright.core.zones.SitBackZone;
import org.fallwright.core.zones.TapeTies;
import org.fallwright.core.zones.TargetClearance;
import org.fallwright.core.zones.WireCheck;
import org.locationtech.jts.geom.Coordinate;

/** What is said of where the tree lands and where it falls if line or hinge is lost. */
final class LandingNotes {
  private final Site site;
  private final RuleSet rules;
  private final DisplayUnits in;
  private final Subject subject;
  private final GroundFall ground;
  private final TapeTies ties;
  private final LayTargets targets;
  private final List<WireCheck.Reach> reach;

  LandingNotes(
      Site site,
      RuleSet rules,
      DisplayUnits in,
      Subject subject,
      GroundFall ground,
      TapeTies ties,
      LayTargets targets,
      List<WireCheck.Reach> reach) {
    this.site = site;
    this.rules = rules;
    this.in = in;
    this.subject = subject;
    this.ground = ground;
    this.ties = ties;
    this.targets = targets;
    this.reach = reach;
  }

  /** An amount of area or of length. */
  String amount(double amount, String unit) {
    return unit.equals("m") ? in.length(amount) : in.area(amount);
  }

  /** What it means for a kind of thing to be struck. */
  static String struck(Target t) {
    return switch (t.kind()) {
      case TREE -> "The tree can hang up in " + t.id();
      case ROAD -> "The tree can come down across " + t.id();
      case PLACE_OF_PEOPLE -> "The tree can come down on " + t.id() + ", where people are";
      case BURIED -> "The tree can come down on the ground over " + t.id();
      case STRUCTURE, FENCE, CAR, PLANTING, OTHER ->
          "The tree can come down on " + t.id() + (t.occupied() ? ", where people may be" : "");
    };
  }

  /** What must be said of the crew's places. */
  List<String> ofCrew(Ground g) {
    List<String> notes = new ArrayList<>();
    if (g.places().stream().noneMatch(p -> p.role() == StandingPlace.Role.LOOK_OUT)) {
      notes.add(
          "No place for a look-out was found from where the stump and the source are in sight; use"
              + " two, or radio.");
    }
    if (!g.clearFirst().isEmpty()) {
      notes.add(
          "Clear before work, within "
              + in.length(g.peopleRadiusM())
              + " of the stump: "
              + String.join(
                  "; ", g.clearFirst().stream().map(c -> c.id() + ": " + c.act()).toList())
              + ".");
    }
    return notes;
  }

  /** What must be said of the ground and of tapes, whatever the setup. */
  List<String> ofSite() {
    List<String> notes = new ArrayList<>();
    for (Target t : site.targets()) {
      ties.disagreementM(t)
          .ifPresent(
              off ->
                  notes.add(
                      "A tape to "
                          + t.id()
                          + " and its drawing disagree by "
                          + in.length(off)
                          + "; that counts as its position error. Draw it again."));
      if (ties.oneWayOnly(t)) {
        notes.add(
            "The tapes to "
                + t.id()
                + " all run one way and fix it to the stump in that way only; tape a second point of"
                + " it.");
      }
    }
    if (ground.steepestDeg() > Allowances.SLIDE_SLOPE.value() && rules.moreOnSlopes().yes()) {
      notes.add(
          "The ground falls "
              + in.angle(Math.toRadians(ground.steepestDeg()))
              + " by the heights entered. Where trees or logs may roll or slide the people ring must"
              + " be more than two tree heights; no rule says how much"
              + (site.zones().peopleRadius() == null ? ", and none is stated here." : "."));
    }
    for (WireCheck.Reach r : reach) {
      Wire wire =
          site.wires().stream().filter(w -> w.id().equals(r.wireId())).findFirst().orElseThrow();
      boolean towers = wire.voltageKv() > HIGHEST_ON_POLES_KV;
      rules
          .consultDistanceM(towers)
          .filter(c -> !c.metBy(r.groundM() - r.errorM(), 1))
          .ifPresent(
              c ->
                  notes.add(
                      "Line "
                          + r.wireId()
                          + " is nearer than "
                          + in.length(c.value())
                          + ": ask its operator first ("
                          + c.citation()
                          + "; "
                          + c.status().words()
                          + ")."));
    }
    return notes;
  }

  /** A line above this stands on towers, where nobody says otherwise [kV]. */
  private static final double HIGHEST_ON_POLES_KV = 33;

  /** What must be said of where a setup's tree lands. */
  List<String> of(Landing.Landed landed, Setup setup, SitBackZone sitBack, Route route) {
    List<String> notes = new ArrayList<>();
    double fall = ground.alongDeg(setup.layDeg());
    if (fall > Allowances.SLIDE_SLOPE.value()) {
      notes.add(
          "The ground falls about "
              + in.angle(Math.toRadians(fall))
              + " along this lay by the heights entered: the felled tree may slide on, and ground for"
              + " that is counted.");
    }
    for (TargetClearance c : landed.clearances()) {
      if (c.mayBeHit() && c.overlaps()) {
        notes.add(
            struck(target(c.targetId()))
                + " ("
                + amount(c.overlapAmount(), c.overlapUnit())
                + "), which may be hit.");
      }
    }
    List<String> stake =
        sitBack.atStake(targets).stream()
            .filter(o -> !ground(o.targetId()))
            .map(o -> o.targetId() + " (" + amount(o.amount(), o.unit()) + ")")
            .toList();
    notes.add(
        stake.isEmpty()
            ? "If line or hinge is lost the tree falls back with up to "
                + fallBack()
                + "; no line stops it once it goes."
            : "If line or hinge is lost the tree falls back on "
                + String.join(", ", stake)
                + ": nobody indoors, nobody on that side. It brings up to "
                + fallBack()
                + "; no line stops it once it goes.");
    for (WireCheck.Reach r : reach) {
      if (!r.stops() && r.advises()) {
        notes.add(
            "Line "
                + r.wireId()
                + " lies within two tree lengths and the approach distance: "
                + (rules.extraAdviceTwoH().yes()
                    ? "its owner's plan is asked for first."
                    : "ask its owner before the work."));
      }
    }
    for (Target t : site.targets()) {
      if (!LineRun.matters(t) && t.kind() == Target.Kind.ROAD && crosses(t, route)) {
        notes.add("The line runs along or over " + t.id() + ": close it for the work.");
      }
    }
    return notes;
  }

  /** Energy of the whole tree falling from where its mass centre stands. */
  private String fallBack() {
    double high = subject.figures().massCentreM() - site.cut().heightM();
    return in.energy(subject.figures().massKg() * G * high);
  }

  private static final double G = 9.80665;

  private Target target(String id) {
    return site.targets().stream().filter(t -> t.id().equals(id)).findFirst().orElseThrow();
  }

  private boolean ground(String id) {
    return site.targets().stream()
        .anyMatch(
            t ->
                t.id().equals(id)
                    && (t.kind() == Target.Kind.ROAD || t.kind() == Target.Kind.BURIED));
  }

  private static boolean crosses(Target t, Route route) {
    List<Position> path = route.path();
    return t.shape()
        .geometry()
        .intersects(
            Shape.FACTORY.createLineString(
                path.stream()
                    .map(p -> new Coordinate(p.eastM(), p.northM()))
                    .toArray(Coordinate[]::new)));
  }
}
