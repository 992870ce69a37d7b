package org.fallwright.core.tree;

import org.fallwright.core.site.Position;
import org.fallwright.core.site.Shape;
import org.fallwright.core.site.SubjectTree;
import org.locationtech.jts.geom.Geometry;
import org.locationtech.jts.geom.Point;

/**
 * A crown as sketched from above or traced from the air. Its weight is taken to lie over the
 * outline's middle (its centroid): a crown as dense on one side as on the other. A crown that is
 * heavier on one side than it is wide there weighs more to that side than this says.
 *
 * @param middle the middle of its area, on the site plane
 * @param areaM2 its area [m²]
 * @param radiusM radius of a circle of that area [m], for drawing only
 */
public record CrownOutline(Position middle, double areaM2, double radiusM) {
  /** The figures of that outline. */
  public static CrownOutline of(Shape.Polygon outline) {
    Geometry g = outline.geometry();
    Point c = g.getCentroid();
    return new CrownOutline(
        new Position(c.getX(), c.getY()), g.getArea(), Math.sqrt(g.getArea() / Math.PI));
  }

  /**
   * Offset of its middle from the stem's axis [east, north; m], the axis taken where it goes
   * through the middle of the crown's height: what is over the stump on a leaning stem counts as
   * offset against the lean.
   *
   * @param cutHeightM height of the cut above the ground [m]; the axis stands over the stump there
   */
  public Position offsetM(SubjectTree tree, double cutHeightM) {
    double high = (tree.crownBaseM() + tree.heightM().value()) / 2 - cutHeightM;
    Position axis =
        tree.stump()
            .at()
            .along(
                tree.leanAzimuthDeg().value(),
                high * Math.tan(Math.toRadians(tree.leanDeg().value())));
    return new Position(middle.eastM() - axis.eastM(), middle.northM() - axis.northM());
  }
}
