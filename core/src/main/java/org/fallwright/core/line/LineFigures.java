package org.fallwright.core.line;

import java.util.Arrays;
import java.util.Comparator;
import java.util.Locale;
import org.fallwright.core.reference.Kind;
import org.fallwright.core.site.Gear;

/**
 * A line as it is rigged: what it breaks at, what its ends, its tightest bend, water, weather and
 * age leave of that, and how soft it is.
 *
 * <p>Strength = breaking load × the lesser of both ends × bend × wet × weather × age. What was not
 * entered is the worst known of its kind: a breaking load by the rule of its material, an end as
 * the weakest of its kind, the softest stretch, a bend over a sheave of unknown size as sharp as
 * the rope is thick.
 *
 * @param line the line as entered
 * @param breakingN breaking load, from its label or by rule [N]
 * @param treeEnd what its end at the tree leaves
 * @param sourceEnd what the other leaves
 * @param bend what its tightest bend leaves
 * @param wet what water leaves
 * @param weather what years of weather leave
 * @param age what age and wear leave
 * @param bendRatio diameter of the sheave over that of the line; NaN: it runs over none, or over
 *     one of unknown size
 * @param stiffnessN axial stiffness EA [N]
 */
public record LineFigures(
    Gear.Line line,
    double breakingN,
    Share treeEnd,
    Share sourceEnd,
    Share bend,
    Share wet,
    Share weather,
    Share age,
    double bendRatio,
    double stiffnessN) {
  /** Least ratio of diameters that is known of a wire rope's bend. */
  public static final double LEAST_RATIO = 1;

  /**
   * The figures of a line.
   *
   * @param over the block that it runs over; null: none
   */
  public static LineFigures of(Gear.Line line, Gear.Block over) {
    double breaking = line.breakingLoadN() == null ? byRuleN(line) : line.breakingLoadN();
    double ratio =
        over == null || over.sheaveDiameterM() == null
            ? Double.NaN
            : over.sheaveDiameterM() / line.diameterM();
    boolean fibre = line.material().fibre();
    return new LineFigures(
        line,
        breaking,
        end(line, line.treeEnd()),
        end(line, line.sourceEnd()),
        bend(line, over, ratio),
        line.wet() && fibre
            ? Share.of(bare(line).fibre().inWater())
            : Share.whole("dry, or not of fibre"),
        line.weathered() && fibre
            ? Share.of(bare(line).fibre().weather())
            : Share.whole("no years of weather"),
        line.age() == null
            ? Share.whole("as new")
            : Share.stated("what age and wear leave", line.age()),
        ratio,
        line.stiffnessN() == null ? softestN(line, breaking) : line.stiffnessN());
  }

  /** The weaker end. */
  public Share end() {
    return treeEnd.value() <= sourceEnd.value() ? treeEnd : sourceEnd;
  }

  /** Ultimate strength as rigged [N]. */
  public double strengthN() {
    return breakingN * end().value() * bend.value() * wet.value() * weather.value() * age.value();
  }

  /** Whether its breaking load is by the rule of its material. */
  public boolean byRule() {
    return line.breakingLoadN() == null;
  }

  /** Whether its stiffness is the softest known. */
  public boolean softest() {
    return line.stiffnessN() == null;
  }

  /** The fibre of a fibre line. */
  public FibreRope fibre() {
    return FibreRope.valueOf(line.material().name());
  }

  /** The grade of a chain. */
  public ChainGrade grade() {
    return ChainGrade.valueOf(line.material().name().replace("CHAIN", "GRADE"));
  }

  /** The core of a wire rope. */
  public WireRope core() {
    return WireRope.valueOf(line.material().name().replace("WIRE_", ""));
  }

  private static double byRuleN(Gear.Line line) {
    LineFigures bare = bare(line);
    double d = line.diameterM();
    return line.material().wire()
        ? bare.core().breakingN(d, WireRope.GRADE_1770)
        : line.material().chain()
            ? bare.grade().breakingN(d)
            : bare.fibre().breakingN(d).orElseThrow();
  }

  private static double softestN(Gear.Line line, double breakingN) {
    return breakingN / bare(line).softness().value();
  }

  /** Stretch over the share of the breaking load, the softest known of its material. */
  public Share softness() {
    return line.material().fibre() ? fibre().softness() : WireRope.softness();
  }

  private static LineFigures bare(Gear.Line line) {
    return new LineFigures(line, 0, null, null, null, null, null, null, Double.NaN, 0);
  }

  private static Share end(Gear.Line line, Gear.End end) {
    boolean wire = line.material().wire();
    if (end == null) {
      if (line.material().chain()) {
        return Share.whole("end of a chain: its link");
      }
      return Arrays.stream(RopeEnd.values())
          .filter(e -> e.wire() == wire)
          .map(e -> end(line, e))
          .min(Comparator.comparingDouble(Share::value))
          .map(
              s -> new Share("end not stated, the weakest counts", s.value(), s.kind(), s.source()))
          .orElseThrow();
    }
    if (end.stated() != null) {
      return Share.stated(words(end.kind()), end.stated());
    }
    return end(line, RopeEnd.valueOf(end.kind().name()));
  }

  private static Share end(Gear.Line line, RopeEnd end) {
    boolean slippery = line.material() == Gear.Material.HMPE;
    return slippery && end.factorIn(FibreRope.HMPE) < end.factor()
        ? Share.row("fibre-end.hmpe-knot")
        : Share.of(end.figure());
  }

  /** A kind of end in words. */
  static String words(Gear.End.Kind kind) {
    return kind == Gear.End.Kind.OTHER
        ? "end"
        : kind.name().toLowerCase(Locale.ROOT).replace('_', ' ');
  }

  private static Share bend(Gear.Line line, Gear.Block over, double ratio) {
    if (line.bend() != null) {
      return Share.stated("what its tightest bend leaves", line.bend());
    }
    if (over == null || !line.material().wire()) {
      return Share.whole(
          over == null ? "no block in the line" : "over a sheave: nothing read for this line");
    }
    Share sharpest = Share.row("wire.bend.1");
    if (Double.isNaN(ratio)) {
      return new Share(
          "bend over a sheave of unknown size, the sharpest counts",
          sharpest.value(),
          sharpest.kind(),
          sharpest.source());
    }
    return new Share(
        "strength left over the sheave, by its diameter over the rope's",
        WireBend.keeps(Math.max(LEAST_RATIO, ratio)),
        Kind.FROM_MEMORY,
        sharpest.source());
  }
}
