package org.fallwright.core.zones;

import org.fallwright.core.site.Position;
import org.fallwright.core.units.Range;
import org.locationtech.jts.geom.Coordinate;
import org.locationtech.jts.geom.Geometry;
import org.locationtech.jts.geom.Polygon;
import org.locationtech.jts.operation.overlayng.OverlayNG;
import org.locationtech.jts.operation.overlayng.OverlayNGRobust;

/**
 * Where the tree can come to lie on a lay: its felled outline swept about the middle of the stump
 * over the aim half-angle to each side.
 *
 * <p>Outline, s along the lay and r to its right, a height above the ground landing at s = that
 * height: the stem, |r| ≤ Ds/2 from −max(0.1 H, 2 m) behind the stump to R = H + max(0.1 H, 3 m);
 * the crown, an ellipse from its base to R, half as wide as the crown's radius. Both count as they
 * are and pushed sideways to r + s·tan λ_v by the side lean λ_v, tan λ_v = tan λ·sin(γ − lay). A
 * slide draws stem and crown out beyond R. Heights count at full length on slopes, the safe side.
 *
 * <p>Source: own reckoning; half-angle, butt and margin are planning allowances. Leaves out broken
 * wood thrown further and a tree that rolls.
 */
public final class FallFootprint {
  /** Aim half-angle of a hinge that steers nothing [degrees]: planning allowance. */
  static final double AIM_LEAST_DEG = 5;

  /** Growth of the aim half-angle with the steering share [degrees]: planning allowance. */
  static final double AIM_PER_SHARE_DEG = 20;

  /** Greatest aim half-angle [degrees]: planning allowance. */
  static final double AIM_MOST_DEG = 30;

  /** Fall of the ground along the lay beyond which the tree may slide [degrees]: as above. */
  static final double SLIDE_FROM_DEG = 10;

  /** Slide where nobody has stated one, share of the height: planning allowance. */
  static final double SLIDE_SHARE = 0.5;

  private final Position stump;
  private final double layDeg;
  private final double halfAngleDeg;
  private final double lengthM;
  private final Geometry geometry;
  private final Edges edges;

  private FallFootprint(
      Position stump, double layDeg, double halfAngleDeg, double lengthM, Geometry geometry) {
    this.stump = stump;
    this.layDeg = layDeg;
    this.halfAngleDeg = halfAngleDeg;
    this.lengthM = lengthM;
    this.geometry = geometry;
    this.edges = new Edges(geometry);
  }

  /**
   * The footprint of a lay.
   *
   * @param outline the tree
   * @param stump middle of the stump
   * @param layDeg intended fall direction [degrees]
   * @param steeringShare share of the hinge's steering capacity in use; may be infinite
   * @param slideM slide beyond the tip margin [m], see {@link #slideM}
   */
  public static FallFootprint of(
      FallOutline outline, Position stump, double layDeg, double steeringShare, double slideM) {
    Range.check("lay_deg", layDeg, -360, 720, "degrees");
    Range.check("slide_m", slideM, 0, 500, "m");
    double half = halfAngleDeg(steeringShare);
    double reach = outline.reachM();
    double push = outline.sideLean(layDeg);
    Sweep sweep = new Sweep(stump, layDeg, half);
    Geometry all = pieces(sweep, outline, slideM, 0);
    if (Math.abs(push) * (reach + slideM) > 1e-6) {
      all = union(all, pieces(sweep, outline, slideM, push));
    }
    return new FallFootprint(stump, layDeg, half, reach, all);
  }

  private static Geometry pieces(Sweep sweep, FallOutline o, double slideM, double push) {
    double reach = o.reachM();
    Polygon stem = sweep.strip(o.stumpDiameterM() / 2, reach + slideM, o.buttM(), push);
    return union(stem, sweep.crown(o.crownBaseM(), reach, o.crownRadiusM(), slideM, push));
  }

  private static Geometry union(Geometry a, Geometry b) {
    return OverlayNGRobust.overlay(a, b, OverlayNG.UNION);
  }

  /**
   * Aim half-angle min(30, 5 + 20·share) [degrees].
   *
   * @param steeringShare share of the hinge's steering capacity in use, 0 or more; may be infinite
   */
  public static double halfAngleDeg(double steeringShare) {
    if (!(steeringShare >= 0)) {
      throw new IllegalArgumentException(
          "steering_share is " + steeringShare + "; it must be 0 or more");
    }
    return Math.min(AIM_MOST_DEG, AIM_LEAST_DEG + AIM_PER_SHARE_DEG * steeringShare);
  }

  /**
   * How far the felled tree may slide on: nothing unless the ground falls more than 10° along the
   * lay; then the stated slide, else half the height [m].
   *
   * @param heightM height of the tree [m]
   * @param fallDeg fall of the ground along the lay, positive downhill [degrees]
   * @param statedM slide that the person states [m]; null: none stated
   */
  public static double slideM(double heightM, double fallDeg, Double statedM) {
    if (!(fallDeg > SLIDE_FROM_DEG)) {
      Range.check("fall_deg", fallDeg, -90, 90, "degrees");
      return 0;
    }
    return statedM != null ? statedM : SLIDE_SHARE * heightM;
  }

  public Position stump() {
    return stump;
  }

  public double layDeg() {
    return layDeg;
  }

  /** Aim half-angle [degrees]. */
  public double halfAngleDeg() {
    return halfAngleDeg;
  }

  /** R, from the stump to the end of the tip margin, without a slide [m]. */
  public double lengthM() {
    return lengthM;
  }

  /** The ground covered [m]. */
  public Geometry geometry() {
    return geometry;
  }

  /** Whether a point lies in the footprint or on its edge. */
  public boolean contains(Position p) {
    return edges.contains(new Coordinate(p.eastM(), p.northM()));
  }

  Edges edges() {
    return edges;
  }
}
