package org.fallwright.plugins.api;

import com.fasterxml.jackson.databind.JsonNode;
import com.fasterxml.jackson.databind.node.ObjectNode;
import java.util.HashSet;
import java.util.List;
import java.util.Set;
import org.fallwright.core.pull.Parameter;
import org.fallwright.core.pull.Parameter.Kind;
import org.fallwright.core.pull.SourceDescription;

/**
 * Reads a source's parameters by its own description, which refuses in one sentence whatever is
 * unknown, wrong, out of range, missing or out of place: nothing is defaulted, clipped or passed
 * over. A value of null counts as not stated.
 */
public final class ParameterReader {
  private final SourceDescription description;
  private final ObjectNode values;

  /**
   * Takes the parameters and checks all of them.
   *
   * @throws IllegalArgumentException see {@link SourceDescription#check}
   */
  public ParameterReader(SourceDescription description, ObjectNode values) {
    description.check(values);
    this.description = description;
    this.values = values;
  }

  /** Whether the key has a value. */
  public boolean isStated(String key) {
    return values.hasNonNull(key);
  }

  /** A number, in the parameter's unit. */
  public double number(String key) {
    return stated(key, Kind.NUMBER).doubleValue();
  }

  /** A number, in the parameter's unit; null where it is not stated. */
  public Double numberOrNull(String key) {
    return isStated(key) ? Double.valueOf(number(key)) : null;
  }

  /** A whole number. */
  public int wholeNumber(String key) {
    return stated(key, Kind.WHOLE_NUMBER).intValue();
  }

  /** A flag. */
  public boolean flag(String key) {
    return stated(key, Kind.FLAG).booleanValue();
  }

  /** The one choice made. */
  public String choice(String key) {
    return stated(key, Kind.CHOICE).textValue();
  }

  /** The choices made, at least one, in the order of the description. */
  public List<String> choices(String key) {
    Set<String> chosen = new HashSet<>();
    stated(key, Kind.CHOICES).forEach(n -> chosen.add(n.asText()));
    return parameter(key).choiceKeys().stream().filter(chosen::contains).toList();
  }

  private JsonNode stated(String key, Kind kind) {
    if (parameter(key).kind() != kind) {
      throw new IllegalStateException(key + " is not described as " + kind);
    }
    if (!isStated(key)) {
      throw new IllegalArgumentException(key + " is missing; it must be " + parameter(key).asked());
    }
    return values.get(key);
  }

  private Parameter parameter(String key) {
    return description
        .parameter(key)
        .orElseThrow(() -> new IllegalStateException(key + " is not described"));
  }
}
