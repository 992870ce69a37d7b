package org.fallwright.core.anchor;

import java.util.Locale;
import java.util.Optional;
import org.fallwright.core.line.Point3;

/**
 * A load shared between two legs that meet at a point in space.
 *
 * <p>Tight legs swing about the line between their anchors until the load lies in their plane; the
 * point where they meet is swung there from where it is drawn, the load keeping its direction. The
 * load is then shared in that plane ({@link TwoLegs}), and each anchor is pulled along its swung
 * leg, so that a load that rises lifts both. Refused where the point would swing by more than
 * {@link #SWING_DEG}, where the load lies outside the legs, so that one would be slack, and where
 * they stand wider than {@link #WIDEST_DEG}, when each carries more than the load. Statics; legs
 * without weight or stretch.
 *
 * @param first share of the first leg, per newton of the load
 * @param second share of the second
 * @param firstPull direction of the pull on the first anchor
 * @param secondPull direction of the pull on the second
 * @param refused why no share is given; then both are 0
 */
public record Bridle(
    double first, double second, Point3 firstPull, Point3 secondPull, Optional<String> refused) {
  /** Farthest that the legs may swing from where they are drawn [degrees]; planning allowance. */
  public static final double SWING_DEG = 45;

  /** Widest angle between the legs [degrees]; planning allowance. */
  public static final double WIDEST_DEG = 120;

  private static final double NARROWEST_DEG = 1;
  private static final double SHORTEST_M = 0.3;

  /**
   * Shares a load.
   *
   * @param apex where the legs meet, as drawn
   * @param first anchor's end of the first leg
   * @param second anchor's end of the second leg
   * @param force force of the line on the apex; only its direction counts
   */
  public static Bridle of(Point3 apex, Point3 first, Point3 second, Point3 force) {
    Point3 drawn = apex.minus(first);
    if (Math.min(drawn.length(), apex.minus(second).length()) < SHORTEST_M) {
      return refuse("a leg is shorter than %.1f m", SHORTEST_M);
    }
    double included = drawn.angleDeg(apex.minus(second));
    if (included < NARROWEST_DEG || included > WIDEST_DEG) {
      return refuse(
          "its legs stand at %.0f degrees; from %.0f to %.0f is asked",
          included, NARROWEST_DEG, WIDEST_DEG);
    }
    Point3 between = second.minus(first);
    Point3 axis = between.times(1 / between.length());
    Point3 foot = axis.times(drawn.dot(axis));
    Point3 out = drawn.minus(foot);
    Point3 pull = force.minus(axis.times(force.dot(axis)));
    double swing = pull.length() < 1e-9 * force.length() ? 180 : out.angleDeg(pull);
    if (swing > SWING_DEG) {
      return refuse(
          "its legs would swing by %.0f degrees from where they are drawn; %.0f is the most",
          swing, SWING_DEG);
    }
    Point3 one = foot.plus(pull.times(out.length() / pull.length()));
    Point3 other = one.minus(between);
    double toFirst = force.angleDeg(one);
    double toSecond = force.angleDeg(other);
    if (Math.max(toFirst, toSecond) > included + 1e-6) {
      return refuse("the load lies outside its legs, so one of them is slack");
    }
    TwoLegs legs = TwoLegs.share(1, Math.min(toFirst, included), Math.max(0, included - toFirst));
    return new Bridle(legs.firstN(), legs.secondN(), one, other, Optional.empty());
  }

  private static Bridle refuse(String why, Object... values) {
    Point3 none = new Point3(0, 0, 0);
    return new Bridle(0, 0, none, none, Optional.of(String.format(Locale.ROOT, why, values)));
  }
}
