package org.fallwright.core.site;

import org.fallwright.core.units.Range;

/**
 * A piece of gear that does not come to the site.
 *
 * @param item its name in the gear
 * @param where where it stays, such as another truck; null: not stated
 */
public record LeftBehind(String item, String where) {
  public LeftBehind {
    Range.text("item", item);
    if (where != null) {
      Range.text("where", where);
    }
  }
}
