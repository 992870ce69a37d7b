package org.fallwright.plugins.vehicle;

import java.util.Arrays;

/**
 * Stand-ins for vehicles whose figures nobody has at hand. Every figure is a planning allowance;
 * the shares of the front axle follow what is usual, from memory. The light end of the mass counts
 * as what pulls, the heavy end as what loads the parts, and of both shares whichever is worse. A
 * figure of one's own comes before the class's; two slips of a weighbridge, an axle each, are
 * better still.
 */
enum VehicleClass {
  WAGON("four-wheel-drive-wagon", 1600, 2900, 0.48, 0.56, 2.75, 0.75, 0.50, 1.00),
  PICK_UP("pick-up", 1800, 3200, 0.45, 0.60, 3.30, 0.75, 0.55, 1.25),
  HEAVY_PICK_UP("heavy-pick-up", 2700, 5000, 0.42, 0.60, 3.90, 0.85, 0.60, 1.35),
  MEDIUM_TRUCK("medium-truck", 4500, 11_000, 0.33, 0.50, 4.20, 1.10, 0.70, 1.60),
  TRACTOR_2WD("tractor-two-wheel-drive", 2200, 4500, 0.25, 0.35, 2.20, 0.90, 0.50, 0.60),
  TRACTOR_4WD("tractor-four-wheel-drive", 3200, 7500, 0.36, 0.45, 2.40, 1.00, 0.50, 0.70),
  COMPACT_LOADER("compact-loader", 2200, 4200, 0.25, 0.40, 1.10, 0.75, 0.40, 0.60),
  SKIDDER("skidder", 8000, 15_000, 0.58, 0.65, 3.40, 1.20, 0.80, 0.90);

  /** How it is written among the parameters. */
  final String key;

  final double lightKg;
  final double heavyKg;
  final double shareLeast;
  final double shareMost;
  final double wheelbaseM;
  final double cgHeightM;
  final double hitchHeightM;
  final double overhangM;

  VehicleClass(
      String key,
      double lightKg,
      double heavyKg,
      double shareLeast,
      double shareMost,
      double wheelbaseM,
      double cgHeightM,
      double hitchHeightM,
      double overhangM) {
    this.key = key;
    this.lightKg = lightKg;
    this.heavyKg = heavyKg;
    this.shareLeast = shareLeast;
    this.shareMost = shareMost;
    this.wheelbaseM = wheelbaseM;
    this.cgHeightM = cgHeightM;
    this.hitchHeightM = hitchHeightM;
    this.overhangM = overhangM;
  }

  static VehicleClass of(String key) {
    return Arrays.stream(values()).filter(c -> c.key.equals(key)).findFirst().orElseThrow();
  }
}
