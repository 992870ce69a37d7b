package org.fallwright.core.zones;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.ArrayList;
import java.util.List;
import java.util.Set;
import org.fallwright.core.site.Position;
import org.fallwright.core.site.Target;
import org.junit.jupiter.api.Test;

class EscapeRoutesTest {
  private static final Position STUMP = Things.at(0, 0);

  private static EscapeRoutes.Zones zones(
      FallOutline tree, double lay, double back, Position... line) {
    List<Position> path = List.of(line);
    List<Leg> legs = new ArrayList<>();
    for (int i = 1; i < path.size(); i++) {
      legs.add(new Leg(path.get(i - 1), 1, path.get(i), 1, Set.of()));
    }
    return new EscapeRoutes.Zones(
        FallFootprint.of(tree, STUMP, lay, 0, 0),
        SitBackZone.of(STUMP, back, tree.heightM()),
        Bight.along(path),
        new Recoil(path),
        legs);
  }

  private static List<Double> bearings(List<Position> ends) {
    return ends.stream().map(STUMP::azimuthTo).sorted().toList();
  }

  /** 45 degrees off the line opposite the fall, US training glossary; 25 ft, OAR 437-007-0810. */
  @Test
  void whereTheSitBackZoneIsShortTheWaysRunAtTheUsualAngle() {
    FallOutline sapling = new FallOutline(2, 1, 0.4, 0.1, 2, 0);
    EscapeRoutes open = new EscapeRoutes(List.of());
    double[][] expected = {{90, 225, 315}, {350, 125, 215}, {30, 165, 255}};
    for (double[] e : expected) {
      EscapeRoutes.Zones z = zones(sapling, e[0], (e[0] + 180) % 360, STUMP, STUMP.along(e[0], 3));
      List<Position> ends = open.ends(z, 9, 2);
      List<Double> found = bearings(ends);
      assertThat(found).hasSize(2);
      assertThat(found.get(0)).isCloseTo(e[1], within(1e-6));
      assertThat(found.get(1)).isCloseTo(e[2], within(1e-6));
      assertThat(STUMP.distanceTo(ends.get(0))).isCloseTo(9, within(1e-9));
    }
  }

  @Test
  void aTallBackLeanerTurnsTheWaysOutOfItsSitBackZone() {
    FallOutline tree = new FallOutline(18, 6, 4, 0.5, 5, 180);
    EscapeRoutes.Zones z = zones(tree, 0, 180, STUMP, Things.at(0, 40));
    List<Position> ends = new EscapeRoutes(List.of()).ends(z, 7.62, 18);
    assertThat(ends).hasSize(2);
    for (Position end : ends) {
      assertThat(z.sitBack().distanceTo(end)).isGreaterThan(3);
      assertThat(z.footprint().contains(end)).isFalse();
      assertThat(STUMP.distanceTo(end)).isCloseTo(7.62, within(1e-9));
    }
  }

  @Test
  void aWallToOneSideLeavesTheOther() {
    FallOutline tree = new FallOutline(18, 6, 4, 0.5, 5, 180);
    EscapeRoutes.Zones z = zones(tree, 0, 180, STUMP, Things.at(0, 40));
    Target wall =
        Things.target("w", Target.Kind.FENCE, Things.line(4, -60, 4, 60), 1.2, 0.5, false);
    List<Position> ends = new EscapeRoutes(List.of(wall)).ends(z, 7.62, 18);
    assertThat(ends).hasSize(1);
    assertThat(ends.get(0).eastM()).isNegative();
    Target other =
        Things.target("x", Target.Kind.FENCE, Things.line(-4, -60, -4, 60), 1.2, 0.5, false);
    assertThat(new EscapeRoutes(List.of(wall, other)).ends(z, 7.62, 18)).isEmpty();
  }

  @Test
  void nobodyRunsIntoTheBight() {
    FallOutline tree = new FallOutline(18, 6, 4, 0.5, 5, 180);
    EscapeRoutes.Zones z = zones(tree, 0, 180, STUMP, Things.at(0, 40), Things.at(40, -5));
    List<Position> ends = new EscapeRoutes(List.of()).ends(z, 7.62, 18);
    assertThat(ends).isNotEmpty();
    for (Position end : ends) {
      assertThat(z.bights().get(0).contains(end)).isFalse();
      assertThat(z.recoil().contains(end)).isFalse();
    }
    assertThat(ends.get(0).eastM()).as("away from the bight").isNegative();
  }

  @Test
  void grassAndBuriedThingsDoNotBlockAWay() {
    FallOutline tree = new FallOutline(18, 6, 4, 0.5, 5, 180);
    EscapeRoutes.Zones z = zones(tree, 0, 180, STUMP, Things.at(0, 40));
    List<Target> around =
        List.of(
            Things.target(
                "septic",
                Target.Kind.BURIED,
                Things.polygon(2, -9, 20, -9, 20, 9, 2, 9),
                0,
                0,
                false),
            Things.target(
                "bed",
                Target.Kind.PLANTING,
                Things.polygon(-20, -9, -2, -9, -2, 9, -20, 9),
                0.3,
                0,
                true));
    assertThat(new EscapeRoutes(around).ends(z, 7.62, 18))
        .isEqualTo(new EscapeRoutes(List.of()).ends(z, 7.62, 18));
  }
}
