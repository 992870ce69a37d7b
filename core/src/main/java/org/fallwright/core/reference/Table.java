package org.fallwright.core.reference;

import com.fasterxml.jackson.core.StreamReadFeature;
import com.fasterxml.jackson.core.type.TypeReference;
import com.fasterxml.jackson.databind.DeserializationFeature;
import com.fasterxml.jackson.databind.MapperFeature;
import com.fasterxml.jackson.databind.json.JsonMapper;
import java.io.IOException;
import java.io.InputStream;
import java.io.UncheckedIOException;
import java.util.Collections;
import java.util.LinkedHashMap;
import java.util.Map;

/** Reads the tables that ship beside this class; strict, since a slip there is a wrong figure. */
final class Table {
  private static final JsonMapper MAPPER =
      JsonMapper.builder()
          .enable(StreamReadFeature.STRICT_DUPLICATE_DETECTION)
          .enable(DeserializationFeature.FAIL_ON_UNKNOWN_PROPERTIES)
          .enable(DeserializationFeature.FAIL_ON_NULL_FOR_PRIMITIVES)
          .enable(DeserializationFeature.FAIL_ON_MISSING_CREATOR_PROPERTIES)
          .disable(MapperFeature.ALLOW_COERCION_OF_SCALARS)
          .build();

  private Table() {}

  /** Rows of the table by key, in the order of the file. */
  static <T> Map<String, T> read(String name, TypeReference<Map<String, T>> type) {
    try (InputStream in = Table.class.getResourceAsStream(name)) {
      if (in == null) {
        throw new IllegalStateException("the table " + name + " is missing from this build");
      }
      return Collections.unmodifiableMap(new LinkedHashMap<>(MAPPER.readValue(in, type)));
    } catch (IOException e) {
      throw new UncheckedIOException("the table " + name + " cannot be read", e);
    }
  }

  /**
   * Returns the row of that key.
   *
   * @throws IllegalArgumentException naming the table's subject, the key and what comes near it
   */
  static <T> T row(Map<String, T> rows, String subject, String key) {
    T row = rows.get(key);
    if (row == null) {
      throw new IllegalArgumentException(
          subject + " is \"" + key + "\"; it must be one of the table, such as " + near(rows, key));
    }
    return row;
  }

  private static String near(Map<String, ?> rows, String key) {
    String wanted = key == null ? "" : key;
    return rows.keySet().stream()
        .sorted((a, b) -> Integer.compare(distance(a, wanted), distance(b, wanted)))
        .limit(3)
        .reduce((a, b) -> a + ", " + b)
        .orElse("(none)");
  }

  /** Fewest single-letter edits that turn one word into the other; words in common come first. */
  private static int distance(String a, String b) {
    int shared = 0;
    for (String word : b.split("-")) {
      if (word.length() > 2 && a.contains(word)) {
        shared++;
      }
    }
    int[] row = new int[b.length() + 1];
    for (int j = 0; j <= b.length(); j++) {
      row[j] = j;
    }
    for (int i = 1; i <= a.length(); i++) {
      int diagonal = row[0];
      row[0] = i;
      for (int j = 1; j <= b.length(); j++) {
        int substitute = diagonal + (a.charAt(i - 1) == b.charAt(j - 1) ? 0 : 1);
        diagonal = row[j];
        row[j] = Math.min(substitute, 1 + Math.min(row[j], row[j - 1]));
      }
    }
    return row[b.length()] - 20 * shared;
  }
}
