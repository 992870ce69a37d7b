package org.fallwright.core.site;

import java.math.BigDecimal;
import java.math.MathContext;
import java.util.ArrayList;
import java.util.List;
import org.fallwright.core.units.Range;

/**
 * Ground along which a vehicle or people can stand anywhere: a driveway, a verge, the edge of a
 * meadow. The planner tries a place every so many metres, each a spot of its own named after the
 * strip and its distance from the strip's beginning, as "Lane 12.5 m".
 *
 * <p>A strip wider than its step has rows of places beside its middle line too. The ground rises or
 * falls evenly from one end to the other and is level across; what lies between is left out.
 *
 * @param id its name on the plan
 * @param points its middle line, at least two
 * @param fix how the points were set
 * @param statedErrorM the person's own position error [m], or null for the usual one of the fix
 * @param groundFromM elevation of the ground at the first point above the site's height datum [m]
 * @param groundToM the same at the last point [m]
 * @param widthM its clear width [m]
 * @param stepM distance between places tried [m]
 * @param oneWay whether a vehicle on it faces along it, from the first point to the last, and has
 *     its clear way up to the last; else it faces as it likes and no clear way is stated
 * @param surface key of the surface table
 * @param wet whether the surface is wet
 * @param land whose land it is; null: not stated
 */
public record Strip(
    String id,
    List<Position> points,
    Fix fix,
    Double statedErrorM,
    double groundFromM,
    double groundToM,
    double widthM,
    double stepM,
    boolean oneWay,
    String surface,
    boolean wet,
    String land) {
  /** Most places on one strip; more would be no finer plan, only a slower one. */
  private static final int MOST = 500;

  /** Shortest piece of its middle line [m]. */
  private static final double SHORTEST_M = 0.1;

  public Strip {
    Range.text("id", id);
    points = List.copyOf(Range.present("points", points));
    if (points.size() < 2) {
      throw new IllegalArgumentException(
          "points has " + points.size() + " points; it must have at least 2");
    }
    for (int i = 1; i < points.size(); i++) {
      Range.check(
          "points nearest to each other",
          points.get(i - 1).distanceTo(points.get(i)),
          SHORTEST_M,
          4 * Position.FARTHEST,
          "m");
    }
    Range.present("fix", fix);
    Range.checkOrNull("stated_error_m", statedErrorM, 0, 100, "m");
    Range.check("ground_from_m", groundFromM, -500, 9000, "m");
    Range.check("ground_to_m", groundToM, -500, 9000, "m");
    Range.check("width_m", widthM, 0.5, 500, "m");
    Range.check("step_m", stepM, 0.5, 200, "m");
    Range.text("surface", surface);
    Range.check("places", count(points, widthM, stepM), 1, MOST, "");
    Range.check("grade", grade(points, groundFromM, groundToM), -30, 30, "degrees");
  }

  private static double length(List<Position> points) {
    double length = 0;
    for (int i = 1; i < points.size(); i++) {
      length += points.get(i - 1).distanceTo(points.get(i));
    }
    return length;
  }

  private static int along(List<Position> points, double step) {
    return (int) Math.min(1e6, Math.floor(length(points) / step + 1e-9) + 1);
  }

  private static int beside(double width, double step) {
    return (int) Math.floor(width / 2 / step + 1e-9);
  }

  private static double count(List<Position> points, double width, double step) {
    return (double) along(points, step) * (1 + 2 * beside(width, step));
  }

  private static double grade(List<Position> points, double from, double to) {
    return Math.toDegrees(Math.atan((to - from) / length(points)));
  }

  /**
   * The places tried, from its beginning, at each distance from left to right.
   *
   * @param tree where the tree stands: of a strip that is not one-way the slope counts as rising
   *     where it rises away from there
   */
  public List<Spot> places(Position tree) {
    List<Spot> places = new ArrayList<>();
    double length = length(points);
    int rows = beside(widthM, stepM);
    for (int i = 0; i < along(points, stepM); i++) {
      double at = Math.min(i * stepM, length);
      for (int row = -rows; row <= rows; row++) {
        places.add(place(at, row * stepM, length, tree));
      }
    }
    return places;
  }

  private Spot place(double at, double aside, double length, Position tree) {
    int leg = 1;
    double begun = 0;
    double legLength = points.get(0).distanceTo(points.get(1));
    while (leg < points.size() - 1 && begun + legLength <= at) {
      begun += legLength;
      leg++;
      legLength = points.get(leg - 1).distanceTo(points.get(leg));
    }
    double azimuth = points.get(leg - 1).azimuthTo(points.get(leg));
    Position place =
        points
            .get(leg - 1)
            .along(azimuth, Math.min(at - begun, legLength))
            .along(azimuth + 90, aside);
    double ground = groundFromM + (groundToM - groundFromM) * at / length;
    double away = Math.cos(Math.toRadians(azimuth - tree.azimuthTo(place)));
    double grade = grade(points, groundFromM, groundToM);
    return new Spot(
        name(at, aside),
        new Place(place, ground, fix, statedErrorM),
        oneWay ? azimuth : null,
        surface,
        wet,
        oneWay || away >= 0 ? grade : -grade,
        oneWay ? Double.valueOf(Math.min(1000, length - at)) : null,
        land);
  }

  private String name(double at, double aside) {
    String along = id + " " + metres(at) + " m";
    return aside == 0
        ? along
        : along + ", " + metres(Math.abs(aside)) + " m " + (aside < 0 ? "left" : "right");
  }

  private static String metres(double m) {
    BigDecimal short9 = new BigDecimal(m).round(new MathContext(9)).stripTrailingZeros();
    return m == 0 ? "0" : short9.toPlainString();
  }
}
