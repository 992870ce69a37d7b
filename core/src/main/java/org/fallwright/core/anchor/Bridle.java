package org.fallwright.core.anchor;

import java.util.Locale;
import java.util.Optional;
import org.fallwright.core.line.Point3;

/**
 * Shares of a load between two legs that meet at a point in space, per newton of the load.
 *
 * <p>Drawn by hand the load is never quite in the plane of the legs; tight, they swing into it
 * about the line between their anchors. So the load's direction is laid into that plane and its
 * whole amount shared there ({@link TwoLegs}). Refused where it stands farther off the plane than
 * {@link #OFF_PLANE_DEG}, where it lies outside the legs, so that one would be slack, and where
 * they stand wider than {@link #WIDEST_DEG}, when each carries more than the load. Statics;
 * weightless legs.
 *
 * @param first share of the first leg
 * @param second share of the second
 * @param refused why no share is given; then both are 0
 */
public record Bridle(double first, double second, Optional<String> refused) {
  /** Farthest that a load may stand off the plane of the legs [degrees]; planning allowance. */
  public static final double OFF_PLANE_DEG = 15;

  /** Widest angle between the legs [degrees]; planning allowance. */
  public static final double WIDEST_DEG = 120;

  private static final double NARROWEST_DEG = 1;
  private static final double SHORTEST_M = 0.3;

  /**
   * Shares a load.
   *
   * @param apex where the legs meet
   * @param first end of the first leg
   * @param second end of the second leg
   * @param force force of the line on the apex; only its direction counts
   */
  public static Bridle of(Point3 apex, Point3 first, Point3 second, Point3 force) {
    Point3 one = first.minus(apex);
    Point3 two = second.minus(apex);
    if (Math.min(one.length(), two.length()) < SHORTEST_M) {
      return refuse("a leg is shorter than %.1f m", SHORTEST_M);
    }
    double included = one.angleDeg(two);
    if (included < NARROWEST_DEG || included > WIDEST_DEG) {
      return refuse(
          "its legs stand at %.0f degrees; from %.0f to %.0f is asked",
          included, NARROWEST_DEG, WIDEST_DEG);
    }
    Point3 back = force.times(-1);
    double c = Math.cos(Math.toRadians(included));
    double ca = Math.cos(Math.toRadians(back.angleDeg(one)));
    double cb = Math.cos(Math.toRadians(back.angleDeg(two)));
    // parts along the legs of the unit vector's projection on their plane
    double t1 = (ca - cb * c) / (1 - c * c);
    double t2 = (cb - ca * c) / (1 - c * c);
    double inPlane = Math.sqrt(Math.max(0, t1 * ca + t2 * cb));
    if (inPlane < Math.cos(Math.toRadians(OFF_PLANE_DEG))) {
      return refuse(
          "the load stands %.0f degrees off the plane of its legs; %.0f is the most",
          Math.toDegrees(Math.acos(Math.min(1, inPlane))), OFF_PLANE_DEG);
    }
    if (t1 < 0 || t2 < 0) {
      return refuse("the load lies outside its legs, so one of them is slack");
    }
    double toFirst = Math.toDegrees(Math.acos(Math.min(1, ca / inPlane)));
    TwoLegs legs = TwoLegs.share(1, Math.min(toFirst, included), Math.max(0, included - toFirst));
    return new Bridle(legs.firstN(), legs.secondN(), Optional.empty());
  }

  private static Bridle refuse(String why, Object... values) {
    return new Bridle(0, 0, Optional.of(String.format(Locale.ROOT, why, values)));
  }
}
