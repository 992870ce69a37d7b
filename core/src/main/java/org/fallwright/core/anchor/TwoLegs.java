package org.fallwright.core.anchor;

import org.fallwright.core.units.Range;

/**
 * One load shared between two legs in a plane, each to an anchor of its own.
 *
 * <p>Leg 1 carries R·sin(b)/sin(a + b), leg 2 R·sin(a)/sin(a + b), with a and b the angles of the
 * load R to leg 1 and to leg 2, the load lying between them. Holds for straight legs that are both
 * tight; a load outside them slackens one, which is refused here. Statics.
 *
 * @param firstN load on leg 1 [N]
 * @param secondN load on leg 2 [N]
 */
public record TwoLegs(double firstN, double secondN) {
  /**
   * Shares a load.
   *
   * @param loadN the load [N]
   * @param toFirstDeg its angle to leg 1 [degrees]
   * @param toSecondDeg its angle to leg 2 [degrees]
   */
  public static TwoLegs share(double loadN, double toFirstDeg, double toSecondDeg) {
    Range.check("load_N", loadN, 0, 1e8, "N");
    Range.check("to_first_deg", toFirstDeg, 0, 150, "degrees");
    Range.check("to_second_deg", toSecondDeg, 0, 150, "degrees");
    double included = Range.check("included angle", toFirstDeg + toSecondDeg, 1, 150, "degrees");
    double sine = Math.sin(Math.toRadians(included));
    return new TwoLegs(
        loadN * Math.sin(Math.toRadians(toSecondDeg)) / sine,
        loadN * Math.sin(Math.toRadians(toFirstDeg)) / sine);
  }
}
