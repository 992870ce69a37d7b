package org.fallwright.core.statics;

import org.fallwright.core.reference.Allowances;

/** The angles of the movement: 65 equally spaced, from sat back to the end, both included. */
final class Movement {
  /** Number of angles looked at. */
  static final int ANGLES = (int) Allowances.MOVEMENT_SAMPLES.value();

  /** The movement is never followed further than this [rad]; planning allowance. */
  static final double CAP = Math.toRadians(Allowances.MOVEMENT_CAP.value());

  /** A lever of this share of the attachment height counts as lost; planning allowance. */
  static final double LOST_SHARE = Allowances.LEVER_LEAST.value();

  private Movement() {}

  static double angle(double from, double to, int i) {
    return from + (to - from) * i / (ANGLES - 1);
  }
}
