package org.fallwright.core.statics;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.Optional;
import org.fallwright.core.reference.Allowances;
import org.fallwright.core.tree.StemTaper;

/**
 * The statics of one pull: what the tree asks of the line, and how it behaves on what a source
 * gives. Built for one case; immutable.
 */
public final class Statics {
  /** A strongest hinge factor; planning allowance. */
  private static final double STRONGEST_HINGE = Allowances.HINGE_K_MOST.value();

  private final PullCase c;
  private final Posture nominal;
  private final Percentiles spread;
  private final double bend;
  private final LettingGo lettingGo;
  private final TreeSide side;

  /**
   * What the hinge alone, in calm air, lets go at: whatever the line's course.
   *
   * @param laterN after a little movement [N]
   * @param atOnceN at once [N]
   * @param later that little movement [rad]
   */
  private record LettingGo(double laterN, double atOnceN, double later) {}

  /** With the spreads one input at a time. */
  public Statics(PullCase c) {
    this(c, new OneAtATime(c));
  }

  /** With the spreads as the trials have them. */
  public Statics(PullCase c, List<Trial> trials) {
    this(c, new Sampled(c, trials));
  }

  private Statics(PullCase c, Percentiles spread) {
    this.c = c;
    this.spread = spread;
    nominal = new Posture(c, Draw.nominal(c));
    StemTaper taper = c.tree().taper();
    bend = PathStiffness.bend(c, taper);
    side = reckon(taper);
    lettingGo = side.movable() ? lettingGo() : null;
  }

  /** See {@link #over}. */
  private Statics(Statics like, PullCase c, TreeSide side) {
    this.c = c;
    nominal = like.nominal;
    spread = like.spread;
    bend = like.bend;
    lettingGo = like.lettingGo;
    this.side = side;
  }

  /**
   * The same pull over a line that differs only beyond its first bearing point: what that changes
   * is its stiffness, its length and the take-up.
   *
   * @param line a line with the same attachment and first bearing point
   */
  public Statics over(LineSet line) {
    PullCase other =
        new PullCase(c.layDeg(), c.tree(), c.wood(), c.cut(), c.wind(), line, c.spread());
    return new Statics(
        this,
        other,
        side.movable() ? side.over(PathStiffness.of(other, bend), line.slackM()) : side);
  }

  private OneAtATime oneAtATime() {
    return spread instanceof OneAtATime o ? o : new OneAtATime(c);
  }

  /** What each trial says; empty where the spreads are one input at a time. */
  public Optional<EachTrial> eachTrial() {
    return spread instanceof Sampled s ? Optional.of(new EachTrial(c, s, side)) : Optional.empty();
  }

  /** What the tree asks. */
  public TreeSide treeSide() {
    return side;
  }

  /** What stands behind it, to be worked again. */
  public Worked worked() {
    return new Worked(c, oneAtATime(), side);
  }

