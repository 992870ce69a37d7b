package org.fallwright.core.statics;

/**
 * A point of the pull curve with its band.
 *
 * @param lineInM line taken in from slack: slack and the shortening of the first leg, what line and
 *     stem stretch left out [m]
 * @param lowN 5th percentile of the tension that moves the tree there [N]; never below 0
 * @param nominalN the tension with everything as entered [N]; never below 0
 * @param highN 95th percentile [N]; infinite where the lever is lost too often
 */
public record BandPoint(double lineInM, double lowN, double nominalN, double highN) {
  /** The band is reckoned at every so many angles of the movement. */
  static final int EVERY = 4;
}
