package org.fallwright.core.statics;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.List;
import java.util.Random;
import org.fallwright.core.line.Point3;
import org.junit.jupiter.api.Test;

/** Laws that every pull obeys, on random sites. The seed stands in each message. */
class StaticsPropertyTest {
  private static final long SEED = 20260117;

  /**
   * A second route to the pull that shares no lever and no moment with the first: the work the line
   * does while it shortens equals the rise of the potential energy plus the work against hinge and
   * wind. Positions of mass centre and attachment are found by turning points in space about the
   * hinge's axis with a rotation matrix, lengths are taken between those points.
   */
  @Test
  void workOfTheLineEqualsEnergyGained() {
    Random r = new Random(SEED);
    int compared = 0;
    for (int i = 0; i < 5000; i++) {
      PullCase c = RandomPulls.next(r);
      Statics s = new Statics(c);
      if (s.treeSide().status() != Status.BACK_LEANER || s.treeSide().neededN() == 0) {
        continue;
      }
      Posture p = new Posture(c, Draw.nominal(c));
      double from = -p.sitBack();
      double to = s.treeSide().commitRad();
      double work = 0;
      int steps = 200;
      for (int k = 0; k < steps; k++) {
        double a = from + (to - from) * k / steps;
        double b = from + (to - from) * (k + 1) / steps;
        double shortened = length(c, a) - length(c, b);
        work += ForceBalance.need(p, (a + b) / 2) * shortened;
      }
      double lifted = c.tree().massKg() * 9.80665 * (massHeight(c, to) - massHeight(c, from));
      double resisted = (s.treeSide().hingeNm() + s.treeSide().windNm()) * (to - from);
      double scale = Math.abs(lifted) + resisted;
      assertThat(work)
          .as("seed %d, case %d", SEED, i)
          .isCloseTo(lifted + resisted, within(1e-4 * scale));
      compared++;
    }
    assertThat(compared).as("seed " + SEED).isGreaterThan(3000);
  }

  @Test
  void theNeedOnlyFallsWhileTheLeverIsPositive() {
    Random r = new Random(SEED + 1);
    int compared = 0;
    for (int i = 0; i < 3000; i++) {
      PullCase c = RandomPulls.next(r);
      Statics s = new Statics(c);
      if (s.treeSide().status() != Status.BACK_LEANER) {
        continue;
      }
      double[][] curve = s.needCurve();
      // the law holds while there is a need at all: a negative one is a push
      for (int k = 1; k < curve.length && curve[k][1] >= 0; k++) {
        assertThat(curve[k][1])
            .as("seed %d, case %d, angle %d", SEED + 1, i, k)
            .isLessThanOrEqualTo(curve[k - 1][1] * (1 + 1e-12));
        compared++;
      }
    }
    assertThat(compared).isGreaterThan(10_000);
  }

  @Test
  void turningTheSiteTurnsNothingElse() {
    Random r = new Random(SEED + 2);
    for (int i = 0; i < 300; i++) {
      PullCase c = RandomPulls.next(r);
      double by = RandomPulls.between(r, 0, 360);
      TreeSide a = new Statics(c).treeSide();
      TreeSide b = new Statics(turned(c, by)).treeSide();
      assertThat(b.status()).isEqualTo(a.status());
      if (a.movable()) {
        assertThat(b.planN())
            .as("seed %d, case %d", SEED + 2, i)
            .isCloseTo(a.planN(), rel(a.planN()));
        assertThat(b.steerShare()).isCloseTo(a.steerShare(), rel(a.steerShare()));
        assertThat(b.turnShare()).isCloseTo(a.turnShare(), rel(a.turnShare()));
      }
    }
  }

  @Test
  void aWiderSpreadNeverAsksForLess() {
    Random r = new Random(SEED + 3);
    for (int i = 0; i < 300; i++) {
      PullCase c = RandomPulls.next(r);
      Spread s = c.spread();
      Spread wide =
          new Spread(
              s.massRel() * 1.5,
              s.massCentreM() * 1.5,
              s.leanDeg() * 2,
              s.azimuthDeg() * 1.5,
              s.diameterRel() * 2,
              s.morCv() * 1.2,
              s.thicknessRel() * 1.5,
              s.windRel() * 1.2,
              s.attachM() * 2,
              s.bearingM() * 2);
      PullCase w = new PullCase(c.layDeg(), c.tree(), c.wood(), c.cut(), c.wind(), c.line(), wide);
      TreeSide a = new Statics(c).treeSide();
      TreeSide b = new Statics(w).treeSide();
      if (a.movable() && b.movable()) {
        assertThat(b.planN())
            .as("seed %d, case %d", SEED + 3, i)
            .isGreaterThanOrEqualTo(a.planN() - 1e-6);
        assertThat(b.holdN()).isGreaterThanOrEqualTo(a.holdN() - 1e-6);
      }
    }
  }

