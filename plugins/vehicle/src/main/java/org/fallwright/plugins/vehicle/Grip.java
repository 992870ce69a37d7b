package org.fallwright.plugins.vehicle;

import java.util.Set;
import org.fallwright.core.units.Range;

/**
 * What the tyres of each axle give of its load, and whether one axle may give more than the other.
 *
 * <p>An open differential gives both wheels of an axle the same, so that the wheel on the worse
 * ground governs both; a locked one lets each give what it has. An open centre differential does
 * the same between the axles. A relation of any text on vehicle mechanics.
 *
 * @param front thrust over load of the front axle
 * @param rear the same of the rear axle
 * @param even whether an open centre differential makes both axles give the same
 */
record Grip(double front, double rear, boolean even) {
  /**
   * Grip of the worse wheel over the ground's low where an axle's differential is open and nothing
   * is said of the worse side. Planning allowance.
   */
  static final double WORSE_WHEEL = 0.8;

  /** What can be locked. */
  enum Lock {
    FRONT,
    CENTRE,
    REAR
  }

  Grip {
    Range.check("grip_front", front, 0, 2, "");
    Range.check("grip_rear", rear, 0, 2, "");
  }

  /** The same grip under every wheel, and every wheel giving what it has. */
  static Grip everywhere(double grip) {
    return new Grip(grip, grip, false);
  }

  /**
   * Grip through the differentials.
   *
   * @param grip of the ground that the vehicle stands on
   * @param worse of the ground under the wheels of one side; null: not stated
   * @param locked which differentials are locked; null: not stated, which counts as open where a
   *     worse side is stated and else is passed over
   */
  static Grip of(double grip, Double worse, Set<Lock> locked) {
    if (worse == null && locked == null) {
      return everywhere(grip);
    }
    Set<Lock> locks = locked == null ? Set.of() : locked;
    return new Grip(
        axle(grip, worse, locks.contains(Lock.FRONT)),
        axle(grip, worse, locks.contains(Lock.REAR)),
        locked != null && !locks.contains(Lock.CENTRE));
  }

  private static double axle(double grip, Double worse, boolean locked) {
    if (worse == null) {
      return locked ? grip : WORSE_WHEEL * grip;
    }
    double low = Math.min(grip, worse);
    return locked ? (grip + low) / 2 : low;
  }

  /** Wheels that are braked each for itself. */
  static Grip braked(double grip, Double worse) {
    return everywhere(worse == null ? grip : (grip + Math.min(grip, worse)) / 2);
  }
}
