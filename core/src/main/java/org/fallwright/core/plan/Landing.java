package org.fallwright.core.plan;

import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.concurrent.ConcurrentHashMap;
import org.fallwright.core.rules.RuleSet;
import org.fallwright.core.site.Position;
import org.fallwright.core.site.Site;
import org.fallwright.core.site.SubjectTree;
import org.fallwright.core.site.Target;
import org.fallwright.core.site.Wire;
import org.fallwright.core.statics.TreeSide;
import org.fallwright.core.units.DisplayUnits;
import org.fallwright.core.zones.Bight;
import org.fallwright.core.zones.DropZoneFit;
import org.fallwright.core.zones.EscapeRoutes;
import org.fallwright.core.zones.FallFootprint;
import org.fallwright.core.zones.FallOutline;
import org.fallwright.core.zones.LayTargets;
import org.fallwright.core.zones.Leg;
import org.fallwright.core.zones.LookOut;
import org.fallwright.core.zones.OperatorStand;
import org.fallwright.core.zones.Recoil;
import org.fallwright.core.zones.SitBackZone;
import org.fallwright.core.zones.TapeTies;
import org.fallwright.core.zones.TargetClearance;
import org.fallwright.core.zones.WireCheck;
import org.locationtech.jts.geom.Geometry;
import org.locationtech.jts.operation.overlayng.OverlayNG;
import org.locationtech.jts.operation.overlayng.OverlayNGRobust;

/** Where the tree lands: targets, drop zone, wires, the zones about it and the ways out. */
final class Landing {
  private final Site site;
  private final RuleSet rules;
  private final DisplayUnits in;
  private final Knowledge knowledge;
  private final FallOutline outline;
  private final LayTargets targets;
  private final List<Target> near;
  private final LayTargets hangUps;
  private final LookOut lookOut;
  private final double peopleM;
  private final List<ClearFirst> clearFirst;
  private final LandingNotes words;
  private final DropZoneFit dropZone;
  private final WireCheck wires;
  private final List<WireCheck.Reach> reach;
  private final EscapeRoutes escapes;
  private final GroundFall ground;
  private final Map<Fall, Landed> falls = new ConcurrentHashMap<>();
  private final Map<Out, List<Position>> waysOut = new ConcurrentHashMap<>();
  private final Map<Along, Angles> angles = new ConcurrentHashMap<>();

  /** All that a footprint depends on. */
  private record Fall(double layDeg, double steeringShare) {}

  /** A footprint and how the things on the site stand to it. */
  record Landed(
      FallFootprint footprint,
      List<TargetClearance> clearances,
      List<TargetClearance> hangUps,
      DropZoneFit.Fit fit,
      List<WireCheck.InLay> wires) {}

  /** All that the ways out depend on; the sit-back zone follows from the lay. */
  private record Out(double layDeg, double steeringShare, Along along) {}

  /** The path of the line and the two-legged anchors on it. */
  private record Along(List<Position> path, List<BridleLegs> bridles) {}

  /** The inside of the angle of a two-legged anchor. */
  record Bridle(String id, Bight inside) {}

  /** The insides of a line's angles and of its anchors', and where parted ends fly. */
  record Angles(List<Bight> bights, List<Bridle> bridles, Recoil recoil) {
    List<Bight> all() {
      if (bridles.isEmpty()) {
        return bights;
      }
      List<Bight> all = new ArrayList<>(bights);
      bridles.forEach(b -> all.add(b.inside()));
      return all;
    }
  }

  /**
   * The zones of a setup.
   *
   * @param landed the footprint, and how the things on the site stand to it
   * @param clearanceM least clearance to a target that must not be hit, the one that is nearest to
   *     what it asks [m]; NaN: none
   * @param clearanceTarget that target, or null
   * @param angles insides of the line's angles, and where parted ends fly
   * @param about the same with the sit-back zone and the legs, as a person meets them
   * @param waysOut ends of the ways out, best first
   * @param notes sentences
   */
  record Zones(
      Landed landed,
      double clearanceM,
      String clearanceTarget,
      Angles angles,
      EscapeRoutes.Zones about,
      List<Position> waysOut,
      List<String> notes) {
    FallFootprint footprint() {
      return landed.footprint();
    }
  }

  Landing(Site site, RuleSet rules, DisplayUnits in, Subject subject, Knowledge knowledge) {
    this.site = site;
    this.rules = rules;
    this.in = in;
    this.knowledge = knowledge;
    SubjectTree t = site.tree();
    outline = outline(site, subject.figures().stumpDiameterM());
    TapeTies ties = new TapeTies(site.tapeTies(), t.id(), t.stump(), site.targets());
    targets = new LayTargets(site.targets(), ties::errorM);
    dropZone = site.dropZones().isEmpty() ? null : new DropZoneFit(site.dropZones());
    wires = new WireCheck(site.wires(), t.stump(), site.cut().heightM(), outline);
    reach = knowledge.ofWires() ? wires.reach(knowledge.approach()) : List.of();
    escapes = new EscapeRoutes(site.targets());
    ground = GroundFall.of(site);
    near = HangUps.near(site, outline.farthestM() + slideM(ground.steepestDeg()));
    hangUps = new LayTargets(near, t.stump());
    lookOut = new LookOut(site.targets());
    peopleM = PeopleRing.factor(site, rules) * t.heightM().value();
    clearFirst = ClearFirst.within(site, peopleM);
    words = new LandingNotes(site, rules, in, subject, ground, ties, targets, reach);
  }

