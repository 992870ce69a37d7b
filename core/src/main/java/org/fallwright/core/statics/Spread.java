package org.fallwright.core.statics;

/**
 * One standard deviation of each entered quantity.
 *
 * @param massRel share of the mass
 * @param massCentreM [m]
 * @param leanDeg [degrees]
 * @param azimuthDeg [degrees]
 * @param diameterRel share of the diameter at the cut
 * @param morCv share of the rupture strength
 * @param thicknessRel share of the hinge thickness
 * @param windRel share of the gust; at least 1 m/s is taken
 * @param attachM attachment height [m]
 * @param bearingM bearing point, aside [m]
 */
public record Spread(
    double massRel,
    double massCentreM,
    double leanDeg,
    double azimuthDeg,
    double diameterRel,
    double morCv,
    double thicknessRel,
    double windRel,
    double attachM,
    double bearingM) {}
