package org.fallwright.core.plan;

import java.util.ArrayList;
import java.util.List;
import org.fallwright.core.reference.Allowances;
import org.fallwright.core.site.Anchor;
import org.fallwright.core.site.Place;
import org.fallwright.core.site.Position;
import org.fallwright.core.site.Shape;
import org.fallwright.core.site.Site;
import org.fallwright.core.site.Target;

/**
 * Candidate anchors that the falling tree can meet as well: crowns that it can hang up in, and
 * parked vehicles. Drawn as targets of which no distance is asked, so only reaching them counts.
 */
final class HangUps {
  private HangUps() {}

  /**
   * Those that some lay can reach.
   *
   * @param farthestM farthest that any footprint reaches from the stump [m]
   */
  static List<Target> near(Site site, double farthestM) {
    List<Target> near = new ArrayList<>();
    Position stump = site.tree().stump().at();
    for (Anchor a : site.anchors()) {
      if (a instanceof Anchor.StandingTree t) {
        add(near, a, Target.Kind.TREE, t.crownRadiusM(), t.heightM(), stump, farthestM);
      } else if (a instanceof Anchor.ParkedVehicle) {
        double radius = Allowances.MACHINE_REACH.value();
        add(near, a, Target.Kind.CAR, radius, radius, stump, farthestM);
      }
    }
    return near;
  }

  private static void add(
      List<Target> near,
      Anchor a,
      Target.Kind kind,
      double radiusM,
      double heightM,
      Position stump,
      double farthestM) {
    Place p = a.place();
    if (stump.distanceTo(p.at()) - radiusM > farthestM) {
      return;
    }
    near.add(
        new Target(
            a.id(),
            kind,
            new Shape.Circle(p.at(), radiusM),
            p.fix(),
            p.statedErrorM(),
            p.groundM(),
            heightM,
            0,
            false,
            false,
            false));
  }
}
