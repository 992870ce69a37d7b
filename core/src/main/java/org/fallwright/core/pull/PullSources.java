package org.fallwright.core.pull;

import java.util.List;
import java.util.Optional;
import java.util.function.Supplier;

/** The pull sources there are; the plugin host provides it, and a test may. */
public interface PullSources {
  /**
   * All sources.
   *
   * @return them in a fixed order
   */
  List<PullSource> all();

  /**
   * The source of a stable id.
   *
   * @param id its id, as its description says it
   * @return the source; empty where none has this id
   */
  default Optional<PullSource> byId(String id) {
    return all().stream().filter(s -> s.describe().id().equals(id)).findFirst();
  }

  /**
   * Does a piece of work that asks sources many times. Whoever stands guard over the sources can
   * watch the piece as a whole, which costs less than watching each question; the answers are the
   * same.
   *
   * @param <T> kind of result
   * @param work what asks the sources; done once
   * @return what the work gives
   * @throws SourceFault if a source fails meanwhile and the work lets that through
   */
  default <T> T asking(Supplier<T> work) {
    return work.get();
  }
}
