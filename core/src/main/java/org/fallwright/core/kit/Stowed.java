package org.fallwright.core.kit;

import java.time.LocalDate;
import java.time.format.DateTimeParseException;
import org.fallwright.core.units.Range;

/**
 * Where a piece of gear is, or some of several alike.
 *
 * @param item its name in the kit
 * @param truck name of the truck
 * @param shelf where on the truck; null: not stated
 * @param count how many are there
 * @param condition what was seen at the last look; null: not stated
 * @param inspected day of that look, year-month-day; null: not stated
 */
public record Stowed(
    String item, String truck, String shelf, int count, String condition, String inspected) {
  public Stowed {
    Range.text("item", item);
    Range.text("truck", truck);
    if (shelf != null) {
      Range.text("shelf", shelf);
    }
    Range.check("count", count, 1, 100, "");
    if (condition != null) {
      Range.text("condition", condition);
    }
    if (inspected != null && !isDay(inspected)) {
      throw new IllegalArgumentException(
          "inspected is \"" + inspected + "\"; it must be a day such as \"2025-03-31\"");
    }
  }

  private static boolean isDay(String text) {
    try {
      LocalDate.parse(text);
      return true;
    } catch (DateTimeParseException e) {
      return false;
    }
  }
}
