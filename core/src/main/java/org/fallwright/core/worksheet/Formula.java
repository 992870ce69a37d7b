package org.fallwright.core.worksheet;

import java.util.ArrayList;
import java.util.List;
import java.util.Set;
import java.util.function.UnaryOperator;
import java.util.regex.Matcher;
import java.util.regex.Pattern;

/**
 * A sum as it is printed: signs and numbers with + − × ÷ ^, brackets, and the functions √ sin cos
 * tan asin atan ln exp min max abs; angles in degrees. A power binds first, then × and ÷ from the
 * left, then + and −. A negative number stands in brackets.
 */
final class Formula {
  private static final Set<String> FUNCTIONS =
      Set.of("sin", "cos", "tan", "asin", "atan", "ln", "exp", "min", "max", "abs", "π");
  private static final Pattern SIGN = Pattern.compile("\\p{L}[\\p{L}\\p{N}_]*");

  private final String text;
  private int at;

  private Formula(String numbers) {
    text = numbers.replace(" ", "");
  }

  /** The signs in a formula, each once, in order. */
  static List<String> signs(String formula) {
    return SIGN.matcher(formula)
        .results()
        .map(r -> r.group())
        .filter(s -> !FUNCTIONS.contains(s))
        .distinct()
        .toList();
  }

  /** The formula with the number of each sign put in. */
  static String with(String formula, UnaryOperator<String> numberOf) {
    return SIGN.matcher(formula)
        .replaceAll(
            r -> {
              if (FUNCTIONS.contains(r.group())) {
                return r.group();
              }
              String n = numberOf.apply(r.group());
              return Matcher.quoteReplacement(n.startsWith("−") ? "(" + n + ")" : n);
            });
  }

  /**
   * What a formula of numbers gives.
   *
   * @throws IllegalArgumentException where it cannot be read
   */
  static double value(String numbers) {
    Formula f = new Formula(numbers);
    double v = f.sum();
    if (f.at < f.text.length()) {
      throw f.unreadable();
    }
    return v;
  }

  private double sum() {
    double v = product();
    while (true) {
      if (eat("+")) {
        v += product();
      } else if (eat("−")) {
        v -= product();
      } else {
        return v;
      }
    }
  }

  private double product() {
    double v = power();
    while (true) {
      if (eat("×")) {
        v *= power();
      } else if (eat("÷")) {
        v /= power();
      } else {
        return v;
      }
    }
  }

  private double power() {
    double base = atom();
    return eat("^") ? Math.pow(base, atom()) : base;
  }

  private double atom() {
    if (eat("(")) {
      double v = eat("−") ? -sum() : sum();
      expect(")");
      return v;
    }
    if (eat("√")) {
      return Math.sqrt(arguments(1).get(0));
    }
    if (eat("π")) {
      return Math.PI;
    }
    for (String name : FUNCTIONS) {
      if (eat(name + "(")) {
        at--;
        return function(name);
      }
    }
    int start = at;
    while (at < text.length() && (Character.isDigit(text.charAt(at)) || text.charAt(at) == '.')) {
      at++;
    }
    if (start == at) {
      throw unreadable();
    }
    return Double.parseDouble(text.substring(start, at));
  }

  private double function(String name) {
    if (name.equals("min") || name.equals("max")) {
      List<Double> all = arguments(2);
      return name.equals("min")
          ? all.stream().mapToDouble(d -> d).min().orElseThrow()
          : all.stream().mapToDouble(d -> d).max().orElseThrow();
    }
    double x = arguments(1).get(0);
    return switch (name) {
      case "sin" -> Math.sin(Math.toRadians(x));
      case "cos" -> Math.cos(Math.toRadians(x));
      case "tan" -> Math.tan(Math.toRadians(x));
      case "asin" -> Math.toDegrees(Math.asin(x));
      case "atan" -> Math.toDegrees(Math.atan(x));
      case "ln" -> Math.log(x);
      case "exp" -> Math.exp(x);
      case "abs" -> Math.abs(x);
      default -> throw unreadable();
    };
  }

  private List<Double> arguments(int least) {
    expect("(");
    List<Double> all = new ArrayList<>();
    do {
      all.add(sum());
    } while (eat(","));
    expect(")");
    if (all.size() < least) {
      throw unreadable();
    }
    return all;
  }

  private boolean eat(String what) {
    if (text.startsWith(what, at)) {
      at += what.length();
      return true;
    }
    return false;
  }

  private void expect(String what) {
    if (!eat(what)) {
      throw unreadable();
    }
  }

  private IllegalArgumentException unreadable() {
    return new IllegalArgumentException(
        "the sum \"" + text + "\" cannot be read at sign " + (at + 1));
  }
}
