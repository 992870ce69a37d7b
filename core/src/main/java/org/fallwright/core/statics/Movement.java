package org.fallwright.core.statics;

/** The angles of the movement: 65 equally spaced, from sat back to the end, both included. */
final class Movement {
  /** Number of angles looked at. */
  static final int ANGLES = 65;

  /** The movement is never followed further than this [rad]; planning allowance. */
  static final double CAP = Math.toRadians(60);

  /** A lever of this share of the attachment height counts as lost; planning allowance. */
  static final double LOST_SHARE = 0.1;

  private Movement() {}

  static double angle(double from, double to, int i) {
    return from + (to - from) * i / (ANGLES - 1);
  }
}
