package org.fallwright.maps.demo;

/**
 * Where the light comes from: azimuth 150 degrees, 56 degrees high; shadows run north-north-west.
 */
final class Sun {
  private static final double AZIMUTH = Math.toRadians(150);
  private static final double HEIGHT = Math.toRadians(56);

  /** Towards the sun, over the ground: unit vector east, north. */
  static final double EAST = Math.sin(AZIMUTH);

  static final double NORTH = Math.cos(AZIMUTH);

  /** Metres a ray towards the sun rises over a metre of ground. */
  static final double RISE = Math.tan(HEIGHT);

  /** Towards the sun: unit vector east, north, up. */
  static final double X = EAST * Math.cos(HEIGHT);

  static final double Y = NORTH * Math.cos(HEIGHT);
  static final double Z = Math.sin(HEIGHT);

  private Sun() {}

  /** Share of the light that meets a surface rising by (east, north) metres a metre, 0 to 1. */
  static double on(double riseEast, double riseNorth) {
    double up = 1 / Math.sqrt(1 + riseEast * riseEast + riseNorth * riseNorth);
    return Math.max(0, (Z - riseEast * X - riseNorth * Y) * up);
  }
}
