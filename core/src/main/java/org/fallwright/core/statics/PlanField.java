package org.fallwright.core.statics;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import org.fallwright.core.line.Point3;

/**
 * What the tree asks of the line as it depends on where the line first bears: {@link Statics} for
 * one lay, attachment and hinge, with everything made ready that the bearing point does not change.
 * The figures are those of the statics; only the time differs.
 */
public final class PlanField {
  private final double sin;
  private final double cos;
  private final boolean letsGo;
  private final double leverLeast;

  /** The nominal tree, the tree at the means, then one for each input at an end. */
  private final SatBack nominal;

  private final SatBack mean;
  private final List<SatBack[]> ends = new ArrayList<>();

  /** Where the attachment has gone along the movement [m]. */
  private final double[] alongM;

  private final double[] aboveM;

  /**
   * What is asked at a bearing point.
   *
   * @param planN pull to plan for [N]
   * @param holdN hold tension [N]
   */
  public record Asked(double planN, double holdN) {}

  /**
   * The tree sat back: its attachment in the tree frame, and what turns it.
   *
   * @param needNm hinge and wind less weight [N·m]
   * @param holdNm wind less weight [N·m]
   * @param hingeM how far the hinge is ahead of the stump's centre [m]
   * @param asideM the bearing point moved aside [m]
   */
  private record SatBack(
      double needNm, double holdNm, double u, double v, double w, double hingeM, double asideM) {
    static SatBack of(Posture p) {
      double phi = -p.sitBack();
      double weight = p.weightMoment(phi);
      return new SatBack(
          p.hingeNm + p.windNm - weight,
          p.windNm - weight,
          p.ua(phi),
          p.va,
          p.wa(phi),
          p.hinge.offsetM(),
          p.draw.bearingM());
    }

    double lever(double ahead, double aside, double up) {
      double pu = ahead - hingeM;
      double du = pu - u;
      double dv = aside + asideM - v;
      double dw = up - w;
      return (w * pu - u * up) / Math.sqrt(du * du + dv * dv + dw * dw);
    }
  }

  /** Takes everything from the case but its bearing point and what lies behind that. */
  public PlanField(PullCase c) {
    double lay = Math.toRadians(c.layDeg());
    sin = Math.sin(lay);
    cos = Math.cos(lay);
    Posture p = new Posture(c, Draw.nominal(c));
    nominal = SatBack.of(p);
    letsGo = CommitAngle.exists(p);
    leverLeast = Movement.LOST_SHARE * p.wa;
    OneAtATime spread = new OneAtATime(c);
    mean = SatBack.of(spread.mean);
    spread.ends().forEach(e -> ends.add(new SatBack[] {SatBack.of(e[0]), SatBack.of(e[1])}));
    alongM = new double[Movement.ANGLES];
    aboveM = new double[Movement.ANGLES];
    double end =
        letsGo
            ? Math.max(
                CommitAngle.of(p), Math.min(Movement.CAP, spread.p95(CommitAngle::unfloored)))
            : 0;
    for (int i = 0; i < Movement.ANGLES; i++) {
      double phi = Movement.angle(-p.sitBack(), end, i);
      alongM[i] = p.ua(phi);
      aboveM[i] = p.wa(phi);
    }
  }

  /**
   * What a line asks that first bears at a point; empty where it cannot move the tree, for want of
   * a lever or because the hinge never lets go.
   *
   * @param bearing metres from the stump's centre at hinge level
   */
  public Optional<Asked> at(Point3 bearing) {
    double ahead = bearing.e() * sin + bearing.n() * cos;
    double aside = bearing.e() * cos - bearing.n() * sin;
    double up = bearing.up();
    if (!letsGo || leverLost(ahead, aside, up)) {
      return Optional.empty();
    }
    double needed = nominal.needNm / nominal.lever(ahead, aside, up);
    double meanLever = mean.lever(ahead, aside, up);
    double need = mean.needNm / meanLever;
    double hold = mean.holdNm / meanLever;
    double needSquares = 0;
    double holdSquares = 0;
    for (SatBack[] e : ends) {
      double low = e[0].lever(ahead, aside, up);
      double high = e[1].lever(ahead, aside, up);
      double rise = Math.max(e[0].needNm / low, e[1].needNm / high) - need;
      needSquares += rise > 0 ? rise * rise : 0;
      rise = Math.max(e[0].holdNm / low, e[1].holdNm / high) - hold;
      holdSquares += rise > 0 ? rise * rise : 0;
    }
    return Optional.of(
        new Asked(
            Math.max(0, Math.max(needed, need + Math.sqrt(needSquares))),
            Math.max(0, hold + Math.sqrt(holdSquares))));
  }

  private boolean leverLost(double ahead, double aside, double up) {
    double pu = ahead - nominal.hingeM;
    double dv = aside + nominal.asideM - nominal.v;
    for (int i = 0; i < alongM.length; i++) {
      double du = pu - alongM[i];
      double dw = up - aboveM[i];
      double moment = aboveM[i] * pu - alongM[i] * up;
      // moment/leg against the least lever, without the root
      if (moment <= 0
          || moment * moment <= leverLeast * leverLeast * (du * du + dv * dv + dw * dw)) {
        return true;
      }
    }
    return false;
  }
}