  private static FallOutline outline(Site site, double stumpDiameterM) {
    SubjectTree t = site.tree();
    FallOutline round =
        new FallOutline(
            t.heightM().value(),
            t.crownBaseM(),
            t.crownRadiusM(),
            stumpDiameterM,
            t.leanDeg().value(),
            t.leanAzimuthDeg().value());
    if (t.crownOutline() != null) {
      return round.drawn(t.crownOutline().geometry(), t.stump().at(), site.cut().heightM());
    }
    return t.crownOffsetM() == null ? round : round.offset(t.crownOffsetM());
  }

  /** What is said of where the tree lands. */
  LandingNotes words() {
    return words;
  }

  /** How far the tree may slide on where the ground falls so [m]. */
  private double slideM(double fallDeg) {
    return FallFootprint.slideM(site.tree().heightM().value(), fallDeg, site.zones().slideM());
  }

  /** Where the tree lands, wires, ways out. */
  Zones check(Grade grade, Setup setup, Route route, TreeSide tree, boolean full) {
    double share = tree.movable() ? Math.max(0, tree.steerShare()) : Double.POSITIVE_INFINITY;
    Landed landed = falls.computeIfAbsent(new Fall(setup.layDeg(), share), this::land);
    TargetClearance nearest = targets(grade, landed);
    hangUps(grade, landed);
    dropZone(grade, landed);
    wires(grade, landed);
    List<BridleLegs> bridles = BridleLegs.of(site, setup);
    Along along = new Along(route.path(), bridles);
    Angles angles = this.angles.computeIfAbsent(along, Landing::anglesOf);
    double back = setup.layDeg() + Math.toDegrees(Math.atan2(tree.vgM(), tree.ugM()));
    SitBackZone sitBack =
        SitBackZone.of(site.tree().stump().at(), normal(back), site.tree().heightM().value());
    List<Leg> legs = route.legs();
    if (!bridles.isEmpty()) {
      legs = new ArrayList<>(legs);
      for (BridleLegs b : bridles) {
        legs.addAll(b.legs());
      }
    }
    EscapeRoutes.Zones about =
        new EscapeRoutes.Zones(landed.footprint(), sitBack, angles.all(), angles.recoil(), legs);
    List<Position> ways =
        waysOut.computeIfAbsent(
            new Out(setup.layDeg(), share, along),
            o -> escapes.ends(about, wayOutM(), site.tree().heightM().value()));
    grade.rule(
        "ways out",
        ways.size(),
        1,
        "",
        ways.isEmpty() ? 0 : Double.POSITIVE_INFINITY,
        site.tree().stump().at(),
        () ->
            ways.isEmpty()
                ? "No way out ends clear of the footprint, the sit-back zone, the line's angle and its"
                    + " ends."
                : ways.size() + " way(s) out end clear of every zone.");
    return new Zones(
        landed,
        nearest == null ? Double.NaN : nearest.clearanceM(),
        nearest == null ? null : nearest.targetId(),
        angles,
        about,
        ways,
        full ? words.of(landed, setup, sitBack, route) : List.of());
  }

  /** Least length of a way out: the rule's, and past the crown as it stands where a rule asks. */
  private double wayOutM() {
    double length = rules.escapeLengthM().value();
    if (!rules.escapeOutsideCrown().yes()) {
      return length;
    }
    Position stump = site.tree().stump().at();
    double crown =
        stump.distanceTo(outline.axisInCrown(stump, site.cut().heightM())) + outline.crownReachM();
    return Math.max(length, crown);
  }

  private static Angles anglesOf(Along along) {
    List<List<Position>> more = along.bridles().stream().map(BridleLegs::path).toList();
    List<Bridle> bridles =
        along.bridles().stream()
            .map(b -> new Bridle(b.id(), Bight.along(b.path()).get(0)))
            .toList();
    return new Angles(Bight.along(along.path()), bridles, new Recoil(along.path(), more));
  }

  /** The footprint of a lay were the hinge not to steer at all. */
  FallFootprint widest(double layDeg) {
    return footprint(new Fall(layDeg, Double.POSITIVE_INFINITY));
  }

  private FallFootprint footprint(Fall fall) {
    return FallFootprint.of(
        outline,
        site.tree().stump().at(),
        fall.layDeg(),
        fall.steeringShare(),
        slideM(ground.alongDeg(fall.layDeg())));
  }

  private Landed land(Fall fall) {
    FallFootprint f = footprint(fall);
    return new Landed(
        f,
        targets.clearances(f),
        near.isEmpty() ? List.of() : hangUps.clearances(f),
        dropZone == null ? null : dropZone.of(f),
        knowledge.ofWires() ? wires.inLay(f, knowledge.approach()) : List.of());
  }

