package org.fallwright.core.statics;

import org.fallwright.core.line.Point3;
import org.fallwright.core.units.Range;

/**
 * One way that the tree, the day and the rigging may really be: a value of everything that has a
 * spread, what is derived of it worked out already. What hangs on the setup is in standard
 * deviations, so that the same trials serve every setup of a site.
 *
 * @param massKg mass [kg]
 * @param massCentreM height of the mass centre above the hinge [m]
 * @param leanDeg lean [degrees]; below 0 it leans the other way
 * @param azimuthDeg direction of the lean [degrees]
 * @param hingeFactor hinge factor k
 * @param ruptureSds rupture strength off its mean [standard deviations]
 * @param thicknessSds hinge thickness off what is planned [standard deviations]
 * @param stumpDiameterM diameter at the cut [m]
 * @param gustMps gust [m/s]
 * @param windFactor factor on the wind's moment: drag, and another crown's area and height
 * @param attachSds attachment off its height [standard deviations]
 * @param bearingSds bearing point off its place, to the right of the lay [standard deviations]
 * @param crownShift how far the crown moves the mass centre [m]; up is not used
 */
public record Trial(
    double massKg,
    double massCentreM,
    double leanDeg,
    double azimuthDeg,
    double hingeFactor,
    double ruptureSds,
    double thicknessSds,
    double stumpDiameterM,
    double gustMps,
    double windFactor,
    double attachSds,
    double bearingSds,
    Point3 crownShift) {
  /** What a quantity that cannot be nought or less is left at, share of its mean. */
  public static final double LEAST_SHARE = 0.1;

  /** Least back cut, share of the diameter: a cut deeper than that cannot be made. */
  private static final double LEAST_BACK_CUT = 0.01;

  public Trial {
    Range.check("mass_kg", massKg, 0, 1e7, "kg");
    Range.check("mass_centre_m", massCentreM, -100, 200, "m");
    Range.check("stump_diameter_m", stumpDiameterM, 0, 20, "m");
    Range.check("wind_factor", windFactor, 0, 1e3, "");
  }

  /**
   * The draw of a case. A thickness that leaves no back cut is taken at the most that leaves one.
   */
  Draw draw(PullCase c) {
    Spread s = c.spread();
    double most = stumpDiameterM * (1 - c.cut().faceFraction() - LEAST_BACK_CUT);
    return new Draw(
        massKg,
        massCentreM,
        leanDeg,
        azimuthDeg,
        hingeFactor,
        c.wood().morPa() * share(s.morCv() * ruptureSds),
        Math.min(most, c.cut().thicknessM() * share(s.thicknessRel() * thicknessSds)),
        stumpDiameterM,
        gustMps,
        windFactor,
        Math.max(
            LEAST_SHARE * c.line().attachHeightM(),
            c.line().attachHeightM() + s.attachM() * attachSds),
        s.bearingM() * bearingSds);
  }

  private static double share(double off) {
    return Math.max(LEAST_SHARE, 1 + off);
  }
}
