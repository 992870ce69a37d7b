package org.fallwright.core.plan;

import java.util.List;
import java.util.Map;
import java.util.concurrent.ConcurrentHashMap;
import java.util.stream.Stream;
import org.fallwright.core.pull.SourceFault;
import org.fallwright.core.site.Site;

/**
 * The pull sources that failed while a site was planned. One that failed once is out of the whole
 * plan, with all ways that it pulls or drives, so that the answer does not hang on which of its
 * ways was tried first. Safe for use by several threads.
 */
final class LeftOut {
  private final Site site;
  private final Map<String, String> sentenceByKind = new ConcurrentHashMap<>();

  LeftOut(Site site) {
    this.site = site;
  }

  /** Takes note of a fault; false where the source is out already. */
  boolean add(SourceFault fault) {
    return sentenceByKind.putIfAbsent(fault.sourceId(), fault.getMessage()) == null;
  }

  /** Whether a kind of source is out. */
  boolean has(String kind) {
    return sentenceByKind.containsKey(kind);
  }

  /** Whether a way is pulled or driven by a source that is out. */
  boolean uses(Setup way) {
    return !sentenceByKind.isEmpty()
        && Stream.of(way.source(), way.driver() == null ? way.source() : way.driver().source())
            .anyMatch(id -> has(site.source(id).orElseThrow().plugin()));
  }

  /** A sentence for every source of the site that is out. */
  List<String> notes() {
    return site.gear().sources().stream()
        .filter(s -> has(s.plugin()))
        .map(s -> "Source \"" + s.id() + "\" is left out: " + sentenceByKind.get(s.plugin()))
        .toList();
  }
}
