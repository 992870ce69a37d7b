package org.fallwright.core.statics;

/**
 * Wind on the crown.
 *
 * @param gustMps gust at crown height [m/s]
 * @param towardDeg direction it blows towards [degrees]; null: not known
 * @param dragC C of the drag coefficient C·V^(−N)
 * @param dragN N of the same
 * @param areaM2 frontal area in still air [m²]
 * @param heightM middle of the crown above the hinge [m]
 * @param airDensity [kg/m³]
 */
public record Wind(
    double gustMps,
    Double towardDeg,
    double dragC,
    double dragN,
    double areaM2,
    double heightM,
    double airDensity) {}
