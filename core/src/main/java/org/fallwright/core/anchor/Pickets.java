package org.fallwright.core.anchor;

import java.util.Locale;
import org.fallwright.core.reference.Figure;
import org.fallwright.core.reference.Hardware;
import org.fallwright.core.site.Anchor;
import org.fallwright.core.site.Anchor.Holdfast;
import org.fallwright.core.site.Anchor.PicketSoil;
import org.fallwright.core.units.Range;
import org.fallwright.core.units.Units;

/**
 * Holding power of pickets and pins driven into the ground.
 *
 * <p>Wooden pickets: the pull that a combination stands in undisturbed loam (published; the text
 * does not say whether the ground then gives way). Steel pickets: a safe load each, to a most in
 * all (published). Pins: design loads by ground, about half of what they hold (published, second
 * hand). In any ground but loam, no picket counts for more than a 1 in pin there, and in loam no
 * pin for more than in poor cohesive ground. Wet ground counts half (planning allowance). Every
 * figure is taken as the ultimate strength, under the factors of an anchor, though most are allowed
 * loads: the safe side, for the sources differ by ten to one.
 */
public final class Pickets {
  private Pickets() {}

  /** What a holdfast holds under a load of a given direction. */
  static Capacity capacity(Anchor.Pickets p, AnchorLoad load) {
    double steepest = Hardware.value("picket.uplift");
    if (load.upliftDeg() > steepest) {
      return Capacity.refuse(
          String.format(
              Locale.ROOT,
              "the load rises %.1f degrees and would draw its pickets; %.0f is the most",
              load.upliftDeg(),
              steepest));
    }
    if (load.downhill()) {
      return Capacity.refuse("the load pulls steeply downhill; its table is for level ground");
    }
    return Capacity.holds(
        holdsN(p.holdfast(), p.count(), p.soil(), p.wet()),
        "ground",
        "its table's figure taken as all it holds"
            + (p.soil() == PicketSoil.UNDISTURBED_LOAM ? "" : ", no picket above a pin there")
            + (p.wet() ? ", wet ground counted at half" : ""));
  }

  /**
   * Holding power [N].
   *
   * @param holdfast how they are set
   * @param count how many steel pickets or pins; 1 for wooden pickets
   * @param soil ground class
   * @param wet whether the ground is wet
   */
  public static double holdsN(Holdfast holdfast, int count, PicketSoil soil, boolean wet) {
    Range.check("count", count, 1, 10, "");
    double ground =
        switch (holdfast) {
          case THIN_PINS -> count * pinN("1in", soil);
          case THICK_PINS -> count * pinN("3in", soil);
          case STEEL_ROW -> inGround(steelRowN(count), count, soil);
          case SINGLE -> inGround(woodN("single"), 1, soil);
          case ONE_ONE -> inGround(woodN("one-one"), 2, soil);
          case ONE_ONE_ONE -> inGround(woodN("one-one-one"), 3, soil);
          case TWO_ONE -> inGround(woodN("two-one"), 3, soil);
          case THREE_TWO_ONE -> inGround(woodN("three-two-one"), 6, soil);
        };
    return wet ? ground * Hardware.value("picket.wet") : ground;
  }

  /** A row of the table that its holding power is from. */
  public static Figure row(Anchor.Pickets p) {
    boolean pins = p.holdfast() == Holdfast.THIN_PINS || p.holdfast() == Holdfast.THICK_PINS;
    return Hardware.of(
        pins || p.soil() != PicketSoil.UNDISTURBED_LOAM
            ? "pin.1in.cohesive-poor"
            : p.holdfast() == Holdfast.STEEL_ROW
                ? "picket.steel"
                : "picket." + p.holdfast().name().toLowerCase(Locale.ROOT).replace('_', '-'));
  }

  private static double inGround(double inLoamN, int pickets, PicketSoil soil) {
    return soil == PicketSoil.UNDISTURBED_LOAM
        ? inLoamN
        : Math.min(inLoamN, pickets * pinN("1in", soil));
  }

  private static double woodN(String combination) {
    return Hardware.value("picket." + combination) * Units.POUND_FORCE;
  }

  private static double steelRowN(int pickets) {
    double kg =
        Math.min(pickets * Hardware.value("picket.steel"), Hardware.value("picket.steel-most"));
    return kg * Units.KILOGRAM_FORCE;
  }

  private static double pinN(String size, PicketSoil soil) {
    PicketSoil row = soil == PicketSoil.UNDISTURBED_LOAM ? PicketSoil.COHESIVE_POOR : soil;
    String key = row.name().toLowerCase(Locale.ROOT).replace('_', '-');
    return Hardware.value("pin." + size + "." + key) * Units.POUND_FORCE;
  }

  /** Pins needed for a load at the design load of one, both in the same unit. */
  public static int pinsFor(double load, double eachHolds) {
    Range.check("load", load, 0, 1e8, "");
    Range.check("each_holds", eachHolds, 1e-3, 1e8, "");
    return (int) Math.ceil(load / eachHolds);
  }
}
