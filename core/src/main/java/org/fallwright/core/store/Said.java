package org.fallwright.core.store;

import com.fasterxml.jackson.databind.JsonNode;
import java.lang.reflect.RecordComponent;
import java.util.Arrays;
import java.util.List;
import java.util.stream.Collectors;
import org.fallwright.core.site.Position;

/** Values and expectations in plain words. */
final class Said {
  private static final int LONGEST_VALUE = 60;
  private static final int LONGEST_PATH = 200;

  private Said() {}

  /** A value as it stands in the file, cut where it is long. */
  static String value(JsonNode node) {
    if (node == null || node.isMissingNode()) {
      return "missing";
    }
    if (node.isArray()) {
      return node.isEmpty() ? "an empty list" : "a list of " + node.size();
    }
    if (node.isObject()) {
      return "an object";
    }
    return cut(node.toString(), LONGEST_VALUE);
  }

  /** A path, cut where it is long. */
  static String path(String path) {
    return cut(path, LONGEST_PATH);
  }

  private static String cut(String text, int longest) {
    return text.length() <= longest ? text : text.substring(0, longest) + "…";
  }

  /** What a field of this type must be. */
  static String expected(Class<?> type) {
    if (type == double.class || type == Double.class) {
      return "a number, without quotes";
    }
    if (type == int.class || type == Integer.class) {
      return "a whole number, without quotes";
    }
    if (type == boolean.class || type == Boolean.class) {
      return "true or false";
    }
    if (type == String.class) {
      return "a text in quotes";
    }
    if (type.isEnum()) {
      return "one of " + words(type);
    }
    if (type == Position.class || type == double[].class) {
      return "[east, north], two numbers in metres";
    }
    if (List.class.isAssignableFrom(type)) {
      return "a list in [ ]";
    }
    if (type.isRecord()) {
      return "an object with the fields " + String.join(", ", fields(type));
    }
    return "an object in { }";
  }

  /** Names in the file of a record's fields, in order. */
  static List<String> fields(Class<?> record) {
    return record.isRecord()
        ? Arrays.stream(record.getRecordComponents())
            .map(RecordComponent::getName)
            .map(SiteJson::fieldName)
            .toList()
        : List.of();
  }

  private static String words(Class<?> type) {
    return Arrays.stream(type.getEnumConstants())
        .map(c -> "\"" + SiteJson.word((Enum<?>) c) + "\"")
        .collect(Collectors.joining(", "));
  }
}
