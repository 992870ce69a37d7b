package org.fallwright.core.store;

import com.fasterxml.jackson.databind.JsonNode;
import com.fasterxml.jackson.databind.node.ObjectNode;
import java.lang.reflect.RecordComponent;
import java.util.Arrays;
import java.util.List;
import java.util.stream.Collectors;
import org.fallwright.core.site.Position;

/** Values and expectations in plain words. */
final class Said {
  private static final int LONGEST = 60;

  private Said() {}

  /** A value as it stands in the file, cut where it is long. */
  static String value(JsonNode node) {
    if (node == null || node.isMissingNode()) {
      return "nothing";
    }
    if (node.isArray()) {
      return "a list of " + node.size();
    }
    if (node.isObject()) {
      return "an object";
    }
    return cut(node.toString());
  }

  static String cut(String text) {
    return text.length() <= LONGEST ? text : text.substring(0, LONGEST) + "…";
  }

  /** What a field of this type must be. */
  static String expected(Class<?> type) {
    if (type == double.class || type == Double.class) {
      return "a number, without quotes";
    }
    if (type == int.class || type == Integer.class) {
      return "a whole number, without quotes";
    }
    if (type == boolean.class) {
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
    if (type.isRecord() && type != ObjectNode.class) {
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
