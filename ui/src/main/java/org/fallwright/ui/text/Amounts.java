package org.fallwright.ui.text;

import java.util.Locale;
import org.fallwright.core.site.Site.Display;
import org.fallwright.core.units.DisplayUnits;
import org.fallwright.core.units.DisplayUnits.Measure;

/** SI amounts as text in the units that the person reads, with the words for what is no number. */
public final class Amounts {
  private final Display display;
  private final DisplayUnits units;

  public Amounts(Display display) {
    this.display = display;
    this.units = display.units();
  }

  public Display display() {
    return display;
  }

  /** A distance or height [m]. */
  public String length(double m) {
    return units.length(m);
  }

  /** A distance to the nearest whole unit [m]. */
  public String roundLength(double m) {
    DisplayUnits.Unit u = units.unit(Measure.LENGTH);
    return String.format(Locale.US, "%,.0f %s", u.fromSi(m), u.symbol());
  }

  /** A diameter, thickness or gape [m]. */
  public String small(double m) {
    return units.smallLength(m);
  }

  /** A force that is needed, or that loads something [N]: never shown as less than it is. */
  public String forceNeeded(double n) {
    return units.forceAtLeast(n);
  }

  /** A force that something can give or bear [N]: never shown as more than it is. */
  public String forceGiven(double n) {
    return units.forceAtMost(n);
  }

  /** A wind speed [m/s]. */
  public String speed(double mps) {
    return units.speed(mps);
  }

  /** An angle [degrees]. */
  public String angle(double deg) {
    return units.angle(Math.toRadians(deg));
  }

  /** An azimuth [degrees from true north], three digits. */
  public String azimuth(double deg) {
    long tenths = Math.floorMod(Math.round(deg * 10), 3600L);
    return tenths % 10 == 0
        ? String.format(Locale.ROOT, "%03d°", tenths / 10)
        : String.format(Locale.ROOT, "%05.1f°", tenths / 10.0);
  }

  /** A ratio of capacity to demand; a word where nothing is demanded or nobody can say. */
  public String ratio(double r) {
    if (Double.isNaN(r)) {
      return Messages.text("ratio.unknown");
    }
    return Double.isInfinite(r) || r >= 100
        ? Messages.text("ratio.free")
        : String.format(Locale.ROOT, "%.2f", r);
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
      case "N" -> units.force(value);
      case "kg" -> units.mass(value);
      case "m/s" -> speed(value);
      case "deg", "degrees" -> angle(value);
      default ->
          String.format(Locale.US, value == Math.rint(value) ? "%,.0f %s" : "%,.2f %s", value, unit)
              .strip();
    };
  }

  /** The unit that distances are counted in [m]: ruler divisions are round in it. */
  public double rulerUnitM() {
    return units.unit(Measure.LENGTH).inSi();
  }
}
