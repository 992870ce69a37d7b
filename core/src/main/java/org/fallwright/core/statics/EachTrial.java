package org.fallwright.core.statics;

/**
 * What every trial by itself says of one pull, in the order of the trials; nothing here is a
 * percentile. The tension in the line and the end of the movement are those of the plan.
 */
public final class EachTrial {
  private final PullCase c;
  private final Sampled sampled;
  private final TreeSide side;

  EachTrial(PullCase c, Sampled sampled, TreeSide side) {
    this.c = c;
    this.sampled = sampled;
    this.side = side;
  }

  public int count() {
    return sampled.postures.length;
  }

  /** Tension that moves the tree sat back [N]: below 0 none; infinite where the lever is lost. */
  public double needN(int i) {
    Posture p = sampled.postures[i];
    return sampled.lost(i) ? Double.POSITIVE_INFINITY : ForceBalance.need(p, -p.sitBack());
  }

  /** Tension that holds it once the hinge is gone [N]: below 0 none. */
  public double holdN(int i) {
    return sampled.lost(i) ? Double.POSITIVE_INFINITY : ForceBalance.hold(sampled.postures[i]);
  }

  /**
   * Tension at which it moves at an angle of the movement [N]; infinite where there is no lever.
   */
  double needN(int i, double phiRad) {
    Posture p = sampled.postures[i];
    return p.lever(phiRad) <= 0 ? Double.POSITIVE_INFINITY : ForceBalance.need(p, phiRad);
  }

  /** Angle at which the weight takes over [rad]; NaN where the hinge never lets go. */
  public double commitRad(int i) {
    Posture p = sampled.postures[i];
    return CommitAngle.exists(p) ? CommitAngle.of(p) : Double.NaN;
  }

  /** Greatest steering share, of both sides, with and without the line, at both ends. */
  public double steerShare(int i) {
    Posture p = sampled.postures[i];
    double most = Double.NEGATIVE_INFINITY;
    for (int sign = -1; sign <= 1; sign += 2) {
      for (double tension : new double[] {0, side.workingN()}) {
        most = Math.max(most, HingeStress.steering(p, -p.sitBack(), tension, sign));
        most = Math.max(most, HingeStress.steering(p, side.endRad(), tension, sign));
      }
    }
    return most;
  }

  /** Greatest turning share, of both sides and at both ends. */
  public double turnShare(int i) {
    Posture p = sampled.postures[i];
    double shear = c.wood().shearPa();
    return Math.max(
        Math.abs(HingeStress.turning(p, -p.sitBack(), side.workingN(), 1, shear)),
        Math.abs(HingeStress.turning(p, side.endRad(), side.workingN(), 1, shear)));
  }

  /** Share of the hinge's crushing strength. */
  public double crushShare(int i) {
    Posture p = sampled.postures[i];
    return Statics.crushing(c, p, p.weightN, side.workingN(), side.riseRad());
  }

  /**
   * Hold stability.
   *
   * @param captured whether the far end of the line stays where it is
   */
  public double stability(int i, boolean captured) {
    Posture p = sampled.postures[i];
    double line = captured ? side.lineNPerM() : 0;
    return Statics.stability(p, p.weightN, line, Math.max(0, holdN(i)));
  }
}
