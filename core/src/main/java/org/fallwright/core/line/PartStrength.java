package org.fallwright.core.line;

import org.fallwright.core.reference.Allowances;
import org.fallwright.core.reference.Hardware;
import org.fallwright.core.site.Gear;
import org.fallwright.core.units.Range;

/**
 * Ultimate strength of a part of the line and the factors asked of it.
 *
 * @param strengthN ultimate strength [N]
 * @param designFactor factor asked at the planned load
 * @param lastFactor factor asked at the most the source can do
 */
public record PartStrength(double strengthN, double designFactor, double lastFactor) {
  /** Factor asked of a fibre line. Published: 29 CFR 1918 App. II Table 2 (fibre slings). */
  public static final double FIBRE = Allowances.FIBRE_FACTOR.value();

  /**
   * Factor asked of a wire rope that pulls. Published: Oregon tethered logging, a third of break.
   */
  public static final double WIRE = Allowances.WIRE_FACTOR.value();

  /** Factor asked of a chain that pulls: breaking over working load of chain. */
  public static final double CHAIN = Hardware.value("chain.factor");

  /** Factor asked at the most the source can do; planning allowance. */
  public static final double LAST = Allowances.LAST_FACTOR.value();

  /**
   * A pull line as it is rigged.
   *
   * @param ruleFactor least design factor that the rule set asks; 1 where it asks none
   */
  public static PartStrength line(LineFigures line, double ruleFactor) {
    Range.check("rule_factor", ruleFactor, 1, 20, "");
    Gear.Material m = line.line().material();
    return new PartStrength(
        line.strengthN(), Math.max(m.chain() ? CHAIN : m.wire() ? WIRE : FIBRE, ruleFactor), LAST);
  }

  /** Rated hardware as it is rigged. */
  public static PartStrength of(RatedFigures rated) {
    return rated(rated.asRiggedN(), rated.factor().value());
  }

  /**
   * Rated hardware: its breaking load is its rating times the factor of its standard, and that
   * factor is asked at the planned load.
   */
  public static PartStrength rated(double ratedLoadN, double standardFactor) {
    Range.check("rated_load_N", ratedLoadN, 1, 1e8, "N");
    Range.check("standard_factor", standardFactor, 1, 12, "");
    return new PartStrength(ratedLoadN * standardFactor, standardFactor, LAST);
  }

  /** Tension at the planned load that the part allows [N]. */
  public double allowedN() {
    return strengthN / designFactor;
  }
}
