package org.fallwright.core.site;

import org.fallwright.core.units.Range;

/**
 * The aerial picture under the plan.
 *
 * @param file name of the base map's file, looked for beside the site file and among the base maps
 * @param taken date of the picture as stated by its source; null: not known
 * @param source where it comes from
 */
public record Picture(String file, String taken, String source) {
  public Picture {
    Range.text("file", file);
    Range.text("source", source);
  }
}
