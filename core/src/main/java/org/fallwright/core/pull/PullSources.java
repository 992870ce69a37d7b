package org.fallwright.core.pull;

import java.util.List;
import java.util.Optional;

/** The pull sources there are; the plugin host provides it, and a test may. */
public interface PullSources {
  /** All sources, in a fixed order. */
  List<PullSource> all();

  /** The source of a stable id. */
  default Optional<PullSource> byId(String id) {
    return all().stream().filter(s -> s.describe().id().equals(id)).findFirst();
  }
}
