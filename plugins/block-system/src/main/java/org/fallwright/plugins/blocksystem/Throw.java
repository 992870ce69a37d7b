package org.fallwright.plugins.blocksystem;

/**
 * How far a block system takes the line in before its blocks meet, and how often it must be reset.
 *
 * <p>The blocks close by the room between them less what must stay, {@link #CLOSE_M}; in a compound
 * the second tackle closes n₁ times as fast as the first and meets first. Resets: take-up over
 * throw, rounded up, less one. The line's stretch when the load comes off for a reset is left out.
 *
 * @param metres line taken in at the load between two resets [m]
 */
record Throw(double metres) {
  /** What must stay between the blocks [m]. Planning allowance. */
  static final double CLOSE_M = 0.5;

  /** Least room that leaves a throw worth the name [m]. */
  static final double LEAST_ROOM_M = 1;

  static Throw of(Rig rig, double roomM) {
    return new Throw((roomM - CLOSE_M) / (rig.compound() ? rig.first().parts() : 1));
  }

  /** Resets for a take-up at the load. */
  int resets(double takeUpM) {
    return Math.max(0, (int) Math.ceil(takeUpM / metres * (1 - 1e-12)) - 1);
  }
}
