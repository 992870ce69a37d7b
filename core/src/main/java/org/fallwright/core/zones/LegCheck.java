package org.fallwright.core.zones;

import java.util.ArrayList;
import java.util.List;
import java.util.function.ToDoubleFunction;
import org.fallwright.core.site.Anchor;
import org.fallwright.core.site.Place;
import org.fallwright.core.site.Position;
import org.fallwright.core.site.Target;
import org.fallwright.core.site.Wire;
import org.locationtech.jts.geom.Coordinate;

/**
 * A site's things that a leg of the line must stay clear of, made ready once.
 *
 * <p>Structures, fences, plants, trees and other things stand from the ground to their height, and
 * a leg may pass over them. A leg may not run over a car, a road or a place of people at any
 * height, nor through the crown of a standing anchor tree, taken as a cylinder from the crown's
 * base to the top. Wires keep the approach distance. Buried things do not matter to a leg. Leaves
 * out the sag of a slack line.
 */
public final class LegCheck {
  private final List<Obstacle> obstacles = new ArrayList<>();
  private final List<ReadyWire> wires = new ArrayList<>();

  /** A thing beside a leg. */
  interface Obstacle {
    String id();

    double errorM();

    /** Clearance to the leg and where; null where the leg ends at the thing. */
    Near near(Leg leg);
  }

  /** A clearance [m], negative where the leg fouls the thing, and where in plan. */
  record Near(double clearanceM, Position place) {}

  private record ReadyWire(Wire wire, List<Segment3> chords) {}

  /**
   * What a leg passes.
   *
   * @param what id of the target, anchor or wire
   * @param clearanceM distance of the leg; negative where it fouls: how far it runs inside or below
   *     the top [m]
   * @param askedM distance asked, the thing's position error included [m]
   * @param place where, in plan: on the thing or on the leg beside it
   */
  public record Passing(String what, double clearanceM, double askedM, Position place) {
    public boolean clear() {
      return clearanceM >= askedM;
    }
  }

  public LegCheck(List<Target> targets, List<Anchor> anchors, List<Wire> wires) {
    for (Target t : targets) {
      switch (t.kind()) {
        case CAR, ROAD, PLACE_OF_PEOPLE -> obstacles.add(new PlanObstacle(t));
        case STRUCTURE, FENCE, PLANTING, TREE, OTHER -> obstacles.add(new Prism(t));
        case BURIED -> {}
      }
    }
    for (Anchor a : anchors) {
      if (a instanceof Anchor.StandingTree tree) {
        obstacles.add(new CrownObstacle(tree));
      }
    }
    for (Wire w : wires) {
      this.wires.add(new ReadyWire(w, Segment3.conductor(w)));
    }
  }

  /**
   * Everything that a leg passes, least clearance over what is asked first.
   *
   * @param askedM distance asked of everything but wires, with the position error of the leg's ends
   *     [m]
   * @param approachM approach distance of a wire by the rule set, with the position error of the
   *     leg's ends [m]
   */
  public List<Passing> passing(Leg leg, double askedM, ToDoubleFunction<Wire> approachM) {
    List<Passing> all = new ArrayList<>();
    for (Obstacle o : obstacles) {
      Near n = o.near(leg);
      if (n != null) {
        all.add(new Passing(o.id(), n.clearanceM, askedM + o.errorM(), n.place));
      }
    }
    Segment3 line = leg.segment();
    for (ReadyWire w : wires) {
      Segment3.Nearest best = new Segment3.Nearest(Double.POSITIVE_INFINITY, 0);
      for (Segment3 c : w.chords) {
        Segment3.Nearest n = line.nearest(c);
        best = n.distanceM() < best.distanceM() ? n : best;
      }
      double asked = approachM.applyAsDouble(w.wire) + w.wire.errorM() + WireCheck.swingM(w.wire);
      all.add(new Passing(w.wire.id(), best.distanceM(), asked, line.planAt(best.at())));
    }
    all.sort((p, q) -> Double.compare(p.clearanceM - p.askedM, q.clearanceM - q.askedM));
    return all;
  }

  /**
   * Distance of a machine or of people at a place from a wire, least clearance over what is asked
   * first: all within the reach of the place and as high above its ground counts as the machine.
   *
   * @param reachM its reach, aside and upwards [m]
   * @param approachM approach distance of a wire by the rule set [m]
   */
  public List<Passing> machine(Place place, double reachM, ToDoubleFunction<Wire> approachM) {
    Segment3 post =
        Segment3.between(place.at(), place.groundM(), place.at(), place.groundM() + reachM);
    List<Passing> all = new ArrayList<>();
    for (ReadyWire w : wires) {
      double nearest =
          w.chords.stream().mapToDouble(post::distanceTo).min().orElse(Double.POSITIVE_INFINITY);
      double asked =
          approachM.applyAsDouble(w.wire)
              + place.errorM()
              + w.wire.errorM()
              + WireCheck.swingM(w.wire);
      all.add(new Passing(w.wire.id(), nearest - reachM, asked, place.at()));
    }
    all.sort((p, q) -> Double.compare(p.clearanceM - p.askedM, q.clearanceM - q.askedM));
    return all;
  }

  static Position position(Coordinate c) {
    return new Position(c.x, c.y);
  }
}
