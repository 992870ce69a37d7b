package org.fallwright.core.zones;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.assertj.core.api.Assertions.within;

import org.junit.jupiter.api.Test;

class FallFootprintTest {
  /** The footprint of a lay to the north, a sign a metre, the stump marked o. */
  private static String picture(FallFootprint f, int west, int east, int south, int north) {
    StringBuilder b = new StringBuilder();
    for (int n = north; n >= south; n--) {
      for (int e = west; e <= east; e++) {
        b.append(e == 0 && n == 0 ? 'o' : f.contains(Things.at(e, n)) ? '#' : '.');
      }
      b.append('\n');
    }
    return b.toString();
  }

  @Test
  void aStraightTreeGivesAStemAndACrown() {
    FallOutline tree = new FallOutline(12, 6, 3, 1.2, 0, 0);
    assertThat(picture(FallFootprint.of(tree, Things.at(0, 0), 0, 0, 0), -5, 5, -3, 16))
        .isEqualTo(
            """
            ...........
            .....#.....
            ...#####...
            ..#######..
            ..#######..
            ..#######..
            ..#######..
            ..#######..
            ..#######..
            ...#####...
            ....###....
            ....###....
            .....#.....
            .....#.....
            .....#.....
            .....#.....
            .....o.....
            .....#.....
            .....#.....
            ...........
            """);
  }

  @Test
  void aTreeThatLeansFarAsideCountsAsItIsAndPushed() {
    FallOutline tree = new FallOutline(12, 6, 1, 1.2, 40, 90);
    assertThat(picture(FallFootprint.of(tree, Things.at(0, 0), 0, 0, 0), -3, 14, -3, 16))
        .isEqualTo(
            """
            ..............#...
            ...#.........####.
            ..###........#####
            ..###.......#####.
            ..###......#####..
            ..###.....######..
            ..###.....#####...
            ..###....#####....
            ..###...####......
            ..###...###.......
            ..###..###........
            ..###.###.........
            ...#..##..........
            ...#.##...........
            ...###............
            ...##.............
            ...o..............
            ..##..............
            .###..............
            ..................
            """);
  }

  @Test
  void aCrownDownToTheGroundBeginsAtTheStump() {
    FallOutline tree = new FallOutline(8, 0, 2, 1.2, 0, 0);
    assertThat(picture(FallFootprint.of(tree, Things.at(0, 0), 0, 0, 0), -4, 4, -3, 12))
        .isEqualTo(
            """
            .........
            ....#....
            ...###...
            ..#####..
            ..#####..
            ..#####..
            ..#####..
            ..#####..
            ..#####..
            ..#####..
            ...###...
            ...###...
            ....o....
            ....#....
            ....#....
            .........
            """);
  }

  @Test
  void aCrownDrawnToOneSideLiesToThatSide() {
    // from above: two metres to the left of the stem, four to the right, four deep
    FallOutline tree =
        new FallOutline(12, 6, 3, 1.2, 0, 0)
            .drawn(Things.polygon(-2, -2, 4, -2, 4, 2, -2, 2).geometry(), Things.at(0, 0), 0.3);
    assertThat(picture(FallFootprint.of(tree, Things.at(0, 0), 0, 0, 0), -5, 6, -3, 16))
        .isEqualTo(
            """
            ............
            ...#######..
            ..#########.
            ..#########.
            ..#########.
            ...#######..
            ...#######..
            ...#######..
            ...#######..
            ...#######..
            ...#######..
            ....###.....
            .....#......
            .....#......
            .....#......
            .....#......
            .....o......
            .....#......
            .....#......
            ............
            """);
    // felled to the south, what stands out to the east still comes down to the east
    FallFootprint south = FallFootprint.of(tree, Things.at(0, 0), 180, 0, 0);
    assertThat(south.contains(Things.at(3.9, -10))).isTrue();
    assertThat(south.contains(Things.at(-3.9, -10))).isFalse();
  }

