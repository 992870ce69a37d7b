package org.fallwright.core.plan;

import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.Set;
import java.util.concurrent.ConcurrentHashMap;
import java.util.stream.Collectors;
import org.fallwright.core.site.Site;
import org.fallwright.core.site.Target;
import org.fallwright.core.site.Wire;
import org.fallwright.core.units.DisplayUnits;
import org.fallwright.core.zones.Leg;
import org.fallwright.core.zones.LegCheck;

/** Where the line runs: each leg against everything beside it. The same for every lay. */
final class LineRun {
  private final Site site;
  private final DisplayUnits in;
  private final Knowledge knowledge;
  private final LegCheck legs;
  private final Set<String> wires;
  private final Map<Leg, List<LegCheck.Passing>> passed = new ConcurrentHashMap<>();

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

  void check(Grade grade, Route route) {
    List<Leg> list = route.legs();
    List<LinePoint> points = route.all();
    for (int i = 0; i < list.size(); i++) {
      leg(grade, i, list.get(i), points.get(i).id(), points.get(i + 1).id());
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
    for (LegCheck.Passing what :
        passed.computeIfAbsent(leg, l -> passing(l, Math.max(error(from), error(to))))) {
      boolean over = what.clearanceM() <= 0;
      grade.plain(
          "line clear of " + what.what() + (number > 0 ? ", leg " + (number + 1) : ""),
          what.clearanceM(),
          what.askedM(),
          "m",
          Math.max(0, what.clearanceM()) / what.askedM(),
          what.place(),
          () ->
              over
                  ? "The line runs over or through "
                      + what.what()
                      + (movable(what.what()) ? "; move it before the work." : ".")
                  : "The line passes "
                      + what.what()
                      + " at "
                      + in.length(what.clearanceM())
                      + " of "
                      + in.length(what.askedM())
                      + " asked.");
    }
  }

  private boolean movable(String id) {
    return site.targets().stream().anyMatch(t -> t.id().equals(id) && t.movable());
  }

  /** What a leg passes within ten times the distance asked; the rest is plainly clear. */
  private List<LegCheck.Passing> passing(Leg leg, double error) {
    List<LegCheck.Passing> all = new ArrayList<>();
    for (LegCheck.Passing p :
        legs.passing(leg, error, w -> knowledge.approach().applyAsDouble(w) + error)) {
      if (wires.contains(p.what()) || p.clearanceM() < NEAR * p.askedM()) {
        all.add(p);
      }
    }
    return all;
  }

  /** Multiple of what is asked beyond which a thing beside the line is not listed. */
  private static final double NEAR = 10;

  private double error(String id) {
    return id.equals(site.tree().id())
        ? site.tree().stump().errorM()
        : Route.place(site, id).errorM();
  }
}
