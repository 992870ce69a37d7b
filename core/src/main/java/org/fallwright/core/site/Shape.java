package org.fallwright.core.site;

import com.fasterxml.jackson.annotation.JsonSubTypes;
import com.fasterxml.jackson.annotation.JsonTypeInfo;
import java.util.ArrayList;
import java.util.List;
import org.fallwright.core.units.Range;
import org.locationtech.jts.geom.Coordinate;
import org.locationtech.jts.geom.Geometry;
import org.locationtech.jts.geom.GeometryFactory;
import org.locationtech.jts.operation.valid.IsValidOp;

/** The outline of a thing on the site plane. */
@JsonTypeInfo(use = JsonTypeInfo.Id.NAME, property = "type")
@JsonSubTypes({
  @JsonSubTypes.Type(value = Shape.Polygon.class, name = "polygon"),
  @JsonSubTypes.Type(value = Shape.Line.class, name = "line"),
  @JsonSubTypes.Type(value = Shape.Circle.class, name = "circle")
})
public sealed interface Shape {
  /** Shared factory; coordinates are metres east and north. */
  GeometryFactory FACTORY = new GeometryFactory();

  /** The outline as plane geometry [m]; a circle as a polygon of 96 corners. */
  Geometry geometry();

  /** An area: at least three corners, not closed, no edge crossing another. */
  record Polygon(List<Position> points) implements Shape {
    public Polygon {
      points = List.copyOf(Range.present("points", points));
      if (points.size() < 3) {
        throw new IllegalArgumentException(
            "a polygon has " + points.size() + " points; it must have at least 3");
      }
      IsValidOp op = new IsValidOp(polygonOf(points));
      if (!op.isValid()) {
        Coordinate c = op.getValidationError().getCoordinate();
        throw new IllegalArgumentException(
            "a polygon's outline crosses or touches itself near [" + c.x + ", " + c.y + "]");
      }
    }

    @Override
    public Geometry geometry() {
      return polygonOf(points);
    }

    private static Geometry polygonOf(List<Position> points) {
      List<Coordinate> c = new ArrayList<>();
      points.forEach(p -> c.add(new Coordinate(p.eastM(), p.northM())));
      c.add(c.get(0).copy());
      return FACTORY.createPolygon(c.toArray(Coordinate[]::new));
    }
  }

  /** A fence, hedge or the like: at least two points. */
  record Line(List<Position> points) implements Shape {
    public Line {
      points = List.copyOf(Range.present("points", points));
      if (points.size() < 2) {
        throw new IllegalArgumentException(
            "a line has " + points.size() + " points; it must have at least 2");
      }
    }

    @Override
    public Geometry geometry() {
      return FACTORY.createLineString(
          points.stream()
              .map(p -> new Coordinate(p.eastM(), p.northM()))
              .toArray(Coordinate[]::new));
    }
  }

  /**
   * A round thing.
   *
   * @param centre its middle
   * @param radiusM its radius [m]
   */
  record Circle(Position centre, double radiusM) implements Shape {
    public Circle {
      Range.present("centre", centre);
      Range.check("radius_m", radiusM, 0.01, 1000, "m");
    }

    @Override
    public Geometry geometry() {
      return FACTORY
          .createPoint(new Coordinate(centre.eastM(), centre.northM()))
          .buffer(radiusM, 24);
    }
  }
}
