package org.fallwright.plugins.vehicle;

import java.util.Locale;
import org.fallwright.core.pull.PullOffer.Limit;
import org.fallwright.core.pull.Wording;

/** Which wheels keep a vehicle from being drawn to the tree. */
enum Drive {
  /** Rear axle drives, front axle rolls. */
  RWD(false, true, "the rear axle", "del eje trasero"),
  /** Front axle drives, rear axle rolls. */
  FWD(true, false, "the front axle", "del eje delantero"),
  /** All wheels drive, coupled so that each axle takes its share. */
  AWD(true, true, "all wheels", "de todas las llantas"),
  /** All wheels locked, standing. */
  LOCKED(true, true, "all wheels", "de todas las llantas");

  final boolean front;
  final boolean rear;
  final Limit limit;

  Drive(boolean front, boolean rear, String driven, String spanish) {
    this.front = front;
    this.rear = rear;
    limit =
        new Limit(
            new Wording("grip of " + driven, "agarre " + spanish),
            new Wording(
                "On this ground the wheels slip before the vehicle pulls more.",
                "En este suelo las llantas patinan antes de que el vehículo jale más."));
  }

  /** The drive of a mode, for example "rwd". */
  static Drive of(String mode) {
    return valueOf(mode.toUpperCase(Locale.ROOT));
  }
}
