package org.fallwright.core.tree;

import java.util.List;
import java.util.Locale;
import java.util.Optional;
import org.fallwright.core.units.Range;

/**
 * Dry mass above the ground from the diameter at breast height:
 *
 * <p>m = exp(b0 + b1·ln D), m in kg, D in centimetres over bark at 1.3 m.
 *
 * <p>Groups 1 to 9 are from Jenkins, Chojnacky, Heath, Birdsey 2003, Forest Science 49:12 (source
 * "jenkins-2003"): forest trees of North America, made from published equations; the authors speak
 * of agreement within 30 %. Group 10, pines of heavy wood, is from Chojnacky, Heath, Jenkins 2014
 * (source "chojnacky-2014"), since for them it gives up to 40 % more than group 4. Outside the
 * fitted diameters the curve is carried on and {@link #warning} says so. It leaves out: how wide or
 * one-sided the crown is, decay, snow and ice. Open-grown trees may be a fifth lighter; that credit
 * is not taken.
 *
 * @param group number of the group, 1 to 10
 * @param name what it holds
 * @param b0 constant
 * @param b1 slope: the share by which mass grows for a share of diameter
 * @param mostDbhM greatest diameter fitted [m]
 * @param source key of its source
 */
public record MassEquation(
    int group, String name, double b0, double b1, double mostDbhM, String source) {
  /** Least diameter fitted, all groups [m]. */
  public static final double LEAST_DBH_M = 0.025;

  private static final String JENKINS = "jenkins-2003";

  private static final List<MassEquation> GROUPS =
      List.of(
          new MassEquation(1, "cedar and larch", -2.0336, 2.2592, 2.50, JENKINS),
          new MassEquation(2, "Douglas-fir", -2.2304, 2.4435, 2.10, JENKINS),
          new MassEquation(3, "true fir and hemlock", -2.5384, 2.4814, 2.30, JENKINS),
          new MassEquation(4, "pine", -2.5356, 2.4349, 1.80, JENKINS),
          new MassEquation(5, "spruce", -2.0773, 2.3323, 2.50, JENKINS),
          new MassEquation(
              6, "aspen, alder, cottonwood and willow", -2.2094, 2.3867, 0.70, JENKINS),
          new MassEquation(7, "soft maple and birch", -1.9123, 2.3651, 0.66, JENKINS),
          new MassEquation(8, "mixed hardwood", -2.4800, 2.4835, 0.56, JENKINS),
          new MassEquation(9, "hard maple, oak, hickory and beech", -2.0127, 2.4342, 0.73, JENKINS),
          new MassEquation(10, "pine of heavy wood", -3.0506, 2.6465, 0.56, "chojnacky-2014"));

  /** The equation of that group, 1 to 10. */
  public static MassEquation of(int group) {
    Range.check("mass_group", group, 1, GROUPS.size(), "");
    return GROUPS.get(group - 1);
  }

  /**
   * Dry mass above the ground, leaves and all [kg].
   *
   * @param dbhM stem diameter over bark at 1.3 m [m]
   */
  public double dryKg(double dbhM) {
    Range.check("dbh_m", dbhM, 0.01, 5, "m");
    return Math.exp(b0 + b1 * Math.log(100 * dbhM));
  }

  /** Why the figure must be doubted at that diameter; empty within the diameters fitted. */
  public Optional<String> warning(double dbhM) {
    if (dbhM >= LEAST_DBH_M && dbhM <= mostDbhM) {
      return Optional.empty();
    }
    return Optional.of(
        String.format(
            Locale.ROOT,
            "the mass equation for %s was fitted on diameters from %.3f to %.2f m; this tree has"
                + " %.2f m",
            name,
            LEAST_DBH_M,
            mostDbhM,
            dbhM));
  }
}
