package org.fallwright.core.plan;

import java.util.LinkedHashSet;
import java.util.List;
import java.util.Map;
import java.util.Set;
import java.util.concurrent.ConcurrentHashMap;
import java.util.stream.Collectors;
import org.fallwright.core.reference.Allowances;
import org.fallwright.core.site.Site;
import org.fallwright.core.site.Target;
import org.fallwright.core.site.Wire;
import org.fallwright.core.units.DisplayUnits;
import org.fallwright.core.zones.Leg;
import org.fallwright.core.zones.LegCheck;

/**
 * Where the line runs: each leg, and each leg of a two-legged anchor, against everything beside it;
 * and what stands at its ends and blocks against the wires. The same for every lay.
 */
final class LineRun {
  private final Site site;
  private final DisplayUnits in;
  private final Knowledge knowledge;
  private final LegCheck legs;
  private final Set<String> wires;
  private final Map<Beside, List<LegCheck.Passing>> passed = new ConcurrentHashMap<>();
  private final Map<String, List<LegCheck.Passing>> manned = new ConcurrentHashMap<>();

  /** A leg and the position error of its ends: all that what it passes hangs on. */
  private record Beside(Leg leg, double errorM) {}

  LineRun(Site site, DisplayUnits in, Knowledge knowledge) {
    this.site = site;
    this.in = in;
    this.knowledge = knowledge;
    wires = site.wires().stream().map(Wire::id).collect(Collectors.toUnmodifiableSet());
    legs =
        new LegCheck(
            site.targets().stream().filter(LineRun::matters).toList(),
            site.anchors(),
            knowledge.ofWires() ? site.wires() : List.of());
  }

  /** A private way that asks for no distance is closed for the work; a plant may be brushed. */
  static boolean matters(Target t) {
    return !t.mayBeHit() && !(t.kind() == Target.Kind.ROAD && t.requiredDistanceM() == 0);
  }

  void check(Grade grade, Setup setup, Route route) {
    List<Leg> list = route.legs();
    List<LinePoint> points = route.all();
    for (int i = 0; i < list.size(); i++) {
      leg(grade, i, list.get(i), points.get(i).id(), points.get(i + 1).id());
    }
    for (BridleLegs b : BridleLegs.of(site, setup)) {
      bridle(grade, b);
    }
    for (String id : manned(setup)) {
      manned(grade, id);
    }
  }

  /**
   * One leg.
   *
   * @param number how many are nearer to the tree
   * @param from id of what it begins at
   * @param to id of what it ends at
   */
  void leg(Grade grade, int number, Leg leg, String from, String to) {
    String which = number > 0 ? ", leg " + (number + 1) : "";
    double error = Math.max(error(from), error(to));
    for (LegCheck.Passing what : passing(leg, error)) {
      clear(grade, "line clear of " + what.what() + which, "The line runs", what);
    }
  }

  /** The legs of a two-legged anchor. */
  void bridle(Grade grade, BridleLegs b) {
    double error =
        Math.max(error(b.apex().id()), Math.max(error(b.first().id()), error(b.second().id())));
    for (int i = 0; i < 2; i++) {
      String which = ", leg to " + (i == 0 ? b.first() : b.second()).id();
      for (LegCheck.Passing what : passing(b.legs().get(i), error)) {
        clear(
            grade,
            "bridle " + b.id() + " clear of " + what.what() + which,
            "A leg of " + b.id() + " runs",
            what);
      }
    }
  }

  /** The places of a way at which something is set or somebody works, each once. */
  Set<String> manned(Setup way) {
    if (!knowledge.ofWires() || wires.isEmpty()) {
      return Set.of();
    }
    Set<String> manned = new LinkedHashSet<>(way.redirects());
    manned.add(way.place());
    if (way.driver() != null) {
      manned.add(way.driver().place());
    }
    return manned;
  }

  /** What stands at one of them against the wires. */
  void manned(Grade grade, String id) {
    for (LegCheck.Passing what : manned.computeIfAbsent(id, this::machine)) {
      clear(grade, "wire " + what.what() + " from " + id, "What stands at " + id + " is", what);
    }
  }

  private List<LegCheck.Passing> machine(String id) {
    return legs.machine(
        Route.place(site, id), Allowances.MACHINE_REACH.value(), knowledge.approach());
  }

  /**
   * @param subject what passes it, as a sentence begins
   */
  private void clear(Grade grade, String check, String subject, LegCheck.Passing what) {
    boolean over = what.clearanceM() <= 0;
    grade.plain(
        check,
        what.clearanceM(),
        what.askedM(),
        "m",
        Math.max(0, what.clearanceM()) / what.askedM(),
        what.place(),
        () ->
            over
                ? subject
                    + " over or through "
                    + what.what()
                    + (movable(what.what()) ? "; move it before the work." : ".")
                : subject
                    + " past "
                    + what.what()
                    + " at "
                    + in.lengthAgainst(what.clearanceM(), what.askedM())
                    + " of "
                    + in.length(what.askedM())
                    + " asked.");
  }

  private boolean movable(String id) {
    return site.targets().stream().anyMatch(t -> t.id().equals(id) && t.movable());
  }

  /** What a leg passes within ten times the distance asked; the rest is plainly clear. */
  private List<LegCheck.Passing> passing(Leg leg, double error) {
    return passed.computeIfAbsent(
        new Beside(leg, error),
        b ->
            legs.passing(leg, error, w -> knowledge.approach().applyAsDouble(w) + error).stream()
                .filter(p -> wires.contains(p.what()) || p.clearanceM() < NEAR * p.askedM())
                .toList());
  }

  /** Multiple of what is asked beyond which a thing beside the line is not listed. */
  private static final double NEAR = 10;

  private double error(String id) {
    return id.equals(site.tree().id())
        ? site.tree().stump().errorM()
        : Route.place(site, id).errorM();
  }
}
