package org.fallwright.core.reference;

import java.util.stream.Stream;
import org.fallwright.core.units.Range;

/**
 * Moisture of green wood and the density that follows from it:
 *
 * <p>ρ = 1000·G·(1 + M/100) [kg/m³], G the specific gravity (oven-dry mass over green volume), M
 * the moisture in per cent of the oven-dry mass.
 *
 * <p>A stem is neither all heartwood nor all sapwood, so what it weighs lies between the two; a
 * young or fast-grown conifer is mostly sapwood. No wood holds more than {@link #most}: Wood
 * Handbook, Eq. 4-3, 100·(1.54 − G)/(1.54·G).
 *
 * @param gravity specific gravity, oven-dry mass and green volume
 * @param heart moisture of green heartwood [%]
 * @param sap moisture of green sapwood [%]
 */
public record Moisture(Figure gravity, Figure heart, Figure sap) {
  private static final double CELL_WALL = 1.54;

  public Moisture {
    double g = Range.check("gravity", gravity.value(), 0.2, 1.1, "");
    Range.check("heart_moisture", heart.value(), 25, most(g), "%");
    Range.check("sap_moisture", sap.value(), 25, most(g), "%");
  }

  /** Moisture of wood that is soaked through [% of the oven-dry mass]. */
  public static double most(double gravity) {
    return 100 * (CELL_WALL - gravity) / (CELL_WALL * gravity);
  }

  /** Green density [kg/m³] of wood of that specific gravity and moisture [%]. */
  public static double density(double gravity, double moisturePercent) {
    return 1000 * gravity * (1 + moisturePercent / 100);
  }

  /** Green density of a stem whose volume is heartwood to that share, 0 to 1 [kg/m³]. */
  public double density(double heartShare) {
    double share = Range.check("heart_share", heartShare, 0, 1, "");
    return density(gravity.value(), share * heart.value() + (1 - share) * sap.value());
  }

  /** Density of the drier of heartwood and sapwood [kg/m³]. */
  public double densityLow() {
    return Math.min(density(1.0), density(0.0));
  }

  /** Density of the wetter of heartwood and sapwood [kg/m³]. */
  public double densityHigh() {
    return Math.max(density(1.0), density(0.0));
  }

  Stream<Figure> figures() {
    return Stream.of(gravity, heart, sap);
  }
}
