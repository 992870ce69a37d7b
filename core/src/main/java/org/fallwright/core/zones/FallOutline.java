package org.fallwright.core.zones;

import java.util.ArrayList;
import java.util.List;
import org.fallwright.core.reference.Allowances;
import org.fallwright.core.site.Position;
import org.fallwright.core.site.Shape;
import org.fallwright.core.units.Range;
import org.locationtech.jts.algorithm.Orientation;
import org.locationtech.jts.geom.Coordinate;
import org.locationtech.jts.geom.Geometry;

/**
 * What of a tree decides the ground that it covers when it falls.
 *
 * @param heightM height above the ground [m]
 * @param crownBaseM height of the crown's base above the ground [m]
 * @param crownRadiusM radius of the crown [m]
 * @param stumpDiameterM stem diameter at the cut [m]
 * @param leanDeg lean of the stem axis from the vertical [degrees]
 * @param leanAzimuthDeg direction that the tree leans towards [degrees]
 * @param crown the crown as seen from above, as corners east and north of the stem's axis where it
 *     goes through the crown [m], none of its edges bent inwards; empty: round, of its radius
 */
public record FallOutline(
    double heightM,
    double crownBaseM,
    double crownRadiusM,
    double stumpDiameterM,
    double leanDeg,
    double leanAzimuthDeg,
    List<Position> crown) {
  /** Margin beyond the tip, share of the height: planning allowance. */
  static final double TIP_SHARE = Allowances.TIP_SHARE.value();

  /** Least margin beyond the tip [m]: planning allowance. */
  static final double TIP_LEAST_M = Allowances.TIP_LEAST.value();

  /** Ground behind the stump for the butt, share of the height: planning allowance. */
  static final double BUTT_SHARE = Allowances.BUTT_SHARE.value();

  /** Least ground behind the stump for the butt [m]: planning allowance. */
  static final double BUTT_LEAST_M = Allowances.BUTT_LEAST.value();

  public FallOutline {
    Range.check("height_m", heightM, 2, 120, "m");
    Range.check("crown_base_m", crownBaseM, 0, heightM, "m");
    Range.check("crown_radius_m", crownRadiusM, 0.1, 40, "m");
    Range.check("stump_diameter_m", stumpDiameterM, 0.05, 6, "m");
    Range.check("lean_deg", leanDeg, 0, 45, "degrees");
    Range.check("lean_azimuth_deg", leanAzimuthDeg, -360, 720, "degrees");
    crown = List.copyOf(Range.present("crown", crown));
  }

  /** A tree with a round crown. */
  public FallOutline(
      double heightM,
      double crownBaseM,
      double crownRadiusM,
      double stumpDiameterM,
      double leanDeg,
      double leanAzimuthDeg) {
    this(heightM, crownBaseM, crownRadiusM, stumpDiameterM, leanDeg, leanAzimuthDeg, List.of());
  }

  /**
   * The same tree with its crown as drawn from above. Bays between branches are filled, the safe
   * side: the outline of a rubber band about the crown.
   *
   * @param drawn the crown's outline on the site plane
   * @param stump middle of the stump
   * @param cutHeightM height above the ground at which the stem's axis stands over the stump [m]
   */
  public FallOutline drawn(Geometry drawn, Position stump, double cutHeightM) {
    return about(drawn, axisInCrown(stump, cutHeightM));
  }

  /**
   * The same tree with a round crown whose middle lies off the stem's axis; the round crown about
   * the axis counts as well, for the offset is the weight's.
   *
   * @param off the offset, east and north [m]
   */
  public FallOutline offset(Position off) {
    Coordinate from = new Coordinate(0, 0);
    Coordinate to = new Coordinate(off.eastM(), off.northM());
    Geometry way =
        from.equals2D(to)
            ? Shape.FACTORY.createPoint(from)
            : Shape.FACTORY.createLineString(new Coordinate[] {from, to});
    return about(way.buffer(crownRadiusM / Math.cos(Math.PI / 64), 16), new Position(0, 0));
  }

  private FallOutline about(Geometry crown, Position axis) {
    List<Position> about = new ArrayList<>();
    Coordinate[] hull = crown.convexHull().getCoordinates();
    // the hull's ring is closed and may run either way round; corners are kept anticlockwise
    boolean left = Orientation.isCCW(hull);
    for (int i = 0; i + 1 < hull.length; i++) {
      Coordinate c = hull[left ? i : hull.length - 1 - i];
      about.add(new Position(c.x - axis.eastM(), c.y - axis.northM()));
    }
    return new FallOutline(
        heightM, crownBaseM, crownRadiusM, stumpDiameterM, leanDeg, leanAzimuthDeg, about);
  }

  /** Where the stem's axis goes through the middle of the crown's height, in plan. */
  public Position axisInCrown(Position stump, double cutHeightM) {
    double above = (crownBaseM + heightM) / 2 - cutHeightM;
    return stump.along(leanAzimuthDeg, above * Math.tan(Math.toRadians(leanDeg)));
  }

  /** Farthest that any footprint without a slide reaches from the stump [m]. */
  public double farthestM() {
    double aside = crownReachM() + reachM() * Math.tan(Math.toRadians(leanDeg));
    return Math.hypot(reachM(), Math.max(aside, stumpDiameterM));
  }

  /** How far the crown reaches from the stem's axis, whichever way [m]. */
  public double crownReachM() {
    return crown.stream()
        .mapToDouble(c -> Math.hypot(c.eastM(), c.northM()))
        .max()
        .orElse(crownRadiusM);
  }

  /** Height with the tip margin, H + max(0.1 H, 3 m) [m]. */
  public double reachM() {
    return reachM(heightM);
  }

  /** Length that the butt can slide or kick behind the stump, max(0.1 H, 2 m) [m]. */
  public double buttM() {
    return Math.max(BUTT_SHARE * heightM, BUTT_LEAST_M);
  }

  static double reachM(double heightM) {
    return heightM + Math.max(TIP_SHARE * heightM, TIP_LEAST_M);
  }

  /** Tangent of the side lean seen along the lay, positive to the lay's right. */
  double sideLean(double layDeg) {
    return Math.tan(Math.toRadians(leanDeg)) * Math.sin(Math.toRadians(leanAzimuthDeg - layDeg));
  }
}
