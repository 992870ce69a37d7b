package org.fallwright.core.site;

import org.fallwright.core.units.Range;

/**
 * An entered quantity in SI units (the unit is in the field's name), how it was got, and the
 * person's own plus-or-minus where one was given.
 *
 * @param value nominal value, in the unit that the field's name ends in
 * @param how measured, estimated or guessed
 * @param plusMinus one standard deviation in the same unit that replaces the usual spread, or null
 */
public record Quantity(double value, How how, Double plusMinus) {
  public Quantity {
    Range.check("value", value, -1e9, 1e9, "");
    Range.present("how", how);
    Range.checkOrNull("plus_minus", plusMinus, 0, 1e9, "");
  }

  public static Quantity measured(double value) {
    return new Quantity(value, How.MEASURED, null);
  }

  public static Quantity estimated(double value) {
    return new Quantity(value, How.ESTIMATED, null);
  }

  public Quantity withValue(double other) {
    return new Quantity(other, how, plusMinus);
  }

  /** Checks the nominal value against the limits of its field. */
  Quantity within(String field, double least, double most, String unit) {
    Range.check(field, value, least, most, unit);
    return this;
  }
}
