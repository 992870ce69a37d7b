package org.fallwright.core.zones;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.List;
import java.util.Optional;
import org.fallwright.core.site.Position;
import org.fallwright.core.site.Target;
import org.fallwright.core.site.Wire;
import org.junit.jupiter.api.Test;

/** Places of the crew, bridles, recoil and machines. */
class CrewZonesTest {
  private static final Position STUMP = Things.at(0, 0);
  private static final FallOutline TREE = new FallOutline(18, 6, 4, 0.5, 5, 180);

  private static EscapeRoutes.Zones zones(double lay, Position... path) {
    List<Position> points = List.of(path);
    return new EscapeRoutes.Zones(
        FallFootprint.of(TREE, STUMP, lay, 0, 0),
        SitBackZone.of(STUMP, (lay + 180) % 360, 18),
        Bight.along(points),
        new Recoil(points),
        List.of());
  }

  @Test
  void theWinchStandsBeforeItsAnchorAndItsOperatorOutsideTheAngle() {
    // tree at the origin, block 30 m north, anchor 20 m west of the block
    List<Position> path = List.of(STUMP, Things.at(0, 30), Things.at(-20, 30));
    OperatorStand s = OperatorStand.besideWinch(path, 2, 1);
    assertThat(s.at().eastM()).isCloseTo(-18, within(1e-9));
    assertThat(s.at().northM()).as("north, for the tree is south").isCloseTo(31, within(1e-9));
    assertThat(s.shelter()).isEqualTo(OperatorStand.Shelter.OFF_AXIS);
    OperatorStand direct = OperatorStand.besideWinch(List.of(STUMP, Things.at(0, 30)), 2, 5);
    assertThat(direct.at().northM()).isCloseTo(28, within(1e-9));
    assertThat(Math.abs(direct.at().eastM())).isCloseTo(5, within(1e-9));
    // at most half way to the next point
    assertThat(OperatorStand.besideWinch(List.of(STUMP, Things.at(0, 2)), 2, 0).at().northM())
        .isCloseTo(1, within(1e-9));
  }

  @Test
  void theLookOutStandsSquareToTheLayOutsideTheRing() {
    EscapeRoutes.Zones z = zones(0, STUMP, Things.at(0, 40));
    Position p = new LookOut(List.of()).find(z, 36, Things.at(1, 38)).orElseThrow();
    assertThat(STUMP.distanceTo(p)).isCloseTo(37, within(1e-9));
    assertThat(STUMP.azimuthTo(p)).isCloseTo(90, within(1e-9));
  }

  @Test
  void aBuildingInTheSightMovesTheLookOutAndOneAllRoundLeavesNone() {
    EscapeRoutes.Zones z = zones(0, STUMP, Things.at(0, 40));
    Target barn = Things.target("Barn", Things.polygon(10, -3, 14, -3, 14, 3, 10, 3), 1.5);
    Position p = new LookOut(List.of(barn)).find(z, 36, null).orElseThrow();
    assertThat(STUMP.azimuthTo(p)).isNotCloseTo(90, within(1e-9));
    Target ring =
        Things.target(
            "Wall",
            Target.Kind.STRUCTURE,
            Things.line(-9, -9, 9, -9, 9, 9, -9, 9, -9, -9),
            2,
            0,
            false);
    assertThat(new LookOut(List.of(ring)).find(z, 36, null)).isEqualTo(Optional.empty());
  }

  @Test
  void theLegsOfATwoLeggedAnchorHaveAnAngleAndRecoilOfTheirOwn() {
    List<Position> line = List.of(STUMP, Things.at(0, 30));
    List<Position> bridle = List.of(Things.at(-8, 40), Things.at(0, 30), Things.at(8, 40));
    Bight inside = Bight.along(bridle).get(0);
    assertThat(inside.contains(Things.at(0, 36))).isTrue();
    assertThat(inside.contains(Things.at(0, 46))).as("5 m past the far side").isFalse();
    assertThat(new Recoil(line).contains(Things.at(-12, 45))).isFalse();
    assertThat(new Recoil(line, List.of(bridle)).contains(Things.at(-12, 45))).isTrue();
    assertThat(new Recoil(line, List.of(bridle)).onLastLeg(Things.at(0, 20)))
        .as("the last leg is the line's")
        .isTrue();
    assertThat(new Recoil(line, List.of(bridle)).onLastLeg(Things.at(-12, 45))).isFalse();
  }

  @Test
  void aMachineReachesThreeMetresTowardsAWire() {
    Wire w = Things.wire(10, 0);
    LegCheck check = new LegCheck(List.of(), List.of(), List.of(w));
    LegCheck.Passing near = check.machine(Things.STUMP, 3, x -> 3.048).get(0);
    // stump at E 16, wire at E 10 and 9.5 m up: 3 m up, 6 m aside
    assertThat(near.clearanceM()).isCloseTo(Math.hypot(6, 6.5) - 3, within(1e-6));
    assertThat(near.askedM()).isCloseTo(3.048 + 0.2 + 0.2, within(1e-9));
  }

  @Test
  void aSaggingWireMaySwingTowardsLegAndTree() {
    assertThat(WireCheck.swingM(Things.wire(10, 0))).isZero();
    assertThat(WireCheck.swingM(Things.wire(10, 2))).isCloseTo(Math.sqrt(2), within(1e-9));
  }
}
