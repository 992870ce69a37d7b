package org.fallwright.core.line;

import java.util.Comparator;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.stream.Stream;
import org.fallwright.core.reference.Figure;
import org.fallwright.core.reference.Hardware;
import org.fallwright.core.reference.Kind;
import org.fallwright.core.units.Range;
import org.fallwright.core.units.Units;

/**
 * Fibre ropes by what they are made of: strength where there is no label, stretch, and what water
 * and weather take.
 *
 * <p>Every figure is a row of {@link Hardware} with its source. A rule of thumb stands in only
 * where a line has no label, and is said to; for HMPE none was read.
 */
public enum FibreRope {
  NYLON("nylon"),
  POLYESTER("polyester"),
  HMPE("hmpe"),
  POLYPROPYLENE("polypropylene"),
  MANILA("manila");

  /** Loads at which a stretch is known. */
  public enum At {
    TENTH("10", 0.1),
    FIFTH("20", 0.2),
    BREAK("break", 1);

    private final String key;
    private final double share;

    At(String key, double share) {
      this.key = key;
      this.share = share;
    }

    /** Share of the breaking load. */
    public double share() {
      return share;
    }
  }

  /**
   * Stretch as a share of the length.
   *
   * @param low the stiff end of what is known
   * @param high the soft end
   */
  public record Stretch(double low, double high) {}

  /** Thickest rope that the rule of thumb answers for [m]. */
  public static final double THICKEST_M = 0.026;

  private final String key;

  FibreRope(String key) {
    this.key = key;
  }

  /**
   * Breaking load of a laid rope without a label [N]: c·C² pounds-force, C = π·d its circumference
   * in inches. Up to {@link #THICKEST_M} it comes within 13 % of a table of manila ropes; thicker
   * ropes hold less than it says, so none is answered for.
   */
  public OptionalDouble breakingN(double diameterM) {
    Range.check("diameter_m", diameterM, 0.003, THICKEST_M, "m");
    double pounds = poundsPerInch2();
    double circumferenceIn = Math.PI * diameterM / Units.INCH;
    return Double.isNaN(pounds)
        ? OptionalDouble.empty()
        : OptionalDouble.of(pounds * circumferenceIn * circumferenceIn * Units.POUND_FORCE);
  }

  /** Breaking load over the square of the circumference [lbf/in²]; NaN: none was read. */
  public double poundsPerInch2() {
    double manila = Hardware.value("fibre.manila.rule");
    return switch (this) {
      case MANILA -> manila;
      case NYLON -> Hardware.value("fibre.nylon.rule");
      case POLYESTER, POLYPROPYLENE -> manila * Hardware.value("fibre." + key + ".over-manila");
      case HMPE -> Double.NaN;
    };
  }

  /** Stretch at that load, where it is known. Polypropylene: two thirds of nylon. */
  public Optional<Stretch> stretch(At at) {
    if (this == POLYPROPYLENE) {
      double share = Hardware.value("fibre.polypropylene.stretch-over-nylon");
      return NYLON.stretch(at).map(s -> new Stretch(share * s.low(), share * s.high()));
    }
    String row = "fibre." + key + ".stretch-" + at.key;
    return Hardware.find(row + ".low")
        .map(low -> new Stretch(low.value(), Hardware.value(row + ".high")));
  }

  /**
   * Axial stiffness EA, the softest that is known [N]: the load over the greatest stretch there, at
   * a fifth of the breaking load and at break, the lesser. A soft line holds a tree worse and
   * stores more, so this is the safe side. Of manila no stretch was read: it counts as nylon, the
   * softest of all (planning allowance).
   *
   * @param breakingN breaking load on the label [N]
   */
  public double softestN(double breakingN) {
    return Range.check("breaking_load_N", breakingN, 100, 5e6, "N") / softness().value();
  }

  /** The greatest stretch over the share of the breaking load at which it is reached. */
  Share softness() {
    String what = "stretch over share of the breaking load, the softest known";
    if (this == MANILA) {
      return new Share(what + ": of nylon", NYLON.softness().value(), Kind.PLANNING_ALLOWANCE, "");
    }
    FibreRope of = this == POLYPROPYLENE ? NYLON : this;
    return Stream.of(At.FIFTH, At.BREAK)
        .flatMap(
            at -> {
              Optional<Figure> row =
                  Hardware.find("fibre." + of.key + ".stretch-" + at.key + ".high");
              return stretch(at).stream()
                  .map(
                      s ->
                          new Share(
                              what,
                              s.high() / at.share(),
                              row.orElseThrow().kind(),
                              row.orElseThrow().source()));
            })
        .max(Comparator.comparingDouble(Share::value))
        .orElseThrow();
  }

  /** Share of its strength that it keeps when wet. */
  public double wet() {
    return inWater().value();
  }

  /** The same with what stands behind it. */
  Figure inWater() {
    return Hardware.of("fibre." + key + ".wet");
  }

  /** Share of its strength that it keeps after two years in the weather. */
  public double weathered() {
    return weather().value();
  }

  /** The same with what stands behind it: published of synthetic lines, of manila none was read. */
  Figure weather() {
    return Hardware.of(this == MANILA ? "fibre.manila.weather" : "fibre.weather");
  }
}
