package org.fallwright.plugins.vehicle;

import java.util.Locale;

/** Which wheels pull. */
enum Drive {
  /** Rear axle drives, front axle rolls. */
  RWD(false, true, Limit.REAR_GRIP),
  /** Front axle drives, rear axle rolls. */
  FWD(true, false, Limit.FRONT_GRIP),
  /** All wheels drive. */
  AWD(true, true, Limit.ALL_GRIP);

  final boolean front;
  final boolean rear;
  final Limit limit;

  Drive(boolean front, boolean rear, Limit limit) {
    this.front = front;
    this.rear = rear;
    this.limit = limit;
  }

  /** The drive of a mode, for example "rwd". */
  static Drive of(String mode) {
    return valueOf(mode.toUpperCase(Locale.ROOT));
  }
}
