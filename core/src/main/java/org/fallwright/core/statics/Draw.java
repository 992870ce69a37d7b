package org.fallwright.core.statics;

/**
 * One value of every entered quantity that has a spread; everything else is recomputed from these.
 *
 * @param massKg mass [kg]
 * @param massCentreM height of the mass centre above the hinge [m]
 * @param leanDeg lean [degrees]
 * @param azimuthDeg direction of the lean [degrees]
 * @param hingeFactor hinge factor k
 * @param morPa rupture strength [Pa]
 * @param thicknessM hinge thickness [m]
 * @param stumpDiameterM diameter at the cut [m]
 * @param gustMps gust [m/s]
 * @param drag factor on the wind moment
 * @param attachM attachment above the hinge [m]
 * @param bearingM bearing point moved aside along the right of the lay [m]
 */
public record Draw(
    double massKg,
    double massCentreM,
    double leanDeg,
    double azimuthDeg,
    double hingeFactor,
    double morPa,
    double thicknessM,
    double stumpDiameterM,
    double gustMps,
    double drag,
    double attachM,
    double bearingM) {

  /** Number of entered quantities. */
  public static final int COUNT = 12;

  /** Names of the quantities in the order of {@link #with}. */
  public static final String[] NAMES = {
    "mass",
    "mass centre",
    "lean",
    "lean azimuth",
    "hinge factor",
    "rupture strength",
    "hinge thickness",
    "stump diameter",
    "gust",
    "drag",
    "attach height",
    "bearing point"
  };

  /** The nominal values of a case. */
  public static Draw nominal(PullCase c) {
    return new Draw(
        c.tree().massKg(),
        c.tree().massCentreM(),
        c.tree().leanDeg(),
        c.tree().leanAzimuthDeg(),
        c.cut().hingeFactor(),
        c.wood().morPa(),
        c.cut().thicknessM(),
        c.tree().stumpDiameterM(),
        c.wind().gustMps(),
        1,
        c.line().attachHeightM(),
        0);
  }

  /** Value of quantity {@code i}, in the order of {@link #NAMES}. */
  public double get(int i) {
    return switch (i) {
      case 0 -> massKg;
      case 1 -> massCentreM;
      case 2 -> leanDeg;
      case 3 -> azimuthDeg;
      case 4 -> hingeFactor;
      case 5 -> morPa;
      case 6 -> thicknessM;
      case 7 -> stumpDiameterM;
      case 8 -> gustMps;
      case 9 -> drag;
      case 10 -> attachM;
      case 11 -> bearingM;
      default -> throw new IndexOutOfBoundsException(i);
    };
  }

  /** The same draw with quantity {@code i} put to {@code x}. */
  public Draw with(int i, double x) {
    double[] v = new double[COUNT];
    for (int j = 0; j < COUNT; j++) {
      v[j] = j == i ? x : get(j);
    }
    return of(v);
  }

  /** A draw from its values in the order of {@link #NAMES}. */
  public static Draw of(double[] v) {
    return new Draw(v[0], v[1], v[2], v[3], v[4], v[5], v[6], v[7], v[8], v[9], v[10], v[11]);
  }
}
