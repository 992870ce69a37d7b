package org.fallwright.plugins.blocksystem;

/**
 * A block system as rigged: a simple tackle, or a compound of two, the second hauling on the haul
 * part of the first.
 *
 * <p>In a compound the haul part of the first leaves its moving block, towards the anchor that both
 * fixed blocks are on, and the second pulls it that way. Gain and parts are the products of the
 * two; that anchor carries the load, less or plus the haul as the haul part of the second leaves
 * the moving or the fixed block. Balance of forces; all parts taken as parallel.
 *
 * @param first the tackle at the load
 * @param second the tackle that hauls on it; null: a simple system
 */
record Rig(Tackle first, Tackle second) {
  /** A simple system. */
  static Rig simple(Tackle tackle) {
    return new Rig(tackle, null);
  }

  boolean compound() {
    return second != null;
  }

  /** Metres hauled for a metre at the load. */
  int parts() {
    return first.parts() * (compound() ? second.parts() : 1);
  }

  /** Force on the load per newton hauled, hauling. */
  double gain() {
    return first.gain() * (compound() ? second.gain() : 1);
  }

  /** Tension of the last haul part per newton at the load, hauling. */
  double haulHauling() {
    return 1 / gain();
  }

  /** The same, holding. */
  double haulHolding() {
    return 1.0 / parts();
  }

  /** Load on the anchor per newton at the load, hauling. */
  double anchorHauling() {
    return anchor(haulHauling());
  }

  /** The same, holding. */
  double anchorHolding() {
    return anchor(haulHolding());
  }

  private double anchor(double haul) {
    return (compound() ? second : first).fromFixed() ? 1 + haul : 1 - haul;
  }

  /**
   * What the stiffness of the line is to be divided by, so that one leg of {@link #parts} parts, as
   * long as the first tackle, gives way as the system does.
   *
   * <p>A simple system is that leg itself. Of a compound the first tackle gives way by d/(n₁ EA)
   * and the second, which must be n₁ times as long to haul without a reset, by d/(n₁ n₂ EA), where
   * the one leg has d/(n₁ n₂ EA): n₂ + 1 times as much. Elasticity, all lines alike.
   */
  double softerBy() {
    return compound() ? second.parts() + 1 : 1;
  }
}
