package org.fallwright.core.plan;

import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.concurrent.ConcurrentHashMap;
import org.fallwright.core.site.Site;
import org.fallwright.core.site.Target;
import org.fallwright.core.units.DisplayUnits;
import org.fallwright.core.zones.Leg;
import org.fallwright.core.zones.LegCheck;

/** Where the line runs: each leg against everything beside it. The same for every lay. */
final class LineRun {
  private final Site site;
  private final DisplayUnits in;
  private final Knowledge knowledge;
  private final LegCheck legs;
  private final Map<Setup, List<Passed>> passed = new ConcurrentHashMap<>();

  /** What a leg passes, with the number of the leg. */
  private record Passed(int leg, LegCheck.Passing what) {}

  LineRun(Site site, DisplayUnits in, Knowledge knowledge) {
    this.site = site;
    this.in = in;
    this.knowledge = knowledge;
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
    for (Passed p : passed.computeIfAbsent(setup.withLay(0), w -> passing(setup, route))) {
      LegCheck.Passing what = p.what();
      boolean over = what.clearanceM() <= 0;
      grade.plain(
          "line clear of " + what.what() + (p.leg() > 0 ? ", leg " + (p.leg() + 1) : ""),
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

  /** What the legs pass within ten times the distance asked; the rest is plainly clear. */
  private List<Passed> passing(Setup setup, Route route) {
    List<Passed> all = new ArrayList<>();
    List<Leg> list = route.legs();
    List<LinePoint> points = route.all();
    for (int i = 0; i < list.size(); i++) {
      double error = Math.max(error(points.get(i).id()), error(points.get(i + 1).id()));
      for (LegCheck.Passing p :
          legs.passing(list.get(i), error, w -> knowledge.approach().applyAsDouble(w) + error)) {
        boolean wire = site.wires().stream().anyMatch(w -> w.id().equals(p.what()));
        if (wire || p.clearanceM() < NEAR * p.askedM()) {
          all.add(new Passed(i, p));
        }
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
