package org.fallwright.core.units;

import java.math.BigDecimal;
import java.math.MathContext;
import java.math.RoundingMode;
import java.text.DecimalFormat;
import java.text.DecimalFormatSymbols;
import java.util.Locale;
import java.util.function.Function;

/**
 * How quantities are shown to a person. Every method takes SI. What is not a number shows as a
 * dash, so a missing figure never looks like nought.
 */
public enum DisplayUnits {
  US,
  METRIC;

  /** Kinds of quantity that have a unit of entry and display. */
  public enum Measure {
    FORCE(new Unit("lbf", Units.POUND_FORCE), new Unit("kN", 1000)),
    LENGTH(new Unit("ft", Units.FOOT), new Unit("m", 1)),
    SMALL_LENGTH(new Unit("in", Units.INCH), new Unit("cm", 0.01)),
    MASS(new Unit("lb", Units.POUND), new Unit("kg", 1)),
    SPEED(new Unit("mph", Units.MILE_PER_HOUR), new Unit("m/s", 1)),
    MOMENT(new Unit("lbf·ft", Units.POUND_FORCE_FOOT), new Unit("kN·m", 1000)),
    ENERGY(new Unit("ft·lbf", Units.POUND_FORCE_FOOT), new Unit("kJ", 1000)),
    STRESS(new Unit("psi", Units.PSI), new Unit("MPa", 1e6)),
    AREA(new Unit("ft²", Units.SQUARE_FOOT), new Unit("m²", 1)),
    ANGLE(new Unit("°", Math.PI / 180), new Unit("°", Math.PI / 180));

    private final Unit us;
    private final Unit metric;

    Measure(Unit us, Unit metric) {
      this.us = us;
      this.metric = metric;
    }
  }

  /**
   * A unit of entry and display.
   *
   * @param symbol what stands behind the number
   * @param inSi one of it in SI
   */
  public record Unit(String symbol, double inSi) {
    public double toSi(double shown) {
      return shown * inSi;
    }

    public double fromSi(double si) {
      return si / inSi;
    }
  }

  private static final String NONE = "–";

  /** Takes off the last bits of a conversion, so that a round number is not rounded on from it. */
  private static final MathContext NOISE_OFF = new MathContext(12);

  /** The unit of that quantity. */
  public Unit unit(Measure measure) {
    return this == US ? measure.us : measure.metric;
  }

  /** Decimals that a ratio is shown with, as a factor. */
  private static final double RATIO_STEP = 100;

  /** A ratio of capacity over demand: two decimals, never shown as more than it is. */
  public static String ratio(double ratio) {
    if (!Double.isFinite(ratio)) {
      return Double.isNaN(ratio) ? NONE : ratio > 0 ? "∞" : "-∞";
    }
    // a hair is forgiven, so that 1.5 computed a little low does not show as 1.49
    return String.format(Locale.ROOT, "%.2f", Math.floor(ratio * RATIO_STEP + 1e-9) / RATIO_STEP);
  }

  /** A force [N] to three digits. */
  public String force(double n) {
    return digits(Measure.FORCE, n, RoundingMode.HALF_EVEN);
  }

  /** A force that something can give or bear [N]: never shown as more than it is. */
  public String forceAtMost(double n) {
    return digits(Measure.FORCE, n, RoundingMode.FLOOR);
  }

  /** A force that is needed or that loads something [N]: never shown as less than it is. */
  public String forceAtLeast(double n) {
    return digits(Measure.FORCE, n, RoundingMode.CEILING);
  }

  /** A length on the site [m]: metres, or feet and inches up to a hundred feet. */
  public String length(double m) {
    if (this == METRIC || !Double.isFinite(m)) {
      return fixed(Measure.LENGTH, m, Math.abs(m) < 10 ? 2 : 1);
    }
    long inches = Math.round(Math.abs(m) / Units.INCH);
    String sign = m < 0 && inches > 0 ? "-" : "";
    if (inches >= 1200) {
      return sign + grouped(BigDecimal.valueOf(Math.round(Math.abs(m) / Units.FOOT))) + " ft";
    }
    return sign + inches / 12 + " ft " + inches % 12 + " in";
  }

