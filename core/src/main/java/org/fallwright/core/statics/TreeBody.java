package org.fallwright.core.statics;

import java.util.List;
import org.fallwright.core.line.Point3;
import org.fallwright.core.site.StemDiameter;
import org.fallwright.core.tree.StemTaper;

/**
 * The tree as a body, with the stem below and above the cut.
 *
 * @param heightM height above the ground [m]
 * @param dbhM diameter over bark at 1.3 m above the ground [m]
 * @param cutHeightM hinge above the ground [m]
 * @param diameters further diameters over bark, heights above the ground
 * @param stumpDiameterM diameter inside the bark at the cut [m]
 * @param shellM sound shell at the cut and up the stem [m]; null: sound through
 * @param deadOrDecayed whether the hinge's wood is dead or decayed
 * @param massKg green mass [kg]
 * @param massCentreM mass centre above the hinge [m]
 * @param leanDeg lean of the stem axis [degrees]
 * @param leanAzimuthDeg direction of the lean [degrees]
 * @param crownShift crown share × crown offset, moves the mass centre only [m]; up is not used
 */
public record TreeBody(
    double heightM,
    double dbhM,
    double cutHeightM,
    List<StemDiameter> diameters,
    double stumpDiameterM,
    Double shellM,
    boolean deadOrDecayed,
    double massKg,
    double massCentreM,
    double leanDeg,
    double leanAzimuthDeg,
    Point3 crownShift) {

  /** The stem's diameters. */
  StemTaper taper() {
    return StemTaper.of(heightM, dbhM, diameters, cutHeightM, stumpDiameterM);
  }

  /**
   * Share of a section's stiffness and strength that the cavity takes, (inner/outer)⁴, the sound shell
   * counted from inside the bark.
   *
   * @param insideBarkM diameter inside the bark [m]
   */
  double cavityLoss(double insideBarkM) {
    if (shellM == null || insideBarkM <= 2 * shellM) {
      return 0;
    }
    return Math.pow((insideBarkM - 2 * shellM) / insideBarkM, 4);
  }
}
