package org.fallwright.plugins.handline;

import org.fallwright.core.units.Range;

/**
 * One of the crew.
 *
 * @param massKg mass [kg]
 * @param statureM stature [m]
 */
record Person(double massKg, double statureM) {
  /** A light adult, taken where a mass is not stated and mass helps [kg]. Planning allowance. */
  static final double LIGHT_KG = 55;

  /** A heavy adult with gear, taken where it loads the parts [kg]. Planning allowance. */
  static final double HEAVY_KG = 130;

  /** A short adult, taken where a stature is not stated [m]. Planning allowance. */
  static final double SHORT_M = 1.55;

  Person {
    Range.check("person_mass_kg", massKg, 30, 200, "kg");
    Range.check("stature_m", statureM, 1.2, 2.3, "m");
  }
}
