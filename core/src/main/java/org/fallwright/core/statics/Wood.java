package org.fallwright.core.statics;

import org.fallwright.core.units.Range;

/**
 * Green wood of the pulled tree.
 *
 * @param morPa mean modulus of rupture where it resists the pull [Pa]: the hinge that must bend
 * @param morCv its coefficient of variation
 * @param moePa mean modulus of elasticity [Pa]
 * @param shearPa mean shear strength along the grain [Pa]
 * @param crushPa compression strength along the grain [Pa]
 * @param knotFactor what knots leave of the rupture strength
 * @param morHoldsPa mean modulus of rupture where it must hold [Pa]: the stem, and the hinge that
 *     steers or holds the tree; at most {@code morPa}, below it only where sources disagree
 */
public record Wood(
    double morPa,
    double morCv,
    double moePa,
    double shearPa,
    double crushPa,
    double knotFactor,
    double morHoldsPa) {
  public Wood {
    Range.check("mor_holds_Pa", morHoldsPa, 0, morPa, "Pa");
  }

  /** Wood of one rupture strength, whether it resists or holds. */
  public Wood(
      double morPa, double morCv, double moePa, double shearPa, double crushPa, double knotFactor) {
    this(morPa, morCv, moePa, shearPa, crushPa, knotFactor, morPa);
  }

  /** What of a rupture strength that resists may be counted on to hold, 0 to 1. */
  double holdsShare() {
    return morHoldsPa / morPa;
  }
}
