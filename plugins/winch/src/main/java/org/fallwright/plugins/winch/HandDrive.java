package org.fallwright.plugins.winch;

/**
 * What a hand on a lever or crank brings to the line.
 *
 * <p>P = F VR η: F the force of the hand [N], VR its way in a stroke or turn over the line that
 * this takes in, η what the gear leaves. Steady pull across the end of the lever; leaves out the
 * dead points of a crank and a lever that is out of reach. Balance of work.
 *
 * @param gain VR η, newtons on the line for a newton of the hand
 */
record HandDrive(double gain) {
  /**
   * A lever that swings through an angle; 360 degrees: a crank.
   *
   * @param lengthM its length to the hand [m]
   * @param swingDeg angle of one stroke [degrees]
   * @param strokeM line that a stroke takes in [m]
   * @param efficiency η
   */
  static HandDrive lever(double lengthM, double swingDeg, double strokeM, double efficiency) {
    return new HandDrive(Math.toRadians(swingDeg) * lengthM / strokeM * efficiency);
  }

  /** A drive whose plate states the force of the hand at a pull [N]; the friction is in it. */
  static HandDrive plate(double handN, double pullN) {
    return new HandDrive(pullN / handN);
  }

  /** Pull of the line for a force of the hand [N]. */
  double pullN(double handN) {
    return gain * handN;
  }

  /** Force of the hand for a pull of the line [N]. */
  double handN(double pullN) {
    return pullN / gain;
  }
}
