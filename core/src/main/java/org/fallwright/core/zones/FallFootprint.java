package org.fallwright.core.zones;

import java.util.ArrayList;
import java.util.List;
import org.fallwright.core.reference.Allowances;
import org.fallwright.core.site.Position;
import org.fallwright.core.units.Range;
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
 * the crown, an ellipse from its base to R, half as wide as the crown's radius, or its outline as
 * drawn from above, stretched along the lay in the same way: hindmost corner to its base, foremost
 * to R. Both count as they are and pushed sideways to r + s·tan λ_v by the side lean λ_v, tan λ_v =
 * tan λ·sin(γ − lay). A slide draws stem and crown out beyond R. Heights count at full length on
 * slopes, the safe side.
 *
 * <p>Source: own reckoning; half-angle, butt and margin are planning allowances. Leaves out broken
 * wood thrown further, a tree that rolls, and at which height a drawn crown is how wide: a view
 * from above does not tell.
 */
public final class FallFootprint {
  /** Aim half-angle of a hinge that steers nothing [degrees]: planning allowance. */
  static final double AIM_LEAST_DEG = Allowances.AIM_LEAST.value();

  /** Growth of the aim half-angle with the steering share [degrees]: planning allowance. */
  static final double AIM_PER_SHARE_DEG = Allowances.AIM_PER_STEERING.value();

  /** Greatest aim half-angle [degrees]: planning allowance. */
  static final double AIM_MOST_DEG = Allowances.AIM_MOST.value();

  /** Fall of the ground along the lay beyond which the tree may slide [degrees]: as above. */
  static final double SLIDE_FROM_DEG = Allowances.SLIDE_SLOPE.value();

  /** Slide where nobody has stated one, share of the height: planning allowance. */
  static final double SLIDE_SHARE = Allowances.SLIDE_SHARE.value();

  private final Position stump;
  private final double layDeg;
  private final double halfAngleDeg;
  private final double steeringShare;
  private final double lengthM;
  private final List<Polygon> pieces;
  private final List<Edges> pieceEdges;
  private Geometry geometry;
  private Edges edges;

  private FallFootprint(
      Position stump,
      double layDeg,
      double steeringShare,
      double halfAngleDeg,
      double lengthM,
      List<Polygon> pieces) {
    this.stump = stump;
    this.layDeg = layDeg;
    this.halfAngleDeg = halfAngleDeg;
    this.steeringShare = steeringShare;
    this.lengthM = lengthM;
    this.pieces = List.copyOf(pieces);
    this.pieceEdges = new ArrayList<>(pieces.size());
    for (Polygon p : pieces) {
      pieceEdges.add(new Edges(p));
    }
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
    List<Polygon> pieces = new ArrayList<>(4);
    boolean leansAside = Math.abs(push) * (reach + slideM) > 1e-6;
    List<double[]> crown =
        outline.crown().isEmpty()
            ? Sweep.ellipse(outline.crownBaseM(), reach, outline.crownRadiusM())
            : Sweep.stretched(outline.crown(), layDeg, outline.crownBaseM(), reach);
    for (double p : leansAside ? new double[] {0, push} : new double[] {0}) {
      pieces.add(sweep.crown(crown, slideM, p));
      pieces.add(sweep.strip(outline.stumpDiameterM() / 2, reach + slideM, outline.buttM(), p));
    }
    return new FallFootprint(stump, layDeg, steeringShare, half, reach, pieces);
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

  /** Share of the hinge's steering capacity in use. */
  public double steeringShare() {
    return steeringShare;
  }

  /** Aim half-angle [degrees]. */
  public double halfAngleDeg() {
    return halfAngleDeg;
  }

  /** R, from the stump to the end of the tip margin, without a slide [m]. */
  public double lengthM() {
    return lengthM;
  }

  /** The ground covered [m]; worked out when first asked for. */
  public synchronized Geometry geometry() {
    if (geometry == null) {
      Geometry all = pieces.get(0);
      for (Polygon p : pieces.subList(1, pieces.size())) {
        all = OverlayNGRobust.overlay(all, p, OverlayNG.UNION);
      }
      geometry = all;
    }
    return geometry;
  }

  /** Whether a point lies in the footprint. */
  public boolean contains(Position p) {
    for (Edges e : pieceEdges) {
      if (e.contains(p.eastM(), p.northM())) {
        return true;
      }
    }
    return false;
  }

  /** The edges of each piece. */
  List<Edges> pieceEdges() {
    return pieceEdges;
  }

  /** The gap to another outline: that of the nearest piece, so the whole is not needed. */
  Edges.Gap gapTo(Edges other) {
    Edges.Gap best = null;
    for (Edges piece : pieceEdges) {
      Edges.Gap gap =
          piece.gapTo(other, best == null ? Double.POSITIVE_INFINITY : best.distanceM());
      if (gap != null && (best == null || gap.distanceM() < best.distanceM())) {
        best = gap;
      }
      if (best.distanceM() <= 0) {
        break;
      }
    }
    return best;
  }

  /** The edges of the whole. */
  synchronized Edges edges() {
    if (edges == null) {
      edges = new Edges(geometry());
    }
    return edges;
  }
}