  /**
   * A length on the site that is held against another [m]; one that falls short and would show as
   * the other is said to be just under it.
   */
  public String lengthAgainst(double m, double askedM) {
    String shown = length(m);
    return m < askedM && shown.equals(length(askedM)) ? "just under " + shown : shown;
  }

  /** A length of the cut or the stem [m]: millimetres below 10 cm, centimetres; or inches. */
  public String smallLength(double m) {
    if (this == METRIC && Math.abs(m) < 0.1) {
      return grouped(BigDecimal.valueOf(m * 1000).setScale(0, RoundingMode.HALF_EVEN)) + " mm";
    }
    return fixed(Measure.SMALL_LENGTH, m, 1);
  }

  /** A mass [kg] to three digits. */
  public String mass(double kg) {
    return digits(Measure.MASS, kg, RoundingMode.HALF_EVEN);
  }

  /** A speed [m/s]. */
  public String speed(double mps) {
    return fixed(Measure.SPEED, mps, 1);
  }

  /** A moment [N·m] to three digits. */
  public String moment(double nm) {
    return digits(Measure.MOMENT, nm, RoundingMode.HALF_EVEN);
  }

  /** An energy [J] to three digits. */
  public String energy(double j) {
    return digits(Measure.ENERGY, j, RoundingMode.HALF_EVEN);
  }

  /** A stress [Pa] to three digits. */
  public String stress(double pa) {
    return digits(Measure.STRESS, pa, RoundingMode.HALF_EVEN);
  }

  /** An area [m²] to three digits. */
  public String area(double m2) {
    return digits(Measure.AREA, m2, RoundingMode.HALF_EVEN);
  }

  /** An angle [rad], shown in degrees. */
  public String angle(double rad) {
    return Double.isFinite(rad)
        ? grouped(BigDecimal.valueOf(Math.toDegrees(rad)).setScale(1, RoundingMode.HALF_EVEN)) + "°"
        : NONE;
  }

  /**
   * A quantity in the person's units with the other ones behind it, such as {@code both(u ->
   * u.force(4700))}: "4.7 kN (1,060 lbf)".
   */
  public String both(Function<DisplayUnits, String> shown) {
    DisplayUnits other = this == US ? METRIC : US;
    return shown.apply(this) + " (" + shown.apply(other) + ")";
  }

  private String digits(Measure measure, double si, RoundingMode mode) {
    if (!Double.isFinite(si)) {
      return Double.isNaN(si) ? NONE : si > 0 ? "∞" : "-∞";
    }
    Unit unit = unit(measure);
    BigDecimal exact = BigDecimal.valueOf(unit.fromSi(si)).round(NOISE_OFF);
    BigDecimal shown = exact.round(new MathContext(3, mode));
    return grouped(shown) + " " + unit.symbol();
  }

  private String fixed(Measure measure, double si, int decimals) {
    if (!Double.isFinite(si)) {
      return Double.isNaN(si) ? NONE : si > 0 ? "∞" : "-∞";
    }
    Unit unit = unit(measure);
    BigDecimal shown =
        BigDecimal.valueOf(unit.fromSi(si)).setScale(decimals, RoundingMode.HALF_EVEN);
    return format("#,##0." + "0".repeat(decimals), shown) + " " + unit.symbol();
  }

  private static String grouped(BigDecimal value) {
    return format("#,##0.######", value);
  }

  private static String format(String pattern, BigDecimal value) {
    String text =
        new DecimalFormat(pattern, DecimalFormatSymbols.getInstance(Locale.ROOT)).format(value);
    return text.matches("-[0.,]*") ? text.substring(1) : text;
  }
}
