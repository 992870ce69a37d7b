package org.fallwright.core.pull;

import com.fasterxml.jackson.databind.node.ObjectNode;
import java.util.ArrayList;
import java.util.Iterator;
import java.util.List;
import java.util.Optional;
import java.util.Set;
import java.util.stream.Collectors;
import org.fallwright.core.units.Range;

/**
 * What a pull source says of itself.
 *
 * @param id stable id, lower case with hyphens
 * @param name display name
 * @param places where it can be, at least one
 * @param needsDriver whether another source hauls it; it then has a {@link PullSource#haulLine}
 * @param parameters its parameters, in the order in which a form asks for them, at most 60
 */
public record SourceDescription(
    String id,
    Wording name,
    Set<PlaceKind> places,
    boolean needsDriver,
    List<Parameter> parameters) {
  private static final int MOST_PARAMETERS = 60;

  /** Kinds of place. */
  public enum PlaceKind {
    /** A place on the ground where something can stand. */
    SPOT,
    /** A tree, rated point or ground anchor. */
    ANCHOR
  }

  /**
   * Checks the id, that no parameter is described twice, and that each one hangs only on choices
   * described before it.
   *
   * @throws IllegalArgumentException naming what cannot be described so
   */
  public SourceDescription {
    Range.text("id", id);
    if (!id.matches("[a-z][a-z0-9-]*")) {
      throw new IllegalArgumentException(
          "id is \"" + id + "\"; it must be lower-case letters, digits and hyphens");
    }
    Range.present("name", name);
    places = Set.copyOf(Range.present("places", places));
    Range.check("places, how many", places.size(), 1, PlaceKind.values().length, "");
    parameters = List.copyOf(Range.present("parameters", parameters));
    Range.check("parameters, how many", parameters.size(), 0, MOST_PARAMETERS, "");
    List<Parameter> before = new ArrayList<>();
    for (Parameter p : parameters) {
      if (find(before, p.key()).isPresent()) {
        throw new IllegalArgumentException(p.key() + " is described twice");
      }
      if (p.where() != null
          && !find(before, p.where().key())
              .map(o -> o.choiceKeys().containsAll(p.where().choices()))
              .orElse(false)) {
        throw new IllegalArgumentException(
            p.key() + " hangs on choices of " + p.where().key() + " that are not described before");
      }
      before.add(p);
    }
  }

  /**
   * The parameter of a key.
   *
   * @param key its key in the parameters object
   * @return the parameter; empty where none has this key
   */
  public Optional<Parameter> parameter(String key) {
    return find(parameters, key);
  }

  /**
   * Holds a site's parameters against the description: a key that it does not know, a value of the
   * wrong kind or out of range, one that is missing and one that does not apply are refused. A
   * value of null counts as not stated; a preset does not stand in for one.
   *
   * @param values what a site states, by key
   * @throws IllegalArgumentException one sentence with key, value, limits and unit
   */
  public void check(ObjectNode values) {
    for (Iterator<String> keys = values.fieldNames(); keys.hasNext(); ) {
      String key = keys.next();
      if (parameter(key).isEmpty()) {
        throw new IllegalArgumentException(
            Parameter.brief(key)
                + " is not a parameter of the "
                + name.english()
                + "; it knows "
                + parameters.stream().map(Parameter::key).collect(Collectors.joining(", ")));
      }
    }
    List<Parameter> stated = parameters.stream().filter(p -> values.hasNonNull(p.key())).toList();
    stated.forEach(p -> p.check(values.get(p.key())));
    for (Parameter p : parameters) {
      boolean applies = p.appliesTo(values);
      if (stated.contains(p) && !applies) {
        String other = p.where().key();
        throw new IllegalArgumentException(
            p.key()
                + " is "
                + Parameter.brief(values.get(p.key()).toString())
                + "; it must be left out where "
                + other
                + (values.hasNonNull(other) ? " is " + values.get(other) : " is not stated"));
      }
      if (!stated.contains(p) && applies && !p.optional()) {
        throw new IllegalArgumentException(p.key() + " is missing; it must be " + p.asked());
      }
    }
  }

  private static Optional<Parameter> find(List<Parameter> in, String key) {
    return in.stream().filter(p -> p.key().equals(key)).findFirst();
  }
}