  @Test
  void aCalmTreeWithoutHingeScalesWithItsMass() {
    Random r = new Random(SEED + 4);
    for (int i = 0; i < 300; i++) {
      PullCase c = RandomPulls.next(r);
      TreeBody t = c.tree();
      TreeBody heavy =
          new TreeBody(
              t.heightM(),
              t.dbhM(),
              t.cutHeightM(),
              t.diameters(),
              t.stumpDiameterM(),
              t.shellM(),
              false,
              2 * t.massKg(),
              t.massCentreM(),
              t.leanDeg(),
              t.leanAzimuthDeg(),
              t.crownShift());
      Wind calm = new Wind(0, null, 0, 0, 1, 1, 1.2);
      Posture one =
          posture(new PullCase(c.layDeg(), t, c.wood(), c.cut(), calm, c.line(), c.spread()));
      Posture two =
          posture(new PullCase(c.layDeg(), heavy, c.wood(), c.cut(), calm, c.line(), c.spread()));
      assertThat(two.weightMoment(0.1))
          .isCloseTo(2 * one.weightMoment(0.1), rel(one.weightMoment(0.1)));
      assertThat(ForceBalance.hold(two))
          .isCloseTo(2 * ForceBalance.hold(one), rel(ForceBalance.hold(one)));
      assertThat(ForceBalance.rest(two)).isCloseTo(ForceBalance.rest(one), within(1e-9));
    }
  }

  @Test
  void aLeanAwayFromTheLayAsksForMoreThanOneTowardsIt() {
    Random r = new Random(SEED + 5);
    for (int i = 0; i < 200; i++) {
      PullCase c = RandomPulls.next(r);
      Posture back = posture(leaning(c, (c.layDeg() + 180) % 360));
      Posture forward = posture(leaning(c, c.layDeg()));
      assertThat(back.weightMoment(0)).isLessThan(forward.weightMoment(0));
      assertThat(ForceBalance.need(back, 0)).isGreaterThan(ForceBalance.need(forward, 0));
    }
  }

  private static Posture posture(PullCase c) {
    return new Posture(c, Draw.nominal(c));
  }

  private static PullCase leaning(PullCase c, double azimuth) {
    TreeBody t = c.tree();
    TreeBody b =
        new TreeBody(
            t.heightM(),
            t.dbhM(),
            t.cutHeightM(),
            t.diameters(),
            t.stumpDiameterM(),
            t.shellM(),
            false,
            t.massKg(),
            t.massCentreM(),
            t.leanDeg(),
            azimuth,
            new Point3(0, 0, 0));
    return new PullCase(c.layDeg(), b, c.wood(), c.cut(), c.wind(), c.line(), c.spread());
  }

  private static PullCase turned(PullCase c, double by) {
    TreeBody t = c.tree();
    TreeBody b =
        new TreeBody(
            t.heightM(),
            t.dbhM(),
            t.cutHeightM(),
            t.diameters(),
            t.stumpDiameterM(),
            t.shellM(),
            false,
            t.massKg(),
            t.massCentreM(),
            t.leanDeg(),
            t.leanAzimuthDeg() + by,
            turned(t.crownShift(), by));
    Wind w = c.wind();
    Wind wind =
        new Wind(
            w.gustMps(),
            w.towardDeg() == null ? null : Double.valueOf(w.towardDeg() + by),
            w.dragC(),
            w.dragN(),
            w.areaM2(),
            w.heightM(),
            w.airDensity());
    LineSet l = c.line();
    LineSet line =
        new LineSet(
            l.attachHeightM(),
            l.points().stream().map(p -> turned(p, by)).toList(),
            l.legStiffnessN(),
            null,
            l.slackM());
    return new PullCase(c.layDeg() + by, b, c.wood(), c.cut(), wind, line, c.spread());
  }

  private static Point3 turned(Point3 p, double by) {
    double a = Math.toRadians(by);
    return new Point3(
        p.e() * Math.cos(a) + p.n() * Math.sin(a),
        p.n() * Math.cos(a) - p.e() * Math.sin(a),
        p.up());
  }

  private static List<Point3> standing(PullCase c) {
    double lean = Math.tan(Math.toRadians(c.tree().leanDeg()));
    double az = Math.toRadians(c.tree().leanAzimuthDeg());
    double wa = c.line().attachHeightM();
    double wg = c.tree().massCentreM();
    return List.of(
        new Point3(wa * lean * Math.sin(az), wa * lean * Math.cos(az), wa),
        new Point3(
            wg * lean * Math.sin(az) + c.tree().crownShift().e(),
            wg * lean * Math.cos(az) + c.tree().crownShift().n(),
            wg));
  }

  /** Turns a point in space about the hinge's axis, which runs square to the lay (Rodrigues). */
  private static Point3 felled(PullCase c, Point3 p, double phi) {
    double lay = Math.toRadians(c.layDeg());
    double ds = c.tree().stumpDiameterM();
    double ahead = ds / 2 - c.cut().faceFraction() * ds - c.cut().thicknessM() / 2;
    double ce = ahead * Math.sin(lay);
    double cn = ahead * Math.cos(lay);
    // axis to the right of the lay; turning by -phi about it takes up into the lay
    double ke = Math.cos(lay);
    double kn = -Math.sin(lay);
    double x = p.e() - ce;
    double y = p.n() - cn;
    double z = p.up();
    double along = ke * x + kn * y;
    double crossE = kn * z;
    double crossN = -ke * z;
    double crossUp = ke * y - kn * x;
    double cos = Math.cos(phi);
    double sin = -Math.sin(phi);
    return new Point3(
        ce + x * cos + crossE * sin + ke * along * (1 - cos),
        cn + y * cos + crossN * sin + kn * along * (1 - cos),
        z * cos + crossUp * sin);
  }

  private static double length(PullCase c, double phi) {
    return c.line().bearing().minus(felled(c, standing(c).get(0), phi)).length();
  }

  private static double massHeight(PullCase c, double phi) {
    return felled(c, standing(c).get(1), phi).up();
  }

  private static org.assertj.core.data.Offset<Double> rel(double x) {
    return within(1e-9 + 1e-9 * Math.abs(x));
  }
}
