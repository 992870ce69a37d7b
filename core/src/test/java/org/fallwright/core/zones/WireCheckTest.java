package org.fallwright.core.zones;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.List;
import java.util.Random;
import org.fallwright.core.site.Fix;
import org.fallwright.core.site.Place;
import org.fallwright.core.site.Wire;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

class WireCheckTest {
  private static final double TEN_FEET = 3.05;

  private static WireCheck.Reach reach(double heightM, double eastM) {
    FallOutline tree = new FallOutline(heightM, 5, 3, 0.5, 0, 0);
    Place stump = new Place(Things.at(0, 20), 0, Fix.TAPES, 0.0);
    return new WireCheck(List.of(Things.wire(eastM, 0.8)), stump, 0.3, tree)
        .reach(w -> TEN_FEET)
        .get(0);
  }

  /** 10 ft to 50 kV to ground, 29 CFR 1910.269 definition of line-clearance tree trimming. */
  @Test
  void aWireWithinHeightAndApproachDistanceStopsTheWork() {
    WireCheck.Reach r = reach(15, 17);
    assertThat(r.groundM()).isCloseTo(17, within(1e-9));
    assertThat(r.stopM()).isCloseTo(18.05, within(1e-9));
    assertThat(r.stops()).isTrue();
    assertThat(reach(15, 19).stops()).isFalse();
    assertThat(reach(15, 19).advises()).isTrue();
    assertThat(reach(15, 34).advises()).isFalse();
  }

  @Test
  void theDemoWireIsBeyondReachUntilItIsMovedNearer() {
    WireCheck.Reach w1 =
        new WireCheck(List.of(Things.wire(42.5, 0.8)), Things.STUMP, 0.3, Things.OAK)
            .reach(w -> TEN_FEET)
            .get(0);
    assertThat(w1.groundM()).isCloseTo(26.5, within(1e-9));
    assertThat(w1.stopM()).isCloseTo(20.55, within(1e-9));
    assertThat(w1.adviceM()).isCloseTo(38.05, within(1e-9));
    assertThat(w1.stops()).isFalse();
    assertThat(w1.advises()).isTrue();
    WireCheck.Reach nearer =
        new WireCheck(List.of(Things.wire(36, 0.8)), Things.STUMP, 0.3, Things.OAK)
            .reach(w -> TEN_FEET)
            .get(0);
    assertThat(nearer.groundM()).isCloseTo(20, within(1e-9));
    assertThat(nearer.stops()).isTrue();
  }

  @Test
  void aConductorHangsLowestAtMidSpan() {
    List<Segment3> chords = Segment3.conductor(Things.wire(10, 0.8));
    assertThat(chords).hasSize(64);
    assertThat(chords.get(0).az()).isCloseTo(9.5, within(0.001));
    assertThat(chords.get(16).az()).isCloseTo(8.7, within(0.001)).isLessThan(8.7);
    assertThat(chords.get(16).ay()).isCloseTo(20, within(1e-9));
  }

  @Test
  void aWireOverTheLayIsWithinTheTreesReach() {
    WireCheck check = new WireCheck(List.of(Things.wire(30, 0.8)), Things.STUMP, 0.3, Things.OAK);
    WireCheck.InLay east = check.inLay(Things.oakTo(90), w -> TEN_FEET).get(0);
    // errors of 0.2 m each, and 0.8 m of sag swung by 45 degrees
    assertThat(east.leastM())
        .as("overlap less the errors of both and the swing")
        .isCloseTo(-0.4 - 0.8 * Math.sqrt(0.5), within(1e-9));
    assertThat(east.clear()).isFalse();
    WireCheck.InLay west = check.inLay(Things.oakTo(270), w -> TEN_FEET).get(0);
    assertThat(west.leastM()).isGreaterThan(5);
    assertThat(
            new WireCheck(List.of(), Things.STUMP, 0.3, Things.OAK)
                .inLay(Things.oakTo(90), w -> TEN_FEET))
        .isEmpty();
  }

  /** Points of the tree, from standing to lying, are never nearer than the bound. */
  @ParameterizedTest
  @ValueSource(longs = {1, 2, 3, 4, 5, 6, 7, 8, 9, 10})
  void neverSaysMoreThanTheTrueDistance(long seed) {
    Random r = new Random(seed);
    double lean = 12 * r.nextDouble();
    double leanAzimuth = 360 * r.nextDouble();
    FallOutline tree = new FallOutline(12, 4, 3, 0.5, lean, leanAzimuth);
    Place stump = new Place(Things.at(0, 0), 0, Fix.TAPES, 0.0);
    double x = 4 + 14 * r.nextDouble();
    Wire wire =
        new Wire(
            "W",
            1.0,
            "owner",
            Wire.State.ENERGIZED,
            List.of(
                new Wire.Pole(Things.at(x, -30), 0, 4 + 10 * r.nextDouble()),
                new Wire.Pole(Things.at(x - 3, 30), 0, 4 + 10 * r.nextDouble())),
            r.nextDouble(),
            Fix.TAPES,
            0.0);
    double lay = 360 * r.nextDouble();
    FallFootprint f = FallFootprint.of(tree, stump.at(), lay, 0.5, 0);
    double bound = new WireCheck(List.of(wire), stump, 0, tree).inLay(f, w -> 0).get(0).leastM();
    List<Segment3> conductor = Segment3.conductor(wire);
    double least = Double.POSITIVE_INFINITY;
    for (int i = 0; i < 3000; i++) {
      double s = 12 * r.nextDouble();
      // A round crown: an ellipse over its height, a circle across.
      double k = (s - 8) / 4;
      double wide = s < 4 ? 0.25 : Math.max(0.25, 3 * Math.sqrt(Math.max(0, 1 - k * k)));
      double turn = 2 * Math.PI * r.nextDouble();
      double axis = s * Math.tan(Math.toRadians(lean));
      double aim = Math.toRadians(lay + f.halfAngleDeg() * (2 * r.nextDouble() - 1));
      double off = Math.toRadians(leanAzimuth) - aim;
      double u = axis * Math.cos(off) + wide * Math.cos(turn);
      double v = axis * Math.sin(off) + wide * Math.sin(turn);
      double phi = Math.PI / 2 * r.nextDouble();
      double along = u * Math.cos(phi) + s * Math.sin(phi);
      double up = Math.max(0, -u * Math.sin(phi) + s * Math.cos(phi));
      double e = along * Math.sin(aim) + v * Math.cos(aim);
      double n = along * Math.cos(aim) - v * Math.sin(aim);
      for (Segment3 c : conductor) {
        least = Math.min(least, c.distanceTo(e, n, up));
      }
    }
    assertThat(bound).as("seed " + seed).isLessThanOrEqualTo(least + 1e-6);
  }
}
