package org.fallwright.core.line;

import org.fallwright.core.reference.Hardware;

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

  private final double low;
  private final double high;

  Sheave(String name) {
    String key = "sheave." + name;
    low = Hardware.find(key).orElseGet(() -> Hardware.of(key + ".low")).value();
    high = Hardware.find(key).orElseGet(() -> Hardware.of(key + ".high")).value();
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
