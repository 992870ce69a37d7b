package org.fallwright.core.site;

import org.fallwright.core.units.Range;

/**
 * An entered quantity in SI units (the unit is in the field's name), how it was got, and the
 * person's own plus-or-minus where one was given.
 *
 * <p>A range is its middle and half its width; nothing outside it is held possible. What nobody
 * knows has a value that only stands in.
 *
 * @param value nominal value, in the unit that the field's name ends in
 * @param how measured, estimated, guessed, a range, or not known
 * @param plusMinus one standard deviation in the same unit that replaces the usual spread, or null;
 *     of a range half its width, never null
 */
public record Quantity(double value, How how, Double plusMinus) {
  public Quantity {
    Range.check("value", value, -1e9, 1e9, "");
    Range.present("how", how);
    if (how == How.RANGE) {
      Range.present("plus_minus", plusMinus);
    }
    Range.checkOrNull("plus_minus", plusMinus, 0, 1e9, "");
  }

  public static Quantity measured(double value) {
    return new Quantity(value, How.MEASURED, null);
  }

  public static Quantity estimated(double value) {
    return new Quantity(value, How.ESTIMATED, null);
  }

  /** Somewhere between two ends, both in the quantity's unit. */
  public static Quantity range(double from, double to) {
    return new Quantity((from + to) / 2, How.RANGE, Math.abs(to - from) / 2);
  }

  public Quantity withValue(double other) {
    return new Quantity(other, how, plusMinus);
  }

  /** The lower end of a range; the value of anything else. */
  public double low() {
    return how == How.RANGE ? value - plusMinus : value;
  }

  /** The upper end of a range; the value of anything else. */
  public double high() {
    return how == How.RANGE ? value + plusMinus : value;
  }

  /** Checks the nominal value, or both ends of a range, against the limits of its field. */
  Quantity within(String field, double least, double most, String unit) {
    Range.check(field, value, least, most, unit);
    if (how == How.RANGE) {
      // middle and half width do not always add up to the last digit
      double digit = 1e-12 * (Math.abs(value) + plusMinus);
      Range.check(field, low() + digit < least ? low() : Math.max(low(), least), least, most, unit);
      Range.check(
          field, high() - digit > most ? high() : Math.min(high(), most), least, most, unit);
    }
    return this;
  }
}
