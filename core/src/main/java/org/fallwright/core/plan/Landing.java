package org.fallwright.core.plan;

import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.concurrent.ConcurrentHashMap;
import org.fallwright.core.reference.Allowances;
import org.fallwright.core.rules.RuleSet;
import org.fallwright.core.site.Position;
import org.fallwright.core.site.Shape;
import org.fallwright.core.site.Site;
import org.fallwright.core.site.SubjectTree;
import org.fallwright.core.site.Target;
import org.fallwright.core.statics.TreeSide;
import org.fallwright.core.units.DisplayUnits;
import org.fallwright.core.zones.Bight;
import org.fallwright.core.zones.DropZoneFit;
import org.fallwright.core.zones.EscapeRoutes;
import org.fallwright.core.zones.FallFootprint;
import org.fallwright.core.zones.FallOutline;
import org.fallwright.core.zones.LayTargets;
import org.fallwright.core.zones.Recoil;
import org.fallwright.core.zones.SitBackZone;
import org.fallwright.core.zones.TargetClearance;
import org.fallwright.core.zones.WireCheck;
import org.locationtech.jts.geom.Coordinate;

/** Where the tree lands: targets, drop zone, wires, the zones about it and the ways out. */
final class Landing {
  private final Site site;
  private final RuleSet rules;
  private final DisplayUnits in;
  private final Knowledge knowledge;
  private final FallOutline outline;
  private final LayTargets targets;
  private final DropZoneFit dropZone;
  private final WireCheck wires;
  private final List<WireCheck.Reach> reach;
  private final EscapeRoutes escapes;
  private final GroundFall ground;
  private final Map<Fall, Landed> falls = new ConcurrentHashMap<>();
  private final Map<Double, Landed> widest = new ConcurrentHashMap<>();
  private final Map<Out, List<Position>> waysOut = new ConcurrentHashMap<>();
  private final Map<List<Position>, Angles> angles = new ConcurrentHashMap<>();

  private static final double WIDEST = FallFootprint.halfAngleDeg(Double.POSITIVE_INFINITY);

  /** All that a footprint depends on. */
  private record Fall(double layDeg, double steeringShare) {}

  /** A footprint and how the things on the site stand to it. */
  record Landed(
      FallFootprint footprint,
      List<TargetClearance> clearances,
      DropZoneFit.Fit fit,
      List<WireCheck.InLay> wires) {}

  /** All that the ways out depend on; the sit-back zone follows from the lay. */
  private record Out(double layDeg, double steeringShare, List<Position> path) {}

  /** The insides of a line's angles, and where its parted ends fly. */
  record Angles(List<Bight> bights, Recoil recoil) {
    static Angles of(List<Position> path) {
      return new Angles(Bight.along(path), new Recoil(path));
    }
  }

  /**
   * The zones of a setup.
   *
   * @param footprint the footprint
   * @param ground for painting; null in a quick look
   * @param clearanceM least clearance to a target that must not be hit, the one that is nearest to
   *     what it asks [m]; NaN: none
   * @param clearanceTarget that target, or null
   * @param angles insides of the line's angles, and where parted ends fly
   * @param notes sentences
   */
  record Zones(
      FallFootprint footprint,
      Ground ground,
      double clearanceM,
      String clearanceTarget,
      Angles angles,
      List<String> notes) {}

  Landing(Site site, RuleSet rules, DisplayUnits in, Subject subject, Knowledge knowledge) {
    this.site = site;
    this.rules = rules;
    this.in = in;
    this.knowledge = knowledge;
    SubjectTree t = site.tree();
    outline =
        new FallOutline(
            t.heightM().value(),
            t.crownBaseM(),
            t.crownRadiusM(),
            subject.figures().stumpDiameterM(),
            t.leanDeg().value(),
            t.leanAzimuthDeg().value());
    targets = new LayTargets(site.targets(), t.stump());
    dropZone = site.dropZones().isEmpty() ? null : new DropZoneFit(site.dropZones());
    wires = new WireCheck(site.wires(), t.stump(), site.cut().heightM(), outline);
    reach = knowledge.ofWires() ? wires.reach(knowledge.approach()) : List.of();
    escapes = new EscapeRoutes(site.targets());
    ground = GroundFall.of(site);
  }

