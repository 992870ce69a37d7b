package org.fallwright.core.statics;

import org.fallwright.core.cut.HingeShape;
import org.fallwright.core.line.Point3;
import org.fallwright.core.units.Units;

/**
 * The tree on its hinge for one draw: everything derived, in the tree frame.
 *
 * <p>Frame: origin in the middle of the hinge, u along the lay, v to its right, w up. The tree
 * turns about the v axis by φ, positive towards the lay: u' = u·cos φ + w·sin φ, w' = −u·sin φ +
 * w·cos φ.
 */
final class Posture {
  static final double G = Units.GRAVITY;

  final Draw draw;
  final HingeShape hinge;
  final double weightN;
  final double hingeNm;

  /** Share of the rupture strength that may be counted on where the hinge holds. */
  final double holdsShare;

  final double windNm;
  final double windAsideNm;

  /** Mass centre [m]. */
  final double ug;

  final double vg;
  final double wg;

  /** Attachment [m]. */
  final double ua;

  final double va;
  final double wa;

  /** First bearing point [m], fixed on the site. */
  final double pu;

  final double pv;
  final double pw;

  Posture(PullCase c, Draw d) {
    this(c, d, shape(c, d), c.tree().crownShift());
  }

  /**
   * The tree with its crown aside by another measure than the case's.
   *
   * @param crown how far the crown moves the mass centre [m]
   */
  Posture(PullCase c, Draw d, Point3 crown) {
    this(c, d, shape(c, d), crown);
  }

  /**
   * Another draw whose hinge is often the same.
   *
   * @param like a posture of the same case
   */
  Posture(PullCase c, Draw d, Posture like) {
    this(
        c,
        d,
        d.stumpDiameterM() == like.draw.stumpDiameterM() && d.thicknessM() == like.draw.thicknessM()
            ? like.hinge
            : shape(c, d),
        c.tree().crownShift());
  }

  private static HingeShape shape(PullCase c, Draw d) {
    return HingeShape.of(
        d.stumpDiameterM(),
        c.cut().faceFraction(),
        d.thicknessM(),
        c.cut().widthM(),
        c.tree().shellM(),
        c.tree().deadOrDecayed(),
        c.cut().kerfM(),
        c.cut().wedges());
  }

  private Posture(PullCase c, Draw d, HingeShape shape, Point3 crown) {
    draw = d;
    hinge = shape;
    double lay = Math.toRadians(c.layDeg());
    double sin = Math.sin(lay);
    double cos = Math.cos(lay);
    double lean = Math.tan(Math.toRadians(d.leanDeg()));
    double towards = Math.toRadians(d.azimuthDeg());
    double leanE = lean * Math.sin(towards);
    double leanN = lean * Math.cos(towards);
    double uh = hinge.offsetM();
    wg = d.massCentreM();
    double ge = wg * leanE + crown.e();
    double gn = wg * leanN + crown.n();
    ug = ge * sin + gn * cos - uh;
    vg = ge * cos - gn * sin;
    wa = d.attachM();
    ua = wa * (leanE * sin + leanN * cos) - uh;
    va = wa * (leanE * cos - leanN * sin);
    Point3 p = c.line().bearing();
    pu = p.e() * sin + p.n() * cos - uh;
    pv = p.e() * cos - p.n() * sin + d.bearingM();
    pw = p.up();
    weightN = d.massKg() * G;
    hingeNm = HingeMoment.of(d.hingeFactor(), d.morPa(), hinge.widthM(), hinge.thicknessM());
    holdsShare = c.wood().holdsShare();
    WindMoment wind = WindMoment.of(c.wind(), d.gustMps(), d.drag(), c.layDeg());
    windNm = wind.againstNm();
    windAsideNm = wind.asideNm();
  }

  double sitBack() {
    return hinge.sitBackRad();
  }

  /** Weight moment, positive towards the lay: m·g·(u_g·cos φ + w_g·sin φ) [N·m]. */
  double weightMoment(double phi) {
    return weightN * (ug * Math.cos(phi) + wg * Math.sin(phi));
  }

  /** Where the attachment has gone along the lay [m]. */
  double ua(double phi) {
    return ua * Math.cos(phi) + wa * Math.sin(phi);
  }

  /** How high the attachment is then [m]. */
  double wa(double phi) {
    return -ua * Math.sin(phi) + wa * Math.cos(phi);
  }

  /** Length of the first leg |P − A'| [m]. */
  double leg(double phi) {
    double du = pu - ua(phi);
    double dv = pv - va;
    double dw = pw - wa(phi);
    return Math.sqrt(du * du + dv * dv + dw * dw);
  }

  /** Lever of the line about the hinge: (w_a'·P_u − u_a'·P_w)/|P − A'| [m]. */
  double lever(double phi) {
    return (wa(phi) * pu - ua(phi) * pw) / leg(phi);
  }
}
