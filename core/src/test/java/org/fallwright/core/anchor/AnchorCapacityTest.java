package org.fallwright.core.anchor;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.assertj.core.api.Assertions.within;

import org.fallwright.core.site.Anchor;
import org.fallwright.core.site.Anchor.Condition;
import org.fallwright.core.tree.StemVolume;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.EnumSource;

class AnchorCapacityTest {
  private static final WoodFigures OAK =
      new WoodFigures(57e6, 0.16, 1010, WoodFigures.LOWEST_ROOT_PLATE, StemVolume.PINE);
  private static final AnchorLoad LEVEL = new AnchorLoad(0, false);

  private static Capacity of(Anchor anchor, AnchorLoad load) {
    return AnchorCapacity.of(anchor, load, Anchors.figures(OAK, 0.35));
  }

  @ParameterizedTest
  @EnumSource(names = "SOUND", mode = EnumSource.Mode.EXCLUDE)
  void refusesTreesAndStumpsThatAreNotSound(Condition condition) {
    assertRefused(of(Anchors.tree(0.6, 19, 0.6, false, condition, true, null), LEVEL));
    assertRefused(of(Anchors.stump(0.6, 19, null, condition), LEVEL));
  }

  @Test
  void refusesThinTreesUnlessTiedBack() {
    assertRefused(of(Anchors.sound(0.249, 12, 0.3, false), LEVEL));
    assertThat(of(Anchors.sound(0.25, 12, 0.3, false), LEVEL).refused()).isFalse();
    assertThat(of(Anchors.tree(0.2, 12, 0.3, false, Condition.SOUND, true, null), LEVEL).refused())
        .isFalse();
    assertRefused(of(Anchors.stump(0.24, 12, null, Condition.SOUND), LEVEL));
  }

  @Test
  void refusesSteepUplift() {
    Anchor oak = Anchors.sound(0.62, 19, 0.6, false);
    assertThat(of(oak, new AnchorLoad(30, false)).refused()).isFalse();
    assertRefused(of(oak, new AnchorLoad(30.01, false)));
    assertRefused(of(Anchors.vehicle(2500, 0), new AnchorLoad(31, false)));
    assertRefused(of(Anchors.vehicle(2500, 5), new AnchorLoad(26, false)));
  }

  @Test
  void refusesWhatWasRejectedOnTheSiteWithItsReason() {
    Capacity c =
        of(Anchors.tree(0.62, 19, 0.6, false, Condition.SOUND, false, "fungus at the base"), LEVEL);
    assertRefused(c);
    assertThat(c.why()).contains("fungus at the base");
  }

  @Test
  void soilAndDownhillCountOnTheRootPlateOnly() {
    double dry = of(Anchors.sound(0.62, 19, 0.6, false), LEVEL).strengthN();
    assertThat(of(Anchors.sound(0.62, 19, 0.6, true), LEVEL).strengthN())
        .isCloseTo(dry / 2, within(1e-9 * dry));
    assertThat(of(Anchors.sound(0.62, 19, 0.6, false), AnchorLoad.of(0, 1, -0.4)).strengthN())
        .isCloseTo(0.75 * dry, within(1e-9 * dry));
    WoodAnchor wet = WoodAnchor.of(1000, OAK, 0.4, 1, true, true);
    WoodAnchor drained = WoodAnchor.of(1000, OAK, 0.4, 1, false, false);
    assertThat(wet.stemN()).isEqualTo(drained.stemN());
  }

  @ParameterizedTest
  @CsvSource({"0, 1.0", "0.5, 1.0", "0.6, 1.1", "1.0, 1.5"})
  void theArmReachesBelowTheGround(double sling, double arm) {
    assertThat(WoodAnchor.armM(sling)).isCloseTo(arm, within(1e-12));
  }

  @Test
  void directionOfTheLoadComesFromItsComponents() {
    assertThat(AnchorLoad.of(3, 4, 5).upliftDeg()).isCloseTo(45, within(1e-9));
    assertThat(AnchorLoad.of(0, 1, -Math.tan(Math.toRadians(19.9))).downhill()).isFalse();
    assertThat(AnchorLoad.of(0, 1, -Math.tan(Math.toRadians(20.1))).downhill()).isTrue();
  }

  @Test
  void aThinStemBreaksBeforeStrongRootsLetGo() {
    WoodFigures weakWood = new WoodFigures(10e6, 0.16, 1400, 300, StemVolume.SPRUCE);
    Capacity c =
        AnchorCapacity.of(Anchors.sound(0.3, 30, 0.3, false), LEVEL, Anchors.figures(weakWood, 0));
    assertThat(c.mode()).isEqualTo("stem bending");
  }

  @Test
  void stumpIsHalfTheTreeAndAStatedMassWins() {
    double tree = of(Anchors.sound(0.40, 15, 0.2, false), LEVEL).strengthN();
    double stump = of(Anchors.stump(0.40, 15, null, Condition.SOUND), LEVEL).strengthN();
    assertThat(stump).isCloseTo(tree / 2, within(1e-9 * tree));
    double stated = of(Anchors.stump(0.40, 15, 100.0, Condition.SOUND), LEVEL).strengthN();
    assertThat(stated).isCloseTo(0.5 * 77.4 * 100, within(1e-6));
  }

  @Test
  void vehicleSlopeIsMeasuredAwayFromTheTree() {
    double level = of(Anchors.vehicle(2500, 0), LEVEL).strengthN();
    assertThat(level).isCloseTo(0.35 * 2500 * 9.80665, within(1e-6));
    // parked uphill of the tree, gravity pulls it towards the tree
    assertThat(of(Anchors.vehicle(2500, 5), new AnchorLoad(-5, false)).strengthN())
        .isLessThan(level);
    assertThat(of(Anchors.vehicle(2500, -5), new AnchorLoad(5, false)).strengthN())
        .isGreaterThan(level);
    assertRefused(of(Anchors.vehicle(2500, 25), new AnchorLoad(-25, false)));
  }

  @Test
  void ratedPointOfAVehicleIsAPartOfItsOwn() {
    Capacity c = AnchorCapacity.ratedPoint(Anchors.vehicle(2500, 0)).orElseThrow();
    assertThat(c.strengthN() / c.designFactor()).isEqualTo(30_000);
    assertThat(c.strengthN() / c.lastFactor()).isEqualTo(30_000);
    assertThat(AnchorCapacity.ratedPoint(Anchors.sound(0.5, 15, 1, false))).isEmpty();
  }

  @Test
  void ratedPointIsTheFigureVouchedFor() {
    Anchor point =
        new Anchor.RatedPoint("p", Anchors.PLACE, 0, null, null, 60_000, "the yard's engineer");
    Capacity c = of(point, new AnchorLoad(45, false));
    assertThat(c.strengthN()).isEqualTo(60_000);
    assertThat(c.designFactor()).isEqualTo(3);
    assertThat(c.lastFactor()).isEqualTo(2);
    assertThat(c.why()).contains("the yard's engineer");
  }

  @Test
  void aLoadOutsideTwoLegsIsRefused() {
    assertThatThrownBy(() -> TwoLegs.share(1000, -5, 60))
        .hasMessageContaining("to_first_deg is -5");
    assertThatThrownBy(() -> TwoLegs.share(1000, 0, 0)).hasMessageContaining("included angle");
  }

  private static void assertRefused(Capacity c) {
    assertThat(c.refused()).isTrue();
    assertThat(c.strengthN()).isZero();
    assertThat(c.why()).isNotBlank();
  }
}
