package org.fallwright.core.anchor;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.assertj.core.api.Assertions.within;

import org.fallwright.core.site.Anchor;
import org.fallwright.core.site.Anchor.DeadmanSoil;
import org.fallwright.core.site.Anchor.Holdfast;
import org.fallwright.core.site.Anchor.PicketSoil;
import org.fallwright.core.tree.StemVolume;
import org.fallwright.core.units.Units;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.EnumSource;

/** Pickets, pins and buried logs as anchors of a site. */
class GroundAnchorTest {
  private static final WoodFigures WOOD =
      new WoodFigures(57e6, 0.16, 1010, WoodFigures.LOWEST_ROOT_PLATE, StemVolume.PINE);
  private static final AnchorLoad LEVEL = new AnchorLoad(0, false);

  private static Capacity of(Anchor anchor, AnchorLoad load) {
    return AnchorCapacity.of(anchor, load, Anchors.figures(WOOD, 0.35));
  }

  private static Anchor pickets(Holdfast holdfast, int count, PicketSoil soil, boolean wet) {
    return new Anchor.Pickets("P", Anchors.PLACE, 0.1, null, null, holdfast, count, soil, wet);
  }

  private static Anchor log(double depth, double length, int run, DeadmanSoil soil) {
    return new Anchor.BuriedLog("D", Anchors.PLACE, 0, null, null, depth, 0.4, length, run, soil);
  }

  @Test
  void theTableFigureIsTheStrengthUnderTheFactorsOfAnAnchor() {
    Capacity c = of(pickets(Holdfast.THREE_TWO_ONE, 1, PicketSoil.UNDISTURBED_LOAM, false), LEVEL);
    assertThat(c.strengthN()).isCloseTo(4000 * Units.POUND_FORCE, within(1e-6));
    assertThat(c.designFactor()).isEqualTo(3);
    assertThat(c.lastFactor()).isEqualTo(2);
    assertThat(c.refused()).isFalse();
  }

  @ParameterizedTest
  @EnumSource(Holdfast.class)
  void noOtherGroundHoldsMoreThanLoamAndWetGroundHoldsHalf(Holdfast holdfast) {
    int count = holdfast.wooden() ? 1 : 3;
    double loam = Pickets.holdsN(holdfast, count, PicketSoil.UNDISTURBED_LOAM, false);
    for (PicketSoil soil : PicketSoil.values()) {
      double dry = Pickets.holdsN(holdfast, count, soil, false);
      boolean pins = holdfast == Holdfast.THIN_PINS || holdfast == Holdfast.THICK_PINS;
      assertThat(dry).as("%s", soil).isPositive();
      if (!pins) {
        assertThat(dry).as("%s", soil).isLessThanOrEqualTo(loam);
      }
      assertThat(Pickets.holdsN(holdfast, count, soil, true))
          .as("%s", soil)
          .isCloseTo(dry / 2, within(1e-9 * dry));
    }
  }

  /** Six pickets of 500 lb in poor clay; six of 50 lb in loose sand. */
  @ParameterizedTest
  @CsvSource({"COHESIVE_POOR, 3000", "SAND_LOOSE, 300", "COHESIVE_GOOD, 4000"})
  void inOtherGroundNoPicketCountsForMoreThanAPin(PicketSoil soil, double lbf) {
    assertThat(Pickets.holdsN(Holdfast.THREE_TWO_ONE, 1, soil, false) / Units.POUND_FORCE)
        .isCloseTo(lbf, within(1e-6));
  }

  @Test
  void aLoadThatWouldDrawPicketsIsRefused() {
    Anchor p = pickets(Holdfast.STEEL_ROW, 4, PicketSoil.UNDISTURBED_LOAM, false);
    assertThat(of(p, new AnchorLoad(15, false)).refused()).isFalse();
    assertThat(of(p, new AnchorLoad(15.1, false)).refused()).isTrue();
    assertThat(of(p, AnchorLoad.of(0, 1, -0.5)).refused()).isTrue();
  }

  @Test
  void woodenPicketsAreCountedByTheirHoldfast() {
    assertThatThrownBy(() -> pickets(Holdfast.TWO_ONE, 3, PicketSoil.SAND_DENSE, false))
        .hasMessageContaining("count is 3");
  }

  /** 0.4 m by 1.9 m at 5 ft in loam, line 1:2, by hand: 3,600·1.312·5.234 lb. */
  @Test
  void aLogHoldsByItsFaceLessTheTrench() {
    double lbf = of(log(1.52, 1.9, 2, DeadmanSoil.LOAM), LEVEL).strengthN() / Units.POUND_FORCE;
    assertThat(lbf).isCloseTo(24_725, within(10.0));
    double soft = of(log(1.52, 1.9, 2, DeadmanSoil.SOFT), LEVEL).strengthN();
    assertThat(soft / Units.POUND_FORCE).isCloseTo(lbf / 2, within(1e-6));
    assertThat(of(log(1.82, 1.9, 2, DeadmanSoil.LOAM), LEVEL).strengthN() / Units.POUND_FORCE)
        .as("between two rows the lesser depth counts")
        .isCloseTo(lbf, within(1e-6));
  }

  @Test
  void theSteeperOfTrenchAndLoadCounts() {
    Anchor flat = log(1.6, 1.8, 4, DeadmanSoil.LOAM);
    double level = of(flat, LEVEL).strengthN();
    assertThat(of(flat, new AnchorLoad(14, false)).strengthN()).isEqualTo(level);
    double at20 = of(flat, new AnchorLoad(20, false)).strengthN();
    assertThat(at20).isEqualTo(of(log(1.6, 1.8, 2, DeadmanSoil.LOAM), LEVEL).strengthN());
    assertThat(at20).isLessThan(level);
    assertThat(of(flat, new AnchorLoad(45, false)).refused()).isFalse();
    assertThat(of(flat, new AnchorLoad(46, false)).refused()).isTrue();
    assertThat(of(flat, AnchorLoad.of(0, 1, -0.5)).refused()).isTrue();
  }

  @Test
  void aSlenderLogIsRefusedAsItMightBreak() {
    Capacity c = of(log(1.6, 2.1, 3, DeadmanSoil.LOAM), LEVEL);
    assertThat(c.refused()).isTrue();
    assertThat(c.why()).contains("5.3 times");
  }

  @Test
  void whatWasRejectedOnTheSiteIsRefusedWhateverItIs() {
    Anchor legs = new Anchor.TwoLegs("B", Anchors.PLACE, 0.5, "rope frayed", null, "A1", "A2");
    assertThat(of(legs, LEVEL).why()).contains("rope frayed");
    Anchor sound = new Anchor.TwoLegs("B", Anchors.PLACE, 0.5, null, null, "A1", "A2");
    assertThatThrownBy(() -> of(sound, LEVEL)).hasMessageContaining("B has two legs");
    assertThatThrownBy(() -> new Anchor.TwoLegs("B", Anchors.PLACE, 0.5, null, null, "A1", "A1"))
        .hasMessageContaining("own anchor");
  }

  @Test
  void aTieBackIsSaidToCountNothing() {
    Capacity c = of(Anchors.tree(0.2, 12, 0.3, false, Anchor.Condition.SOUND, true, null), LEVEL);
    assertThat(c.refused()).isFalse();
    assertThat(c.why()).contains("tie-back that is not tensioned counts nothing");
    assertThat(c.strengthN())
        .isLessThan(of(Anchors.sound(0.25, 12, 0.3, false), LEVEL).strengthN());
  }
}
