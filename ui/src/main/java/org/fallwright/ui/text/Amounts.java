package org.fallwright.ui.text;

import java.util.Locale;
import org.fallwright.core.site.Site.Display;

/** SI amounts as text in the units that the person reads. */
public final class Amounts {
  private static final double FOOT_M = 0.3048;
  private static final double INCH_M = 0.0254;
  private static final double POUND_FORCE_N = 4.4482216152605;
  private static final double POUND_KG = 0.45359237;
  private static final double MILE_PER_HOUR_MPS = 0.44704;

  private final Display display;

  public Amounts(Display display) {
    this.display = display;
  }

  public Display display() {
    return display;
  }

  /** A distance or height [m]. */
  public String length(double m) {
    return metric() ? fixed(m, 1) + " m" : fixed(m / FOOT_M, 1) + " ft";
  }

  /** A distance to the nearest whole unit [m]. */
  public String roundLength(double m) {
    return metric() ? fixed(m, 0) + " m" : fixed(m / FOOT_M, 0) + " ft";
  }

  /** A diameter, thickness or gape [m]. */
  public String small(double m) {
    return metric() ? fixed(m * 100, 1) + " cm" : fixed(m / INCH_M, 1) + " in";
  }

  /** A force or tension [N]. */
  public String force(double n) {
    if (metric()) {
      double kn = n / 1000;
      return fixed(kn, Math.abs(kn) < 9.995 ? 2 : 1) + " kN";
    }
    return fixed(n / POUND_FORCE_N, 0) + " lbf";
  }

  /** A force that is needed [N]: never shown as less than it is. */
  public String forceNeeded(double n) {
    return force(Math.ceil(n / forceStep(n) - 1e-9) * forceStep(n));
  }

  /** A force that something can give [N]: never shown as more than it is. */
  public String forceGiven(double n) {
    return force(Math.floor(n / forceStep(n) + 1e-9) * forceStep(n));
  }

  private double forceStep(double n) {
    return metric() ? Math.abs(n) < 9995 ? 10 : 100 : POUND_FORCE_N;
  }

  /** A mass [kg]. */
  public String mass(double kg) {
    return metric() ? fixed(kg, 0) + " kg" : fixed(kg / POUND_KG, 0) + " lb";
  }

  /** A wind speed [m/s]. */
  public String speed(double mps) {
    return metric() ? fixed(mps, 1) + " m/s" : fixed(mps / MILE_PER_HOUR_MPS, 0) + " mph";
  }

  /** An angle [degrees]. */
  public String angle(double deg) {
    return fixed(deg, 1) + "°";
  }

  /** An azimuth [degrees from true north], three digits. */
  public String azimuth(double deg) {
    double turned = ((deg % 360) + 360) % 360;
    long tenths = Math.round(turned * 10) % 3600;
    return tenths % 10 == 0
        ? String.format(Locale.ROOT, "%03d°", tenths / 10)
        : String.format(Locale.ROOT, "%05.1f°", tenths / 10.0);
  }

  /** A ratio of capacity to demand; a word where nothing is demanded or nobody can say. */
  public String ratio(double r) {
    if (Double.isNaN(r)) {
      return Messages.text("ratio.unknown");
    }
    return Double.isInfinite(r) ? Messages.text("ratio.free") : fixed(r, 2);
  }

  /** An amount in an SI unit named by its text, as checks carry it. */
  public String amount(double value, String unit) {
    if (Double.isNaN(value)) {
      return Messages.text("ratio.unknown");
    }
    if (Double.isInfinite(value)) {
      return Messages.text("ratio.free");
    }
    return switch (unit) {
      case "m" -> length(value);
      case "N" -> force(value);
      case "kg" -> mass(value);
      case "m/s" -> speed(value);
      case "degrees" -> angle(value);
      case "" -> fixed(value, 2);
      default -> fixed(value, 2) + " " + unit;
    };
  }

  /** A length in the shown unit to metres: ruler divisions are counted in it. */
  public double rulerUnitM() {
    return metric() ? 1 : FOOT_M;
  }

  private boolean metric() {
    return display == Display.METRIC;
  }

  private static String fixed(double v, int decimals) {
    String s = String.format(Locale.US, "%,." + decimals + "f", v);
    return s.matches("-[0.]+") ? s.substring(1) : s;
  }
}
