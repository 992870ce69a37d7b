package org.fallwright.core.plan;

/**
 * The figures of a setup, SI; the plan file's names for them stand in its specification.
 *
 * @param pullNeededN pull at the tree that moves it at nominal inputs [N]
 * @param pullPlanN pull to plan for [N]
 * @param holdN hold tension [N]
 * @param workingN working tension [N]
 * @param restShare rest on the stump; below the allowance the tree still rests on it
 * @param holdStability hold stability
 * @param startsItself "no", "stops" or "runs"
 * @param pretensionTopN top of the pretension window [N]
 * @param sourceLowN source low at the tree [N]
 * @param sourceHighN source high at the tree [N]
 * @param ceilingN ceiling at the tree [N]
 * @param ceilingPart the part that sets it
 * @param pullMargin source low over pull to plan for; infinite where no pull is needed
 * @param clearanceM least clearance to a target that must not be hit [m]; NaN: no such target
 * @param clearanceTarget that target, or null
 * @param commitDeg commit angle [degrees]
 * @param movementEndDeg end of the movement [degrees]
 * @param takeUpM line to take in at the tree [m]
 * @param lineInAtCommitM line in from slack when it goes [m]
 * @param sourceTravelM travel at the source [m]
 * @param lineRiseDeg rise of the first leg [degrees]
 * @param leverM lever of the line as found standing [m]
 * @param steeringShare steering share of the hinge
 * @param turnShare turning share of the hinge
 * @param gapeM gape of the back cut when it goes [m]
 * @param lineLengthM length of all legs [m]
 * @param leansOnStopReading whether the setup works only with a person reading a load cell
 * @param stopReadingN reading to stop at, at its place [N]; NaN: no load cell
 * @param stopReadingAt where the load cell sits; empty: none
 * @param sourceEndPerTree tension at the source over tension at the tree, hauling
 * @param runsOnStretch whether the line's own stretch carries the tree to its commit angle
 * @param sampled whether its percentiles are over trials; else one input at a time
 */
public record Figures(
    double pullNeededN,
    double pullPlanN,
    double holdN,
    double workingN,
    double restShare,
    double holdStability,
    String startsItself,
    double pretensionTopN,
    double sourceLowN,
    double sourceHighN,
    double ceilingN,
    String ceilingPart,
    double pullMargin,
    double clearanceM,
    String clearanceTarget,
    double commitDeg,
    double movementEndDeg,
    double takeUpM,
    double lineInAtCommitM,
    double sourceTravelM,
    double lineRiseDeg,
    double leverM,
    double steeringShare,
    double turnShare,
    double gapeM,
    double lineLengthM,
    boolean leansOnStopReading,
    double stopReadingN,
    String stopReadingAt,
    double sourceEndPerTree,
    boolean runsOnStretch,
    boolean sampled) {}
