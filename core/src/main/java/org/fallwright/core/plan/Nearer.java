package org.fallwright.core.plan;

import java.util.Optional;
import org.fallwright.core.line.Point3;
import org.fallwright.core.units.DisplayUnits;
import org.fallwright.core.units.Units;

/** How far to stand nearer, or farther off, so that a leg has another length. */
final class Nearer {
  private Nearer() {}

  /**
   * How far the end of a leg must go over level ground towards its other end so that the leg is
   * shorter, up to the next half metre or foot. Geometry, d = h - sqrt((l - s)² - z²).
   *
   * @param leg from the end to be moved to the other [m]
   * @param shorterM by how much it must be shorter, s [m]
   * @return the words; empty where no way along the ground does it
   */
  static Optional<String> by(Point3 leg, double shorterM, DisplayUnits in) {
    double level = Math.hypot(leg.e(), leg.n());
    double left = leg.length() - shorterM;
    double square = left * left - leg.up() * leg.up();
    if (left <= 0 || square <= 0) {
      return Optional.empty();
    }
    return Optional.of("stand " + up(level - Math.sqrt(square), in) + " nearer");
  }

  /** The least length of paces that is no less, as words: half metres or feet. */
  static String up(double m, DisplayUnits in) {
    double step = in == DisplayUnits.US ? Units.FOOT : HALF_M;
    return in.length(Math.ceil(m / step - 1e-9) * step);
  }

  private static final double HALF_M = 0.5;
}
