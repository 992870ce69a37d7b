package org.fallwright.ui.text;

import com.fasterxml.jackson.databind.JsonNode;
import com.fasterxml.jackson.databind.node.ObjectNode;
import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import java.util.stream.Collectors;
import java.util.stream.StreamSupport;
import org.fallwright.core.pull.Parameter;
import org.fallwright.core.pull.SourceDescription;
import org.fallwright.core.pull.Wording;

/**
 * A pull source and its parameters in words, from nothing but what the source says of itself; the
 * command line and the sheet use it, and a source that is added needs no word here.
 */
public final class SourceText {
  private static final Wording RANGE = new Wording("from %s to %s", "de %s a %s");
  private static final Wording YES = new Wording("yes", "sí");
  private static final Wording NO = new Wording("no", "no");
  private static final Wording YES_OR_NO = new Wording("yes or no", "sí o no");
  private static final Wording ONE_OF = new Wording("one of", "una de");
  private static final Wording SOME_OF = new Wording("one or more of", "una o más de");
  private static final Wording PRESET = new Wording("a form fills in", "el formulario pone");
  private static final Wording OPTIONAL = new Wording("may be left out", "se puede omitir");
  private static final Wording ONLY = new Wording("only where %s is %s", "solo si %s es %s");

  /** Below it a length is shown as one of the cut or the stem [m]. */
  private static final double SMALL_M = 0.5;

  private SourceText() {}

  private static String shown(Parameter p, JsonNode value, Locale in, Amounts amounts) {
    if (!value.isNumber() || p.unit().isEmpty()) {
      return value(p, value, in);
    }
    double si = value.doubleValue();
    return p.unit().equals("m") && Math.abs(si) < SMALL_M
        ? amounts.small(si)
        : amounts.amount(si, p.unit());
  }

  /** The first number that a site states of a source: "Rated pull: 2,200 lbf …". */
  public static String firstNumber(
      SourceDescription source, ObjectNode values, Locale in, Amounts amounts) {
    return source.parameters().stream()
            .filter(p -> values.path(p.key()).isNumber())
            .findFirst()
            .map(p -> p.label().in(in) + ": " + shown(p, values.get(p.key()), in, amounts))
            .orElse("")
        + " …";
  }

  /** All that somebody needs who fills in the source's parameters, line by line. */
  public static List<String> explained(SourceDescription source, Locale in) {
    List<String> lines = new ArrayList<>();
    lines.add(source.id() + ": " + source.name().in(in));
    for (Parameter p : source.parameters()) {
      lines.add("  " + p.key() + ": " + p.label().in(in));
      List<String> asked = new ArrayList<>(List.of(asked(p, in)));
      if (p.where() != null) {
        String choices =
            p.where().choices().stream()
                .map(c -> choice(source.parameter(p.where().key()).orElseThrow(), c, in))
                .collect(Collectors.joining(" / "));
        asked.add(String.format(Locale.ROOT, ONLY.in(in), p.where().key(), choices));
      }
      if (p.optional()) {
        asked.add(OPTIONAL.in(in));
      }
      if (p.preset() != null) {
        asked.add(PRESET.in(in) + " " + value(p, p.preset(), in));
      }
      lines.add("      " + String.join("; ", asked));
      lines.add("      " + p.help().in(in));
    }
    return lines;
  }

  private static String asked(Parameter p, Locale in) {
    return switch (p.kind()) {
      case NUMBER, WHOLE_NUMBER ->
          withUnit(
              String.format(Locale.ROOT, RANGE.in(in), number(p.least()), number(p.most())), p);
      case FLAG -> YES_OR_NO.in(in);
      case CHOICE -> ONE_OF.in(in) + " " + choices(p, in);
      case CHOICES -> SOME_OF.in(in) + " " + choices(p, in);
    };
  }

  private static String choices(Parameter p, Locale in) {
    return p.choices().stream()
        .map(c -> c.key() + " (" + c.wording().in(in) + ")")
        .collect(Collectors.joining(", "));
  }

  private static String value(Parameter p, JsonNode value, Locale in) {
    return switch (p.kind()) {
      case NUMBER, WHOLE_NUMBER -> withUnit(number(value.doubleValue()), p);
      case FLAG -> (value.booleanValue() ? YES : NO).in(in);
      case CHOICE -> choice(p, value.asText(), in);
      case CHOICES ->
          StreamSupport.stream(value.spliterator(), false)
              .map(v -> choice(p, v.asText(), in))
              .collect(Collectors.joining(", "));
    };
  }

  private static String choice(Parameter p, String key, Locale in) {
    return p.choices().stream()
        .filter(c -> c.key().equals(key))
        .map(c -> c.wording().in(in))
        .findFirst()
        .orElse(key);
  }

  private static String withUnit(String number, Parameter p) {
    return p.unit().isEmpty() ? number : number + " " + (p.unit().equals("deg") ? "°" : p.unit());
  }

  private static String number(double value) {
    return value == Math.rint(value) && Math.abs(value) < 1e15
        ? Long.toString((long) value)
        : Double.toString(value);
  }
}
