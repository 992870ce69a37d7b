package org.fallwright.core.line;

import org.fallwright.core.reference.Figure;
import org.fallwright.core.reference.Hardware;

/** What an end or a knot leaves of a rope's strength. */
public enum RopeEnd {
  WIRE_RESIN_SOCKET("wire-end.resin-socket", false),
  WIRE_SWAGED_SOCKET("wire-end.swaged-socket", false),
  WIRE_SLEEVE_STEEL_CORE("wire-end.sleeve-steel-core", false),
  WIRE_SLEEVE_FIBRE_CORE("wire-end.sleeve-fibre-core", false),
  WIRE_HAND_SPLICE("wire-end.hand-splice", false),
  WIRE_CLIPS("wire-end.clips", false),
  WIRE_WEDGE_SOCKET("wire-end.wedge-socket", false),
  EYE_SPLICE("fibre-end.eye-splice", false),
  SHORT_SPLICE("fibre-end.short-splice", false),
  TWO_HALF_HITCHES("fibre-end.two-half-hitches", true),
  CLOVE_HITCH("fibre-end.clove-hitch", true),
  ANCHOR_BEND("fibre-end.anchor-bend", true),
  TIMBER_HITCH("fibre-end.timber-hitch", true),
  BOWLINE("fibre-end.bowline", true),
  FIGURE_EIGHT_STOPPER("fibre-end.figure-eight-stopper", true),
  OVERHAND("fibre-end.overhand", true);

  private final Figure figure;
  private final boolean knot;

  RopeEnd(String key, boolean knot) {
    figure = Hardware.of(key);
    this.knot = knot;
  }

  /** Whether it is an end of a wire rope. */
  public boolean wire() {
    return figure.key().startsWith("wire-end");
  }

  /** Whether it is a knot. */
  public boolean knot() {
    return knot;
  }

  /** Share of the rope's breaking load that it keeps, with its source. */
  public Figure figure() {
    return figure;
  }

  /** Share of the rope's breaking load that it keeps. */
  public double factor() {
    return figure.value();
  }

  /** The same in a rope of that fibre: a knot in a slippery one keeps much less. */
  public double factorIn(FibreRope fibre) {
    return knot && fibre == FibreRope.HMPE
        ? Math.min(factor(), Hardware.value("fibre-end.hmpe-knot"))
        : factor();
  }
}
