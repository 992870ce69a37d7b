package org.fallwright.core.reference;

import java.util.Arrays;
import java.util.List;
import java.util.Locale;
import java.util.stream.Stream;
import org.fallwright.core.site.How;
import org.fallwright.core.site.Place;
import org.fallwright.core.site.Quantity;
import org.fallwright.core.units.Range;

/**
 * How far an entered quantity may be off: one standard deviation by the way it was got. The usual
 * spreads are allowances of ours; a person's own plus-or-minus takes their place.
 */
public final class Spreads {
  /** The kinds of quantity that have a usual spread. */
  public enum What {
    DBH(true, "", 0.02, 0.05, 0.10),
    STUMP_DIAMETER(true, "", 0.02, 0.05, 0.10),
    HEIGHT(true, "", 0.03, 0.08, 0.15),
    LEAN(false, "deg", 0.5, 1.5, 3),
    LEAN_AZIMUTH(false, "deg", 5, 15, 30),
    GREEN_DENSITY(true, "", 0.05, 0.10, 0.15),
    MASS(true, "", 0.05, 0.15, 0.30),
    /** Shares of the tree's height, see {@link Spreads#massCentreM}. */
    MASS_CENTRE(true, "", 0.02, 0.04, 0.06),
    HINGE_THICKNESS(true, "", 0.10, 0.20, 0.30),
    GUST(true, "", 0.20, 0.40, 0.60),
    ATTACH_HEIGHT(false, "m", 0.1, 0.5, 1.0);

    private final boolean share;
    private final List<Figure> byHow;

    What(boolean share, String unit, double measured, double estimated, double guessed) {
      this.share = share;
      double[] sd = {measured, estimated, guessed};
      byHow =
          Arrays.stream(How.values())
              .filter(How::usual)
              .map(how -> figure(how, sd[how.ordinal()], unit))
              .toList();
    }

    /**
     * The usual standard deviation, in its unit; a share of the value where the unit is empty. What
     * is not known or a range counts as guessed where nothing of its own is stated.
     */
    public Figure usual(How how) {
      return byHow.get(Math.min(how.ordinal(), How.GUESSED.ordinal()));
    }

    private Figure figure(How how, double sd, String unit) {
      String what = name().toLowerCase(Locale.ROOT).replace('_', '-');
      String got = how.name().toLowerCase(Locale.ROOT);
      return new Figure(
          "spread-" + what + "-" + got,
          sd,
          unit,
          Kind.PLANNING_ALLOWANCE,
          "",
          "standard deviation of a "
              + got
              + " "
              + what.replace('-', ' ')
              + (share ? ", share" : ""));
    }
  }

  /** Least standard deviation of a gust [m/s]. */
  public static final Figure GUST_LEAST_SD =
      new Figure(
          "spread-gust-least",
          1,
          "m/s",
          Kind.PLANNING_ALLOWANCE,
          "",
          "least standard deviation of a gust, however it was got");

  private Spreads() {}

  /**
   * One standard deviation of a quantity, in its own unit: the person's own where stated, else the
   * usual one. A gust below the least that counts is spread as that least, and its spread is never
   * below {@link #GUST_LEAST_SD}, not even where the person states less.
   *
   * @throws IllegalArgumentException for the mass centre, whose spread needs the height: see {@link
   *     #massCentreM}
   */
  public static double of(What what, Quantity q) {
    Range.present("quantity", q);
    if (what == What.MASS_CENTRE) {
      throw new IllegalArgumentException("the spread of a mass centre needs the tree's height");
    }
    if (q.how() == How.RANGE) {
      return ofRange(q);
    }
    double sd = q.plusMinus() != null ? q.plusMinus() : of(what, q.value(), q.how());
    return what == What.GUST ? Math.max(sd, GUST_LEAST_SD.value()) : sd;
  }

  /**
   * What a range counts for: its ends stand where the 5th and 95th percentiles of a spread stand,
   * so that whatever takes a low or a high takes an end.
   */
  public static double ofRange(Quantity q) {
    return q.plusMinus() / Allowances.PERCENTILE_SDS.value();
  }

  /** The usual standard deviation of a value got in that way, in the value's unit. */
  public static double of(What what, double value, How how) {
    double base = what == What.GUST ? Math.max(value, Allowances.GUST_LEAST.value()) : value;
    double usual = what.usual(how).value();
    double sd = what.share ? usual * Math.abs(base) : usual;
    return what == What.GUST ? Math.max(sd, GUST_LEAST_SD.value()) : sd;
  }

  /**
   * One standard deviation of the height of the mass centre [m]: the person's own, else a share of
   * the tree's height.
   *
   * @param q the entered height of the mass centre [m]
   * @param heightM height of the tree [m]
   */
  public static double massCentreM(Quantity q, double heightM) {
    if (q.how() == How.RANGE) {
      return ofRange(q);
    }
    return q.plusMinus() != null
        ? q.plusMinus()
        : What.MASS_CENTRE.usual(q.how()).value() * heightM;
  }

  /** One standard deviation of a bearing point aside [m]: half its position error. */
  public static double bearingAsideM(Place place) {
    return Allowances.BEARING_ASIDE.value() * place.errorM();
  }

  static List<Figure> figures() {
    return Stream.concat(
            Arrays.stream(What.values()).flatMap(w -> w.byHow.stream()), Stream.of(GUST_LEAST_SD))
        .toList();
  }
}
