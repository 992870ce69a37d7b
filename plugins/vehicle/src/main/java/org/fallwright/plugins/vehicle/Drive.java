package org.fallwright.plugins.vehicle;

import java.util.Locale;

/** Which wheels keep a vehicle from being drawn to the tree. */
enum Drive {
  /** Rear axle drives, front axle rolls. */
  RWD(false, true, "grip of the rear axle"),
  /** Front axle drives, rear axle rolls. */
  FWD(true, false, "grip of the front axle"),
  /** All wheels drive, coupled so that each axle takes its share. */
  AWD(true, true, "grip of all wheels"),
  /** All wheels locked, standing. */
  LOCKED(true, true, "grip of all wheels");

  final boolean front;
  final boolean rear;
  final String limit;

  Drive(boolean front, boolean rear, String limit) {
    this.front = front;
    this.rear = rear;
    this.limit = limit;
  }

  /** The drive of a mode, for example "rwd". */
  static Drive of(String mode) {
    return valueOf(mode.toUpperCase(Locale.ROOT));
  }
}
