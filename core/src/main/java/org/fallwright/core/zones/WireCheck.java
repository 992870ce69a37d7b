package org.fallwright.core.zones;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.function.ToDoubleFunction;
import org.fallwright.core.reference.Allowances;
import org.fallwright.core.site.Place;
import org.fallwright.core.site.Position;
import org.fallwright.core.site.Shape;
import org.fallwright.core.site.Wire;
import org.fallwright.core.units.Range;
import org.locationtech.jts.geom.Coordinate;
import org.locationtech.jts.geom.Geometry;

/**
 * The overhead wires of a site against the falling tree, made ready once.
 *
 * <p>In the lay: a distance that the tree cannot come below. Every point of the tree stays within a
 * ball about the hinge, and over ground within the hull of the footprint and of the crown as it
 * stands; so a piece of conductor is at least max(distance outside the hull in plan, distance
 * outside the ball in space) away. The ball's radius is the greater of R and the distance from the
 * stump to the farthest point of the leaning crown. The true distance is never less; it can be
 * more.
 *
 * <p>All round: the ground distance to the nearest point below a conductor, as if the tree could
 * fall any way. Either way the conductor may be blown aside: {@link #swingM} counts as one more
 * position error.
 */
public final class WireCheck {
  private final FallOutline outline;
  private final Place stump;
  private final Edges standing;
  private final List<Ready> wires = new ArrayList<>();

  private record Chord(Segment3 piece, Edges plan, double outsideBallM) {}

  private record Ready(Wire wire, List<Chord> chords, double errorM) {}

  /**
   * Least distance of a wire in a lay.
   *
   * @param leastM least distance that cannot be ruled out, position errors and swing taken off [m]
   * @param askedM approach distance asked [m]
   * @param place where on the conductor, in plan
   */
  public record InLay(String wireId, double leastM, double askedM, Position place) {
    public boolean clear() {
      return leastM >= askedM;
    }
  }

  /**
   * A wire against the full circle about the stump.
   *
   * @param groundM distance on the ground to the nearest point below the conductor [m]
   * @param errorM position errors of stump and wire and the wire's swing [m]; count as if the wire
   *     were so much nearer
   * @param stopM H + approach distance: within it the work stops [m]
   * @param adviceM 2 H + approach distance: within it the wire's owner is asked first [m]
   * @param place the point below the conductor
   */
  public record Reach(
      String wireId, double groundM, double errorM, double stopM, double adviceM, Position place) {
    public boolean stops() {
      return groundM - errorM <= stopM;
    }

    public boolean advises() {
      return groundM - errorM <= adviceM;
    }
  }

  /**
   * @param wires the wires
   * @param stump the stump; its ground level is where heights count from
   * @param cutHeightM height of the hinge above that ground [m]
   * @param outline the tree
   */
  public WireCheck(List<Wire> wires, Place stump, double cutHeightM, FallOutline outline) {
    this.outline = outline;
    this.stump = stump;
    Range.check("height_m", cutHeightM, 0, 5, "m");
    double lean = Math.tan(Math.toRadians(outline.leanDeg()));
    double h = outline.heightM();
    double ball = Math.max(outline.reachM(), Math.hypot(h, h * lean + outline.crownReachM()));
    double z = stump.groundM() + cutHeightM;
    double x = stump.at().eastM();
    double y = stump.at().northM();
    Position top = stump.at().along(outline.leanAzimuthDeg(), h * lean);
    standing =
        new Edges(
            Shape.FACTORY
                .createLineString(
                    new Coordinate[] {
                      new Coordinate(x, y), new Coordinate(top.eastM(), top.northM())
                    })
                .buffer(outline.crownReachM() / Math.cos(Math.PI / 48), 12));
    for (Wire wire : wires) {
      List<Chord> chords = new ArrayList<>();
      for (Segment3 s : Segment3.conductor(wire)) {
        Geometry plan = Shape.FACTORY.createLineString(new Coordinate[] {s.planFrom(), s.planTo()});
        chords.add(new Chord(s, new Edges(plan), Math.max(0, s.distanceTo(x, y, z) - ball)));
      }
      chords.sort(Comparator.comparingDouble(Chord::outsideBallM));
      this.wires.add(new Ready(wire, chords, wire.errorM() + swingM(wire) + stump.errorM()));
    }
  }

  /** How far wind may blow a conductor aside where it sags most, sag·sin 45° [m]: an allowance. */
  public static double swingM(Wire wire) {
    return wire.sagM() * Math.sin(Math.toRadians(Allowances.WIRE_SWING.value()));
  }

  /**
   * Every wire in a lay.
   *
   * @param approachM approach distance of a wire by the rule set [m]
   */
  public List<InLay> inLay(FallFootprint footprint, ToDoubleFunction<Wire> approachM) {
    if (wires.isEmpty()) {
      return List.of();
    }
    Edges hull = hull(footprint);
    return wires.stream().map(w -> inLay(hull, w, approachM.applyAsDouble(w.wire))).toList();
  }

  /** Footprint and standing crown with all that lies between them in plan. */
  private Edges hull(FallFootprint footprint) {
    List<Edges> all = new ArrayList<>(footprint.pieceEdges());
    all.add(standing);
    return Edges.hull(all);
  }

  private static InLay inLay(Edges hull, Ready w, double askedM) {
    double best = Double.POSITIVE_INFINITY;
    Coordinate at = null;
    for (Chord c : w.chords) {
      if (c.outsideBallM >= best) {
        break;
      }
      Edges.Gap gap = hull.gapTo(c.plan);
      double d = Math.max(gap.distanceM(), c.outsideBallM);
      if (d < best) {
        best = d;
        at = gap.onOther();
      }
    }
    return new InLay(w.wire.id(), best - w.errorM, askedM, new Position(at.x, at.y));
  }

  /**
   * Every wire against the full circle about the stump.
   *
   * @param approachM approach distance of a wire by the rule set [m]
   */
  public List<Reach> reach(ToDoubleFunction<Wire> approachM) {
    return wires.stream().map(w -> reach(w, approachM.applyAsDouble(w.wire))).toList();
  }

  private Reach reach(Ready w, double approachM) {
    double x = stump.at().eastM();
    double y = stump.at().northM();
    Position nearest = null;
    for (Chord c : w.chords) {
      Segment3 s = c.piece;
      Segment3 ground = new Segment3(s.ax(), s.ay(), 0, s.bx(), s.by(), 0);
      Position p = ground.planAt(ground.nearestTo(x, y, 0));
      if (nearest == null || stump.at().distanceTo(p) < stump.at().distanceTo(nearest)) {
        nearest = p;
      }
    }
    double h = outline.heightM();
    return new Reach(
        w.wire.id(),
        stump.at().distanceTo(nearest),
        w.errorM,
        h + approachM,
        2 * h + approachM,
        nearest);
  }
}
