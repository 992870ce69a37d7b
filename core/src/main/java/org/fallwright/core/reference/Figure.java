package org.fallwright.core.reference;

import org.fallwright.core.units.Range;

/**
 * A figure with its unit, its kind and its source.
 *
 * @param key stable name
 * @param value value in {@code unit}
 * @param unit unit; empty for a pure number
 * @param kind what stands behind it
 * @param source key of {@link Sources}; empty where the kind claims none
 * @param note what it is for, in a few words
 */
public record Figure(String key, double value, String unit, Kind kind, String source, String note) {
  public Figure {
    Range.text("key", key);
    Range.check(key, value, -1e12, 1e12, unit);
    Range.present("kind", kind);
    Range.present("source", source);
    Range.text("note", note);
    if ((kind == Kind.PUBLISHED || kind == Kind.FROM_MEMORY) && source.isEmpty()) {
      throw new IllegalArgumentException(key + " is published and names no source");
    }
  }
}