  @Test
  void aDrawnCrownSlidesOnAsAWhole() {
    FallOutline tree =
        new FallOutline(8, 4, 1.5, 1.2, 0, 0)
            .drawn(Things.polygon(-1, -1, 2, -1, 2, 1, -1, 1).geometry(), Things.at(0, 0), 0.3);
    FallFootprint still = FallFootprint.of(tree, Things.at(0, 0), 0, 0, 0);
    FallFootprint slid = FallFootprint.of(tree, Things.at(0, 0), 0, 0, 4);
    assertThat(still.contains(Things.at(1.9, 14))).isFalse();
    assertThat(slid.contains(Things.at(1.9, 14))).isTrue();
    assertThat(slid.geometry().buffer(1e-6).covers(still.geometry())).isTrue();
  }

  @Test
  void aCrownOffItsStemCountsOnBothSidesOfIt() {
    FallOutline tree = new FallOutline(12, 6, 2, 0.4, 0, 0).offset(Things.at(3, 0));
    FallFootprint f = FallFootprint.of(tree, Things.at(0, 0), 0, 0, 0);
    assertThat(f.contains(Things.at(4.9, 10.5))).isTrue();
    assertThat(f.contains(Things.at(-1.9, 10.5))).isTrue();
    assertThat(f.contains(Things.at(-4, 10.5))).isFalse();
    assertThat(tree.crownReachM()).isCloseTo(5, within(0.01));
  }

  @Test
  void aSlideDrawsTheCrownOut() {
    FallOutline tree = new FallOutline(8, 4, 1.5, 1.2, 0, 0);
    assertThat(picture(FallFootprint.of(tree, Things.at(0, 0), 0, 0, 4), -4, 4, -3, 16))
        .isEqualTo(
            """
            .........
            ....#....
            ..#####..
            ..#####..
            ..#####..
            ..#####..
            ..#####..
            ..#####..
            ..#####..
            ..#####..
            ...###...
            ...###...
            ....#....
            ....#....
            ....#....
            ....#....
            ....o....
            ....#....
            ....#....
            .........
            """);
  }

  @Test
  void halfAngleGrowsWithTheSteeringShareUpToThirtyDegrees() {
    assertThat(FallFootprint.halfAngleDeg(0)).isEqualTo(5);
    assertThat(FallFootprint.halfAngleDeg(0.45)).isCloseTo(14, within(1e-12));
    assertThat(FallFootprint.halfAngleDeg(1.3)).isEqualTo(30);
    assertThat(FallFootprint.halfAngleDeg(Double.POSITIVE_INFINITY)).isEqualTo(30);
    assertThatThrownBy(() -> FallFootprint.halfAngleDeg(Double.NaN))
        .hasMessageContaining("steering_share");
    assertThatThrownBy(() -> FallFootprint.halfAngleDeg(-0.1))
        .hasMessageContaining("must be 0 or more");
  }

  @Test
  void slidesOnlyWhereTheGroundFallsMoreThanTenDegrees() {
    assertThat(FallFootprint.slideM(20, 10, null)).isZero();
    assertThat(FallFootprint.slideM(20, -30, 6.0)).isZero();
    assertThat(FallFootprint.slideM(20, 10.1, null)).isEqualTo(10);
    assertThat(FallFootprint.slideM(20, 10.1, 6.0)).isEqualTo(6);
    assertThatThrownBy(() -> FallFootprint.slideM(20, Double.NaN, null))
        .hasMessageContaining("fall_deg");
  }

  @Test
  void aHugeStumpAndAHugeLeanStillGiveASoundOutline() {
    for (double lean : new double[] {0, 20, 45}) {
      for (double azimuth : new double[] {0, 90, 180, 270}) {
        FallOutline tree = new FallOutline(5, 0, 12, 6, lean, azimuth);
        FallFootprint f = FallFootprint.of(tree, Things.at(0, 0), 30, 2, 0);
        assertThat(f.geometry().isValid()).isTrue();
        assertThat(f.contains(Things.at(-0.1, -2.9))).isTrue();
        assertThat(f.geometry().getArea()).isGreaterThan(Math.PI * 2.5 * 12);
      }
    }
  }

  @Test
  void marginsOfShortAndTallTrees() {
    FallOutline small = new FallOutline(10, 4, 2, 0.3, 0, 0);
    FallOutline tall = new FallOutline(40, 15, 4, 1, 0, 0);
    assertThat(small.reachM()).isEqualTo(13);
    assertThat(small.buttM()).isEqualTo(2);
    assertThat(tall.reachM()).isEqualTo(44);
    assertThat(tall.buttM()).isEqualTo(4);
  }
}
