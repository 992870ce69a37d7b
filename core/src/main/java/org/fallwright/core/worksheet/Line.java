package org.fallwright.core.worksheet;

import java.util.List;
import org.fallwright.core.units.Range;

/**
 * One line of a worksheet: a figure that is given, or a sum that can be repeated.
 *
 * @param symbol its sign, used once in a worksheet
 * @param name what it is
 * @param formula the sum in signs; empty: the figure is given
 * @param numbers the sum with the printed numbers put in; empty: the figure is given
 * @param result the result as printed: what the numbers give, rounded to its last digit
 * @param unit its unit; empty: a pure number
 * @param basis what stands behind it
 * @param source key of {@link org.fallwright.core.reference.Sources}; empty: none is claimed
 * @param dependsOn signs in the formula that are lines of the same worksheet
 */
public record Line(
    String symbol,
    String name,
    String formula,
    String numbers,
    String result,
    String unit,
    Basis basis,
    String source,
    List<String> dependsOn) {
  public Line {
    Range.text("symbol", symbol);
    Range.text("result", result);
    Range.present("basis", basis);
    dependsOn = List.copyOf(dependsOn);
  }

  /** Whether it is worked from other lines. */
  public boolean worked() {
    return !formula.isEmpty();
  }

  /** What stands behind it, with the key of its source. */
  public String grounds() {
    return source.isEmpty() ? basis.word() : basis.word() + ": " + source;
  }
}
