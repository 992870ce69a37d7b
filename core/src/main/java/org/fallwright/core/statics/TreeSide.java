package org.fallwright.core.statics;

import org.fallwright.core.cut.HingeShape;

/**
 * What the tree asks of the line, whatever pulls it. Forces at the tree, in the leg that leaves the
 * attachment.
 *
 * @param status kind of pull; after "never lets go" and "lever lost" the forces are NaN
 * @param hinge nominal hinge
 * @param hingeNm nominal hinge moment [N·m]
 * @param windNm nominal wind moment against the lay [N·m]
 * @param windAsideNm nominal wind moment aside [N·m]
 * @param ugM nominal offset of the mass centre along the lay, from the hinge [m]
 * @param vgM the same to the right [m]
 * @param weightNm nominal weight moment standing, positive towards the lay [N·m]
 * @param commitRad commit angle [rad]
 * @param endRad end of the movement [rad]
 * @param leverM lever as found standing [m]
 * @param leverSitM lever sat back [m]
 * @param leverMinM least lever over the movement [m]
 * @param leverLostRad angle at which the lever is lost [rad]; NaN: it is not
 * @param thicknessThatWouldM hinge thickness that would let go [m]; NaN: none would, or not asked
 * @param neededN pull needed [N]
 * @param planN pull to plan for [N]
 * @param holdN hold tension [N]
 * @param workingN working tension [N]
 * @param restShare rest on the stump
 * @param lineNPerM line stiffness as if captured [N/m]
 * @param pathNPerM path stiffness as if captured [N/m]
 * @param riseRad rise of the first leg [rad]
 * @param lengthM length of all legs [m]
 * @param shorteningM shortening over the movement [m]
 * @param shorteningToCommitM shortening from sat back to the commit angle [m]
 * @param takeUpM take-up [m]
 * @param gapeM gape of the back cut at the commit angle [m]
 * @param steerShare steering share
 * @param turnShare turning share
 * @param crushShare crushing share
 * @param stemBreakN tension that breaks the stem [N]
 * @param stemWeakestM height of the weakest section above the hinge [m]
 */
public record TreeSide(
    Status status,
    HingeShape hinge,
    double hingeNm,
    double windNm,
    double windAsideNm,
    double ugM,
    double vgM,
    double weightNm,
    double commitRad,
    double endRad,
    double leverM,
    double leverSitM,
    double leverMinM,
    double leverLostRad,
    double thicknessThatWouldM,
    double neededN,
    double planN,
    double holdN,
    double workingN,
    double restShare,
    double lineNPerM,
    double pathNPerM,
    double riseRad,
    double lengthM,
    double shorteningM,
    double shorteningToCommitM,
    double takeUpM,
    double gapeM,
    double steerShare,
    double turnShare,
    double crushShare,
    double stemBreakN,
    double stemWeakestM) {

  /** The same over a line of another stiffness and length; the first leg is the same. */
  TreeSide over(PathStiffness stiff, double slackM) {
    return new TreeSide(
        status,
        hinge,
        hingeNm,
        windNm,
        windAsideNm,
        ugM,
        vgM,
        weightNm,
        commitRad,
        endRad,
        leverM,
        leverSitM,
        leverMinM,
        leverLostRad,
        thicknessThatWouldM,
        neededN,
        planN,
        holdN,
        workingN,
        restShare,
        stiff.lineNPerM(),
        stiff.pathNPerM(),
        riseRad,
        stiff.lengthM(),
        shorteningM,
        shorteningToCommitM,
        shorteningM + workingN / stiff.pathNPerM() + slackM,
        gapeM,
        steerShare,
        turnShare,
        crushShare,
        stemBreakN,
        stemWeakestM);
  }

  /** Whether the forces could be reckoned. */
  public boolean movable() {
    return status == Status.BACK_LEANER || status == Status.NO_PULL_NEEDED;
  }
}
