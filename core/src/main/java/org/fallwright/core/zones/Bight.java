package org.fallwright.core.zones;

import org.fallwright.core.reference.Allowances;
import java.util.ArrayList;
import java.util.List;
import org.fallwright.core.site.Position;
import org.fallwright.core.site.Shape;
import org.locationtech.jts.geom.Coordinate;
import org.locationtech.jts.geom.Geometry;

/**
 * The inside of the line's angle at a redirect block, into which a torn-off block is thrown: the
 * triangle of the block and the points before and after it, and a margin all round.
 *
 * <p>Source: common rule that nobody stands in a redirected line's inner angle; the margin is a
 * planning allowance.
 */
public final class Bight {
  /** Margin about the triangle [m]: planning allowance. */
  static final double MARGIN_M = Allowances.BIGHT_MARGIN.value();

  private static final int QUARTER = 24;

  private final Geometry triangle;
  private final Edges edges;

  private Bight(Position before, Position block, Position after) {
    Coordinate a = corner(before);
    Coordinate b = corner(block);
    Coordinate c = corner(after);
    triangle = Shape.FACTORY.createPolygon(new Coordinate[] {a, b, c, a.copy()});
    edges = new Edges(triangle);
  }

  /**
   * One for each block of a line.
   *
   * @param path the line's points in plan, from the tree through its blocks to the source
   */
  public static List<Bight> along(List<Position> path) {
    List<Bight> all = new ArrayList<>();
    for (int i = 1; i + 1 < path.size(); i++) {
      all.add(new Bight(path.get(i - 1), path.get(i), path.get(i + 1)));
    }
    return all;
  }

  private static Coordinate corner(Position p) {
    return new Coordinate(p.eastM(), p.northM());
  }

  public boolean contains(Position p) {
    return edges.distanceTo(corner(p)) <= MARGIN_M;
  }

  /** Its outline, never smaller than the margin asks. */
  public Geometry geometry() {
    return triangle.buffer(MARGIN_M / Math.cos(Math.PI / (4 * QUARTER)), QUARTER);
  }
}
