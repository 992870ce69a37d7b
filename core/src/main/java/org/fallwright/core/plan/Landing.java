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
  private final double wayOutM;
  private final GroundFall ground;
  private final Map<Fall, Landed> falls = new ConcurrentHashMap<>();
  private final Map<Double, Landed> widest = new ConcurrentHashMap<>();
  private final Map<Out, List<Position>> waysOut = new ConcurrentHashMap<>();
  private final Map<Along, Angles> angles = new ConcurrentHashMap<>();

  private static final double WIDEST = FallFootprint.halfAngleDeg(Double.POSITIVE_INFINITY);

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
  record Along(List<Position> path, List<BridleLegs> bridles) {}

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

    static Angles of(Along along) {
      List<List<Position>> more = along.bridles().stream().map(BridleLegs::path).toList();
      List<Bridle> bridles =
          along.bridles().stream()
              .map(b -> new Bridle(b.id(), Bight.along(b.path()).get(0)))
              .toList();
      return new Angles(Bight.along(along.path()), bridles, new Recoil(along.path(), more));
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
   * @param about the same with the sit-back zone and the legs, as a person meets them; null: a
   *     quick look
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
    wayOutM = wayOutM();
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

  /**
   * Where the tree lands, wires, ways out.
   *
   * @param exact whether depths, amounts and places are worked out that no verdict hangs on
   */
  Zones check(Grade grade, Setup setup, Route route, TreeSide tree, boolean exact) {
    double share = steeringShare(tree);
    Landed landed =
        exact
            ? falls.computeIfAbsent(new Fall(setup.layDeg(), share), this::land)
            : lookAt(setup.layDeg(), share);
    TargetClearance nearest = lands(grade, landed);
    SitBackZone sitBack = sitBack(setup.layDeg(), tree);
    List<BridleLegs> bridles = BridleLegs.of(site, setup);
    Along along = new Along(route.path(), bridles);
    List<Leg> legs = legs(route, bridles);
    if (!exact) {
      Angles angles = Angles.of(along);
      boolean any =
          ends(landed, sitBack).any(new EscapeRoutes.Line(angles.all(), angles.recoil(), legs));
      waysOut(grade, any ? 1 : 0);
      return new Zones(landed, Double.NaN, null, angles, null, List.of(), List.of());
    }
    Angles angles = this.angles.computeIfAbsent(along, Angles::of);
    EscapeRoutes.Zones about =
        new EscapeRoutes.Zones(landed.footprint(), sitBack, angles.all(), angles.recoil(), legs);
    List<Position> ways =
        waysOut.computeIfAbsent(
            new Out(setup.layDeg(), share, along),
            o -> escapes.ends(about, wayOutM, site.tree().heightM().value()));
    waysOut(grade, ways.size());
    return new Zones(
        landed,
        nearest == null ? Double.NaN : nearest.clearanceM(),
        nearest == null ? null : nearest.targetId(),
        angles,
        about,
        ways,
        grade.full() ? words.of(landed, setup, sitBack, route) : List.of());
  }

  /** The legs of a line, then those of the two-legged anchors on it. */
  static List<Leg> legs(Route route, List<BridleLegs> bridles) {
    if (bridles.isEmpty()) {
      return route.legs();
    }
    List<Leg> legs = new ArrayList<>(route.legs());
    bridles.forEach(b -> legs.addAll(b.legs()));
    return legs;
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

  /** The footprint of a lay were the hinge not to steer at all. */
  FallFootprint widest(double layDeg) {
    return footprint(layDeg, Double.POSITIVE_INFINITY);
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

  /** Targets, hang-ups, drop zone and wires; the target that is nearest to what it asks. */
  TargetClearance lands(Grade grade, Landed landed) {
    TargetClearance nearest = targets(grade, landed);
    hangUps(grade, landed);
    dropZone(grade, landed);
    wires(grade, landed);
    return nearest;
  }

  /** The ways out, to be asked for many lines. */
  EscapeRoutes.Ends ends(Landed landed, SitBackZone sitBack) {
    return escapes.ends(landed.footprint(), sitBack, wayOutM, site.tree().heightM().value());
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
        near.isEmpty() ? List.of() : hangUps.gaps(f),
        dropZone == null
            ? null
            : new DropZoneFit.Fit(
                Double.NaN, dropZone.holds(f) ? 0 : Double.NaN, site.tree().stump().at()),
        knowledge.ofWires() ? wires.inLay(f, knowledge.approach()) : List.of());
  }

  private FallFootprint footprint(double layDeg, double share) {
    return FallFootprint.of(
        outline, site.tree().stump().at(), layDeg, share, slideM(ground.alongDeg(layDeg)));
  }

  private Landed land(Fall fall) {
    FallFootprint f = footprint(fall.layDeg(), fall.steeringShare());
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
                      + in.lengthAgainst(c.clearanceM(), c.askedM())
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
