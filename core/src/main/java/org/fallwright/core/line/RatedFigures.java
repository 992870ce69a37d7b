package org.fallwright.core.line;

import java.util.ArrayList;
import java.util.List;
import org.fallwright.core.reference.Hardware;
import org.fallwright.core.reference.Kind;
import org.fallwright.core.site.Gear;

/**
 * What rated hardware may carry as it is rigged: its rating, by its tag or by rule, times what the
 * way it is laid or loaded leaves of it.
 *
 * @param id its name in the gear
 * @param ratedN rated load, by its tag or by rule [N]
 * @param rule how it was got where there is no tag
 * @param shares what the hitch, the choke and a load aside make of it
 * @param factor breaking load over rated load
 */
public record RatedFigures(String id, double ratedN, Rule rule, List<Share> shares, Share factor) {
  /** How a rating was got. */
  public enum Rule {
    TAG,
    CHAIN_BY_GRADE,
    UNMARKED_SHACKLE
  }

  public RatedFigures {
    shares = List.copyOf(shares);
  }

  /** Rating as it is rigged [N]. */
  public double asRiggedN() {
    double n = ratedN;
    for (Share s : shares) {
      n *= s.value();
    }
    return n;
  }

  public static RatedFigures of(Gear.Block b) {
    return new RatedFigures(
        b.id(), b.ratedLoadN(), Rule.TAG, List.of(), factor(b.standardFactor(), "factor.block"));
  }

  public static RatedFigures of(Gear.LoadCell c) {
    return new RatedFigures(
        c.id(), c.ratedLoadN(), Rule.TAG, List.of(), factor(c.standardFactor(), ""));
  }

  public static RatedFigures of(Gear.Connector c) {
    boolean tag = c.ratedLoadN() != null;
    double rated = tag ? c.ratedLoadN() : Shackles.unmarkedN(c.bodyDiameterM());
    List<Share> shares = new ArrayList<>();
    if (c.kind() == Gear.Connector.Kind.SHACKLE) {
      shares.add(Share.row(Shackles.asideRow(c.asideDeg())));
    }
    return new RatedFigures(
        c.id(),
        rated,
        tag ? Rule.TAG : Rule.UNMARKED_SHACKLE,
        shares,
        factor(
            c.standardFactor(),
            Shackles.designFactor(rated) == Shackles.DESIGN_FACTOR
                ? "shackle.factor"
                : "shackle.factor-large"));
  }

  public static RatedFigures of(Gear.Sling s) {
    boolean tag = s.ratedLoadN() != null;
    double rated = tag ? s.ratedLoadN() : grade(s.kind()).workingN(s.diameterM());
    return new RatedFigures(
        s.id(),
        rated,
        tag ? Rule.TAG : Rule.CHAIN_BY_GRADE,
        hitch(s),
        factor(
            s.standardFactor(),
            switch (s.kind()) {
              case NATURAL_FIBRE -> "factor.sling.natural-fibre";
              case WIRE_ROPE -> "factor.sling.wire";
              case CHAIN_30, CHAIN_43, CHAIN_80, CHAIN_100 -> "factor.sling.chain";
              case ROUND_SLING, WEBBING, OTHER -> "factor.sling.synthetic";
            }));
  }

  private static List<Share> hitch(Gear.Sling s) {
    switch (s.hitch()) {
      case AS_RIGGED:
        return List.of();
      case VERTICAL:
        return List.of(Share.of(SlingHitch.VERTICAL.figure()));
      case BASKET:
        double leg = s.angleDeg() == null ? SlingHitch.FLATTEST_DEG : s.angleDeg();
        return List.of(
            new Share(
                "basket: twice the sine of its legs' angle to the horizontal",
                SlingHitch.basket(leg),
                Kind.COMMON_PRACTICE,
                ""));
      default:
        SlingHitch choker =
            switch (s.kind()) {
              case NATURAL_FIBRE -> SlingHitch.CHOKER_NATURAL_FIBRE;
              case WIRE_ROPE -> SlingHitch.CHOKER_WIRE;
              default -> SlingHitch.CHOKER_SYNTHETIC;
            };
        return List.of(
            Share.of(choker.figure()),
            Share.row(SlingHitch.chokeRow(s.angleDeg() == null ? 0 : s.angleDeg())));
    }
  }

  /** The grade of a chain sling. */
  public static ChainGrade grade(Gear.Sling.Kind kind) {
    return ChainGrade.valueOf(kind.name().replace("CHAIN", "GRADE"));
  }

  private static Share factor(Double stated, String row) {
    return stated == null
        ? Share.of(Hardware.of(row))
        : new Share("factor of its standard", stated, null, "");
  }
}
