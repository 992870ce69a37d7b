package org.fallwright.core.anchor;

import org.fallwright.core.units.Range;

/**
 * A log buried across the pull in loam.
 *
 * <p>Holding power P [lb per square foot of face] by mean depth and slope of the line; length L =
 * B/(P·D) + 1 ft, with B the breaking load of the line [lb], D the log's diameter [ft] and 1 ft for
 * the line's trench; a log longer than five diameters is rejected. Published: US Army TM
 * 5-5420-278-10, Table 9 and page 317. Its units are kept, as the table is in feet and pounds.
 *
 * @param powerLbPerSqFt holding power [lb/ft²]
 * @param lengthFt length of the log [ft]
 * @param lengthOverDiameter slenderness
 * @param accepted whether the log is stout enough
 */
public record Deadman(
    double powerLbPerSqFt, double lengthFt, double lengthOverDiameter, boolean accepted) {
  private static final double[][] POWER = {
    {950, 1300, 1450, 1500},
    {1750, 2200, 2600, 2700},
    {2800, 3600, 4000, 4100},
    {3800, 5100, 5800, 6000},
    {5100, 7000, 8000, 8400}
  };

  /**
   * Sizes a log.
   *
   * @param breakingLb breaking load of the line [lb]
   * @param depthFt mean depth, whole feet from 3 to 7
   * @param run horizontal feet for each foot of rise of the line, 1 to 4
   * @param diameterFt diameter of the log [ft]
   */
  public static Deadman log(double breakingLb, int depthFt, int run, double diameterFt) {
    Range.check("breaking_lb", breakingLb, 100, 1e6, "lb");
    Range.check("depth_ft", depthFt, 3, 7, "ft");
    Range.check("run", run, 1, 4, "");
    Range.check("diameter_ft", diameterFt, 0.25, 5, "ft");
    double power = POWER[depthFt - 3][run - 1];
    double length = breakingLb / (power * diameterFt) + 1;
    double ratio = length / diameterFt;
    return new Deadman(power, length, ratio, ratio <= 5);
  }
}
