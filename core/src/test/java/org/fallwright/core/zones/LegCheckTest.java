package org.fallwright.core.zones;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.List;
import java.util.Random;
import java.util.Set;
import org.fallwright.core.site.Anchor;
import org.fallwright.core.site.Fix;
import org.fallwright.core.site.Place;
import org.fallwright.core.site.Target;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

class LegCheckTest {
  private static Leg level(double height, String... fastenedTo) {
    return new Leg(Things.at(0, 0), height, Things.at(20, 0), height, Set.of(fastenedTo));
  }

  private static LegCheck of(Target... targets) {
    return new LegCheck(List.of(targets), List.of(), List.of());
  }

  private static LegCheck.Passing one(LegCheck check, Leg leg) {
    List<LegCheck.Passing> all = check.passing(leg, 0.3, w -> 3.05);
    assertThat(all).hasSize(1);
    return all.get(0);
  }

  /** From 8 to 12 m along, 1 m beside the leg or under it, 2.6 m high. */
  private static Target box(Target.Kind kind, double fromNorth) {
    return Things.target(
        "box",
        kind,
        Things.polygon(8, fromNorth, 12, fromNorth, 12, fromNorth + 4, 8, fromNorth + 4),
        2.6,
        1,
        false);
  }

  @Test
  void aLegBesideAShedCountsInPlanBelowItsTopAndInSpaceAbove() {
    LegCheck check = of(box(Target.Kind.STRUCTURE, 1));
    LegCheck.Passing beside = one(check, level(2));
    assertThat(beside.clearanceM()).isCloseTo(1, within(1e-9));
    assertThat(beside.askedM()).as("0.3 m and the shed's 0.2 m").isCloseTo(0.5, within(1e-12));
    assertThat(one(check, level(5.6)).clearanceM()).isCloseTo(Math.hypot(1, 3), within(1e-9));
  }

  @Test
  void aLegOverAShedHasTheHeightToSpare() {
    LegCheck check = of(box(Target.Kind.STRUCTURE, -2));
    assertThat(one(check, level(4)).clearanceM()).isCloseTo(1.4, within(1e-9));
    assertThat(one(check, level(2)).clearanceM()).as("to be raised").isCloseTo(-0.6, within(1e-9));
    Leg falling = new Leg(Things.at(0, 0), 10, Things.at(20, 0), 0, Set.of());
    assertThat(one(check, falling).clearanceM())
        .as("4 m high over the far eave, straight down or aslant to the rim")
        .isBetween(1.2, 1.4);
    Leg into = new Leg(Things.at(0, 0), 5, Things.at(20, 0), 0, Set.of());
    assertThat(one(check, into).clearanceM()).as("2.0 m at 12 m").isCloseTo(-0.6, within(1e-9));
  }

  @Test
  void aFenceIsPassedOverItsTop() {
    Target fence =
        Things.target("F", Target.Kind.FENCE, Things.line(10, -5, 10, 5), 1.2, 0.5, false);
    assertThat(one(of(fence), level(1.5)).clearanceM()).isCloseTo(0.3, within(1e-9));
    assertThat(one(of(fence), level(1.0)).clearanceM()).isCloseTo(-0.2, within(1e-9));
  }

  @Test
  void carsRoadsAndPlacesOfPeopleAreNotRunOverAtAnyHeight() {
    for (Target.Kind kind :
        List.of(Target.Kind.CAR, Target.Kind.ROAD, Target.Kind.PLACE_OF_PEOPLE)) {
      assertThat(one(of(box(kind, -1)), level(30)).clearanceM())
          .as(kind.name())
          .isCloseTo(-1, within(0.01));
      assertThat(one(of(box(kind, 1)), level(30)).clearanceM())
          .as(kind.name())
          .isCloseTo(1, within(1e-9));
    }
  }

  @Test
  void whatTheLegEndsAtAndBuriedThingsAreLeftOut() {
    Target drive =
        Things.target(
            "drive", Target.Kind.ROAD, Things.polygon(18, -5, 25, -5, 25, 5, 18, 5), 0, 0, false);
    assertThat(of(drive).passing(level(2), 0.3, w -> 0)).isEmpty();
    assertThat(of(box(Target.Kind.STRUCTURE, -2)).passing(level(2, "box"), 0.3, w -> 0)).isEmpty();
    assertThat(of(box(Target.Kind.BURIED, -2)).passing(level(2), 0.3, w -> 0)).isEmpty();
  }

