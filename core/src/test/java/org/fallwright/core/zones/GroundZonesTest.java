package org.fallwright.core.zones;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.assertj.core.api.Assertions.within;

import java.util.List;
import java.util.Random;
import org.fallwright.core.site.DropZone;
import org.fallwright.core.site.Position;
import org.fallwright.core.site.Shape;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;
import org.locationtech.jts.geom.Coordinate;
import org.locationtech.jts.geom.Geometry;

/** Sit-back, drop, people, bight and recoil zones, and the operator's place. */
class GroundZonesTest {
  private static final FallOutline STRAIGHT = new FallOutline(20, 8, 3, 0.6, 0, 0);

  @Test
  void dropZoneThatHoldsTheFootprintLeavesAMargin() {
    DropZoneFit zone =
        new DropZoneFit(
            List.of(new DropZone("D", Things.polygon(-10, -10, 10, -10, 10, 24, -10, 24))));
    DropZoneFit.Fit fit = zone.of(FallFootprint.of(STRAIGHT, Things.at(0, 0), 0, 0, 0));
    assertThat(fit.inside()).isTrue();
    assertThat(fit.marginM()).as("24 less R = 23").isCloseTo(1, within(0.01));
    assertThat(fit.place().northM()).isCloseTo(23, within(0.01));
  }

  @Test
  void dropZoneTooShortNamesWhatSticksOut() {
    DropZoneFit zone =
        new DropZoneFit(
            List.of(new DropZone("D", Things.polygon(-10, -10, 10, -10, 10, 22, -10, 22))));
    DropZoneFit.Fit fit = zone.of(FallFootprint.of(STRAIGHT, Things.at(0, 0), 0, 0, 0));
    assertThat(fit.inside()).isFalse();
    assertThat(fit.marginM()).as("22 less R = 23").isCloseTo(-1, within(0.02));
    assertThat(fit.outsideM2()).isBetween(1.0, 7.0);
  }

  @Test
  void twoDropZonesSideBySideAllowWhatLiesAcrossBoth() {
    DropZoneFit zone =
        new DropZoneFit(
            List.of(
                new DropZone("D1", Things.polygon(-10, -10, 0, -10, 0, 30, -10, 30)),
                new DropZone("D2", Things.polygon(0, -10, 10, -10, 10, 30, 0, 30))));
    assertThat(zone.of(FallFootprint.of(STRAIGHT, Things.at(0, 0), 0, 0, 0)).inside()).isTrue();
    assertThatThrownBy(() -> new DropZoneFit(List.of())).hasMessageContaining("drop_zones");
  }

  @Test
  void sitBackSpansSixtyDegreesEachSideOverHeightAndMargin() {
    SitBackZone zone = SitBackZone.of(Things.at(0, 0), 350, 20);
    Position stump = Things.at(0, 0);
    assertThat(zone.contains(stump.along(350, 22.9))).isTrue();
    assertThat(zone.contains(stump.along(350, 23.1))).isFalse();
    assertThat(zone.contains(stump.along(49, 20))).as("across north").isTrue();
    assertThat(zone.contains(stump.along(51, 20))).isFalse();
    assertThat(zone.contains(stump.along(291, 20))).isTrue();
    assertThat(zone.contains(stump.along(289, 20))).isFalse();
    assertThat(zone.geometry().getArea())
        .as("a third of the circle")
        .isCloseTo(Math.PI * 23 * 23 / 3, within(0.5));
    assertThat(zone.distanceTo(stump.along(350, 30))).isCloseTo(7, within(1e-9));
    assertThat(zone.distanceTo(stump.along(80, 10)))
        .isCloseTo(10 * Math.sin(Math.toRadians(30)), within(1e-9));
  }

  @Test
  void sitBackNamesTheHouseBehindTheDemoOak() {
    List<LayTargets.Overlap> stake =
        SitBackZone.of(Things.STUMP.at(), 188, 17.5)
            .atStake(
                new LayTargets(
                    List.of(Things.house(), Things.shed(), Things.fence()), Things.STUMP));
    assertThat(stake).extracting(LayTargets.Overlap::targetId).containsExactly("House", "F1");
    assertThat(stake.get(0).amount()).isBetween(200.0, 230.0);
    assertThat(stake.get(1).unit()).isEqualTo("m");
  }

  @ParameterizedTest
  @ValueSource(longs = {1, 2, 3, 4, 5})
  void aFansDistanceAgreesWithItsOutline(long seed) {
    Random r = new Random(seed);
    Sector fan = new Sector(Things.at(3, -2), 360 * r.nextDouble(), 10 + 80 * r.nextDouble(), 20);
    Geometry outline = fan.geometry();
    for (int i = 0; i < 200; i++) {
      Position p = Things.at(80 * r.nextDouble() - 40, 80 * r.nextDouble() - 40);
      Coordinate c = new Coordinate(p.eastM(), p.northM());
      assertThat(fan.distanceTo(p))
          .as("seed " + seed)
          .isCloseTo(outline.distance(Shape.FACTORY.createPoint(c)), within(0.01));
      assertThat(fan.contains(p)).as("seed " + seed).isEqualTo(fan.distanceTo(p) == 0);
    }
  }

