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
   * @param description what the source says of itself
   * @param values what a site states, by key
   * @throws IllegalArgumentException see {@link SourceDescription#check}
   */
  public ParameterReader(SourceDescription description, ObjectNode values) {
    description.check(values);
    this.description = description;
    this.values = values;
  }

  /**
   * Whether a parameter has a value.
   *
   * @param key key of the parameter
   * @return false where it is left out or null
   */
  public boolean isStated(String key) {
    return values.hasNonNull(key);
  }

  /**
   * A number that must be there.
   *
   * @param key key of the parameter
   * @return the number [in the parameter's unit]
   * @throws IllegalArgumentException if it is not stated, saying what it must be
   * @throws IllegalStateException if the source describes no such number: a mistake of the source
   */
  public double number(String key) {
    return stated(key, Kind.NUMBER).doubleValue();
  }

  /**
   * A number that may have been left out.
   *
   * @param key key of the parameter
   * @return the number [in the parameter's unit]; null where it is not stated
   * @throws IllegalStateException if the source describes no such number: a mistake of the source
   */
  public Double numberOrNull(String key) {
    return isStated(key) ? Double.valueOf(number(key)) : null;
  }

  /**
   * A whole number that must be there.
   *
   * @param key key of the parameter
   * @return the number
   * @throws IllegalArgumentException if it is not stated, saying what it must be
   * @throws IllegalStateException if the source describes no such whole number: a mistake of the
   *     source
   */
  public int wholeNumber(String key) {
    return stated(key, Kind.WHOLE_NUMBER).intValue();
  }

  /**
   * A yes or no that must be there.
   *
   * @param key key of the parameter
   * @return true for yes
   * @throws IllegalArgumentException if it is not stated, saying what it must be
   * @throws IllegalStateException if the source describes no such flag: a mistake of the source
   */
  public boolean flag(String key) {
    return stated(key, Kind.FLAG).booleanValue();
  }

  /**
   * The one choice made, which must be there.
   *
   * @param key key of the parameter
   * @return key of the choice
   * @throws IllegalArgumentException if it is not stated, saying what it must be
   * @throws IllegalStateException if the source describes no such choice: a mistake of the source
   */
  public String choice(String key) {
    return stated(key, Kind.CHOICE).textValue();
  }

  /**
   * The choices made, at least one.
   *
   * @param key key of the parameter
   * @return keys of the choices, in the order of the description
   * @throws IllegalArgumentException if it is not stated, saying what it must be
   * @throws IllegalStateException if the source describes no such choices: a mistake of the source
   */
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
