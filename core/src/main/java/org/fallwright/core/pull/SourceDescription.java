package org.fallwright.core.pull;

import java.util.List;
import java.util.Set;
import org.fallwright.core.units.Range;

/**
 * What a pull source says of itself.
 *
 * @param id stable id, lower case with hyphens
 * @param name display name
 * @param places where it can be
 * @param needsDriver whether another source hauls it
 * @param parameters its parameters, so that a form can be drawn without knowing it
 */
public record SourceDescription(
    String id,
    String name,
    Set<PlaceKind> places,
    boolean needsDriver,
    List<Parameter> parameters) {
  /** Kinds of place. */
  public enum PlaceKind {
    SPOT,
    ANCHOR
  }

  /** Kinds of value. */
  public enum ValueKind {
    NUMBER,
    WHOLE_NUMBER,
    FLAG,
    CHOICE,
    CHOICES
  }

  /**
   * One parameter.
   *
   * @param key its key in the parameters object; a unit, if any, ends it
   * @param label what a form calls it
   * @param kind kind of value
   * @param unit SI unit; empty where there is none
   * @param least least value of a number
   * @param most greatest value of a number
   * @param choices what may be chosen
   */
  public record Parameter(
      String key,
      String label,
      ValueKind kind,
      String unit,
      double least,
      double most,
      List<String> choices) {
    public Parameter {
      Range.text("key", key);
      Range.text("label", label);
      Range.present("kind", kind);
      Range.present("unit", unit);
      choices = List.copyOf(Range.present("choices", choices));
    }

    public static Parameter number(
        String key, String label, String unit, double least, double most) {
      return new Parameter(key, label, ValueKind.NUMBER, unit, least, most, List.of());
    }
  }

  public SourceDescription {
    Range.text("id", id);
    if (!id.matches("[a-z][a-z0-9-]*")) {
      throw new IllegalArgumentException(
          "id is \"" + id + "\"; it must be lower-case letters, digits and hyphens");
    }
    Range.text("name", name);
    places = Set.copyOf(Range.present("places", places));
    parameters = List.copyOf(Range.present("parameters", parameters));
  }
}