  @Test
  void theDemoCarIsAMetreBesideTheLineAndFoulsItWhenMovedAMetreWest() {
    Leg line = new Leg(Things.STUMP.at(), 10.5, Things.at(21.5, 66), 2.05, Set.of("T1", "V1"));
    assertThat(one(of(car(21.7)), line).clearanceM()).isCloseTo(1.0, within(0.01));
    assertThat(one(of(car(21.7)), line).clear()).isTrue();
    assertThat(one(of(car(20.7)), line).clear()).isFalse();
    assertThat(one(of(car(20.2)), line).clearanceM()).isNegative();
  }

  private static Target car(double west) {
    return Things.target(
        "C1",
        Target.Kind.CAR,
        Things.polygon(west, 55.2, west + 1.8, 55.2, west + 1.8, 59.8, west, 59.8),
        1.5,
        0,
        false);
  }

  private static LegCheck crown(double base) {
    Anchor tree =
        new Anchor.StandingTree(
            "A1",
            new Place(Things.at(10, 3), 0, Fix.TAPES, null),
            0.6,
            null,
            null,
            "white oak",
            0.62,
            19,
            base,
            2,
            Anchor.Soil.FREE_DRAINING_MINERAL,
            false,
            false,
            Anchor.Condition.SOUND,
            false);
    return new LegCheck(List.of(), List.of(tree), List.of());
  }

  @Test
  void aStandingCrownIsACylinder() {
    assertThat(one(crown(6), level(10)).clearanceM()).as("beside").isCloseTo(1, within(1e-6));
    assertThat(one(crown(6), level(5)).clearanceM())
        .as("below and beside")
        .isCloseTo(Math.hypot(1, 1), within(1e-6));
    Leg through = new Leg(Things.at(0, 3), 8, Things.at(20, 3), 8, Set.of());
    assertThat(one(crown(6), through).clearanceM())
        .as("2 m over the base")
        .isCloseTo(-2, within(1e-6));
  }

  @Test
  void aLegSlungToATreeBelowItsCrownIsLeftOutAndInItIsNot() {
    Leg below = new Leg(Things.at(-20, 3), 9, Things.at(10, 3), 0.6, Set.of("A1"));
    assertThat(crown(6).passing(below, 0.3, w -> 0)).isEmpty();
    assertThat(one(crown(0.3), below).clearanceM()).isNegative();
  }

  @Test
  void aWireKeepsItsApproachDistanceInSpace() {
    LegCheck check = new LegCheck(List.of(), List.of(), List.of(Things.wire(10, 0)));
    LegCheck.Passing p = one(check, level(2));
    assertThat(p.clearanceM()).as("crossing 7.5 m below").isCloseTo(7.5, within(1e-6));
    assertThat(p.place().eastM()).isCloseTo(10, within(1e-6));
    assertThat(p.askedM()).isCloseTo(3.25, within(1e-12));
  }

  @ParameterizedTest
  @ValueSource(longs = {1, 2, 3, 4, 5, 6})
  void piecesInSpaceAreAsFarApartAsTheirNearestPoints(long seed) {
    Random r = new Random(seed);
    for (int k = 0; k < 50; k++) {
      double[] c = r.doubles(12, -5, 5).toArray();
      Segment3 p = new Segment3(c[0], c[1], c[2], c[3], c[4], c[5]);
      Segment3 q = new Segment3(c[6], c[7], c[8], c[9], c[10], c[11]);
      double least = Double.POSITIVE_INFINITY;
      int n = 2000;
      for (int i = 0; i <= n; i++) {
        double[] at = p.at((double) i / n);
        least = Math.min(least, q.distanceTo(at[0], at[1], at[2]));
      }
      assertThat(p.distanceTo(q)).as("seed " + seed).isBetween(least - 0.01, least + 1e-9);
    }
  }
}
