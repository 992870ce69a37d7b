package org.fallwright.core.anchor;

import org.fallwright.core.units.Range;
import org.fallwright.core.units.Units;

/**
 * The line tension at which a parked vehicle with all wheels locked starts to slide.
 *
 * <p>T = W·(μ cos s − sin s)/(cos a + μ sin a), never below 0: W the weight [N], μ the grip of
 * tyres on that ground, s the slope along the line, positive where the ground rises away from the
 * tree (gravity then pulls the vehicle towards it), a the rise of the line from that ground,
 * positive towards the tree. A rising line unloads the wheels. Leaves out chocks, banks and blades,
 * which would help, and tipping. Statics; the drag of a 3,000 kg vehicle on grass at about 10 kN
 * (Arboriculture Australia 2022, Tree Rescue Manual p. 214) agrees with it.
 */
public final class LockedWheels {
  /** Standard gravity [m/s²]. */
  private static final double G = Units.GRAVITY;

  private LockedWheels() {}

  /**
   * Sliding tension [N].
   *
   * @param massKg mass of the vehicle [kg]
   * @param grip grip of the tyres taken low
   * @param uphillDeg slope, positive where the ground rises away from the tree [degrees]
   * @param riseToGroundDeg rise of the line from the ground towards the tree [degrees]
   */
  public static double slidesAtN(
      double massKg, double grip, double uphillDeg, double riseToGroundDeg) {
    Range.check("mass_kg", massKg, 200, 60_000, "kg");
    Range.check("grip", grip, 0, 1.5, "");
    double s = Math.toRadians(Range.check("uphill_deg", uphillDeg, -30, 30, "degrees"));
    double a =
        Math.toRadians(Range.check("rise_to_ground_deg", riseToGroundDeg, -30, 30, "degrees"));
    double tension =
        massKg * G * (grip * Math.cos(s) - Math.sin(s)) / (Math.cos(a) + grip * Math.sin(a));
    return Math.max(0, tension);
  }
}
