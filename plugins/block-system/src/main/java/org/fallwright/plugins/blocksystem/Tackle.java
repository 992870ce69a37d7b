package org.fallwright.plugins.blocksystem;

/**
 * A simple tackle between the load and an anchor.
 *
 * <p>Hauling, with every sheave passing on the share k of the tension: the haul part leaves the
 * moving block, gain = 1 + k + … + k^(N−1), and the anchor carries the load less the haul; or it
 * leaves the fixed block, gain k times that, and the anchor carries the load and the haul. Holding,
 * friction is never credited: all parts carry load/N.
 *
 * <p>Leaves out the spread of the parts (all taken as parallel) and the weight of blocks and line.
 * The form k (1 − k^N)/(1 − k) is that of oilfield and army rigging handbooks.
 *
 * @param parts N, parts of line that pull on the moving block
 * @param efficiency k of one sheave, from above 0 to 1
 * @param fromFixed whether the haul part leaves the fixed block
 */
record Tackle(int parts, double efficiency, boolean fromFixed) {
  /** Force on the load per newton hauled, hauling. */
  double gain() {
    double sum = 0;
    double term = fromFixed ? efficiency : 1;
    for (int part = 0; part < parts; part++) {
      sum += term;
      term *= efficiency;
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
