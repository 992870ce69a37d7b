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
  /** R_n of layer n, counted from 1 on the bare drum [m]. */
  double radiusM(int layer) {
    return (barrelM + ropeM) / 2 + (layer - 1) * ropeM;
  }

  /** R_n/R_1 of layer n, counted from 1 on the bare drum. */
  double radiusRatio(int layer) {
    return radiusM(layer) / radiusM(1);
  }

  /** Pull on a layer, for a pull on the bare drum [N]. */
  double pullN(double bareN, int layer) {
    return bareN / radiusRatio(layer);
  }

  /** Line speed on a layer, for that on the bare drum [m/s]. */
  double speedMps(double bareMps, int layer) {
    return bareMps * radiusRatio(layer);
  }

  /** Rope in so many turns on the bare drum [m]. */
  double bareTurnsM(int turns) {
    return turns * 2 * Math.PI * radiusM(1);
  }

  /**
   * The topmost layer that a length of rope makes, wound evenly: each layer has as many whole turns
   * as lie side by side on the barrel, each turn 2 π R_n long.
   *
   * <p>Summed over full layers this is the handbooks' π B h (D + h)/d², B the barrel's width and h
   * the depth of rope. Leaves out rope that winds up unevenly or too thick: it lies on more layers.
   *
   * @param ropeLengthM length of rope on the drum [m]
   * @param widthM B, width of the barrel, at least one rope [m]
   */
  int layers(double ropeLengthM, double widthM) {
    double turns = Math.floor(widthM / ropeM * (1 + 1e-9));
    int layer = 1;
    double left = ropeLengthM;
    while (true) {
      left -= turns * 2 * Math.PI * radiusM(layer);
      if (left <= 1e-9 * ropeLengthM) {
        return layer;
      }
      layer++;
    }
  }
}
