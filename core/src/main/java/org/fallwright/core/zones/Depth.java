package org.fallwright.core.zones;

import java.util.Comparator;
import java.util.PriorityQueue;
import org.locationtech.jts.geom.Coordinate;
import org.locationtech.jts.geom.Envelope;

/**
 * How deep a thing lies inside an area, or how far it sticks out of one: the greatest distance from
 * a point of the thing to the area's edge, over the points on the asked side of that edge.
 *
 * <p>Branch and bound to {@value #TOLERANCE_M} m, resting on two facts: the distance to an edge
 * changes no faster than the point moves; and away from the thing's own edge it is greatest only
 * where the nearest places of the area's edge lie on all sides, so a square with all of them to one
 * side is dropped at once.
 */
final class Depth {
  /** A deeper point than the one found is at most this much deeper [m]. */
  static final double TOLERANCE_M = 0.01;

  private final Edges thing;
  private final Edges area;
  private final boolean outside;
  private double best = 0;
  private Coordinate place;

  private Depth(Edges thing, Edges area, boolean outside) {
    this.thing = thing;
    this.area = area;
    this.outside = outside;
  }

  /** A depth and the point that has it; depth 0 and no point where nothing is on that side. */
  record Deepest(double depthM, Coordinate at) {}

  /** The deepest point of a line or area inside an area. */
  static Deepest inside(Edges thing, Edges area) {
    return new Depth(thing, area, false).search();
  }

  /** The point of a line or area that sticks farthest out of an area. */
  static Deepest outside(Edges thing, Edges area) {
    return new Depth(thing, area, true).search();
  }

  private record Square(Coordinate middle, double half, double most) {}

  private Deepest search() {
    for (int i = 0; i < thing.size(); i++) {
      look(thing.from(i));
    }
    for (int i = 0; i < thing.size(); i++) {
      along(thing.from(i), thing.to(i));
    }
    if (thing.isArea()) {
      within();
    }
    return new Deepest(best, place);
  }

  /** Signed distance to the area's edge, positive on the asked side; keeps the greatest. */
  private double look(Coordinate p) {
    double d = signed(p);
    if (d > best) {
      best = d;
      place = p;
    }
    return d;
  }

  private double signed(Coordinate p) {
    double d = area.toEdge(p);
    return area.contains(p) != outside ? d : -d;
  }

  private void along(Coordinate a, Coordinate b) {
    Coordinate middle = new Coordinate((a.x + b.x) / 2, (a.y + b.y) / 2);
    double half = a.distance(b) / 2;
    if (look(middle) + half > best + TOLERANCE_M) {
      along(a, middle);
      along(middle, b);
    }
  }

  private void within() {
    Envelope box = outside ? thing.envelope() : thing.envelope().intersection(area.envelope());
    double half = Math.max(box.getWidth(), box.getHeight()) / 2;
    PriorityQueue<Square> queue =
        new PriorityQueue<>(Comparator.comparingDouble((Square s) -> -s.most()));
    offer(queue, box.centre(), half);
    while (!queue.isEmpty() && queue.peek().most() > best + TOLERANCE_M) {
      Square s = queue.remove();
      double h = s.half() / 2;
      for (int i = 0; i < 4; i++) {
        double x = s.middle().x + (i % 2 == 0 ? -h : h);
        double y = s.middle().y + (i < 2 ? -h : h);
        offer(queue, new Coordinate(x, y), h);
      }
    }
  }

  private void offer(PriorityQueue<Square> queue, Coordinate middle, double half) {
    double reach = half * Math.sqrt(2);
    double d = signed(middle);
    if (d + reach <= best + TOLERANCE_M) {
      return;
    }
    if (thing.contains(middle)) {
      look(middle);
    } else if (thing.toEdge(middle) > reach) {
      return;
    }
    if (d > reach && oneSided(middle, d, reach)) {
      return;
    }
    queue.add(new Square(middle, half, d + reach));
  }

  /**
   * Whether every place of the area's edge that can be nearest to a point of the square lies to one
   * side of the whole square: then the distance still grows across it, and its greatest value on
   * the thing lies elsewhere.
   */
  private boolean oneSided(Coordinate middle, double d, double reach) {
    double far = d + 2 * reach;
    double toward = Double.NaN;
    double low = 0;
    double high = 0;
    for (int i = 0; i < area.size(); i++) {
      if (area.toEdge(middle, i) > far) {
        continue;
      }
      Coordinate a = area.from(i);
      Coordinate b = area.to(i);
      double dx = b.x - a.x;
      double dy = b.y - a.y;
      double length = Math.hypot(dx, dy);
      double foot = ((middle.x - a.x) * dx + (middle.y - a.y) * dy) / length;
      double off = Math.abs((middle.x - a.x) * dy - (middle.y - a.y) * dx) / length;
      double span = Math.sqrt(Math.max(0, far * far - off * off));
      for (double at : new double[] {foot - span, foot + span}) {
        double t = Math.min(length, Math.max(0, at)) / length;
        double angle = Math.atan2(a.y + t * dy - middle.y, a.x + t * dx - middle.x);
        if (Double.isNaN(toward)) {
          toward = angle;
        }
        double turn = Math.IEEEremainder(angle - toward, 2 * Math.PI);
        low = Math.min(low, turn);
        high = Math.max(high, turn);
      }
    }
    return high - low < Math.PI && d * Math.cos((high - low) / 2) > reach;
  }
}
