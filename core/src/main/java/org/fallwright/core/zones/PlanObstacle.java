package org.fallwright.core.zones;

import org.fallwright.core.site.Shape;
import org.fallwright.core.site.Target;
import org.locationtech.jts.geom.Coordinate;

/**
 * A thing that a leg must not run over at any height: signed distance in plan. A road on which the
 * leg ends is where its source or anchor stands, and does not count.
 */
final class PlanObstacle implements LegCheck.Obstacle {
  private final Target target;
  private final Edges edges;

  PlanObstacle(Target target) {
    this.target = target;
    this.edges = new Edges(target.shape().geometry());
  }

  @Override
  public String id() {
    return target.id();
  }

  @Override
  public double errorM() {
    return target.errorM();
  }

  @Override
  public LegCheck.Near near(Leg leg) {
    Segment3 s = leg.segment();
    boolean endsOnRoad =
        target.kind() == Target.Kind.ROAD
            && (edges.contains(s.planFrom()) || edges.contains(s.planTo()));
    if (endsOnRoad || leg.fastenedTo().contains(target.id())) {
      return null;
    }
    Edges plan =
        new Edges(Shape.FACTORY.createLineString(new Coordinate[] {s.planFrom(), s.planTo()}));
    Edges.Gap gap = plan.gapTo(edges);
    if (gap.distanceM() > 0) {
      return new LegCheck.Near(gap.distanceM(), LegCheck.position(gap.onOther()));
    }
    Depth.Deepest deepest = Depth.inside(plan, edges);
    Coordinate at = deepest.at() != null ? deepest.at() : gap.onOther();
    return new LegCheck.Near(-deepest.depthM(), LegCheck.position(at));
  }
}
