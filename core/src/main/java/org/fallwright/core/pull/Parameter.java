package org.fallwright.core.pull;

import com.fasterxml.jackson.databind.JsonNode;
import com.fasterxml.jackson.databind.node.BooleanNode;
import com.fasterxml.jackson.databind.node.DoubleNode;
import com.fasterxml.jackson.databind.node.IntNode;
import com.fasterxml.jackson.databind.node.JsonNodeFactory;
import com.fasterxml.jackson.databind.node.ObjectNode;
import com.fasterxml.jackson.databind.node.TextNode;
import java.util.Arrays;
import java.util.HashSet;
import java.util.List;
import java.util.stream.Collectors;
import org.fallwright.core.units.Range;

/**
 * One parameter of a pull source, described so that form, site file, command line and sheet need
 * nothing else. Made by {@link #number} and its like, then narrowed by {@link #preset}, {@link
 * #mayBeLeftOut} and {@link #onlyWhere}.
 *
 * @param key its key in the parameters object; a unit, if any, ends it
 * @param kind kind of value
 * @param unit unit of the value, SI where nothing speaks against it; empty where there is none
 * @param least least value of a number, in the unit; 0 for other kinds
 * @param most greatest value of a number, in the unit; 0 for other kinds
 * @param choices what may be chosen, from 1 to 60; empty for other kinds
 * @param preset what a form fills in and marks as not yet touched; null: none. It never stands in
 *     for a value that a site does not state
 * @param optional whether it may be left out
 * @param where what another parameter must say for this one to apply; null: it always does
 * @param label what a form calls it
 * @param help what it is and how to find it, a sentence or two
 */
