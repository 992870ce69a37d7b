package org.fallwright.plugins.blocksystem;

/**
 * A simple tackle between the load and an anchor.
 *
 * <p>Hauling, the line passes the sheaves of both blocks in turn and each leaves the share k of its
 * block: gain = 1 + k₁ + k₁k₂ + …, one term a part, where the haul part leaves the moving block,
 * and the anchor carries the load less the haul; or k₁(1 + k₂ + k₂k₃ + …) where it leaves the fixed
 * block, and the anchor carries the load and the haul. With one k for all these are (1 − k^N)/(1 −
 * k) and k times that. Holding, friction is never credited: all parts carry load/N.
 *
 * <p>Leaves out the spread of the parts (all taken as parallel) and the weight of blocks and line.
 * The form k (1 − k^N)/(1 − k) is that of oilfield and army rigging handbooks.
 *
 * @param parts N, parts of line that pull on the moving block
 * @param moving k of each sheave of the moving block, from above 0 to 1
 * @param fixed the same of the fixed block
 * @param fromFixed whether the haul part leaves the fixed block
 */
record Tackle(int parts, double moving, double fixed, boolean fromFixed) {
  /** A tackle whose sheaves are all alike. */
  Tackle(int parts, double efficiency, boolean fromFixed) {
    this(parts, efficiency, efficiency, fromFixed);
  }

  /** Force on the load per newton hauled, hauling. */
  double gain() {
    boolean atFixed = fromFixed;
    double term = 1;
    if (fromFixed) {
      term = fixed;
      atFixed = false;
    }
    double sum = 0;
    for (int part = 0; part < parts; part++) {
      sum += term;
      term *= atFixed ? fixed : moving;
      atFixed = !atFixed;
    }
    return sum;
  }

  /** Tension of the haul part per newton at the load, hauling: the most in the tackle line. */
  double haulHauling() {
    return 1 / gain();
  }

  /** The same, holding. */
  double haulHolding() {
    return 1.0 / parts;
  }

  /** Load on the fixed block and its anchor per newton at the load, hauling. */
  double anchorHauling() {
    return anchor(haulHauling());
  }

  /** The same, holding. */
  double anchorHolding() {
    return anchor(haulHolding());
  }

  private double anchor(double haul) {
    return fromFixed ? 1 + haul : 1 - haul;
  }
}