  /** Where the tree lands, wires, ways out. */
  Zones check(Grade grade, Setup setup, Route route, TreeSide tree, boolean full) {
    double share = steeringShare(tree);
    Landed landed =
        full
            ? falls.computeIfAbsent(new Fall(setup.layDeg(), share), this::land)
            : lookAt(setup.layDeg(), share);
    TargetClearance nearest = lands(grade, landed);
    List<Position> path = route.path();
    SitBackZone sitBack = sitBack(setup.layDeg(), tree);
    if (!full) {
      Angles angles = Angles.of(path);
      boolean any =
          ends(landed, sitBack)
              .any(new EscapeRoutes.Line(angles.bights(), angles.recoil(), route.legs()));
      waysOut(grade, any ? 1 : 0);
      return new Zones(landed.footprint(), null, Double.NaN, null, angles, List.of());
    }
    Angles angles = angles(path);
    List<Position> ways =
        waysOut.computeIfAbsent(
            new Out(setup.layDeg(), share, path),
            o ->
                escapes.ends(
                    new EscapeRoutes.Zones(
                        landed.footprint(),
                        sitBack,
                        angles.bights(),
                        angles.recoil(),
                        route.legs()),
                    rules.escapeLengthM().value(),
                    site.tree().heightM().value()));
    waysOut(grade, ways.size());
    Ground ground = ground(landed, sitBack, angles, ways, setup);
    return new Zones(
        landed.footprint(),
        ground,
        nearest == null ? Double.NaN : nearest.clearanceM(),
        nearest == null ? null : nearest.targetId(),
        angles,
        notes(landed, setup, sitBack, route));
  }

  /** Share of the hinge's side strength by which the fall is aimed; infinite: it steers nothing. */
  static double steeringShare(TreeSide tree) {
    return tree.movable() ? Math.max(0, tree.steerShare()) : Double.POSITIVE_INFINITY;
  }

  /** What is at stake behind. */
  SitBackZone sitBack(double layDeg, TreeSide tree) {
    double back = layDeg + Math.toDegrees(Math.atan2(tree.vgM(), tree.ugM()));
    return SitBackZone.of(site.tree().stump().at(), normal(back), site.tree().heightM().value());
  }

  /** Targets, drop zone and wires; the target that is nearest to what it asks. */
  TargetClearance lands(Grade grade, Landed landed) {
    TargetClearance nearest = targets(grade, landed);
    dropZone(grade, landed);
    wires(grade, landed);
    return nearest;
  }

  /** The ways out, to be asked for many lines. */
  EscapeRoutes.Ends ends(Landed landed, SitBackZone sitBack) {
    return escapes.ends(
        landed.footprint(), sitBack, rules.escapeLengthM().value(), site.tree().heightM().value());
  }

  void waysOut(Grade grade, int ways) {
    grade.rule(
        "ways out",
        ways,
        1,
        "",
        ways == 0 ? 0 : Double.POSITIVE_INFINITY,
        site.tree().stump().at(),
        () ->
            ways == 0
                ? "No way out ends clear of the footprint, the sit-back zone, the line's angle and"
                    + " its ends."
                : ways + " way(s) out end clear of every zone.");
  }

  /** A footprint as far as verdicts need it: not how deep or how much of anything lies in it. */
  Landed lookAt(double layDeg, double share) {
    // a hinge that steers nothing aims at the same fan whatever the line
    return FallFootprint.halfAngleDeg(share) == WIDEST
        ? widest.computeIfAbsent(layDeg, lay -> look(lay, Double.POSITIVE_INFINITY))
        : look(layDeg, share);
  }

  private Landed look(double layDeg, double share) {
    FallFootprint f = footprint(layDeg, share);
    return new Landed(
        f,
        targets.gaps(f),
        dropZone == null
            ? null
            : new DropZoneFit.Fit(
                Double.NaN, dropZone.holds(f) ? 0 : Double.NaN, site.tree().stump().at()),
        knowledge.ofWires() ? wires.inLay(f, knowledge.approach()) : List.of());
  }

  private Angles angles(List<Position> path) {
    return angles.computeIfAbsent(path, Angles::of);
  }

  private FallFootprint footprint(double layDeg, double share) {
    return FallFootprint.of(
        outline,
        site.tree().stump().at(),
        layDeg,
        share,
        FallFootprint.slideM(site.tree().heightM().value(), ground.alongDeg(layDeg), null));
  }

  private Landed land(Fall fall) {
    FallFootprint f = footprint(fall.layDeg(), fall.steeringShare());
    return new Landed(
        f,
        targets.clearances(f),
        dropZone == null ? null : dropZone.of(f),
        knowledge.ofWires() ? wires.inLay(f, knowledge.approach()) : List.of());
  }

