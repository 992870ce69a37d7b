package org.fallwright.core.units;

import java.util.Locale;
import java.util.Map;
import java.util.regex.Matcher;
import java.util.regex.Pattern;

/**
 * A length as a person writes it: {@code 25}, {@code 25m}, {@code 163 cm}, {@code 82ft}, {@code
 * 64.3in} or {@code 12ft 6in}. A number alone is in metres.
 */
public final class LengthEntry {
  private static final String NUMBER = "([-+]?(?:\\d+(?:\\.\\d*)?|\\.\\d+))";
  private static final Pattern ONE = Pattern.compile(NUMBER + "\\s*(mm|cm|m|ft|in)?");
  private static final Pattern FEET_AND_INCHES =
      Pattern.compile("(\\d+)\\s*ft\\s*(\\d+(?:\\.\\d*)?)\\s*in");
  private static final Map<String, Double> IN_METRES =
      Map.of("mm", 0.001, "cm", 0.01, "m", 1.0, "ft", Units.FOOT, "in", Units.INCH);

  private LengthEntry() {}

  /**
   * The length [m].
   *
   * @throws IllegalArgumentException naming the field, what stands there and what may
   */
  public static double metres(String field, String text) {
    String written = Range.text(field, text).strip().toLowerCase(Locale.ROOT);
    Matcher both = FEET_AND_INCHES.matcher(written);
    if (both.matches()) {
      return Double.parseDouble(both.group(1)) * Units.FOOT
          + Range.check(field + ", its inches,", Double.parseDouble(both.group(2)), 0, 12, "in")
              * Units.INCH;
    }
    Matcher one = ONE.matcher(written);
    if (!one.matches()) {
      throw new IllegalArgumentException(
          field
              + " is \""
              + text
              + "\"; it must be a number in metres, or one with m, cm, mm, ft or in behind it");
    }
    return Double.parseDouble(one.group(1))
        * (one.group(2) == null ? 1 : IN_METRES.get(one.group(2)));
  }
}
