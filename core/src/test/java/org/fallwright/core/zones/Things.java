package org.fallwright.core.zones;

import java.util.Arrays;
import java.util.List;
import org.fallwright.core.site.Fix;
import org.fallwright.core.site.Place;
import org.fallwright.core.site.Position;
import org.fallwright.core.site.Shape;
import org.fallwright.core.site.Target;
import org.fallwright.core.site.Wire;

/** Small makers of site things for the tests here. */
final class Things {
  private Things() {}

  /** The demo site's oak. */
  static final FallOutline OAK = new FallOutline(17.5, 6.0, 4.5, 0.58, 5, 188);

  static final Place STUMP = new Place(new Position(16, 24), 0, Fix.TAPES, null);

  /** The steering share of its leading setup: half-angle 7.9 degrees. */
  static final double SHARE = 0.143;

  static Position at(double east, double north) {
    return new Position(east, north);
  }

  private static List<Position> points(double... c) {
    Position[] p = new Position[c.length / 2];
    Arrays.setAll(p, i -> at(c[2 * i], c[2 * i + 1]));
    return List.of(p);
  }

  static Shape.Polygon polygon(double... c) {
    return new Shape.Polygon(points(c));
  }

  static Shape.Line line(double... c) {
    return new Shape.Line(points(c));
  }

  static Target target(String id, Shape shape, double required) {
    return target(id, Target.Kind.STRUCTURE, shape, 2.6, required, false);
  }

  static Target target(
      String id, Target.Kind kind, Shape shape, double height, double required, boolean mayBeHit) {
    return new Target(
        id, kind, shape, Fix.TAPES, null, 0, height, required, false, mayBeHit, false);
  }

  static Target shed() {
    return target("Shed", polygon(26.5, 34.0, 30.5, 34.0, 30.5, 37.5, 26.5, 37.5), 1.5);
  }

  static Target fence() {
    return target("F1", Target.Kind.FENCE, line(3, 10, 3, 44, -14, 44), 1.2, 0.5, false);
  }

  static Target house() {
    return target(
        "House",
        Target.Kind.STRUCTURE,
        polygon(6, 2, 27, 2, 27, 13, 20, 13, 20, 15.5, 6, 15.5),
        5.0,
        1.5,
        false);
  }

  static Wire wire(double east, double sag) {
    return new Wire(
        "W1",
        12.47,
        "owner",
        Wire.State.ENERGIZED,
        List.of(
            new Wire.Pole(at(east, -5), 0, 9.5),
            new Wire.Pole(at(east, 45), 0, 9.5),
            new Wire.Pole(at(east, 95), 0, 9.5)),
        sag,
        Fix.TAPES,
        null);
  }

  static FallFootprint oakTo(double lay) {
    return FallFootprint.of(OAK, STUMP.at(), lay, SHARE, 0);
  }
}
