package org.fallwright.core.statics;

import java.util.List;
import java.util.function.ToDoubleFunction;

/**
 * What stands behind the figures of one pull, for whoever works them again: the spread of every
 * result, one input at a time.
 */
public final class Worked {
  private final PullCase c;
  private final OneAtATime spread;
  private final TreeSide side;

  Worked(PullCase c, OneAtATime spread, TreeSide side) {
    this.c = c;
    this.spread = spread;
    this.side = side;
  }

  /**
   * One entered quantity at its mean and at its 5th and 95th percentile.
   *
   * @param name its name in {@link Draw#NAMES}
   */
  public record Input(String name, double mean, double low, double high) {}

  /**
   * The case that takes most of the hinge.
   *
   * @param satBack whether the tree is sat back; else it is at the end of the movement
   * @param tensionN tension in the line [N]
   * @param sign to which side, +1 or −1
   * @param share the share
   */
  public record HingeCase(boolean satBack, double tensionN, int sign, Varied share) {}

  /** The entered quantities in the order of {@link Draw#NAMES}. */
  public List<Input> inputs() {
    return spread.inputs();
  }

  /** Commit angle, its floor left out [rad]. */
  public Varied commit() {
    return spread.varied(CommitAngle::unfloored);
  }

  /** Tension that moves the tree, sat back [N]. */
  public Varied need() {
    return spread.varied(p -> ForceBalance.need(p, -p.sitBack()));
  }

  /** Hold tension [N]. */
  public Varied hold() {
    return spread.varied(ForceBalance::hold);
  }

  /** Rest on the stump. */
  public Varied rest() {
    return spread.varied(ForceBalance::rest);
  }

  /** Tension at which the hinge alone, in calm air, lets the tree move at that angle [N]. */
  public Varied letsGo(double phiRad) {
    return spread.varied(p -> ForceBalance.letsGo(p, phiRad));
  }

  /** The case with the greatest steering share. */
  public HingeCase steering() {
    HingeCase most = null;
    for (int sign = -1; sign <= 1; sign += 2) {
      for (double tension : new double[] {0, side.workingN()}) {
        int s = sign;
        most = greater(most, true, tension, s, p -> HingeStress.steering(p, at(p), tension, s));
        most =
            greater(
                most, false, tension, s, p -> HingeStress.steering(p, side.endRad(), tension, s));
      }
    }
    return most;
  }

  /** The case with the greatest turning share. */
  public HingeCase turning() {
    double shear = c.wood().shearPa();
    double tension = side.workingN();
    HingeCase most = null;
    for (int sign = -1; sign <= 1; sign += 2) {
      int s = sign;
      most = greater(most, true, tension, s, p -> HingeStress.turning(p, at(p), tension, s, shear));
      most =
          greater(
              most,
              false,
              tension,
              s,
              p -> HingeStress.turning(p, side.endRad(), tension, s, shear));
    }
    return most;
  }

  private static double at(Posture p) {
    return -p.sitBack();
  }

  private HingeCase greater(
      HingeCase most, boolean satBack, double tension, int sign, ToDoubleFunction<Posture> f) {
    Varied share = spread.varied(f);
    return most == null || share.p95() > most.share().p95()
        ? new HingeCase(satBack, tension, sign, share)
        : most;
  }
}
