package org.fallwright.core.units;

import java.util.Locale;

/** The range a number must lie in; a number outside is refused by name, value, limit and unit. */
public final class Range {
  private Range() {}

  /**
   * Returns {@code value} unchanged if it is finite and within [{@code least}, {@code most}].
   *
   * @throws IllegalArgumentException naming the field, its value, the limits and the unit
   */
  public static double check(String field, double value, double least, double most, String unit) {
    if (Double.isFinite(value) && value >= least && value <= most) {
      return value;
    }
    String suffix = unit.isEmpty() ? "" : " " + unit;
    throw new IllegalArgumentException(
        field
            + " is "
            + plain(value)
            + suffix
            + "; it must be from "
            + plain(least)
            + " to "
            + plain(most)
            + suffix);
  }

  /** As {@link #check}, and null (not stated) is let through. */
  public static Double checkOrNull(
      String field, Double value, double least, double most, String unit) {
    return value == null ? null : Double.valueOf(check(field, value, least, most, unit));
  }

  /**
   * Returns {@code value} if it is there.
   *
   * @throws IllegalArgumentException naming the field
   */
  public static <T> T present(String field, T value) {
    if (value == null) {
      throw new IllegalArgumentException(field + " is null; it must be stated");
    }
    return value;
  }

  /**
   * Returns {@code text} if it is not blank and no longer than 200 characters.
   *
   * @throws IllegalArgumentException naming the field
   */
  public static String text(String field, String text) {
    present(field, text);
    if (text.isBlank() || text.length() > 200) {
      throw new IllegalArgumentException(field + " must have from 1 to 200 characters");
    }
    return text;
  }

  private static String plain(double value) {
    if (!Double.isFinite(value)) {
      return Double.isNaN(value) ? "not a number" : value > 0 ? "infinite" : "minus infinite";
    }
    return value == Math.rint(value) && Math.abs(value) < 1e15
        ? String.format(Locale.ROOT, "%.0f", value)
        : Double.toString(value);
  }
}
