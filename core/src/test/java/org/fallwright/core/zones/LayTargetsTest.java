package org.fallwright.core.zones;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.List;
import java.util.Random;
import org.fallwright.core.site.Fix;
import org.fallwright.core.site.Place;
import org.fallwright.core.site.Shape;
import org.fallwright.core.site.Target;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

class LayTargetsTest {
  /** R = 23 m; felled north from the origin, its tip is an arc of that radius. */
  private static final FallOutline STRAIGHT = new FallOutline(20, 8, 3, 0.6, 0, 0);

  private static final Place ORIGIN = new Place(Things.at(0, 0), 0, Fix.TAPES, null);

  private static TargetClearance north(Target target) {
    FallFootprint f = FallFootprint.of(STRAIGHT, Things.at(0, 0), 0, 0, 0);
    return new LayTargets(List.of(target), ORIGIN).clearances(f).get(0);
  }

  @Test
  void aTargetBeyondTheTipIsApartByTheDifference() {
    TargetClearance c = north(Things.target("a", Things.polygon(-1, 25, 1, 25, 1, 27, -1, 27), 1));
    assertThat(c.clearanceM()).isCloseTo(2, within(0.01));
    assertThat(c.askedM()).isCloseTo(1.4, within(1e-12));
    assertThat(c.ratio()).isCloseTo(2 / 1.4, within(0.01));
    assertThat(c.overlapAmount()).isZero();
    assertThat(c.nearest().northM()).isCloseTo(25, within(1e-6));
  }

  @Test
  void nothingAskedAndApartIsNoLimit() {
    TargetClearance c = north(Things.target("a", Things.polygon(-1, 25, 1, 25, 1, 27, -1, 27), 0));
    assertThat(c.askedM()).isZero();
    assertThat(c.ratio()).isInfinite();
  }

  @Test
  void overlapCountsAgainstATargetEvenWhereNothingIsAsked() {
    TargetClearance c = north(Things.target("a", Things.polygon(-1, 21, 1, 21, 1, 27, -1, 27), 0));
    assertThat(c.clearanceM()).isNegative();
    assertThat(c.overlaps()).isTrue();
    assertThat(c.ratio()).isZero();
    assertThat(c.overlapUnit()).isEqualTo("m²");
  }

  @Test
  void aSmallTargetUnderTheCrownLiesInWhole() {
    TargetClearance c =
        north(Things.target("a", Things.polygon(-0.5, 15, 0.5, 15, 0.5, 16, -0.5, 16), 1));
    assertThat(c.overlapAmount()).isCloseTo(1, within(1e-9));
    assertThat(c.clearanceM()).isLessThan(-3);
  }

  @Test
  void aFenceIsMeasuredInMetres() {
    TargetClearance c =
        north(
            Things.target(
                "f", Target.Kind.FENCE, Things.line(-20, 15.5, 20, 15.5), 1.2, 0.5, false));
    assertThat(c.overlapUnit()).isEqualTo("m");
    // Crown 6 m wide there, and 15.5 m out the half-angle of 5 degrees adds 1.36 m a side.
    assertThat(c.overlapAmount()).isBetween(8.4, 8.8);
    assertThat(c.nearest().northM()).isCloseTo(15.5, within(1e-9));
    assertThat(c.nearest().eastM()).isCloseTo(0, within(0.1));
  }

  @Test
  void aTargetThatMayBeHitIsNamedAndNeverJudged() {
    Shape square = Things.polygon(-1, 10, 1, 10, 1, 12, -1, 12);
    TargetClearance c = north(Things.target("p", Target.Kind.PLANTING, square, 1, 0.5, true));
    assertThat(c.overlapAmount()).isCloseTo(4, within(1e-9));
    assertThat(c.ratio()).isInfinite();
  }

  @Test
  void theDemoShedLimitsLaysToTheEast() {
    LayTargets shed = new LayTargets(List.of(Things.shed()), Things.STUMP);
    TargetClearance at7 = shed.clearances(Things.oakTo(7)).get(0);
    assertThat(at7.clearanceM()).isCloseTo(2.39, within(0.03));
    assertThat(at7.askedM()).isCloseTo(1.90, within(1e-12));
    assertThat(shed.leastRatio(Things.oakTo(7))).isGreaterThan(1.25);
    assertThat(shed.leastRatio(Things.oakTo(8))).isBetween(1.0, 1.25);
    assertThat(shed.leastRatio(Things.oakTo(10))).isLessThan(1);
    assertThat(shed.clearances(Things.oakTo(39)).get(0).overlapAmount())
        .as("all of the shed, 4.0 by 3.5 m")
        .isCloseTo(14, within(1e-6));
  }

  @ParameterizedTest
  @ValueSource(longs = {1, 2, 3, 4, 5, 6, 7, 8})
  void lawsOfClearance(long seed) {
    Random r = new Random(seed);
    double lay = 360 * r.nextDouble();
    double share = r.nextDouble();
    List<Target> targets =
        r.doubles(5, -20, 20)
            .mapToObj(
                e -> {
                  double n = 40 * r.nextDouble() - 20;
                  return Things.target(
                      "t" + e, Things.polygon(e, n, e + 3, n, e + 3, n + 2, e, n + 2), 1);
                })
            .toList();
    LayTargets some = new LayTargets(targets.subList(0, 4), ORIGIN);
    LayTargets all = new LayTargets(targets, ORIGIN);
    FallOutline tree = new FallOutline(15, 5, 3, 0.5, 8, 200);
    FallFootprint narrow = FallFootprint.of(tree, Things.at(0, 0), lay, share, 0);
    FallFootprint wide = FallFootprint.of(tree, Things.at(0, 0), lay, share + 0.2, 0);
    String what = "seed " + seed;
    for (int i = 0; i < targets.size(); i++) {
      assertThat(all.clearances(wide).get(i).clearanceM())
          .as(what)
          .isLessThanOrEqualTo(all.clearances(narrow).get(i).clearanceM() + Depth.TOLERANCE_M);
    }
    assertThat(all.leastRatio(narrow)).as(what).isLessThanOrEqualTo(some.leastRatio(narrow));
    assertThat(all.leastRatio(narrow))
        .as(what)
        .isEqualTo(
            all.clearances(narrow).stream()
                .mapToDouble(TargetClearance::ratio)
                .min()
                .orElseThrow());
  }
}
