package org.fallwright.core.plan;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.EnumMap;
import java.util.List;
import java.util.Map;
import java.util.Set;
import java.util.function.DoubleUnaryOperator;
import java.util.function.ToDoubleFunction;
import org.fallwright.core.line.Point3;
import org.fallwright.core.reference.Allowances;
import org.fallwright.core.rules.RuleSet;
import org.fallwright.core.site.Anchor;
import org.fallwright.core.site.Position;
import org.fallwright.core.site.Shape;
import org.fallwright.core.site.Site;
import org.fallwright.core.site.Target;
import org.fallwright.core.site.Wire;
import org.fallwright.core.statics.PlanField;
import org.fallwright.core.zones.FallFootprint;
import org.fallwright.core.zones.Leg;
import org.fallwright.core.zones.LegCheck;
import org.locationtech.jts.algorithm.RectangleLineIntersector;
import org.locationtech.jts.geom.Coordinate;
import org.locationtech.jts.geom.Envelope;
import org.locationtech.jts.geom.Geometry;
import org.locationtech.jts.geom.prep.PreparedGeometry;
import org.locationtech.jts.geom.prep.PreparedGeometryFactory;
import org.locationtech.jts.operation.union.UnaryUnionOp;

/** Where on the ground the source of a setup could stand, and what it would give there. */
final class StandingGround {
  /** Distance between the rises for which a source is asked [rad]. */
  private static final double RISE_STEP = Math.toRadians(0.25);

  private final Site site;
  private final Setup setup;
  private final PlanField field;
  private final DoubleUnaryOperator lowByRise;
  private final double endElevationM;
  private final LinePoint attachment;
  private final Point3 attached;
  private final double reachM;
  private final double errorM;
  private final Map<MarginMap.Cut, PreparedGeometry> closed = new EnumMap<>(MarginMap.Cut.class);
  private final List<Beside> beside = new ArrayList<>();
  private final ToDoubleFunction<Wire> approach;
  private final double[] lows = new double[2 * (int) Math.round(Math.PI / 2 / RISE_STEP) + 1];

  /** A thing that a leg could foul, and the plain rectangle about it. */
  private record Beside(RectangleLineIntersector near, LegCheck check) {}

  /**
   * @param field what the tree asks by bearing point
   * @param lowByRise what the source gives at its line end for a rise of its line [rad to N]
   * @param route the line of the setup as it is
   * @param lineM line that there is, the source's wire among it [m]
   */
  StandingGround(
      Site site,
      RuleSet rules,
      Knowledge knowledge,
      Setup setup,
      PlanField field,
      DoubleUnaryOperator lowByRise,
      Route route,
      FallFootprint widest,
      double lineM) {
    this.site = site;
    this.setup = setup;
    this.field = field;
    this.lowByRise = lowByRise;
    attachment = route.line().get(0);
    attached = route.points().get(0);
    endElevationM = route.line().get(1).elevationM();
    reachM = lineM - Allowances.LINE_SPARE.value();
    errorM = Math.max(site.tree().stump().errorM(), route.bearingErrorM());
    approach = knowledge.ofWires() ? knowledge.approach() : w -> 0;
    close(rules, knowledge, widest);
    besides(knowledge);
    Arrays.fill(lows, Double.NaN);
  }

  private void close(RuleSet rules, Knowledge knowledge, FallFootprint widest) {
    closed.put(MarginMap.Cut.TREE_CAN_LAND, ready(List.of(widest.geometry())));
    if (!rules.teamException().yes()) {
      double radius = rules.operatorRadiusFactor().value() * site.tree().heightM().value();
      closed.put(MarginMap.Cut.TOO_NEAR, ready(List.of(disc(stump(), radius))));
    }
    double room = Allowances.STANDING_ROOM.value();
    List<Geometry> things = new ArrayList<>();
    for (Target t : site.targets()) {
      if (t.kind() != Target.Kind.ROAD) {
        things.add(t.shape().geometry().buffer(room + t.errorM()));
      }
    }
    for (Anchor a : site.anchors()) {
      things.add(disc(a.place().at(), room + a.place().errorM()));
    }
    closed.put(MarginMap.Cut.THING_THERE, ready(things));
    if (knowledge.ofWires()) {
      List<Geometry> wires = new ArrayList<>();
      for (Wire w : site.wires()) {
        double asked = knowledge.approach().applyAsDouble(w) + w.errorM() + errorM;
        wires.add(
            new Shape.Line(w.poles().stream().map(p -> p.at()).toList()).geometry().buffer(asked));
      }
      closed.put(MarginMap.Cut.WIRE_NEAR, ready(wires));
    }
  }

