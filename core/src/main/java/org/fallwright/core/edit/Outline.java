package org.fallwright.core.edit;

import java.util.ArrayList;
import java.util.List;
import java.util.function.UnaryOperator;
import org.fallwright.core.site.Position;
import org.fallwright.core.site.Shape;

/** The points of a shape, to be moved, added and removed one by one. */
final class Outline {
  private Outline() {}

  /** Its points: corners of a polygon, points of a line, the middle of a circle. */
  static List<Position> points(Shape shape) {
    if (shape instanceof Shape.Polygon p) {
      return p.points();
    }
    if (shape instanceof Shape.Line l) {
      return l.points();
    }
    return List.of(((Shape.Circle) shape).centre());
  }

  /** The same kind of shape through other points. */
  static Shape through(Shape shape, List<Position> points) {
    if (shape instanceof Shape.Polygon) {
      return new Shape.Polygon(points);
    }
    if (shape instanceof Shape.Line) {
      return new Shape.Line(points);
    }
    return new Shape.Circle(points.get(0), ((Shape.Circle) shape).radiusM());
  }

  static List<Position> each(List<Position> points, UnaryOperator<Position> change) {
    return points.stream().map(change).toList();
  }

  static List<Position> with(List<Position> points, int index, Position p) {
    List<Position> changed = new ArrayList<>(points);
    changed.set(index, p);
    return changed;
  }

  static List<Position> inserted(List<Position> points, int index, Position p) {
    List<Position> changed = new ArrayList<>(points);
    changed.add(index, p);
    return changed;
  }

  static List<Position> without(List<Position> points, int index) {
    List<Position> changed = new ArrayList<>(points);
    changed.remove(index);
    return changed;
  }

  /** The mean of the points, about which a thing turns. */
  static Position middle(List<Position> points) {
    return new Position(
        points.stream().mapToDouble(Position::eastM).average().orElseThrow(),
        points.stream().mapToDouble(Position::northM).average().orElseThrow());
  }

  /** A point turned about another, clockwise [degrees]. */
  static Position turned(Position p, Position about, double deg) {
    double a = Math.toRadians(deg);
    double e = p.eastM() - about.eastM();
    double n = p.northM() - about.northM();
    return new Position(
        about.eastM() + e * Math.cos(a) + n * Math.sin(a),
        about.northM() - e * Math.sin(a) + n * Math.cos(a));
  }
}
