package org.fallwright.core.site;

import org.fallwright.core.units.Range;

/**
 * What a person states of the zones on the ground.
 *
 * @param slideM how far the felled tree may slide on where the ground falls away under it [m];
 *     null: half its height
 * @param peopleRadius own radius of the people ring, in tree heights, where it is to be more than
 *     the rule set's; null: the rule set's
 * @param energy stored energy that whoever works the source accepts; null: nobody has
 */
public record ZoneChoices(Double slideM, Double peopleRadius, AcceptedEnergy energy) {
  /** Nothing stated. */
  public static final ZoneChoices NONE = new ZoneChoices(null, null, null);

  /**
   * The energy of the loaded line that the person at the source has been shown and accepts.
   *
   * @param upToJ most energy that is accepted [J]
   * @param by who accepts it
   * @param when day or hour, as written down
   */
  public record AcceptedEnergy(double upToJ, String by, String when) {
    public AcceptedEnergy {
      Range.check("up_to_j", upToJ, 1, 1e6, "J");
      Range.text("by", by);
      Range.text("when", when);
    }
  }

  public ZoneChoices {
    Range.checkOrNull("slide_m", slideM, 0, 200, "m");
    Range.checkOrNull("people_radius", peopleRadius, 1, 10, "tree heights");
  }
}
