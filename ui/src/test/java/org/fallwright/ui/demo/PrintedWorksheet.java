package org.fallwright.ui.demo;

import com.ezylang.evalex.Expression;
import java.math.BigDecimal;
import java.util.ArrayList;
import java.util.List;

/**
 * A worksheet as a person has it on paper: read back from its printed text alone, each sum worked
 * by a library that knows nothing of this program.
 */
final class PrintedWorksheet {
  /** A row of a table of sums. */
  record Row(String symbol, String name, String formula, String numbers, String result) {
    boolean worked() {
      return !numbers.isEmpty();
    }

    BigDecimal printed() {
      return new BigDecimal(result.replace('−', '-'));
    }

    /** What the printed numbers give. */
    double again() {
      try {
        return new Expression(ascii(numbers)).evaluate().getNumberValue().doubleValue();
      } catch (com.ezylang.evalex.EvaluationException
          | com.ezylang.evalex.parser.ParseException e) {
        throw new AssertionError(symbol + ": " + numbers, e);
      }
    }

    /** How far that is from the printed result, in units of its last digit. */
    double offInLastDigit() {
      return Math.abs(again() - printed().doubleValue()) / printed().ulp().doubleValue();
    }
  }

  private PrintedWorksheet() {}

  static List<Row> rows(String markdown) {
    List<Row> rows = new ArrayList<>();
    boolean sums = false;
    for (String line : markdown.split("\n")) {
      if (!line.startsWith("|")) {
        sums = false;
      } else if (line.startsWith("| sign | what | sum |")) {
        sums = true;
      } else if (sums && !line.startsWith("|---")) {
        String[] c = line.split("(?<!\\\\)\\|", -1);
        rows.add(new Row(bare(c[1]), c[2].strip(), bare(c[3]), bare(c[4]), bare(c[5])));
      }
    }
    return rows;
  }

  private static String bare(String cell) {
    return cell.strip().replace("`", "");
  }

  /** The sum in the library's signs; its sin, cos, tan, asin and atan take and give degrees. */
  private static String ascii(String sum) {
    return sum.replace('−', '-')
        .replace('×', '*')
        .replace('÷', '/')
        .replace("π", "PI")
        .replace("√", "SQRT")
        .replace("exp(", "E^(")
        .replace("ln(", "LOG(");
  }
}
