package org.fallwright.core.line;

import org.fallwright.core.reference.Figure;
import org.fallwright.core.reference.Hardware;
import org.fallwright.core.reference.Kind;
import org.fallwright.core.site.Stated;

/**
 * What something leaves of a strength or of a tension, with what stands behind it.
 *
 * @param what what it is, in a few words
 * @param value share left, or a factor on a rating
 * @param kind what stands behind it; null: somebody vouches for it
 * @param source key of its source; empty: none
 */
public record Share(String what, double value, Kind kind, String source) {
  static Share of(Figure f) {
    return new Share(f.note(), f.value(), f.kind(), f.source());
  }

  static Share row(String key) {
    return of(Hardware.of(key));
  }

  static Share stated(String what, Stated s) {
    return new Share(what + ": " + s.why(), s.value(), null, "");
  }

  static Share whole(String what) {
    return new Share(what, 1, Kind.COMMON_PRACTICE, "");
  }
}
