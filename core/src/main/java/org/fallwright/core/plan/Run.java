package org.fallwright.core.plan;

import java.util.List;
import java.util.Map;
import java.util.Objects;
import java.util.Set;
import java.util.concurrent.ConcurrentHashMap;
import java.util.function.Supplier;
import org.fallwright.core.pull.PullOffer;
import org.fallwright.core.statics.Ceiling;
import org.fallwright.core.statics.LineSet;
import org.fallwright.core.statics.Statics;
import org.fallwright.core.statics.TreeSide;
import org.fallwright.core.zones.EscapeRoutes;
import org.fallwright.core.zones.Leg;

/**
 * One way with all about it that no lay changes, looked at once: where the line runs, what bears
 * it, what the source gives. With a {@link Fall} it makes a setup. For one thread.
 */
final class Run {
  private final Shared shared;
  private final Ways.End end;
  private final Setup way;
  private final Route route;
  private final PullOffer probe;
  private final GearParts parts;
  private final Slice usable;
  private final Slice[] legs;
  private final Slice kit;
  private final List<BridleLegs> bridles;
  private LineSet line;
  private Landing.Angles angles;
  private EscapeRoutes.Line beside;

  /** The source's answer hangs on more than the contract lets it. */
  static final class Differs extends RuntimeException {
    private static final long serialVersionUID = 1L;
  }

  /** What runs share: the site's judge and what was looked at once for several of them. */
  static final class Shared {
    private final Judge judge;
    private final Slice known;
    private final Slice wayOut;
    private final Slice noWayOut;
    private final List<Map<Leg, Slice>> legs =
        List.of(
            new ConcurrentHashMap<>(),
            new ConcurrentHashMap<>(),
            new ConcurrentHashMap<>(),
            new ConcurrentHashMap<>());
    private final Map<String, Slice> bridles = new ConcurrentHashMap<>();
    private final Map<String, Slice> manned = new ConcurrentHashMap<>();

    Shared(Judge judge) {
      this.judge = judge;
      Grade grade = judge.quickly();
      judge.knowledge().check(grade);
      known = grade.slice();
      wayOut = ways(1);
      noWayOut = ways(0);
    }

    private Slice ways(int out) {
      Grade grade = judge.quickly();
      judge.landing().waysOut(grade, out);
      return grade.slice();
    }

    /** What must be known before anything is judged. */
    Slice known() {
      return known;
    }

    private Slice leg(int number, Leg leg, String from, String to) {
      return legs.get(number)
          .computeIfAbsent(
              leg,
              l -> {
                Grade grade = judge.quickly();
                judge.lineRun().leg(grade, number, l, from, to);
                return grade.slice();
              });
    }

    private Slice bridle(BridleLegs b) {
      return bridles.computeIfAbsent(
          b.id(),
          id -> {
            Grade grade = judge.quickly();
            judge.lineRun().bridle(grade, b);
            return grade.slice();
          });
    }

    private Slice manned(String id) {
      return manned.computeIfAbsent(
          id,
          i -> {
            Grade grade = judge.quickly();
            judge.lineRun().manned(grade, i);
            return grade.slice();
          });
    }
  }

  /**
   * What bounds need of a way.
   *
   * @param failing how many of its checks fail on every lay
   * @param least lowest standing of those; infinite: none fails
   * @param lowN source low at the tree [N]
   * @param holdN what the source holds [N]
   * @param ceilingN least tension at the tree at which a part but the stem is loaded in full [N]
   */
  record Known(int failing, double least, double lowN, double holdN, double ceilingN) {}

  /**
   * @param route the way's, see {@link #route}
   */
  Run(Shared shared, Ways.End end, Setup way, Route route) {
    this.shared = shared;
    this.end = end;
    this.way = way;
    this.route = route;
    Judge judge = shared.judge;
    probe = offer(new Reach.Pulled(0, 0, 0));
    parts = judge.parts(way, route, probe);
    Grade grade = judge.quickly();
    judge.usable(grade, parts);
    usable = grade.slice();
    List<Leg> all = route.legs();
    List<LinePoint> points = route.all();
    bridles = BridleLegs.of(judge.site(), way);
    Set<String> manned = judge.lineRun().manned(way);
    legs = new Slice[all.size() + bridles.size() + manned.size()];
    int n = 0;
    for (; n < all.size(); n++) {
      legs[n] = shared.leg(n, all.get(n), points.get(n).id(), points.get(n + 1).id());
    }
    for (BridleLegs b : bridles) {
      legs[n++] = shared.bridle(b);
    }
    for (String id : manned) {
      legs[n++] = shared.manned(id);
    }
    kit = hangsOnTakeUp() ? null : kit(null);
  }