  private TargetClearance targets(Grade grade, Landed landed) {
    TargetClearance nearest = null;
    for (int i = 0; i < landed.clearances().size(); i++) {
      TargetClearance c = landed.clearances().get(i);
      Target t = site.targets().get(i);
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
                  ? LandingNotes.struck(t)
                      + ": "
                      + words.amount(c.overlapAmount(), c.overlapUnit())
                      + " of it."
                  : "It clears "
                      + c.targetId()
                      + " by "
                      + in.length(c.clearanceM())
                      + (c.askedM() > 0 ? " of the " + in.length(c.askedM()) + " asked." : "."));
    }
    return nearest;
  }

  /** Trees that may serve as anchors, and parked vehicles: nobody drew them as targets. */
  private void hangUps(Grade grade, Landed landed) {
    for (int i = 0; i < landed.hangUps().size(); i++) {
      TargetClearance c = landed.hangUps().get(i);
      boolean tree = near.get(i).kind() == Target.Kind.TREE;
      grade.plain(
          (tree ? "hang-up in " : "clear of ") + c.targetId(),
          c.clearanceM(),
          0,
          "m",
          c.ratio(),
          c.nearest(),
          () ->
              c.overlaps()
                  ? (tree ? "The tree can hang up in " : "The tree can come down on ")
                      + c.targetId()
                      + ": "
                      + words.amount(c.overlapAmount(), c.overlapUnit())
                      + (tree ? " of its crown." : " of its place.")
                  : "It clears " + c.targetId() + " by " + in.length(c.clearanceM()) + ".");
    }
  }

  private static double spare(TargetClearance c) {
    return c.clearanceM() - c.askedM();
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
      reach(grade, r);
    }
  }

  private void reach(Grade grade, WireCheck.Reach r) {
    double there = r.groundM() - r.errorM();
    Wire wire =
        site.wires().stream().filter(w -> w.id().equals(r.wireId())).findFirst().orElseThrow();
    if (r.stops() && Knowledge.saidDead(wire)) {
      grade.tightAtBest(
          "wire " + r.wireId() + " in reach",
          there,
          r.stopM(),
          "m",
          r.place(),
          () ->
              "Line "
                  + r.wireId()
                  + " is within reach of the tree whichever way it goes; dead and earthed, said by "
                  + wire.voltageSaidBy()
                  + ". Only while that stands in writing, its earths in sight.");
      return;
    }
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
                    + " is within reach of the tree whichever way it goes: stop, its owner must make"
                    + " it dead or attend."
                : "Line "
                    + r.wireId()
                    + " is "
                    + in.length(there)
                    + " off; within "
                    + in.length(r.stopM())
                    + " the work stops.");
  }

  /** The zones for painting and for other programs, with the crew's places. */
  Ground ground(Setup setup, Zones z, OperatorStand operator) {
    double height = site.tree().heightM().value();
    FallFootprint f = z.footprint();
    return new Ground(
        f.geometry(),
        site.tree().stump().at().along(setup.layDeg(), height),
        z.about().sitBack().geometry(),
        peopleM,
        z.angles().bights().stream().map(Bight::geometry).toList(),
        z.angles().recoil().geometry(),
        z.waysOut(),
        f.halfAngleDeg(),
        reach.stream().mapToDouble(WireCheck.Reach::stopM).max().orElse(Double.NaN),
        slide(f),
        z.angles().bridles().stream().map(b -> b.inside().geometry()).toList(),
        z.about().sitBack().atStake(targets),
        hangsUpIn(z.landed()),
        CrewPlaces.of(
            site,
            in,
            z,
            operator,
            lookOut.find(z.about(), peopleM, operator == null ? null : operator.at())),
        clearFirst);
  }

  /** The ground that only the slide covers; null: no slide is counted. */
  private Geometry slide(FallFootprint f) {
    if (slideM(ground.alongDeg(f.layDeg())) == 0) {
      return null;
    }
    FallFootprint still = FallFootprint.of(outline, f.stump(), f.layDeg(), f.steeringShare(), 0);
    return OverlayNGRobust.overlay(f.geometry(), still.geometry(), OverlayNG.DIFFERENCE);
  }

  private List<String> hangsUpIn(Landed landed) {
    List<String> ids = new ArrayList<>();
    for (int i = 0; i < landed.clearances().size(); i++) {
      if (site.targets().get(i).kind() == Target.Kind.TREE
          && landed.clearances().get(i).overlaps()) {
        ids.add(site.targets().get(i).id());
      }
    }
    for (int i = 0; i < landed.hangUps().size(); i++) {
      if (near.get(i).kind() == Target.Kind.TREE && landed.hangUps().get(i).overlaps()) {
        ids.add(near.get(i).id());
      }
    }
    return ids;
  }

  private static double normal(double deg) {
    double d = deg % 360;
    return d < 0 ? d + 360 : d;
  }
}