public record Parameter(
    String key,
    Kind kind,
    String unit,
    double least,
    double most,
    List<Choice> choices,
    JsonNode preset,
    boolean optional,
    Where where,
    Wording label,
    Wording help) {
  private static final int MOST_CHOICES = 60;

  /** Kinds of value. */
  public enum Kind {
    /** A number in the unit. */
    NUMBER,
    /** A whole number. */
    WHOLE_NUMBER,
    /** True or false. */
    FLAG,
    /** The key of one choice. */
    CHOICE,
    /** A list of keys of choices, one or more, each at most once. */
    CHOICES
  }

  /**
   * Something that may be chosen.
   *
   * @param key as the file says it
   * @param wording as a person reads it
   */
  public record Choice(String key, Wording wording) {
    /**
     * Checks that both are there.
     *
     * @throws IllegalArgumentException naming the field and what is asked of it
     */
    public Choice {
      Range.text("choice", key);
      Range.present("wording", wording);
    }

    /**
     * A choice in both languages.
     *
     * @param key as the file says it, from 1 to 200 characters
     * @param english as a person reads it in English
     * @param spanish as a person reads it in Spanish
     * @return the choice
     * @throws IllegalArgumentException naming the field and what is asked of it
     */
    public static Choice of(String key, String english, String spanish) {
      return new Choice(key, new Wording(english, spanish));
    }
  }

  /**
   * That another parameter chooses one of some choices.
   *
   * @param key its key
   * @param choices any of these
   */
  public record Where(String key, List<String> choices) {
    /**
     * Checks that a key and at least one choice are there.
     *
     * @throws IllegalArgumentException naming the field and what is asked of it
     */
    public Where {
      Range.text("key", key);
      choices = List.copyOf(Range.present("choices", choices));
      Range.check("choices, how many", choices.size(), 1, MOST_CHOICES, "");
    }
  }

  /**
   * Checks that the description is whole, and that the preset, if any, is a value it allows.
   *
   * @throws IllegalArgumentException naming what cannot be described so
   */
  public Parameter {
    Range.text("key", key);
    if (!key.matches("[A-Za-z][A-Za-z0-9_]*")) {
      throw new IllegalArgumentException(
          "key is \"" + key + "\"; it must be letters, digits and underscores");
    }
    Range.present("kind", kind);
    Range.present("unit", unit);
    Range.check(key + ", least", least, -1e12, 1e12, unit);
    Range.check(key + ", most", most, least, 1e12, unit);
    choices = List.copyOf(Range.present("choices", choices));
    boolean chosen = kind == Kind.CHOICE || kind == Kind.CHOICES;
    Range.check(
        key + ", how many choices", choices.size(), chosen ? 1 : 0, chosen ? MOST_CHOICES : 0, "");
    if (choices.stream().map(Choice::key).distinct().count() != choices.size()) {
      throw new IllegalArgumentException(key + " names a choice twice");
    }
    Range.present("label", label);
    Range.present("help", help);
    if (preset != null) {
      preset = preset.deepCopy();
      check(preset, key, kind, unit, least, most, choices);
    }
  }

  /**
   * A number in a unit, that must be stated.
   *
   * @param key its key in the parameters object; letters, digits and underscores, a letter first; a
   *     unit, if any, ends it
   * @param unit unit of the number; empty where there is none
   * @param least least value that is taken [in the unit]
   * @param most greatest value that is taken [in the unit]
   * @param label what a form calls it
   * @param help what it is and how to find it, a sentence or two
   * @return the parameter, which a site must state
   * @throws IllegalArgumentException naming what cannot be described so
   */
  public static Parameter number(
      String key, String unit, double least, double most, Wording label, Wording help) {
    return new Parameter(
        key, Kind.NUMBER, unit, least, most, List.of(), null, false, null, label, help);
  }

  /**
   * A whole number without a unit, that must be stated.
   *
   * @param key its key in the parameters object; letters, digits and underscores, a letter first
   * @param least least number that is taken
   * @param most greatest number that is taken
   * @param label what a form calls it
   * @param help what it is and how to find it, a sentence or two
   * @return the parameter, which a site must state
   * @throws IllegalArgumentException naming what cannot be described so
   */
  public static Parameter wholeNumber(
      String key, int least, int most, Wording label, Wording help) {
    return new Parameter(
        key, Kind.WHOLE_NUMBER, "", least, most, List.of(), null, false, null, label, help);
  }

  /**
   * Yes or no, that must be stated.
   *
   * @param key its key in the parameters object; letters, digits and underscores, a letter first
   * @param label what a form calls it
   * @param help what it is and how to find it, a sentence or two
   * @return the parameter, which a site must state
   * @throws IllegalArgumentException naming what cannot be described so
   */
  public static Parameter flag(String key, Wording label, Wording help) {
    return new Parameter(key, Kind.FLAG, "", 0, 0, List.of(), null, false, null, label, help);
  }

  /**
   * One of some choices, that must be made.
   *
   * @param key its key in the parameters object; letters, digits and underscores, a letter first
   * @param label what a form calls it
   * @param help what it is and how to find it, a sentence or two
   * @param choices what may be chosen, from 1 to 60, in the order of a form
   * @return the parameter, which a site must state
   * @throws IllegalArgumentException naming what cannot be described so
   */
  public static Parameter choice(String key, Wording label, Wording help, Choice... choices) {
    return new Parameter(
        key, Kind.CHOICE, "", 0, 0, List.of(choices), null, false, null, label, help);
  }

  /**
   * One or more of some choices, that must be made.
   *
   * @param key its key in the parameters object; letters, digits and underscores, a letter first
   * @param label what a form calls it
   * @param help what it is and how to find it, a sentence or two
   * @param choices what may be chosen, from 1 to 60, in the order of a form
   * @return the parameter, which a site must state
   * @throws IllegalArgumentException naming what cannot be described so
   */
  public static Parameter choices(String key, Wording label, Wording help, Choice... choices) {
    return new Parameter(
        key, Kind.CHOICES, "", 0, 0, List.of(choices), null, false, null, label, help);
  }

  /**
   * The same with a number that a form fills in.
   *
   * @param value the number [in the parameter's unit]; whole for a whole number
   * @return a copy with this preset
   * @throws IllegalArgumentException one sentence with key, value, limits and unit, if the
   *     parameter itself would refuse it
   */
  public Parameter preset(double value) {
    return preset(
        kind == Kind.WHOLE_NUMBER && value == Math.rint(value)
            ? IntNode.valueOf((int) value)
            : DoubleNode.valueOf(value));
  }

  /**
   * The same with a flag that a form fills in.
   *
   * @param value true for yes
   * @return a copy with this preset
   * @throws IllegalArgumentException one sentence with key, value, limits and unit, if the
   *     parameter itself would refuse it
   */
  public Parameter preset(boolean value) {
    return preset(BooleanNode.valueOf(value));
  }

  /**
   * The same with choices that a form fills in.
   *
   * @param keys keys of the choices, each at most once; only one for a single choice
   * @return a copy with this preset
   * @throws IllegalArgumentException one sentence with key, value, limits and unit, if the
   *     parameter itself would refuse it
   */
  public Parameter preset(String... keys) {
    if (kind != Kind.CHOICES) {
      return preset(TextNode.valueOf(String.join(", ", keys)));
    }
    var list = JsonNodeFactory.instance.arrayNode();
    Arrays.stream(keys).forEach(list::add);
    return preset(list);
  }

  private Parameter preset(JsonNode value) {
    return new Parameter(
        key, kind, unit, least, most, choices, value, optional, where, label, help);
  }

  /**
   * The same, but it may be left out.
   *
   * @return a copy that a site need not state
   */
  public Parameter mayBeLeftOut() {
    return new Parameter(key, kind, unit, least, most, choices, preset, true, where, label, help);
  }

  /**
   * The same, but it applies only where another parameter, described before, says one of these.
   *
   * @param otherKey key of the other parameter
   * @param otherChoices keys of its choices beside which this one applies, at least one
   * @return a copy that must be left out beside all other choices
   * @throws IllegalArgumentException naming what cannot be described so
   */
  public Parameter onlyWhere(String otherKey, String... otherChoices) {
    return new Parameter(
        key,
        kind,
        unit,
        least,
        most,
        choices,
        preset,
        optional,
        new Where(otherKey, List.of(otherChoices)),
        label,
        help);
  }

  /**
   * What a form fills in and marks as not yet touched.
   *
   * @return a copy of it; null: there is none
   */
  @Override
  public JsonNode preset() {
    return preset == null ? null : preset.deepCopy();
  }

  /**
   * The keys of the choices.
   *
   * @return them in the order of the description; empty where the kind is no choice
   */
  public List<String> choiceKeys() {
    return choices.stream().map(Choice::key).toList();
  }

  /**
   * Whether it applies beside these other values.
   *
   * @param values the source's parameters, by key
   * @return true if it hangs on no other parameter, or if that one is stated and names a choice
   *     beside which this applies
   */
  public boolean appliesTo(ObjectNode values) {
    if (where == null) {
      return true;
    }
    JsonNode other = values.get(where.key());
    if (other == null || other.isNull()) {
      return false;
    }
    if (!other.isArray()) {
      return where.choices().contains(other.asText());
    }
    for (JsonNode one : other) {
      if (where.choices().contains(one.asText())) {
        return true;
      }
    }
    return false;
  }

  /**
   * Refuses a value that is not what this parameter asks.
   *
   * @param value what a site states; not null
   * @throws IllegalArgumentException one sentence with key, value, limits and unit
   */
  public void check(JsonNode value) {
    check(value, key, kind, unit, least, most, choices);
  }

  private static void check(
      JsonNode value,
      String key,
      Kind kind,
      String unit,
      double least,
      double most,
      List<Choice> choices) {
    List<String> keys = choices.stream().map(Choice::key).toList();
    boolean fits =
        switch (kind) {
          case NUMBER -> value.isNumber();
          case WHOLE_NUMBER -> value.isIntegralNumber() && value.canConvertToInt();
          case FLAG -> value.isBoolean();
          case CHOICE -> value.isTextual() && keys.contains(value.textValue());
          case CHOICES -> areChoices(keys, value);
        };
    if (!fits) {
      throw new IllegalArgumentException(
          key
              + " is "
              + brief(value.toString())
              + "; it must be "
              + asked(kind, unit, least, most, keys));
    }
    if (value.isNumber()) {
      Range.check(key, value.doubleValue(), least, most, unit);
    }
  }

  private static boolean areChoices(List<String> keys, JsonNode value) {
    if (!value.isArray() || value.isEmpty() || value.size() > keys.size()) {
      return false;
    }
    HashSet<String> made = new HashSet<>();
    for (JsonNode one : value) {
      boolean aKey = one.isTextual() || one.isIntegralNumber();
      if (!aKey || !keys.contains(one.asText()) || !made.add(one.asText())) {
        return false;
      }
    }
    return true;
  }

  /**
   * What a value must be, for the end of a sentence that refuses one.
   *
   * @return half a sentence in English: "a number from 100 to 700 kg"
   */
  public String asked() {
    return asked(kind, unit, least, most, choiceKeys());
  }

  private static String asked(
      Kind kind, String unit, double least, double most, List<String> keys) {
    String limits =
        "from " + plain(least) + " to " + plain(most) + (unit.isEmpty() ? "" : " " + unit);
    String quoted = keys.stream().map(c -> "\"" + c + "\"").collect(Collectors.joining(", "));
    return switch (kind) {
      case NUMBER -> "a number " + limits;
      case WHOLE_NUMBER -> "a whole number " + limits;
      case FLAG -> "true or false";
      case CHOICE -> "one of " + quoted;
      case CHOICES -> "a list of one or more of " + quoted + ", each at most once";
    };
  }

  private static String plain(double value) {
    return value == Math.rint(value) && Math.abs(value) < 1e15
        ? Long.toString((long) value)
        : Double.toString(value);
  }

  static String brief(String text) {
    return text.length() <= 60 ? text : text.substring(0, 57) + "...";
  }
}
