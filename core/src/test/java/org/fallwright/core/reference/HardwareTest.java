package org.fallwright.core.reference;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;

import java.util.Set;
import java.util.stream.Stream;
import org.fallwright.core.line.ChainGrade;
import org.fallwright.core.line.FibreRope;
import org.fallwright.core.line.FibreRope.At;
import org.fallwright.core.line.RopeEnd;
import org.fallwright.core.line.Sheave;
import org.fallwright.core.line.SlingHitch;
import org.fallwright.core.line.WireClips;
import org.fallwright.core.line.Wraps;
import org.junit.jupiter.api.Test;

/** The catalogue of ropes and hardware, and the classes that reckon with it. */
class HardwareTest {
  private static final Set<String> UNITS =
      Set.of(
          "",
          "lbf/in²",
          "kip",
          "kg/mm²",
          "kg",
          "in",
          "N/mm²",
          "short ton/in²",
          "t",
          "deg",
          "lbf",
          "lbf/ft²",
          "ft");

  @Test
  void everyRowSaysWhatItIsInWhatUnitAndWhatStandsBehindIt() {
    assertThat(Hardware.all())
        .hasSizeGreaterThan(200)
        .allSatisfy(
            f -> {
              assertThat(f.note()).as(f.key()).hasSizeGreaterThan(10);
              assertThat(f.unit()).as(f.key()).isIn(UNITS);
              assertThat(f.value()).as(f.key()).isPositive();
              assertThat(f.source().isEmpty())
                  .as(f.key())
                  .isEqualTo(
                      f.kind() == Kind.PLANNING_ALLOWANCE || f.kind() == Kind.COMMON_PRACTICE);
            });
  }

  @Test
  void aLowIsNeverAboveItsHigh() {
    assertThat(Hardware.all().stream().filter(f -> f.key().endsWith(".low")))
        .hasSizeGreaterThan(10)
        .allSatisfy(
            f ->
                assertThat(f.value())
                    .as(f.key())
                    .isLessThanOrEqualTo(Hardware.value(f.key().replaceAll("\\.low$", ".high"))));
  }

  @Test
  void anUnknownRowIsRefusedWithWhatComesNear() {
    assertThatThrownBy(() -> Hardware.of("chain.g80.12mm")).hasMessageContaining("chain.g80.1");
    assertThat(Hardware.find("chain.g80.12mm")).isEmpty();
  }

  @Test
  void strongerChainAndThickerChainWorkAtMore() {
    double before = 0;
    for (ChainGrade grade : ChainGrade.values()) {
      assertThat(grade.workingN(0.01)).isGreaterThan(before);
      assertThat(grade.workingN(0.02)).isGreaterThan(grade.workingN(0.01));
      before = grade.workingN(0.01);
    }
  }

  @Test
  void ropesByWhatTheyAreMadeOf() {
    assertThat(FibreRope.HMPE.breakingN(0.012)).isEmpty();
    assertThat(FibreRope.MANILA.stretch(At.FIFTH)).isEmpty();
    assertThat(FibreRope.MANILA.softestN(50e3)).isEqualTo(FibreRope.NYLON.softestN(50e3));
    assertThat(FibreRope.MANILA.weathered()).isEqualTo(FibreRope.NYLON.weathered());
    assertThatThrownBy(() -> FibreRope.NYLON.breakingN(0.03)).hasMessageContaining("diameter_m");
    // stiffest last; nylon the softest, so it holds a tree worst and stores most
    double[] stiffness =
        Stream.of(FibreRope.NYLON, FibreRope.POLYESTER, FibreRope.HMPE)
            .mapToDouble(r -> r.softestN(60e3))
            .toArray();
    assertThat(stiffness).isSorted();
    assertThat(FibreRope.NYLON.softestN(60e3)).isEqualTo(120e3);
    for (FibreRope rope : FibreRope.values()) {
      for (At at : At.values()) {
        rope.stretch(at).ifPresent(s -> assertThat(s.low()).isLessThanOrEqualTo(s.high()));
      }
      assertThat(rope.wet()).isBetween(0.5, 1.0);
    }
  }

  @Test
  void aKnotInASlipperyRopeKeepsLess() {
    assertThat(RopeEnd.BOWLINE.factorIn(FibreRope.HMPE)).isEqualTo(0.30);
    assertThat(RopeEnd.BOWLINE.factorIn(FibreRope.POLYESTER)).isEqualTo(0.60);
    assertThat(RopeEnd.EYE_SPLICE.factorIn(FibreRope.HMPE)).isEqualTo(0.95);
  }

  @Test
  void chokingTighterNeverHoldsMore() {
    double before = 0;
    for (int degrees = 0; degrees <= 180; degrees++) {
      assertThat(SlingHitch.choke(degrees)).isGreaterThanOrEqualTo(before);
      before = SlingHitch.choke(degrees);
    }
    assertThatThrownBy(() -> SlingHitch.choke(-1)).hasMessageContaining("choke_deg");
  }

  @Test
  void clipsBetweenTwoSizesCountAsTheGreater() {
    assertThat(WireClips.of(0.008, true)).isEqualTo(WireClips.of(0.0127, true));
    assertThat(WireClips.of(0.017, true)).isEqualTo(WireClips.of(0.01905, true));
    assertThatThrownBy(() -> WireClips.of(0.05, true)).hasMessageContaining("diameter_m");
  }

  @Test
  void sheavesPassOnLessThanTheyGet() {
    for (Sheave s : Sheave.values()) {
      assertThat(s.low()).isPositive().isLessThanOrEqualTo(s.high());
      assertThat(s.high()).isLessThan(1);
    }
  }

  @Test
  void wrapsHoldByTheLowFrictionAndHaulByTheHigh() {
    for (Wraps w : Wraps.values()) {
      assertThat(w.holdsN(100, 0)).isEqualTo(100);
      assertThat(w.holdsN(100, 2)).isGreaterThan(w.holdsN(100, 1));
      assertThat(w.holdsN(100, 1)).isLessThanOrEqualTo(w.haulN(100, 1));
      assertThat(w.tailN(w.holdsN(100, 1.5), 1.5))
          .isCloseTo(100, org.assertj.core.api.Assertions.within(1e-9));
    }
    assertThatThrownBy(() -> Wraps.ratio(0.2, 11, 180)).hasMessageContaining("turns is 11");
  }

  @Test
  void theLargestShacklesHaveTheSmallerFactor() {
    assertThat(Hardware.value("shackle.factor-large")).isLessThan(Hardware.value("shackle.factor"));
  }
}
