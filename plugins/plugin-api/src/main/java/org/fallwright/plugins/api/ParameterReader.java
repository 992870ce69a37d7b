package org.fallwright.plugins.api;

import com.fasterxml.jackson.databind.JsonNode;
import com.fasterxml.jackson.databind.node.ObjectNode;
import java.util.ArrayList;
import java.util.HashSet;
import java.util.Iterator;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Set;
import java.util.stream.Collectors;
import org.fallwright.core.pull.SourceDescription;
import org.fallwright.core.pull.SourceDescription.Parameter;
import org.fallwright.core.pull.SourceDescription.ValueKind;
import org.fallwright.core.units.Range;

/**
 * Reads a source's parameters strictly by its own description: nothing is defaulted, clipped or
 * passed over. A key that the description does not know is refused, and so is every stated value of
 * the wrong kind or out of its range, whether it is asked for or not. A value of null counts as not
 * stated.
 *
 * <p>Whatever is wrong is an {@link IllegalArgumentException} of one sentence that names the key,
 * what was found and what is asked, limits and unit included.
 */
public final class ParameterReader {
  private final Map<String, Parameter> known = new LinkedHashMap<>();
  private final ObjectNode values;

  /**
   * Takes the parameters and checks all that are stated.
   *
   * @throws IllegalArgumentException if a key is unknown or a value is not what its key asks
   */
  public ParameterReader(SourceDescription description, ObjectNode values) {
    this.values = values;
    description.parameters().forEach(p -> known.put(p.key(), p));
    for (Iterator<String> keys = values.fieldNames(); keys.hasNext(); ) {
      String key = keys.next();
      Parameter parameter = known.get(key);
      if (parameter == null) {
        throw new IllegalArgumentException(
            brief(key)
                + " is not a parameter of the "
                + description.name()
                + "; it knows "
                + String.join(", ", known.keySet()));
      }
      if (isStated(key)) {
        check(parameter, values.get(key));
      }
    }
  }

  /** Whether the key has a value. */
  public boolean isStated(String key) {
    return values.hasNonNull(key);
  }

  /** A number that must be stated, in the parameter's unit. */
  public double number(String key) {
    return stated(key, ValueKind.NUMBER).doubleValue();
  }

  /** A whole number that must be stated. */
  public int wholeNumber(String key) {
    return stated(key, ValueKind.WHOLE_NUMBER).intValue();
  }

  /** A flag that must be stated. */
  public boolean flag(String key) {
    return stated(key, ValueKind.FLAG).booleanValue();
  }

  /** The one choice that must be stated. */
  public String choice(String key) {
    return stated(key, ValueKind.CHOICE).textValue();
  }

  /** The choices made, at least one, in the order of the description. */
  public List<String> choices(String key) {
    Set<String> chosen = new HashSet<>();
    stated(key, ValueKind.CHOICES).forEach(n -> chosen.add(n.asText()));
    return known.get(key).choices().stream().filter(chosen::contains).toList();
  }

  /**
   * Refuses a value where there must be none.
   *
   * @param kind what has no such value, for example "a hand winch"
   */
  public void refuse(String key, String kind) {
    if (isStated(key)) {
      throw new IllegalArgumentException(
          key + " is " + brief(values.get(key).toString()) + "; it must be left out for " + kind);
    }
  }

  private JsonNode stated(String key, ValueKind kind) {
    Parameter parameter = known.get(key);
    if (parameter == null || parameter.kind() != kind) {
      throw new IllegalStateException(key + " is not described as " + kind);
    }
    if (!isStated(key)) {
      throw new IllegalArgumentException(key + " is missing; it must be " + asked(parameter));
    }
    return values.get(key);
  }

  private static void check(Parameter parameter, JsonNode value) {
    boolean fits =
        switch (parameter.kind()) {
          case NUMBER -> value.isNumber();
          case WHOLE_NUMBER -> value.isIntegralNumber() && value.canConvertToInt();
          case FLAG -> value.isBoolean();
          case CHOICE -> value.isTextual() && parameter.choices().contains(value.textValue());
          case CHOICES -> areChoices(parameter, value);
        };
    if (!fits) {
      throw new IllegalArgumentException(
          parameter.key() + " is " + brief(value.toString()) + "; it must be " + asked(parameter));
    }
    if (value.isNumber()) {
      Range.check(
          parameter.key(),
          value.doubleValue(),
          parameter.least(),
          parameter.most(),
          parameter.unit());
    }
  }

  private static boolean areChoices(Parameter parameter, JsonNode value) {
    if (!value.isArray() || value.isEmpty()) {
      return false;
    }
    List<String> made = new ArrayList<>();
    for (JsonNode one : value) {
      if (!one.isTextual() && !one.isIntegralNumber()) {
        return false;
      }
      made.add(one.asText());
    }
    return parameter.choices().containsAll(made) && new HashSet<>(made).size() == made.size();
  }

  private static String asked(Parameter p) {
    String unit = p.unit().isEmpty() ? "" : " " + p.unit();
    return switch (p.kind()) {
      case NUMBER -> "a number from " + plain(p.least()) + " to " + plain(p.most()) + unit;
      case WHOLE_NUMBER ->
          "a whole number from " + plain(p.least()) + " to " + plain(p.most()) + unit;
      case FLAG -> "true or false";
      case CHOICE -> "one of " + quoted(p.choices());
      case CHOICES -> "a list of one or more of " + quoted(p.choices()) + ", each at most once";
    };
  }

  private static String quoted(List<String> choices) {
    return choices.stream().map(c -> "\"" + c + "\"").collect(Collectors.joining(", "));
  }

  private static String plain(double value) {
    return value == Math.rint(value) && Math.abs(value) < 1e15
        ? Long.toString((long) value)
        : Double.toString(value);
  }

  private static String brief(String text) {
    return text.length() <= 60 ? text : text.substring(0, 57) + "...";
  }
}
