package org.fallwright.core.pull;

import java.util.List;
import java.util.Optional;
import java.util.function.Supplier;

/** The pull sources there are; the plugin host provides it, and a test may. */
public interface PullSources {
  /** All sources, in a fixed order. */
  List<PullSource> all();

  /** The source of a stable id. */
  default Optional<PullSource> byId(String id) {
    return all().stream().filter(s -> s.describe().id().equals(id)).findFirst();
  }

  /**
   * Does a piece of work that asks sources many times. Whoever stands guard over the sources can
   * watch the piece as a whole, which costs less than watching each question; the answers are the
   * same.
   */
  default <T> T asking(Supplier<T> work) {
    return work.get();
  }
}
