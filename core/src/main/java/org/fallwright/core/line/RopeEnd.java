package org.fallwright.core.line;

/**
 * What an end or a knot leaves of a rope's strength. Published: wire ends US Army TM 5-3810-305-10
 * Table 4; fibre ends and knots Jacobson, Knots for the Outdoors, p. 24 (after Plymouth Cordage
 * 1946). HMPE is never knotted: it keeps 30 to 40 % (from memory).
 */
public enum RopeEnd {
  WIRE_RESIN_SOCKET(true, false, 1.00),
  WIRE_SPLICED_SLEEVE(true, false, 0.925),
  WIRE_HAND_SPLICE(true, false, 0.86),
  WIRE_CLIPS(true, false, 0.80),
  WIRE_WEDGE_SOCKET(true, false, 0.75),
  EYE_SPLICE(false, false, 0.95),
  SHORT_SPLICE(false, false, 0.90),
  TWO_HALF_HITCHES(false, true, 0.75),
  CLOVE_HITCH(false, true, 0.75),
  ANCHOR_BEND(false, true, 0.70),
  TIMBER_HITCH(false, true, 0.70),
  BOWLINE(false, true, 0.60),
  OVERHAND(false, true, 0.45);

  private final boolean wire;
  private final boolean knot;
  private final double factor;

  RopeEnd(boolean wire, boolean knot, double factor) {
    this.wire = wire;
    this.knot = knot;
    this.factor = factor;
  }

  /** Whether it is an end of a wire rope. */
  public boolean wire() {
    return wire;
  }

  /** Whether it is a knot. */
  public boolean knot() {
    return knot;
  }

  /** Share of the rope's breaking load that it keeps. */
  public double factor() {
    return factor;
  }
}