  private TreeSide reckon(StemTaper taper) {
    double back = nominal.sitBack();
    double commit = CommitAngle.exists(nominal) ? CommitAngle.of(nominal) : Double.NaN;
    if (Double.isNaN(commit)) {
      double would = CommitAngle.thicknessThatWould(c, STRONGEST_HINGE).orElse(Double.NaN);
      return unmovable(
          Status.HINGE_NEVER_LETS_GO, commit, Double.NaN, Double.NaN, Double.NaN, would);
    }
    double end = Math.min(Movement.CAP, spread.p95(CommitAngle::unfloored));
    end = Math.max(end, commit);
    double leverMin = Double.POSITIVE_INFINITY;
    double lost = Double.NaN;
    for (int i = 0; i < Movement.ANGLES; i++) {
      double phi = Movement.angle(-back, end, i);
      double lever = nominal.lever(phi);
      leverMin = Math.min(leverMin, lever);
      if (Double.isNaN(lost) && lever <= Movement.LOST_SHARE * nominal.wa) {
        lost = phi;
      }
    }
    if (!Double.isNaN(lost)) {
      return unmovable(Status.LEVER_LOST, commit, end, leverMin, lost, Double.NaN);
    }
    double needed = Math.max(0, ForceBalance.need(nominal, -back));
    double plan =
        Math.max(0, Math.max(needed, spread.p95(p -> ForceBalance.need(p, -p.sitBack()))));
    double hold = Math.max(0, spread.p95(ForceBalance::hold));
    double working = Math.max(plan, hold);
    if (!Double.isFinite(working)) {
      return unmovable(Status.LEVER_LOST, commit, end, leverMin, -back, Double.NaN);
    }
    double rest = spread.p95(ForceBalance::rest);
    PathStiffness stiff = PathStiffness.of(c, bend);
    StemStrength stem = StemStrength.of(c, taper);
    double shortening = nominal.leg(-back) - nominal.leg(end);
    double takeUp = shortening + working / stiff.pathNPerM() + c.line().slackM();
    return new TreeSide(
        plan > 0 ? Status.BACK_LEANER : Status.NO_PULL_NEEDED,
        nominal.hinge,
        nominal.hingeNm,
        nominal.windNm,
        nominal.windAsideNm,
        nominal.ug,
        nominal.vg,
        nominal.weightMoment(0),
        commit,
        end,
        nominal.lever(0),
        nominal.lever(-back),
        leverMin,
        Double.NaN,
        Double.NaN,
        needed,
        plan,
        hold,
        working,
        rest,
        stiff.lineNPerM(),
        stiff.pathNPerM(),
        stiff.riseRad(),
        stiff.lengthM(),
        shortening,
        nominal.leg(-back) - nominal.leg(commit),
        takeUp,
        c.cut().kerfM() + nominal.hinge.backCutM() * commit,
        steering(working, end),
        turning(working, end),
        crushing(working, stiff.riseRad()),
        stem.tensionN(),
        stem.sectionM());
  }

  private TreeSide unmovable(
      Status status, double commit, double end, double leverMin, double lost, double would) {
    double none = Double.NaN;
    return new TreeSide(
        status,
        nominal.hinge,
        nominal.hingeNm,
        nominal.windNm,
        nominal.windAsideNm,
        nominal.ug,
        nominal.vg,
        nominal.weightMoment(0),
        commit,
        end,
        nominal.lever(0),
        nominal.lever(-nominal.sitBack()),
        leverMin,
        lost,
        would,
        none,
        none,
        none,
        none,
        none,
        none,
        none,
        none,
        none,
        none,
        none,
        none,
        none,
        none,
        none,
        none,
        none,
        none);
  }

  private double steering(double working, double end) {
    double most = Double.NEGATIVE_INFINITY;
    for (int sign = -1; sign <= 1; sign += 2) {
      for (double tension : new double[] {0, working}) {
        int s = sign;
        most = Math.max(most, spread.p95(p -> HingeStress.steering(p, -p.sitBack(), tension, s)));
        most = Math.max(most, spread.p95(p -> HingeStress.steering(p, end, tension, s)));
        if (working == 0) {
          break;
        }
      }
    }
    return most;
  }

  private double turning(double working, double end) {
    if (working == 0) {
      return 0;
    }
    double shear = c.wood().shearPa();
    double most = Double.NEGATIVE_INFINITY;
    for (int sign = -1; sign <= 1; sign += 2) {
      int s = sign;
      most =
          Math.max(most, spread.p95(p -> HingeStress.turning(p, -p.sitBack(), working, s, shear)));
      most = Math.max(most, spread.p95(p -> HingeStress.turning(p, end, working, s, shear)));
    }
    return most;
  }

  private double crushing(double working, double rise) {
    return crushing(c, nominal, nominal.weightN * massHigh(), working, rise);
  }

  static double crushing(PullCase c, Posture p, double weight, double working, double rise) {
    double push = weight + (rise > 0 ? working * Math.sin(rise) : 0);
    return push / (c.wood().crushPa() * p.hinge.steerWidthM() * p.hinge.thicknessM());
  }

