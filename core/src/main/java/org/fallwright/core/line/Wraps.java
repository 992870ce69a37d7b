package org.fallwright.core.line;

import org.fallwright.core.reference.Hardware;
import org.fallwright.core.units.Range;

/**
 * A rope wrapped round something fixed: bollard, lowering device, stem, drum.
 *
 * <p>T₁/T₂ = e^(μθ), θ = 2π·turns, and in a groove of included angle g e^(μθ/sin(g/2)). Holding, a
 * tail tension T₂ holds T₁ = T₂·e^(μθ), μ taken low; hauling over it, the haul must exceed the load
 * by the same ratio, μ taken high. Belt friction, Eytelwein. Leaves out the rope's stiffness, turns
 * that ride on each other, heat and a rope that runs.
 */
public enum Wraps {
  STEEL_CABLE_IN_NOTCHED_STUMP("notched-stump"),
  WIRE_ON_GREASY_STEEL("wire-steel-greasy"),
  WIRE_ON_DRY_STEEL("wire-steel-dry"),
  POLYESTER_ON_METAL("polyester-metal"),
  HMPE_ON_METAL("hmpe-metal"),
  ROPE_ON_BARK("rope-bark");

  private final double low;
  private final double high;
  private final double grooveDeg;

  Wraps(String name) {
    String key = "friction." + name;
    low = Hardware.find(key).orElseGet(() -> Hardware.of(key + ".low")).value();
    high = Hardware.find(key).orElseGet(() -> Hardware.of(key + ".high")).value();
    grooveDeg = Hardware.find(key + "-groove").map(f -> f.value()).orElse(180.0);
  }

  /** Friction, the low end of what is known. */
  public double low() {
    return low;
  }

  /** Friction, the high end. */
  public double high() {
    return high;
  }

  /** Load that a tail tension holds [N], friction taken low. */
  public double holdsN(double tailN, double turns) {
    Range.check("tail_N", tailN, 0, 1e7, "N");
    return tailN * ratio(low, turns, grooveDeg);
  }

  /** Tail tension that holds a load [N], friction taken low. */
  public double tailN(double loadN, double turns) {
    Range.check("load_N", loadN, 0, 1e7, "N");
    return loadN / ratio(low, turns, grooveDeg);
  }

  /** Tension that hauls a load over it [N], friction taken high. */
  public double haulN(double loadN, double turns) {
    Range.check("load_N", loadN, 0, 1e7, "N");
    return loadN * ratio(high, turns, grooveDeg);
  }

  /**
   * Greater tension over the lesser at the point of slipping.
   *
   * @param friction coefficient of friction
   * @param turns turns round it
   * @param grooveDeg included angle of a groove; 180: flat [degrees]
   */
  public static double ratio(double friction, double turns, double grooveDeg) {
    Range.check("friction", friction, 0, 1, "");
    Range.check("turns", turns, 0, 10, "");
    Range.check("groove_deg", grooveDeg, 20, 180, "degrees");
    return Math.exp(friction * 2 * Math.PI * turns / Math.sin(Math.toRadians(grooveDeg / 2)));
  }
}
