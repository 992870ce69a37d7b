package org.fallwright.core.zones;

import java.util.List;
import org.fallwright.core.site.DropZone;
import org.fallwright.core.site.Position;
import org.locationtech.jts.geom.Coordinate;
import org.locationtech.jts.geom.Geometry;
import org.locationtech.jts.operation.overlayng.OverlayNG;
import org.locationtech.jts.operation.overlayng.OverlayNGRobust;
import org.locationtech.jts.operation.union.UnaryUnionOp;

/** A site's drop zone, made ready once: the footprint of a lay must lie inside it. */
public final class DropZoneFit {
  private final Geometry zone;
  private final Edges edges;

  /**
   * How a footprint fits.
   *
   * @param marginM least distance of the footprint to the zone's edge when it lies inside; minus
   *     the farthest that it sticks out when not [m]
   * @param outsideM2 area of the footprint outside the zone [m²]
   * @param place where the margin is least: on the zone's edge, or the farthest point outside
   */
  public record Fit(double marginM, double outsideM2, Position place) {
    /** Whether all of the footprint lies inside. */
    public boolean inside() {
      return outsideM2 == 0;
    }
  }

  /**
   * @param zones the drop zones drawn, at least one; together they are the area allowed
   */
  public DropZoneFit(List<DropZone> zones) {
    if (zones.isEmpty()) {
      throw new IllegalArgumentException("drop_zones is empty; it must have at least one");
    }
    zone = UnaryUnionOp.union(zones.stream().map(z -> z.shape().geometry()).toList());
    edges = new Edges(zone);
  }

  /** How the footprint fits into the zone. */
  public Fit of(FallFootprint footprint) {
    double outside =
        OverlayNGRobust.overlay(footprint.geometry(), zone, OverlayNG.DIFFERENCE).getArea();
    if (outside > 0) {
      Depth.Deepest deepest = Depth.outside(footprint.edges(), edges);
      Coordinate at = deepest.at();
      if (at != null) {
        return new Fit(-deepest.depthM(), outside, new Position(at.x, at.y));
      }
    }
    Least least = least(footprint.edges());
    return new Fit(least.distanceM, 0, new Position(least.at.x, least.at.y));
  }

  /**
   * Whether the footprint lies inside. Where a piece of it plainly sticks out or plainly lies in
   * the zone that is enough; only in between the areas are laid over each other.
   */
  public boolean holds(FallFootprint footprint) {
    boolean plain = true;
    for (Edges piece : footprint.pieceEdges()) {
      double least = Double.POSITIVE_INFINITY;
      for (int i = 0; i < piece.size(); i++) {
        Coordinate c = piece.from(i);
        double d = edges.toEdge(c);
        if (!edges.contains(c)) {
          if (d > PLAIN_M) {
            return false;
          }
          d = 0;
        }
        least = Math.min(least, d);
      }
      // all corners well inside, and no corner of the zone within the piece or near its edges
      for (int i = 0; i < edges.size() && least > PLAIN_M; i++) {
        Coordinate c = edges.from(i);
        least = piece.contains(c) ? 0 : Math.min(least, piece.toEdge(c));
      }
      plain &= least > PLAIN_M && !piece.crosses(edges);
    }
    return plain || of(footprint).inside();
  }

  /** Distance beyond which a point is plainly on its side of an edge [m]. */
  private static final double PLAIN_M = 1e-6;

  private record Least(double distanceM, Coordinate at) {}

  /** Inside the zone the two edges do not cross, so a corner of either is nearest. */
  private Least least(Edges footprint) {
    Least best = new Least(Double.POSITIVE_INFINITY, null);
    for (int i = 0; i < footprint.size(); i++) {
      double d = edges.toEdge(footprint.from(i));
      if (d < best.distanceM) {
        best = new Least(d, footprint.from(i));
      }
    }
    for (int i = 0; i < edges.size(); i++) {
      double d = footprint.toEdge(edges.from(i));
      if (d < best.distanceM) {
        best = new Least(d, edges.from(i));
      }
    }
    return best;
  }
}
