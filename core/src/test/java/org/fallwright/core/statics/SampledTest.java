package org.fallwright.core.statics;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.ArrayList;
import java.util.List;
import java.util.Random;
import org.fallwright.core.line.Point3;
import org.junit.jupiter.api.Test;

class SampledTest {
  private static PullCase somePull() {
    Random r = new Random(3);
    PullCase c = RandomPulls.next(r);
    while (!new Statics(c).treeSide().movable()) {
      c = RandomPulls.next(r);
    }
    return c;
  }

  private static Trial nominal(PullCase c, double massFactor) {
    return new Trial(
        c.tree().massKg() * massFactor,
        c.tree().massCentreM(),
        c.tree().leanDeg(),
        c.tree().leanAzimuthDeg(),
        c.cut().hingeFactor(),
        0,
        0,
        c.tree().stumpDiameterM(),
        c.wind().gustMps(),
        1,
        0,
        0,
        c.tree().crownShift());
  }

  /**
   * The need is a straight line in the mass, so its 95th percentile over masses in equal steps is
   * the need at the 95th percentile of the mass.
   */
  @Test
  void aStraightLineHasThePercentileOfItsInput() {
    PullCase c = somePull();
    List<Trial> trials = new ArrayList<>();
    for (int i = 0; i <= 100; i++) {
      trials.add(nominal(c, 0.8 + 0.004 * i));
    }
    Sampled sampled = new Sampled(c, trials);
    double at95 =
        ForceBalance.need(
            new Posture(c, Draw.nominal(c).with(0, 1.18 * c.tree().massKg())),
            -new Posture(c, Draw.nominal(c)).sitBack());
    double at5 =
        ForceBalance.need(
            new Posture(c, Draw.nominal(c).with(0, 0.82 * c.tree().massKg())),
            -new Posture(c, Draw.nominal(c)).sitBack());
    double high = sampled.p95(p -> ForceBalance.need(p, -p.sitBack()));
    double low = sampled.p5(p -> ForceBalance.need(p, -p.sitBack()));
    assertThat(high).isCloseTo(Math.max(at95, at5), within(1e-6));
    assertThat(low).isCloseTo(Math.min(at95, at5), within(1e-6));
  }

  @Test
  void withoutAnySpreadBothWaysSayTheSame() {
    PullCase c = somePull();
    TreeSide side = new Statics(c, List.of(nominal(c, 1), nominal(c, 1))).treeSide();
    assertThat(side.planN()).isCloseTo(side.neededN(), within(1e-6));
    assertThat(side.holdN())
        .isCloseTo(Math.max(0, ForceBalance.hold(new Posture(c, Draw.nominal(c)))), within(1e-6));
  }

  @Test
  void aLineThatLosesItsLeverTooOftenIsSaidToHaveLostIt() {
    PullCase low = somePull();
    Point3 p = low.line().bearing();
    // the line bears well above the hinge: a tree that lies over has its line end beyond it
    LineSet line =
        new LineSet(
            low.line().attachHeightM(),
            List.of(new Point3(p.e(), p.n(), 3)),
            low.line().legStiffnessN(),
            null,
            0.3);
    PullCase c =
        new PullCase(
            low.layDeg(), low.tree(), low.wood(), low.cut(), low.wind(), line, low.spread());
    Trial turned =
        new Trial(
            c.tree().massKg(),
            c.tree().massCentreM(),
            89,
            c.layDeg(),
            1,
            0,
            0,
            c.tree().stumpDiameterM(),
            0,
            1,
            0,
            0,
            new Point3(0, 0, 0));
    List<Trial> trials = new ArrayList<>(List.of(turned, turned));
    for (int i = 0; i < 8; i++) {
      trials.add(nominal(c, 1));
    }
    assertThat(new Statics(c, trials).treeSide().status()).isEqualTo(Status.LEVER_LOST);
  }

  @Test
  void aHingeThatWouldLeaveNoBackCutLeavesTheLeastThereIs() {
    PullCase c = somePull();
    Trial t = nominal(c, 1);
    Trial thick =
        new Trial(
            t.massKg(),
            t.massCentreM(),
            t.leanDeg(),
            t.azimuthDeg(),
            1,
            0,
            200,
            t.stumpDiameterM(),
            0,
            1,
            0,
            0,
            t.crownShift());
    assertThat(new Posture(c, thick.draw(c), t.crownShift()).hinge.backCutM()).isPositive();
  }
}