  private void besides(Knowledge knowledge) {
    for (Target t : site.targets()) {
      if (LineRun.matters(t)) {
        beside(
            t.shape().geometry(),
            errorM + t.errorM(),
            new LegCheck(List.of(t), List.of(), List.of()));
      }
    }
    for (Anchor a : site.anchors()) {
      if (a instanceof Anchor.StandingTree tree) {
        beside(
            disc(a.place().at(), tree.crownRadiusM()),
            errorM + a.place().errorM(),
            new LegCheck(List.of(), List.of(a), List.of()));
      }
    }
    for (Wire w : knowledge.ofWires() ? site.wires() : List.<Wire>of()) {
      beside(
          new Shape.Line(w.poles().stream().map(p -> p.at()).toList()).geometry(),
          knowledge.approach().applyAsDouble(w) + w.errorM() + errorM,
          new LegCheck(List.of(), List.of(), List.of(w)));
    }
  }

  private void beside(Geometry thing, double askedM, LegCheck check) {
    Envelope near = new Envelope(thing.getEnvelopeInternal());
    near.expandBy(askedM);
    beside.add(new Beside(new RectangleLineIntersector(near), check));
  }

  PlanField field() {
    return field;
  }

  Position stump() {
    return site.tree().stump().at();
  }

  /** Where the line would end, from the stump's centre at hinge level. */
  Point3 lineEnd(Position at) {
    return Route.relative(site, new LinePoint(at, endElevationM, LinePoint.Role.SOURCE, ""));
  }

  /** The first reason why nobody may stand there. */
  MarginMap.Cut standing(Position at) {
    Geometry point = Shape.FACTORY.createPoint(new Coordinate(at.eastM(), at.northM()));
    for (Map.Entry<MarginMap.Cut, PreparedGeometry> c : closed.entrySet()) {
      if (c.getValue().intersects(point)) {
        return c.getKey();
      }
    }
    return MarginMap.Cut.OPEN;
  }

  boolean reaches(Point3 end) {
    return attached.minus(end).length() <= reachM;
  }

  /** Whether the line from there would run over or too near anything. */
  boolean fouled(Position at) {
    Coordinate from = new Coordinate(attachment.at().eastM(), attachment.at().northM());
    Coordinate to = new Coordinate(at.eastM(), at.northM());
    Leg leg = null;
    for (Beside b : beside) {
      if (b.near.intersects(from, to)) {
        if (leg == null) {
          leg =
              new Leg(
                  attachment.at(),
                  attachment.elevationM(),
                  at,
                  endElevationM,
                  Set.of(site.tree().id(), setup.place()));
        }
        for (LegCheck.Passing p :
            b.check.passing(leg, errorM, w -> approach.applyAsDouble(w) + errorM)) {
          if (!p.clear()) {
            return true;
          }
        }
      }
    }
    return false;
  }

  /** What the source gives at the tree at its least [N]; interpolated over the rise of its line. */
  double givesN(Point3 end) {
    Point3 leg = attached.minus(end);
    double rise = Math.asin(leg.up() / leg.length()) / RISE_STEP + lows.length / 2;
    int i = Math.min(lows.length - 2, (int) rise);
    double share = rise - i;
    return low(i) + share * (low(i + 1) - low(i));
  }

  private double low(int i) {
    // several threads may reckon the same figure; they all get the same
    double low = lows[i];
    if (Double.isNaN(low)) {
      low = lowByRise.applyAsDouble((i - lows.length / 2) * RISE_STEP);
      lows[i] = low;
    }
    return low;
  }

  private static Geometry disc(Position middle, double radiusM) {
    return new Shape.Circle(middle, radiusM).geometry();
  }

  private static PreparedGeometry ready(List<Geometry> all) {
    Geometry whole = all.isEmpty() ? Shape.FACTORY.createPolygon() : UnaryUnionOp.union(all);
    return PreparedGeometryFactory.prepare(whole);
  }
}
