package org.fallwright.core.worksheet;

/**
 * A figure worked from rounded numbers against the program's own.
 *
 * @param symbol sign of the line
 * @param name what it is
 * @param worked as worked here, in {@code unit}
 * @param exact the program's own, in {@code unit}
 * @param unit unit of both
 */
public record Compared(String symbol, String name, double worked, double exact, String unit) {
  /** Difference over the program's own figure. */
  public double difference() {
    return worked == exact ? 0 : Math.abs(worked - exact) / Math.abs(exact);
  }
}