  private double massHigh() {
    return 1 + OneAtATime.Z * c.spread().massRel();
  }

  /**
   * How the tree behaves at the hold tension on a line that is held or that gives a constant force.
   *
   * @param captured whether the far end of the line stays where it is
   */
  public Holding holding(boolean captured) {
    double k = captured ? side.lineNPerM() : 0;
    double kp = captured ? side.pathNPerM() : 0;
    double stability = stability(nominal, nominal.weightN * massHigh(), k, side.holdN());
    double top = lettingGo.laterN() + kp * (nominal.leg(0) - nominal.leg(lettingGo.later()));
    Start start =
        side.holdN() < lettingGo.atOnceN()
            ? Start.NO
            : side.holdN() <= top ? Start.STOPS : Start.RUNS;
    return new Holding(stability, top, start);
  }

  private LettingGo lettingGo() {
    double phi = Math.max(Math.toRadians(1), Math.min(Math.toRadians(2), side.commitRad() / 5));
    return new LettingGo(
        Math.max(0, spread.p5(p -> ForceBalance.letsGo(p, phi))),
        Math.max(0, spread.p5(p -> ForceBalance.letsGo(p, 0))),
        phi);
  }

  /** (K·ℓ² − hold·dℓ/dφ) ÷ (m·g·(w_g·cos φ − u_g·sin φ)), sat back. */
  static double stability(Posture p, double weight, double lineNPerM, double hold) {
    double phi = -p.sitBack();
    double pendulum = weight * (p.wg * Math.cos(phi) - p.ug * Math.sin(phi));
    double lever = p.lever(phi);
    return (lineNPerM * lever * lever - hold * leverSlope(p, phi)) / pendulum;
  }

  /** dℓ/dφ [m/rad], from ℓ = N/L with the derivatives of both. */
  private static double leverSlope(Posture p, double phi) {
    double u = p.ua(phi);
    double w = p.wa(phi);
    double leg = p.leg(phi);
    double moment = w * p.pu - u * p.pw;
    // du/dφ = w and dw/dφ = −u
    double dMoment = -u * p.pu - w * p.pw;
    double dLeg = (-(p.pu - u) * w + (p.pw - w) * u) / leg;
    return dMoment / leg - moment * dLeg / (leg * leg);
  }

  /**
   * Tension that each angle of the movement needs [N], for the curve; 65 pairs of angle and need.
   */
  public double[][] needCurve() {
    double[][] curve = new double[Movement.ANGLES][];
    for (int i = 0; i < Movement.ANGLES; i++) {
      double phi = Movement.angle(-nominal.sitBack(), side.endRad(), i);
      curve[i] = new double[] {phi, ForceBalance.need(nominal, phi)};
    }
    return curve;
  }

  /**
   * What the line must bear as it is taken in, the tree as entered and between its 5th and 95th
   * percentile over the trials; empty where the spreads are one input at a time.
   */
  public List<BandPoint> needBand() {
    EachTrial each = eachTrial().orElse(null);
    if (each == null || !side.movable()) {
      return List.of();
    }
    double back = -nominal.sitBack();
    List<BandPoint> band = new ArrayList<>();
    double[] needs = new double[each.count()];
    for (int i = 0; i < Movement.ANGLES; i += BandPoint.EVERY) {
      double phi = Movement.angle(back, side.endRad(), i);
      for (int j = 0; j < needs.length; j++) {
        needs[j] = Math.max(0, each.needN(j, phi));
      }
      Arrays.sort(needs);
      band.add(
          new BandPoint(
              c.line().slackM() + nominal.leg(back) - nominal.leg(phi),
              Sampled.percentile(needs, 0.05),
              Math.max(0, ForceBalance.need(nominal, phi)),
              Sampled.percentile(needs, 0.95)));
    }
    return band;
  }

  /**
   * Rise of the pull to plan for that each entered quantity alone brings [N], as {@link
   * Draw#NAMES}.
   */
  public double[] planRises() {
    return oneAtATime().rises(p -> ForceBalance.need(p, -p.sitBack()));
  }
}
