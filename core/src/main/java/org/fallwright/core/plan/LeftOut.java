package org.fallwright.core.plan;

import java.util.List;
import java.util.Map;
import java.util.concurrent.ConcurrentHashMap;
import java.util.function.Function;
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

  /**
   * Plans a site; again from the beginning, without it, where a source fails.
   *
   * @param plans plans without the sources that are out
   */
  static <T> T without(Site site, Function<LeftOut, T> plans) {
    LeftOut out = new LeftOut(site);
    while (true) {
      try {
        return plans.apply(out);
      } catch (SourceFault fault) {
        if (!out.add(fault)) {
          throw fault;
        }
      }
    }
  }

  /** Takes note of a fault; false where the source is out already. */
  private boolean add(SourceFault fault) {
    return sentenceByKind.putIfAbsent(fault.sourceId(), fault.getMessage()) == null;
  }

  /** Whether a kind of source is out. */
  boolean has(String kind) {
    return sentenceByKind.containsKey(kind);
  }

  /** A sentence for every source of the site that is out. */
  List<String> notes() {
    return site.gear().sources().stream()
        .filter(s -> has(s.plugin()))
        .map(s -> "Source \"" + s.id() + "\" is left out: " + sentenceByKind.get(s.plugin()))
        .toList();
  }
}
