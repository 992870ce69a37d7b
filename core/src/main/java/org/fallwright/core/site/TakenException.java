package org.fallwright.core.site;

import org.fallwright.core.units.Range;

/**
 * A check that somebody takes an exception to: who, why and when. It never makes a setup better
 * than tight, and only checks that allow one heed it.
 *
 * @param check id of the check, as "clear of Shed"
 * @param by who accepts it
 * @param why the reason
 * @param when day or hour, as written down
 */
public record TakenException(String check, String by, String why, String when) {
  public TakenException {
    Range.text("check", check);
    Range.text("by", by);
    Range.text("why", why);
    Range.text("when", when);
  }
}
