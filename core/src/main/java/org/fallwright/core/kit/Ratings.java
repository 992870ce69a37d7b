package org.fallwright.core.kit;

import java.util.Optional;
import org.fallwright.core.line.RatedFigures;
import org.fallwright.core.site.Gear;

/** What rated hardware may carry. */
final class Ratings {
  private Ratings() {}

  /** Its figures; empty for lines and sources. */
  static Optional<RatedFigures> of(Gear.Item item) {
    if (item instanceof Gear.Block b) {
      return Optional.of(RatedFigures.of(b));
    }
    if (item instanceof Gear.Sling s) {
      return Optional.of(RatedFigures.of(s));
    }
    if (item instanceof Gear.Connector c) {
      return Optional.of(RatedFigures.of(c));
    }
    return item instanceof Gear.LoadCell c ? Optional.of(RatedFigures.of(c)) : Optional.empty();
  }
}
