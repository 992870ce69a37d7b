package org.fallwright.core.advice;

import org.fallwright.core.units.DisplayUnits;
import org.fallwright.core.units.DisplayUnits.Measure;

/**
 * Shows the ends of a range so that what is read never lies outside it: a lower end is rounded up
 * and an upper end down, in the person's units and in the other ones.
 */
final class Inward {
  private static final double NOISE = 1e-9;

  private final DisplayUnits in;

  Inward(DisplayUnits in) {
    this.in = in;
  }

  /** A hinge thickness at its lower end [m]. */
  String thicknessFrom(double m) {
    return in.both(u -> u.smallLength(up(m, small(u))));
  }

  /** A hinge thickness, or a gape, at its upper end [m]. */
  String thicknessTo(double m) {
    return in.both(u -> u.smallLength(down(m, small(u))));
  }

  /** A height or length at its lower end [m]. */
  String lengthFrom(double m) {
    return in.both(u -> u.length(up(m, large(u, m))));
  }

  /** A height or length at its upper end [m]. */
  String lengthTo(double m) {
    return in.both(u -> u.length(down(m, large(u, m))));
  }

  /** A wind at its upper end [m/s]. */
  String windTo(double mps) {
    return in.both(u -> u.speed(down(mps, 0.1 * u.unit(Measure.SPEED).inSi())));
  }

  private static double small(DisplayUnits u) {
    return u == DisplayUnits.US ? 0.1 * u.unit(Measure.SMALL_LENGTH).inSi() : 0.001;
  }

  private static double large(DisplayUnits u, double m) {
    double foot = u.unit(Measure.LENGTH).inSi();
    if (u == DisplayUnits.US) {
      return m > 99 * foot ? foot : foot / 12;
    }
    return m < 10 ? 0.01 : 0.1;
  }

  private static double up(double si, double quantum) {
    return Math.ceil(si / quantum - NOISE) * quantum;
  }

  private static double down(double si, double quantum) {
    return Math.floor(si / quantum + NOISE) * quantum;
  }
}
