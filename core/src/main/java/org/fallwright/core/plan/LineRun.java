package org.fallwright.core.plan;

import java.util.ArrayList;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Map;
import java.util.Set;
import java.util.concurrent.ConcurrentHashMap;
import org.fallwright.core.reference.Allowances;
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

  /**
   * What a leg passes.
   *
   * @param check id of its check
   * @param subject what passes it, as a sentence begins
   */
  private record Passed(String check, String subject, LegCheck.Passing what) {}

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
          p.check(),
          what.clearanceM(),
          what.askedM(),
          "m",
          Math.max(0, what.clearanceM()) / what.askedM(),
          what.place(),
          () ->
              over
                  ? p.subject()
                      + " over or through "
                      + what.what()
                      + (movable(what.what()) ? "; move it before the work." : ".")
                  : p.subject()
                      + " past "
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
      String which = i > 0 ? ", leg " + (i + 1) : "";
      add(all, list.get(i), error, "line clear of ", which, "The line runs");
    }
    for (BridleLegs b : BridleLegs.of(site, setup)) {
      double error =
          Math.max(error(b.apex().id()), Math.max(error(b.first().id()), error(b.second().id())));
      for (int i = 0; i < 2; i++) {
        String which = ", leg to " + (i == 0 ? b.first() : b.second()).id();
        add(
            all,
            b.legs().get(i),
            error,
            "bridle " + b.id() + " clear of ",
            which,
            "A leg of " + b.id() + " runs");
      }
    }
    if (knowledge.ofWires()) {
      Set<String> manned = new LinkedHashSet<>(setup.redirects());
      manned.add(setup.place());
      if (setup.driver() != null) {
        manned.add(setup.driver().place());
      }
      for (String id : manned) {
        legs.machine(Route.place(site, id), Allowances.MACHINE_REACH.value(), knowledge.approach())
            .forEach(
                p ->
                    all.add(
                        new Passed(
                            "wire " + p.what() + " from " + id,
                            "What stands at " + id + " is",
                            p)));
      }
    }
    return all;
  }

  private void add(
      List<Passed> all, Leg leg, double error, String check, String which, String subject) {
    for (LegCheck.Passing p :
        legs.passing(leg, error, w -> knowledge.approach().applyAsDouble(w) + error)) {
      boolean wire = site.wires().stream().anyMatch(w -> w.id().equals(p.what()));
      if (wire || p.clearanceM() < NEAR * p.askedM()) {
        all.add(new Passed(check + p.what() + which, subject, p));
      }
    }
  }

  /** Multiple of what is asked beyond which a thing beside the line is not listed. */
  private static final double NEAR = 10;

  private double error(String id) {
    return id.equals(site.tree().id())
        ? site.tree().stump().errorM()
        : Route.place(site, id).errorM();
  }
}
