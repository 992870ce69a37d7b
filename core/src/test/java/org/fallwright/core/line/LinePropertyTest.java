package org.fallwright.core.line;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.ArrayList;
import java.util.List;
import java.util.Random;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

class LinePropertyTest {
  @ParameterizedTest
  @ValueSource(longs = {1, 2, 3, 4, 5, 6, 7, 8})
  void forcesOnTheWholeLineBalance(long seed) {
    Random random = new Random(seed);
    for (int i = 0; i < 100; i++) {
      LegLoads loads = LegLoads.of(path(random, 3), List.of(0.9, 0.8));
      Point3 tree = loads.legs().get(0).towardsTree().times(-1);
      Point3 sum = loads.sourceHaulingForce().plus(tree);
      for (LegLoads.Block b : loads.blocks()) {
        sum = sum.plus(b.haulingForce());
      }
      assertThat(sum.length()).as("seed %d", seed).isCloseTo(0, within(1e-9));
    }
  }

  @ParameterizedTest
  @ValueSource(longs = {11, 12, 13, 14})
  void turningTheSiteTurnsNothingElse(long seed) {
    Random random = new Random(seed);
    for (int i = 0; i < 100; i++) {
      List<Point3> path = path(random, 2);
      double a = 2 * Math.PI * random.nextDouble();
      List<Point3> turned =
          path.stream()
              .map(
                  p ->
                      new Point3(
                          p.e() * Math.cos(a) + p.n() * Math.sin(a),
                          p.n() * Math.cos(a) - p.e() * Math.sin(a),
                          p.up()))
              .toList();
      LegLoads one = LegLoads.of(path, List.of(0.95));
      LegLoads two = LegLoads.of(turned, List.of(0.95));
      assertThat(two.blocks().get(0).hauling())
          .as("seed %d", seed)
          .isCloseTo(one.blocks().get(0).hauling(), within(1e-9));
      assertThat(two.lineRiseDeg()).as("seed %d", seed).isCloseTo(one.lineRiseDeg(), within(1e-9));
    }
  }

  @ParameterizedTest
  @ValueSource(longs = {21, 22, 23, 24})
  void twoWaysToABlocksLoadAgree(long seed) {
    Random random = new Random(seed);
    for (int i = 0; i < 100; i++) {
      double k = 0.5 + 0.5 * random.nextDouble();
      LegLoads.Block b = LegLoads.of(path(random, 2), List.of(k)).blocks().get(0);
      assertThat(b.hauling())
          .as("seed %d", seed)
          .isCloseTo(LegLoads.blockLoadN(1, 1 / k, b.interiorDeg()), within(1e-9));
      assertThat(b.holding()).as("seed %d", seed).isBetween(0.0, 2.0 + 1e-12);
    }
  }

  @ParameterizedTest
  @ValueSource(longs = {31, 32, 33, 34})
  void aPathThatFitsKeepsItsJointClear(long seed) {
    Random random = new Random(seed);
    int fits = 0;
    for (int i = 0; i < 500; i++) {
      double first = 5 + 40 * random.nextDouble();
      double second = 5 + 40 * random.nextDouble();
      double line = 20 + 60 * random.nextDouble();
      double wire = 1 + 30 * random.nextDouble();
      double takeUp = 6 * random.nextDouble();
      PathFit fit = PathFit.of(List.of(first, second), line, 2, wire, takeUp);
      PathFit more = PathFit.of(List.of(first, second), line + 1, 2, wire + 1, takeUp);
      if (fit.fits()) {
        fits++;
        double s = fit.jointM();
        boolean behind = s >= first + PathFit.CLEAR_M - 1e-9;
        boolean before = s + takeUp <= first - PathFit.CLEAR_M + 1e-9;
        assertThat(behind || before).as("seed %d", seed).isTrue();
        assertThat(s).as("seed %d", seed).isLessThanOrEqualTo(line - 2 + 1e-9);
        assertThat(first + second - s).as("seed %d", seed).isLessThanOrEqualTo(wire + 1e-9);
        assertThat(more.fits()).as("more line and wire, seed %d", seed).isTrue();
      } else {
        assertThat(fit.shortOf()).as("seed %d", seed).isNotEmpty();
      }
    }
    assertThat(fits).as("seed %d", seed).isBetween(20, 480);
  }

  /** Against a search in steps of a centimetre along the path. */
  @ParameterizedTest
  @ValueSource(longs = {41, 42, 43, 44})
  void joinedLinesThatFitKeepBothJointsClear(long seed) {
    Random random = new Random(seed);
    int fits = 0;
    for (int i = 0; i < 200; i++) {
      List<Double> legs = List.of(5 + 30 * random.nextDouble(), 5 + 30 * random.nextDouble());
      double a = 10 + 40 * random.nextDouble();
      double b = 5 + 30 * random.nextDouble();
      double wire = 1 + 30 * random.nextDouble();
      double takeUp = 6 * random.nextDouble();
      PathFit fit = PathFit.of(legs, List.of(a, b), 2, wire, takeUp);
      double total = legs.get(0) + legs.get(1);
      double found = Double.NaN;
      for (double s = Math.max(0, total - b - wire); s <= a - 2; s += 0.01) {
        boolean clear = s + b + takeUp <= total - PathFit.CLEAR_M;
        for (double joint : new double[] {s, s + b}) {
          clear &=
              joint >= legs.get(0) + PathFit.CLEAR_M
                  || joint + takeUp <= legs.get(0) - PathFit.CLEAR_M;
        }
        found = clear ? s : found;
      }
      // a room narrower than the steps may be missed by the search
      if (!Double.isNaN(found)) {
        fits++;
        assertThat(fit.fits()).as("seed %d", seed).isTrue();
        assertThat(fit.jointM()).as("seed %d", seed).isBetween(found - 1e-9, found + 0.0101);
      }
    }
    assertThat(fits).as("seed %d", seed).isBetween(10, 190);
  }

  private static List<Point3> path(Random random, int legs) {
    List<Point3> path = new ArrayList<>();
    for (int i = 0; i <= legs; i++) {
      path.add(
          new Point3(
              20 * i + 10 * random.nextDouble(),
              40 * random.nextDouble() - 20,
              10 * random.nextDouble()));
    }
    return path;
  }
}
