package org.fallwright.core.edit;

import java.util.function.UnaryOperator;
import org.fallwright.core.site.Site;
import org.fallwright.core.units.Range;

/**
 * One change of a site.
 *
 * @param kind what kind of change it is
 * @param what what it changes: the name of a thing or of a field
 * @param change the change; it leaves the site given untouched and gives the new one, or throws an
 *     IllegalArgumentException of one sentence
 */
public record Edit(Kind kind, String what, UnaryOperator<Site> change) {
  /** Kinds of change, for the words of a menu. */
  public enum Kind {
    PLACE,
    MOVE,
    TURN,
    SHAPE,
    REMOVE,
    COPY,
    RENAME,
    ENTER
  }

  public Edit {
    Range.present("kind", kind);
    Range.text("what", what);
    Range.present("change", change);
  }

  /** The site after it. */
  public Site on(Site site) {
    return change.apply(site);
  }
}
