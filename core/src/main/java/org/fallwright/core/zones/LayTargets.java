package org.fallwright.core.zones;

import java.util.ArrayList;
import java.util.List;
import java.util.function.ToDoubleFunction;
import org.fallwright.core.site.Place;
import org.fallwright.core.site.Position;
import org.fallwright.core.site.Target;
import org.fallwright.core.units.Range;
import org.locationtech.jts.geom.Coordinate;
import org.locationtech.jts.geom.Geometry;
import org.locationtech.jts.operation.overlayng.OverlayNG;
import org.locationtech.jts.operation.overlayng.OverlayNGRobust;

/** A site's targets, made ready once to be held against the footprints of many lays. */
public final class LayTargets {
  private final List<Ready> ready;

  private record Ready(Target target, Geometry geometry, Edges edges, double askedM) {}

  /** A target that lies in a zone: how much of it, in m² for an area and m for a line. */
  public record Overlap(String targetId, double amount, String unit) {}

  /**
   * @param targets the targets
   * @param stump the stump, for its position error
   */
  public LayTargets(List<Target> targets, Place stump) {
    this(targets, t -> t.errorM() + stump.errorM());
  }

  /**
   * @param targets the targets
   * @param errorM position error between the stump and a target [m]
   */
  public LayTargets(List<Target> targets, ToDoubleFunction<Target> errorM) {
    List<Ready> all = new ArrayList<>();
    for (Target t : Range.present("targets", targets)) {
      Geometry g = t.shape().geometry();
      double required = t.requiredDistanceM();
      double asked = required > 0 ? required + errorM.applyAsDouble(t) : 0;
      all.add(new Ready(t, g, new Edges(g), asked));
    }
    ready = List.copyOf(all);
  }

  /** Every target against a footprint, in the order of the site. */
  public List<TargetClearance> clearances(FallFootprint footprint) {
    return ready.stream().map(r -> clearance(footprint, r)).toList();
  }

  /**
   * The same for a search: apart from each other all is as in {@link #clearances}; of what overlaps
   * it is only said that it does, not how deep or how much; of what may be hit, nothing.
   */
  public List<TargetClearance> gaps(FallFootprint footprint) {
    List<TargetClearance> all = new ArrayList<>(ready.size());
    for (Ready r : ready) {
      boolean judged = !r.target().mayBeHit();
      Edges.Gap gap = judged ? footprint.gapTo(r.edges()) : null;
      all.add(
          new TargetClearance(
              r.target().id(),
              judged ? gap.distanceM() : Double.NaN,
              r.askedM(),
              Double.NaN,
              "",
              judged ? new Position(gap.onOther().x, gap.onOther().y) : null,
              !judged));
    }
    return all;
  }

  /**
   * The least {@link TargetClearance#ratio} of a footprint, without depths and amounts: the quick
   * question of a search. Infinite where nothing limits.
   */
  public double leastRatio(FallFootprint footprint) {
    double least = Double.POSITIVE_INFINITY;
    for (Ready r : ready) {
      if (!r.target().mayBeHit()) {
        double gap = footprint.gapTo(r.edges()).distanceM();
        if (gap <= 0) {
          return 0;
        }
        least = r.askedM() > 0 ? Math.min(least, gap / r.askedM()) : least;
      }
    }
    return least;
  }

  private static TargetClearance clearance(FallFootprint footprint, Ready r) {
    Edges.Gap gap = footprint.gapTo(r.edges());
    double clearance = gap.distanceM();
    Coordinate at = gap.onOther();
    double amount = 0;
    if (clearance <= 0) {
      Depth.Deepest deepest = Depth.inside(r.edges(), footprint.edges());
      clearance = -deepest.depthM();
      at = deepest.at() != null ? deepest.at() : at;
      amount = amountIn(footprint.geometry(), r.geometry());
    }
    return new TargetClearance(
        r.target().id(),
        clearance,
        r.askedM(),
        amount,
        unit(r.geometry()),
        new Position(at.x, at.y),
        r.target().mayBeHit());
  }

  /** The targets that lie wholly or partly in a zone, in the order of the site. */
  public List<Overlap> in(Geometry zone) {
    List<Overlap> in = new ArrayList<>();
    for (Ready r : ready) {
      if (zone.getEnvelopeInternal().intersects(r.edges().envelope())) {
        double amount = amountIn(zone, r.geometry());
        if (amount > 0) {
          in.add(new Overlap(r.target().id(), amount, unit(r.geometry())));
        }
      }
    }
    return in;
  }

  private static double amountIn(Geometry zone, Geometry target) {
    Geometry common = OverlayNGRobust.overlay(zone, target, OverlayNG.INTERSECTION);
    return target.getDimension() == 2 ? common.getArea() : common.getLength();
  }

  private static String unit(Geometry target) {
    return target.getDimension() == 2 ? "m²" : "m";
  }
}
