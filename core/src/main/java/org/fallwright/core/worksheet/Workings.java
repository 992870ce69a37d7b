package org.fallwright.core.worksheet;

import java.math.BigDecimal;
import java.math.MathContext;
import java.math.RoundingMode;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.TreeMap;
import org.fallwright.core.reference.Figure;
import org.fallwright.core.reference.Sources;
import org.fallwright.core.site.Quantity;
import org.fallwright.core.units.DisplayUnits;

/**
 * A worksheet while it is worked. Each result is what its printed sum gives, rounded to the digits
 * that are printed, and goes on rounded: nothing unprinted enters a later line.
 */
final class Workings {
  /** Digits that count in every figure. */
  static final int DIGITS = 6;

  private static final MathContext NOISE_OFF = new MathContext(12);

  private final DisplayUnits in;
  private final Map<String, Line> bySymbol = new LinkedHashMap<>();
  private final List<Section> sections = new ArrayList<>();
  private final List<Compared> compared = new ArrayList<>();
  private final Map<String, String> sources = new TreeMap<>();
  private String title = "";
  private List<String> notes = new ArrayList<>();
  private List<Line> lines = new ArrayList<>();

  Workings(DisplayUnits in) {
    this.in = in;
  }

  DisplayUnits in() {
    return in;
  }

  /** Begins a section. */
  void section(String heading) {
    close();
    title = heading;
  }

  /** A sentence at the head of the section. */
  void note(String sentence) {
    notes.add(sentence);
  }

  /** A figure that is given, in SI; an angle in degrees. */
  void given(String symbol, String name, double si, Dimension d, Basis basis) {
    given(symbol, name, si, d, basis, "");
  }

  /** The same with its source. */
  void given(String symbol, String name, double si, Dimension d, Basis basis, String source) {
    put(new Line(symbol, name, "", "", number(si, d), d.in(in).symbol(), basis, source, List.of()));
  }

  /** An entered quantity, in SI; an angle in degrees. */
  void given(String symbol, String name, Quantity q, Dimension d) {
    given(symbol, name, q.value(), d, Basis.of(q.how()));
  }

  /** A figure of the tables, in SI; an angle in degrees. */
  void given(String symbol, String name, Figure f, Dimension d) {
    given(symbol, name, f.value(), d, Basis.of(f.kind()), f.source());
  }

  /** An allowance, named by its own note, unless it stands above already. */
  void allow(String symbol, Figure f, Dimension d) {
    if (!has(symbol)) {
      given(symbol, f.note(), f, d);
    }
  }

  /** A sum. */
  void work(String symbol, String name, String formula, Dimension d, Basis basis) {
    work(symbol, name, formula, d, basis, "", Map.of());
  }

  /**
   * A sum with further numbers of its own.
   *
   * @param own printed numbers of signs that are no lines
   */
  void work(
      String symbol,
      String name,
      String formula,
      Dimension d,
      Basis basis,
      String source,
      Map<String, String> own) {
    String numbers = Formula.with(formula, s -> own.containsKey(s) ? own.get(s) : line(s).result());
    put(
        new Line(
            symbol,
            name,
            formula,
            numbers,
            printed(BigDecimal.valueOf(Formula.value(numbers)), false),
            d.in(in).symbol(),
            basis,
            source,
            Formula.signs(formula).stream().filter(s -> !own.containsKey(s)).toList()));
  }

  /** Sets a worked figure against the program's own, in SI; an angle in degrees. */
  void compare(String symbol, double exactSi, Dimension d) {
    Line l = line(symbol);
    compared.add(
        new Compared(symbol, l.name(), value(symbol), d.in(in).fromSi(exactSi), d.in(in).symbol()));
  }

  boolean has(String symbol) {
    return bySymbol.containsKey(symbol);
  }

  /** The printed figure of a line, in its unit. */
  double value(String symbol) {
    return Double.parseDouble(line(symbol).result().replace('−', '-'));
  }

  /** An SI figure as printed. */
  String number(double si, Dimension d) {
    return printed(BigDecimal.valueOf(d.in(in).fromSi(si)).round(NOISE_OFF), true);
  }

  /** The same with its unit. */
  String amount(double si, Dimension d) {
    String unit = d.in(in).symbol();
    return number(si, d) + (unit.isEmpty() || unit.equals("°") ? unit : " " + unit);
  }

  /**
   * What a sum must still be multiplied by so that its units fit, as the end of a formula: empty, "
   * ÷ 12", " × 144".
   *
   * @param si product of the units in the sum over the unit of its result, each in SI
   */
  static String fit(double si) {
    double per = 1 / si;
    if (Math.abs(si - 1) < 1e-12) {
      return "";
    }
    if (Math.abs(si - Math.rint(si)) < 1e-9 * si) {
      return " × " + Math.round(si);
    }
    if (Math.abs(per - Math.rint(per)) < 1e-9 * per) {
      return " ÷ " + Math.round(per);
    }
    return " × "
        + BigDecimal.valueOf(si).round(new MathContext(8)).stripTrailingZeros().toPlainString();
  }

  /** A unit in SI. */
  double unit(Dimension d) {
    return d.in(in).inSi();
  }

  /** The end of a formula that turns one unit into another. */
  String fit(Dimension from, Dimension to) {
    return fit(unit(from) / unit(to));
  }

  Worksheet finish(
      String heading, List<String> lead, List<String> remarks, List<Worksheet.Result> results) {
    close();
    return new Worksheet(heading, List.of(), lead, remarks, sections, results, compared, sources);
  }

  private void close() {
    if (!lines.isEmpty() || !notes.isEmpty()) {
      sections.add(new Section(title, notes, lines));
    }
    notes = new ArrayList<>();
    lines = new ArrayList<>();
  }

  private Line line(String symbol) {
    Line l = bySymbol.get(symbol);
    if (l == null) {
      throw new IllegalStateException("the worksheet has no line " + symbol + " yet");
    }
    return l;
  }

  private void put(Line l) {
    if (bySymbol.putIfAbsent(l.symbol(), l) != null) {
      throw new IllegalStateException("the worksheet has the line " + l.symbol() + " twice");
    }
    lines.add(l);
    if (!l.source().isEmpty()) {
      Sources.Source s = Sources.of(l.source());
      sources.put(
          l.source(),
          s.citation()
              + switch (s.seen()) {
                case READ -> s.through().isEmpty() ? "" : " (read in " + s.through() + ")";
                case SECONDARY -> " (read through " + s.through() + ")";
                case FROM_MEMORY -> " (from memory, not seen)";
              });
    }
  }

  /** To {@link #DIGITS} digits, or to whole units where those are fewer than the figure has. */
  private static String printed(BigDecimal x, boolean strip) {
    if (x.signum() == 0) {
      return "0";
    }
    int whole = x.precision() - x.scale();
    BigDecimal r = x.setScale(Math.max(0, DIGITS - whole), RoundingMode.HALF_EVEN);
    if (strip) {
      r = r.stripTrailingZeros();
    }
    return r.signum() == 0 ? "0" : r.toPlainString().replace('-', '−');
  }
}