  /** Two tree lengths, 29 CFR 1910.266(h)(1)(iv); 2.5 lengths, wildland fire practice. */
  @Test
  void peopleKeepSoManyTreeHeightsAway() {
    assertThat(PeopleZone.of(Things.at(0, 0), 2, 24).radiusM()).isEqualTo(48);
    assertThat(PeopleZone.of(Things.at(0, 0), 2, 60 * 0.3048).radiusM())
        .isCloseTo(36.58, within(0.005));
    assertThat(PeopleZone.of(Things.at(0, 0), 2.5, 20).radiusM()).isEqualTo(50);
    assertThat(PeopleZone.of(Things.at(0, 0), 1.5, 30).radiusM()).isEqualTo(45);
    PeopleZone zone = PeopleZone.of(Things.at(1, 1), 2, 10);
    assertThat(zone.contains(Things.at(1, 21))).isTrue();
    assertThat(zone.contains(Things.at(1, 21.01))).isFalse();
  }

  @Test
  void aDirectLineHasNoBightAndARedirectedOneHas() {
    assertThat(Bight.along(List.of(Things.at(0, 0), Things.at(0, 30)))).isEmpty();
    Bight bight =
        Bight.along(List.of(Things.at(0, 0), Things.at(0, 30), Things.at(-30, 30))).get(0);
    assertThat(bight.contains(Things.at(-10, 20))).isTrue();
    assertThat(bight.contains(Things.at(4.99, 15))).isTrue();
    assertThat(bight.contains(Things.at(5.01, 15))).isFalse();
    assertThat(bight.contains(Things.at(-20, 3))).isFalse();
    assertThat(bight.geometry().getArea())
        .as("triangle, margin along its rim, a disc's worth of corners")
        .isCloseTo(450 + 5 * (60 + 30 * Math.sqrt(2)) + 25 * Math.PI, within(1.0));
  }

  /** Ship insurers: a parted end flies about as far past its fixing as the length that is left. */
  @Test
  void aPartedLegOfThirtyMetresFliesThirtyMetresPastItsFixing() {
    Recoil recoil = new Recoil(List.of(Things.at(0, 0), Things.at(0, 30)));
    assertThat(recoil.contains(Things.at(0, 59.9))).isTrue();
    assertThat(recoil.contains(Things.at(0, 60.1))).isFalse();
    assertThat(recoil.contains(Things.at(0, -29.9))).isTrue();
    assertThat(recoil.contains(Things.at(0, 15))).isTrue();
    assertThat(recoil.contains(Things.at(-3, 33))).as("45 degrees off beyond the end").isFalse();
    assertThat(recoil.contains(Things.at(-6, 15))).as("beyond 20 degrees either way").isFalse();
    assertThat(recoil.contains(Things.at(-5, 15))).as("within 20 degrees").isTrue();
    assertThat(recoil.geometry().getEnvelopeInternal().getMaxY()).isCloseTo(60, within(0.05));
  }

  @Test
  void aBlockHasADiscOfItsShorterLeg() {
    Recoil recoil = new Recoil(List.of(Things.at(0, 0), Things.at(0, 30), Things.at(-12, 30)));
    assertThat(recoil.contains(Things.at(8, 38))).as("11.3 m from the block").isTrue();
    assertThat(recoil.contains(Things.at(9, 39))).as("12.7 m from the block").isFalse();
    assertThat(recoil.onLastLeg(Things.at(-12, 30))).isTrue();
    assertThat(recoil.onLastLeg(Things.at(0, 10))).as("on the first leg only").isFalse();
    assertThatThrownBy(() -> new Recoil(List.of(Things.at(0, 0))))
        .hasMessageContaining("at least 2");
    assertThatThrownBy(() -> new Recoil(List.of(Things.at(0, 0), Things.at(0, 0))))
        .hasMessageContaining("leg_m");
  }

  @Test
  void anOperatorBesideTheWinchIsOffTheAxisAndOnItIsNot() {
    List<Position> path = List.of(Things.STUMP.at(), Things.at(17.5, 53), Things.at(-7, 54.4));
    FallFootprint f = Things.oakTo(3);
    OperatorPlace atWinch =
        OperatorPlace.of(Things.at(-7, 54.4), f, Bight.along(path), new Recoil(path));
    assertThat(atWinch.offAxis()).isFalse();
    assertThat(atWinch.outsideFootprint()).isTrue();
    assertThat(atWinch.fromStumpM()).as("given as 38.1 m").isCloseTo(38.1, within(0.1));
    OperatorPlace beside =
        OperatorPlace.of(Things.at(-8, 60), f, Bight.along(path), new Recoil(path));
    assertThat(beside.offAxis()).isTrue();
    assertThat(beside.outsideBights()).isTrue();
    OperatorPlace within =
        OperatorPlace.of(Things.at(12, 50), f, Bight.along(path), new Recoil(path));
    assertThat(within.outsideBights()).isFalse();
    OperatorPlace under =
        OperatorPlace.of(Things.at(16.5, 38), f, Bight.along(path), new Recoil(path));
    assertThat(under.outsideFootprint()).isFalse();
  }
}