  private TargetClearance targets(Grade grade, Landed landed) {
    TargetClearance nearest = null;
    for (TargetClearance c : landed.clearances()) {
      if (c.mayBeHit()) {
        continue;
      }
      if (c.askedM() > 0 && (nearest == null || spare(c) < spare(nearest))) {
        nearest = c;
      }
      grade.plain(
          "clear of " + c.targetId(),
          c.clearanceM(),
          c.askedM(),
          "m",
          c.ratio(),
          c.nearest(),
          () ->
              c.overlaps()
                  ? "The tree can come down on "
                      + c.targetId()
                      + ": "
                      + amount(c.overlapAmount(), c.overlapUnit())
                      + " of it."
                  : "It clears "
                      + c.targetId()
                      + " by "
                      + in.length(c.clearanceM())
                      + (c.askedM() > 0 ? " of the " + in.length(c.askedM()) + " asked." : "."));
    }
    return nearest;
  }

  private static double spare(TargetClearance c) {
    return c.clearanceM() - c.askedM();
  }

  private String amount(double amount, String unit) {
    return unit.equals("m") ? in.length(amount) : in.area(amount);
  }

  private void dropZone(Grade grade, Landed landed) {
    if (landed.fit() == null) {
      return;
    }
    DropZoneFit.Fit fit = landed.fit();
    String id = site.dropZones().size() == 1 ? site.dropZones().get(0).id() : "drop zones";
    grade.factored(
        "inside " + id,
        fit.marginM(),
        0,
        "m",
        fit.inside() ? Double.POSITIVE_INFINITY : 0,
        fit.place(),
        () ->
            fit.inside()
                ? "It lands inside the drop zone with " + in.length(fit.marginM()) + " to spare."
                : "It can land outside the drop zone by " + in.length(-fit.marginM()) + ".");
  }

  private void wires(Grade grade, Landed landed) {
    for (WireCheck.InLay w : landed.wires()) {
      grade.plain(
          "wire " + w.wireId() + " in the lay",
          w.leastM(),
          w.askedM(),
          "m",
          Math.max(0, w.leastM()) / w.askedM(),
          w.place(),
          () ->
              "The falling tree stays at least "
                  + in.length(Math.max(0, w.leastM()))
                  + " from line "
                  + w.wireId()
                  + "; "
                  + in.length(w.askedM())
                  + " are asked.");
    }
    for (WireCheck.Reach r : reach) {
      double there = r.groundM() - r.errorM();
      grade.rule(
          "wire " + r.wireId() + " in reach",
          there,
          r.stopM(),
          "m",
          // on the limit itself the work stops too
          r.stops() ? Math.min(there / r.stopM(), Math.nextDown(1.0)) : there / r.stopM(),
          r.place(),
          () ->
              r.stops()
                  ? "Line "
                      + r.wireId()
                      + " is within reach of the tree whichever way it goes: stop, its owner must"
                      + " make it dead or attend."
                  : "Line "
                      + r.wireId()
                      + " is "
                      + in.length(there)
                      + " off; within "
                      + in.length(r.stopM())
                      + " the work stops.");
    }
  }

  private Ground ground(
      Landed landed, SitBackZone sitBack, Angles angles, List<Position> ways, Setup setup) {
    double height = site.tree().heightM().value();
    return new Ground(
        landed.footprint().geometry(),
        site.tree().stump().at().along(setup.layDeg(), height),
        sitBack.geometry(),
        rules.peopleRadiusFactor().value() * height,
        angles.bights().stream().map(Bight::geometry).toList(),
        angles.recoil().geometry(),
        ways,
        landed.footprint().halfAngleDeg(),
        reach.stream().mapToDouble(WireCheck.Reach::stopM).max().orElse(Double.NaN));
  }

  private List<String> notes(Landed landed, Setup setup, SitBackZone sitBack, Route route) {
    List<String> notes = new ArrayList<>();
    double fall = ground.alongDeg(setup.layDeg());
    if (fall > Allowances.SLIDE_SLOPE.value()) {
      notes.add(
          "The ground falls about "
              + in.angle(Math.toRadians(fall))
              + " along this lay by the heights entered: the felled tree may slide on, and ground"
              + " for that is counted.");
    }
    for (TargetClearance c : landed.clearances()) {
      if (c.mayBeHit() && c.overlaps()) {
        notes.add(
            "The tree can come down on "
                + c.targetId()
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
            ? "If line or hinge is lost the tree falls back; no line stops it once it goes."
            : "If line or hinge is lost the tree falls back on "
                + String.join(", ", stake)
                + ": nobody indoors, nobody on that side. No line stops it once it goes.");
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

  private static double normal(double deg) {
    double d = deg % 360;
    return d < 0 ? d + 360 : d;
  }
}
