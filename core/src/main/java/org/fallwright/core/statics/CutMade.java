package org.fallwright.core.statics;

/**
 * The cut as the balance sees it.
 *
 * @param faceFraction face depth over the diameter at the cut
 * @param thicknessM hinge thickness [m]
 * @param widthM hinge width entered [m]; null: the chord
 * @param kerfM saw kerf [m]
 * @param wedges whether wedges are set behind the tree
 * @param hingeFactor nominal hinge factor k
 */
public record CutMade(
    double faceFraction,
    double thicknessM,
    Double widthM,
    double kerfM,
    boolean wedges,
    double hingeFactor) {}
