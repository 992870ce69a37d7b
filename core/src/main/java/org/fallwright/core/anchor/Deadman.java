package org.fallwright.core.anchor;

import java.util.Locale;
import org.fallwright.core.reference.Hardware;
import org.fallwright.core.site.Anchor;
import org.fallwright.core.site.Anchor.DeadmanSoil;
import org.fallwright.core.units.Range;
import org.fallwright.core.units.Units;

/**
 * A log buried across the pull.
 *
 * <p>Holding power P [lb per square foot of face] in loam by mean depth and slope of the line; a
 * log of length L and diameter D [ft] holds B = P·D·(L − 1), 1 ft going to the line's trench, and
 * one longer than five diameters is rejected, as it might break. Published: US Army TM
 * 5-5420-278-10, Table 9 and page 317, where B is the breaking load of the line, so that P counts
 * as ultimate. Soft ground counts half (published). The source's five-fold figure for rock and
 * hardpan is not credited. Its units are kept, as the table is in feet and pounds.
 *
 * @param powerLbPerSqFt holding power [lb/ft²]
 * @param lengthFt length of the log [ft]
 * @param lengthOverDiameter slenderness
 * @param accepted whether the log is stout enough
 */
public record Deadman(
    double powerLbPerSqFt, double lengthFt, double lengthOverDiameter, boolean accepted) {
  private static final int DEEPEST_FT = 7;

  /** A depth written to the centimetre still counts as its whole foot [ft]. */
  private static final double ROUNDING_FT = 0.02;

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
    Range.check("diameter_ft", diameterFt, 0.25, 5, "ft");
    double power = power(depthFt, run);
    double length = breakingLb / (power * diameterFt) + Hardware.value("deadman.trench");
    double ratio = length / diameterFt;
    return new Deadman(power, length, ratio, ratio <= Hardware.value("deadman.slenderness"));
  }

  /** Holding power [lb/ft²] at a whole foot of depth, the line rising 1 in {@code run}. */
  public static double power(int depthFt, int run) {
    Range.check("depth_ft", depthFt, 3, DEEPEST_FT, "ft");
    Range.check("run", run, 1, 4, "");
    return Hardware.value("deadman." + depthFt + "ft." + run);
  }

  /** What a buried log holds under a load of a given direction. */
  static Capacity capacity(Anchor.BuriedLog log, AnchorLoad load) {
    double most = Hardware.value("deadman.slenderness");
    double slenderness = log.lengthM() / log.faceHeightM();
    if (slenderness > most) {
      return Capacity.refuse(
          String.format(
              Locale.ROOT,
              "the log is %.1f times as long as thick and might break; %.0f is the most",
              slenderness,
              most));
    }
    if (load.downhill()) {
      return Capacity.refuse("the load pulls steeply downhill; its table is for level ground");
    }
    int run = Math.min(log.lineRun(), runOf(load.upliftDeg()));
    if (run < 1) {
      return Capacity.refuse(
          String.format(
              Locale.ROOT, "the load rises %.1f degrees; its table ends at 45", load.upliftDeg()));
    }
    double holds =
        holdsN(log.depthM(), run, log.faceHeightM(), log.lengthM(), log.soil() == DeadmanSoil.SOFT);
    return holds > 0
        ? Capacity.holds(
            holds,
            "ground",
            "the ground before the buried log gives way"
                + (log.soil() == DeadmanSoil.SOFT ? ", soft ground counted at half" : ""))
        : Capacity.refuse("the line's trench takes the whole face of so short a log");
  }

  /**
   * Holding power of a log [N]; between two depths of the table that of the lesser, below its
   * deepest that of the deepest.
   *
   * @param depthM mean depth of its face [m]
   * @param run metres that the line runs for each that it rises, 1 to 4
   * @param faceM height of its face [m]
   * @param lengthM its length [m]
   * @param soft whether the soil is fine-grained, sandy or very wet
   */
  public static double holdsN(double depthM, int run, double faceM, double lengthM, boolean soft) {
    double area = faceM / Units.FOOT * (lengthM / Units.FOOT - Hardware.value("deadman.trench"));
    double pounds = power(wholeFeet(depthM), run) * Math.max(0, area);
    return pounds * Units.POUND_FORCE * (soft ? Hardware.value("deadman.soft") : 1);
  }

  private static int wholeFeet(double depthM) {
    return Math.min(DEEPEST_FT, (int) (depthM / Units.FOOT + ROUNDING_FT));
  }

  /** Holding power of that log's face under that load, in loam [lb/ft²]. */
  public static double power(Anchor.BuriedLog log, AnchorLoad load) {
    return power(wholeFeet(log.depthM()), Math.min(log.lineRun(), runOf(load.upliftDeg())));
  }

  /** The flattest slope of the table that is no flatter than the load's; 0 past 45 degrees. */
  private static int runOf(double upliftDeg) {
    int run = 4;
    while (run > 0 && upliftDeg > Math.toDegrees(Math.atan2(1, run)) + 1e-9) {
      run--;
    }
    return run;
  }
}
