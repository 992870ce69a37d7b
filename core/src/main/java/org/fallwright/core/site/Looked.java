package org.fallwright.core.site;

import org.fallwright.core.units.Range;

/**
 * What was looked for on the site. An empty list of things is not "none": none must be said.
 *
 * @param what the kind of thing
 * @param found none, drawn on the plan, or not looked for
 * @param by who looked; null while nobody has
 */
public record Looked(What what, Found found, String by) {
  /** Things that must be looked for. */
  public enum What {
    WIRES,
    BURIED_SERVICES,
    PEOPLE_INDOORS,
    OTHER_TARGETS
  }

  /** What the look brought. */
  public enum Found {
    NONE,
    DRAWN,
    NOT_LOOKED
  }

  public Looked {
    Range.present("what", what);
    Range.present("found", found);
    if (found != Found.NOT_LOOKED) {
      Range.text("by", by);
    }
  }
}
