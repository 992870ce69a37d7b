package org.fallwright.plugins.winch;

/**
 * How a drum's pull falls and its line speed grows as the layers of rope pile up.
 *
 * <p>R_n = D/2 + d/2 + (n − 1) d, each layer lying on top of the one below (nested layers are
 * lower, so that this errs to too little pull); constant torque: P_n = P_1 R_1/R_n; constant
 * turning speed: v_n = v_1 R_n/R_1. P_1, v_1 on the bare drum.
 *
 * @param barrelM D, bare drum [m]
 * @param ropeM d, rope [m]
 */
record Drum(double barrelM, double ropeM) {
  /** R_n/R_1 of layer n, counted from 1 on the bare drum. */
  double radiusRatio(int layer) {
    double bare = (barrelM + ropeM) / 2;
    return (bare + (layer - 1) * ropeM) / bare;
  }

  /** Pull on a layer, for a pull on the bare drum [N]. */
  double pullN(double bareN, int layer) {
    return bareN / radiusRatio(layer);
  }

  /** Line speed on a layer, for that on the bare drum [m/s]. */
  double speedMps(double bareMps, int layer) {
    return bareMps * radiusRatio(layer);
  }
}
