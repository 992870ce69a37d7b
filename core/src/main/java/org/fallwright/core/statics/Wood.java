package org.fallwright.core.statics;

/**
 * Green wood of the pulled tree.
 *
 * @param morPa mean modulus of rupture [Pa]
 * @param morCv its coefficient of variation
 * @param moePa mean modulus of elasticity [Pa]
 * @param shearPa mean shear strength along the grain [Pa]
 * @param crushPa compression strength along the grain [Pa]
 * @param knotFactor what knots leave of the rupture strength
 */
public record Wood(
    double morPa, double morCv, double moePa, double shearPa, double crushPa, double knotFactor) {}
