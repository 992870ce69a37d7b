package org.fallwright.core.line;

import org.fallwright.core.reference.Figure;
import org.fallwright.core.reference.Hardware;
import org.fallwright.core.site.Gear;

/**
 * Share k of the tension that a sheave passes on while hauling, by its kind. The low end counts
 * where the pull is reckoned; while holding no friction is ever credited.
 */
public enum Sheave {
  WIRE_ON_ROLLERS("wire-roller"),
  WIRE_ON_PLAIN_BEARINGS("wire-plain"),
  /** A tenth lost to each sheave. */
  TACKLE("tackle"),
  FIBRE_ON_BALL_BEARINGS("fibre-bearing"),
  FIBRE_ON_A_BUSH("fibre-bushed"),
  RESCUE_PULLEY("rescue"),
  /** A connector that a rope is led through. */
  CONNECTOR("carabiner");

  private final Figure lowest;
  private final double low;
  private final double high;

  Sheave(String name) {
    String key = "sheave." + name;
    lowest = Hardware.find(key).orElseGet(() -> Hardware.of(key + ".low"));
    low = lowest.value();
    high = Hardware.find(key).orElseGet(() -> Hardware.of(key + ".high")).value();
  }

  /** What a block passes on while hauling: as stated, else the low end of its sheave's kind. */
  public static Share of(Gear.Block block) {
    if (block.efficiency() != null) {
      return Share.stated("tension that the block passes on, hauling", block.efficiency());
    }
    return Share.of(valueOf(block.sheave().name()).lowest);
  }

  /** The low end of what is known of k. */
  public double low() {
    return low;
  }

  /** The high end. */
  public double high() {
    return high;
  }
}
