package org.fallwright.plugins.api;

import org.fallwright.core.units.DisplayUnits;

/**
 * Amounts for the sentences of a source, which do not know the reader's units: both are said, such
 * as "2.86 m (9 ft 5 in)".
 */
public final class Amount {
  private Amount() {}

  /**
   * A length on the site.
   *
   * @param m the length [m]
   * @return it in metres and in feet
   */
  public static String length(double m) {
    return DisplayUnits.METRIC.both(u -> u.length(m));
  }

  /**
   * A length in the hand, such as a stroke.
   *
   * @param m the length [m]
   * @return it in millimetres or centimetres, and in inches
   */
  public static String smallLength(double m) {
    return DisplayUnits.METRIC.both(u -> u.smallLength(m));
  }

  /**
   * A force that is needed or that loads something.
   *
   * @param n the force [N]
   * @return it in newtons and in pounds-force, never as less than it is
   */
  public static String force(double n) {
    return DisplayUnits.METRIC.both(u -> u.forceAtLeast(n));
  }

  /**
   * A force that something gives or bears.
   *
   * @param n the force [N]
   * @return it in newtons and in pounds-force, never as more than it is
   */
  public static String forceAtMost(double n) {
    return DisplayUnits.METRIC.both(u -> u.forceAtMost(n));
  }
}
