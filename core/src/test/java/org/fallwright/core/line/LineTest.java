package org.fallwright.core.line;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.assertj.core.api.Assertions.within;

import java.util.List;
import org.fallwright.core.site.Gear;
import org.fallwright.core.site.Stated;
import org.junit.jupiter.api.Test;

class LineTest {
  @Test
  void haulingTensionGrowsTowardsTheSource() {
    LegLoads loads =
        LegLoads.of(
            List.of(
                new Point3(0, 0, 10),
                new Point3(0, 30, 0),
                new Point3(20, 30, 0),
                new Point3(20, 0, 0)),
            List.of(0.9, 0.8));
    assertThat(loads.legs().get(1).haulingPerTree()).isCloseTo(1 / 0.9, within(1e-12));
    assertThat(loads.sourceEndPerTree()).isCloseTo(1 / 0.72, within(1e-12));
    assertThat(loads.sourceHaulingForce().length()).isCloseTo(1 / 0.72, within(1e-12));
    // the line pulls the source towards the last block, north of it
    assertThat(loads.sourceHaulingForce().n()).isPositive();
    // the first block is pulled up towards the tree and aside towards the second
    Point3 force = loads.blocks().get(0).holdingForce();
    assertThat(force.up()).isPositive();
    assertThat(force.e()).isPositive();
    assertThat(force.n()).isNegative();
  }

  @Test
  void theRiseIsPositiveWhereTheTreeEndIsHigher() {
    LegLoads down = LegLoads.of(List.of(new Point3(0, 0, 10), new Point3(10, 0, 0)), List.of());
    assertThat(down.lineRiseDeg()).isCloseTo(45, within(1e-9));
    LegLoads up = LegLoads.of(List.of(new Point3(0, 0, 0), new Point3(10, 0, 10)), List.of());
    assertThat(up.lineRiseDeg()).isCloseTo(-45, within(1e-9));
  }

  @Test
  void pointsThatCoincideAreRefused() {
    Point3 p = new Point3(1, 1, 1);
    assertThatThrownBy(() -> LegLoads.of(List.of(p, p), List.of()))
        .hasMessageContaining("leg 1 is 0");
    assertThatThrownBy(() -> LegLoads.of(List.of(p, new Point3(9, 9, 9)), List.of(0.9)))
        .hasMessageContaining("there are 0 blocks");
  }

  @Test
  void jointsOfLinesKeepTheirDistanceAndClearOfEveryBlock() {
    // one block at 30 m; the first joint is free up to 18 m and 20 m before the wire's
    PathFit fit = PathFit.of(List.of(30.0, 25.0), List.of(20.0, 20.0), 2, 30, 3);
    assertThat(fit.fits()).isTrue();
    assertThat(fit.jointM()).isEqualTo(18);
    // both joints would have to pass: the second is always within the block's reach
    PathFit none = PathFit.of(List.of(30.0, 2.0), List.of(20.0, 14.0), 2, 0, 3);
    assertThat(none.fits()).isTrue();
    assertThat(none.jointM()).isEqualTo(18);
    PathFit meets = PathFit.of(List.of(30.0, 4.0), List.of(32.0, 6.0), 2, 0, 4);
    assertThat(meets.fits()).isFalse();
    assertThat(meets.shortOf()).containsExactly("a joint would meet a block within 4.0 m of haul");
    PathFit source = PathFit.of(List.of(30.0), List.of(32.0, 2.0), 2, 0, 4);
    assertThat(source.shortOf())
        .containsExactly("a joint would meet the source within 4.0 m of haul");
  }

  @Test
  void aLineWithoutWireMustReachByItself() {
    // 44.1 m of leg and 1.9 m of knots on a 45 m line
    PathFit fit = PathFit.of(List.of(44.1), 45, 1.9, 0, 3);
    assertThat(fit.fits()).isFalse();
    assertThat(fit.shortOf()).containsExactly("line is 1.0 m short: 46.0 m asked, 45.0 there");
    assertThat(PathFit.of(List.of(44.1), 46, 1.9, 0, 3).fits()).isTrue();
  }

