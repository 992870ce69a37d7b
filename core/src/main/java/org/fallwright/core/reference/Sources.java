package org.fallwright.core.reference;

import com.fasterxml.jackson.core.type.TypeReference;
import java.util.Map;
import org.fallwright.core.units.Range;

/** The one list of the sources that figures name by key. */
public final class Sources {
  /** What of a source stands behind the figures taken from it. */
  public enum Seen {
    /** The text itself, or the page of it that holds the figure. */
    READ,
    /** Another public text that repeats it. */
    SECONDARY,
    /** Nothing: carried from memory. */
    FROM_MEMORY
  }

  /**
   * A source.
   *
   * @param citation who, when, what, and the table or page
   * @param seen what of it was seen
   * @param through where it was seen, where that is another text than itself; empty: itself
   */
  public record Source(String citation, Seen seen, String through) {
    public Source {
      Range.text("citation", citation);
      Range.present("seen", seen);
      Range.present("through", through);
    }
  }

  private static final Map<String, Source> ALL =
      Table.read("sources.json", new TypeReference<Map<String, Source>>() {});

  private Sources() {}

  /** Every source by its key. */
  public static Map<String, Source> all() {
    return ALL;
  }

  /**
   * Returns the source of that key.
   *
   * @throws IllegalArgumentException if the list has none of that key
   */
  public static Source of(String key) {
    Source source = ALL.get(key);
    if (source == null) {
      throw new IllegalArgumentException(
          "source is \"" + key + "\"; it must be one of the list of sources");
    }
    return source;
  }
}