  /** Whether some check of the kit asks how much line is taken in. */
  private boolean hangsOnTakeUp() {
    return probe.wireM() > 0
        || probe.travel().mostM() != null
        || route.haulLine() != null
        || JoinedLines.parts(shared.judge.site(), way.line()).size() > 1;
  }

  /** Where a way of an end runs. */
  static Route route(Judge judge, Ways.End end, Setup way) {
    return Route.of(judge.places(), way, end.source(), end.driver());
  }

  Slice usable() {
    return usable;
  }

  Known known() {
    int failing = usable.failing() + (kit == null ? 0 : kit.failing());
    double least = usable.least(Verdict.NOT_WORKABLE);
    for (Slice l : legs) {
      failing += l.failing();
      least = Math.min(least, l.least(Verdict.NOT_WORKABLE));
    }
    if (kit != null) {
      least = Math.min(least, kit.least(Verdict.NOT_WORKABLE));
    }
    return new Known(
        failing,
        least,
        probe.lowN() / route.loads().sourceEndPerTree(),
        probe.holdN(),
        Ceiling.of(parts.parts()).tensionN());
  }

  private PullOffer offer(Reach.Pulled pulled) {
    return Reach.of(shared.judge.site(), way, route, pulled, end.source(), end.driver());
  }

  /**
   * The first check that fails of those that ask nothing of the source; null: none does. A lay that
   * does not land clear is found before anything else is worked out for it.
   */
  Slice missed(Fall fall) {
    if (!usable.passes()) {
      return usable;
    }
    if (!fall.lands().passes()) {
      return fall.lands();
    }
    if (!out(fall.kept()).passes()) {
      return shared.noWayOut;
    }
    for (Slice l : legs) {
      if (!l.passes()) {
        return l;
      }
    }
    if (kit != null && !kit.passes()) {
      return kit;
    }
    if (kit == null) {
      Slice own = kit(over(fall.kept()).treeSide());
      if (!own.passes()) {
        return own;
      }
    }
    return fall.moves().passes() ? null : fall.moves();
  }

  /** Every check of the setup. */
  Look look(Fall fall) {
    Fall.Kept known = fall.kept();
    Fall.Kept kept = known != null ? known : fall.keep(shared.judge.fall(end, route, fall));
    Statics statics = over(kept);
    TreeSide tree = statics.treeSide();
    PullOffer offer = tree.movable() ? offer(Reach.Pulled.of(tree)) : probe;
    if (!sameButHigh(probe, offer)) {
      throw new Differs();
    }
    Slice[] slices = new Slice[7 + legs.length];
    int at = 0;
    slices[at++] = shared.known;
    slices[at++] = usable;
    slices[at++] = fall.lands();
    slices[at++] = out(kept);
    for (Slice l : legs) {
      slices[at++] = l;
    }
    slices[at++] = kit != null ? kit : kit(tree);
    slices[at++] = fall.moves();
    Grade grade = shared.judge.quickly();
    Supplier<String> unnamed = () -> "";
    Judge.Stopped stopped =
        shared.judge.pulled(grade, way, statics, offer, route, parts.parts(), unnamed);
    Landing.Zones zones =
        new Landing.Zones(kept.landed(), Double.NaN, null, angles(), null, List.of(), List.of());
    shared.judge.people(grade, way, route, zones, offer, tree);
    slices[at] = grade.slice();
    return new Look(
        fall.layDeg(),
        stopped == null ? 0 : stopped.ratios().parts().size(),
        stopped == null ? Judge.NOT_MADE : 0,
        slices);
  }

  private Statics over(Fall.Kept kept) {
    if (line == null) {
      line = shared.judge.subject().line(way, route, probe.stiffnessNPerM());
    }
    return kept.statics().over(line);
  }

  private Slice kit(TreeSide tree) {
    Grade grade = shared.judge.quickly();
    shared.judge.kit(grade, way, route, tree, probe, parts);
    return grade.slice();
  }

  private Landing.Angles angles() {
    if (angles == null) {
      angles = Landing.Angles.of(new Landing.Along(route.path(), bridles));
    }
    return angles;
  }

  private Slice out(Fall.Kept kept) {
    if (beside == null) {
      beside =
          new EscapeRoutes.Line(angles().all(), angles().recoil(), Landing.legs(route, bridles));
    }
    return kept.ways().any(beside) ? shared.wayOut : shared.noWayOut;
  }

  private static boolean sameButHigh(PullOffer a, PullOffer b) {
    return a.lowN() == b.lowN()
        && a.holdN() == b.holdN()
        && a.captured() == b.captured()
        && a.wireM() == b.wireM()
        && Objects.equals(a.travel().mostM(), b.travel().mostM())
        && Objects.equals(a.stiffnessNPerM(), b.stiffnessNPerM())
        && a.anchorHauling() == b.anchorHauling()
        && a.anchorHolding() == b.anchorHolding()
        && a.parts().equals(b.parts());
  }
}