  @Test
  void wireMakesUpForLineBehindTheLastBlock() {
    PathFit fit = PathFit.of(List.of(31.3, 24.5), 45, 2, 20, 2.9);
    assertThat(fit.fits()).isTrue();
    assertThat(fit.jointM()).isBetween(31.3 + PathFit.CLEAR_M, 43.0);
  }

  @Test
  void theJointMustNotMeetABlock() {
    // line ends between 1 m short of the block and 4 m short; the haul is 6 m
    PathFit fit = PathFit.of(List.of(30.0, 18.0), 32, 3, 20, 6);
    assertThat(fit.fits()).isFalse();
    assertThat(fit.shortOf()).singleElement().asString().contains("meet a block");
    // more wire lets it start farther from the block
    PathFit more = PathFit.of(List.of(30.0, 18.0), 32, 3, 30, 6);
    assertThat(more.fits()).isTrue();
    assertThat(more.jointM()).isCloseTo(30 - 6 - PathFit.CLEAR_M, within(1e-9));
  }

  @Test
  void theJointMustNotReachTheSource() {
    PathFit fit = PathFit.of(List.of(40.0), 60, 2, 3, 5);
    assertThat(fit.fits()).isFalse();
    assertThat(fit.shortOf())
        .containsExactly("5.3 m of wire must be out at the start and 3.0 m can be");
    PathFit longer = PathFit.of(List.of(40.0), 60, 2, 10, 5);
    assertThat(longer.jointM()).isCloseTo(40 - 5 - PathFit.CLEAR_M, within(1e-9));
  }

  @Test
  void ruleSetsCanAskMoreOfALineNeverLess() {
    LineFigures wire =
        LineFigures.of(
            new Gear.Line(
                "W",
                Gear.Material.WIRE_STEEL_CORE,
                0.01,
                50,
                60e3,
                new Gear.End(Gear.End.Kind.WIRE_CLIPS, null),
                new Gear.End(Gear.End.Kind.WIRE_SWAGED_SOCKET, null),
                new Stated(0.9, "the test"),
                false,
                false,
                null,
                5e6,
                true),
            null);
    assertThat(PartStrength.line(wire, 1).designFactor()).isEqualTo(3);
    assertThat(PartStrength.line(wire, 5).designFactor()).isEqualTo(5);
    assertThat(PartStrength.line(wire, 1).strengthN()).isCloseTo(60e3 * 0.72, within(1e-6));
    assertThat(PartStrength.line(wire, 1).lastFactor()).isEqualTo(1.5);
  }

  @Test
  void bendsAreReadOffTheCurveAndNeverBelowIt() {
    assertThat(WireBend.keeps(2)).isEqualTo(0.65);
    assertThat(WireBend.keeps(3)).isCloseTo(0.70, within(1e-12));
    assertThat(WireBend.keeps(100)).isEqualTo(0.95);
    assertThatThrownBy(() -> WireBend.keeps(0.5)).hasMessageContaining("bend ratio is 0.5");
  }

  @Test
  void shacklesLoseWhenLoadedAside() {
    assertThat(Shackles.sideLoad(0)).isEqualTo(1);
    assertThat(Shackles.sideLoad(45)).isEqualTo(0.7);
    assertThat(Shackles.sideLoad(46)).isEqualTo(0.5);
  }

  @Test
  void unmarkedChainCountsAsTheWeakestGrade() {
    for (ChainGrade grade : ChainGrade.values()) {
      assertThat(ChainGrade.GRADE_30.workingN(0.01)).isLessThanOrEqualTo(grade.workingN(0.01));
    }
  }

  @Test
  void knotsKeepLessThanSplices() {
    for (RopeEnd end : RopeEnd.values()) {
      if (end.knot()) {
        assertThat(end.wire()).isFalse();
        assertThat(end.factor()).isLessThan(RopeEnd.SHORT_SPLICE.factor());
      }
    }
  }
}
