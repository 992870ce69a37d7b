package org.fallwright.core.worksheet;

import static org.fallwright.core.worksheet.Dimension.FORCE;
import static org.fallwright.core.worksheet.Dimension.NUMBER;
import static org.fallwright.core.worksheet.Dimension.SMALL_LENGTH;
import static org.fallwright.core.worksheet.Dimension.STRESS;

import org.fallwright.core.line.LineFigures;
import org.fallwright.core.line.RatedFigures;
import org.fallwright.core.line.Share;
import org.fallwright.core.line.WireRope;
import org.fallwright.core.reference.Figure;
import org.fallwright.core.reference.Hardware;
import org.fallwright.core.units.Units;

/** What a line breaks at and what rated hardware may carry, from what was entered of them. */
final class GearLines {
  private final Workings w;

  GearLines(Workings w) {
    this.w = w;
  }

  /** Breaking load of a line. */
  void breaking(LineFigures l) {
    if (l.byRule()) {
      byRule(l);
    } else {
      w.given("b_l", "breaking load on its label", l.breakingN(), FORCE, Basis.ENTERED);
    }
  }

  /** What a line's ends, bend, water, weather and age leave of it. */
  void line(LineFigures l) {
    share("q_e1", l.treeEnd(), "its end at the tree");
    share("q_e2", l.sourceEnd(), "its other end");
    w.work("q_e", "what its weaker end leaves", "min(q_e1, q_e2)", NUMBER, Basis.RULE);
    share("q_k", l.bend(), "its tightest bend");
    share("q_n", l.wet(), "wet");
    share("q_j", l.weather(), "weather");
    share("q_a", l.age(), "age and wear");
  }

  private void byRule(LineFigures l) {
    w.given("d_l", "diameter of the line", l.line().diameterM(), SMALL_LENGTH, Basis.ENTERED);
    double d = w.unit(SMALL_LENGTH);
    String area = Workings.fit(d * d * w.unit(STRESS) / w.unit(FORCE));
    if (l.line().material().wire()) {
      row("k_l", "wire." + (l.core() == WireRope.FIBRE_CORE ? "fibre-core" : "steel-core"));
      w.given(
          "R_l", "usual grade of its wires", WireRope.GRADE_1770, STRESS, Basis.COMMON_PRACTICE);
      w.work(
          "b_l",
          "breaking load, no label: by core and diameter",
          "k_l × d_l^2 × R_l" + area,
          FORCE,
          Basis.FROM_MEMORY);
    } else if (l.line().material().chain()) {
      Figure f = Hardware.of("chain.g" + l.grade().name().replace("GRADE_", "") + ".stress");
      w.given("R_l", f.note(), 1e6 * f.value(), STRESS, Basis.of(f.kind()), f.source());
      w.work(
          "b_l",
          "breaking load, no label: by grade and diameter",
          "R_l × π × d_l^2 ÷ 2" + area,
          FORCE,
          Basis.FROM_MEMORY);
    } else {
      w.given(
          "k_l",
          "breaking load over the square of the circumference, lbf/in²",
          l.fibre().poundsPerInch2(),
          NUMBER,
          Basis.PUBLISHED,
          "navy-builder");
      w.work(
          "b_l",
          "breaking load, no label: by the rule of its fibre",
          "k_l × (π × d_l"
              + Workings.fit(d / Units.INCH)
              + ")^2"
              + Workings.fit(Units.POUND_FORCE / w.unit(FORCE)),
          FORCE,
          Basis.PUBLISHED);
    }
  }

  /** Rated load and factor of rated hardware, as it is rigged. */
  void rated(int i, RatedFigures r) {
    boolean plain = r.shares().isEmpty();
    String e = plain ? "E_" + i : "E_r" + i;
    switch (r.rule()) {
      case TAG -> w.given(e, "rated load of " + r.id(), r.ratedN(), FORCE, Basis.ENTERED);
      case CHAIN_BY_GRADE ->
          w.given(
              e,
              "working load of the chain " + r.id() + ", by its grade and diameter",
              r.ratedN(),
              FORCE,
              Basis.FROM_MEMORY,
              "chain-grades");
      case UNMARKED_SHACKLE ->
          w.given(
              e,
              "rated load of " + r.id() + ", no mark: by the diameter of its body",
              r.ratedN(),
              FORCE,
              Basis.PUBLISHED,
              "navy-14251");
    }
    StringBuilder formula = new StringBuilder(e);
    for (int j = 0; j < r.shares().size(); j++) {
      String q = "q_" + (char) ('x' + j) + i;
      share(q, r.shares().get(j), "");
      formula.append(" × ").append(q);
    }
    if (!plain) {
      w.work("E_" + i, "rated load as it is rigged", formula.toString(), FORCE, Basis.RULE);
    }
    share("F_" + i, r.factor(), "asked as planned");
  }

  private void row(String symbol, String key) {
    w.given(symbol, Hardware.of(key).note(), Hardware.of(key), NUMBER);
  }

  private void share(String symbol, Share s, String of) {
    String name = of.isEmpty() ? s.what() : s.what() + " (" + of + ")";
    w.given(symbol, name, s.value(), NUMBER, Basis.of(s), s.source());
  }
}
