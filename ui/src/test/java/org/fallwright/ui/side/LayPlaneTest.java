package org.fallwright.ui.side;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.List;
import org.fallwright.core.site.Position;
import org.fallwright.core.site.Site;
import org.fallwright.ui.demo.DemoSite;
import org.junit.jupiter.api.Test;

class LayPlaneTest {
  private final Site site = DemoSite.asItIs().site();

  @Test
  void distancesRunAlongTheLayFromTheStumpAndToItsRight() {
    LayPlane east = new LayPlane(site, 90);
    assertThat(east.s(new Position(26, 20))).isCloseTo(10, within(1e-9));
    assertThat(east.r(new Position(26, 20)))
        .as("south of a lay to the east")
        .isCloseTo(4, within(1e-9));
  }

  @Test
  void aWireIsMetAtItsSagThere() {
    // the poles at N -5, 45 and 95; a lay due east crosses 29 m along the first span of 50 m
    LayPlane.Crossing c = new LayPlane(site, 90).wires(-20, 40).get(0);
    assertThat(c.s()).isCloseTo(26.5, within(1e-9));
    double t = 29.0 / 50;
    assertThat(c.z()).isCloseTo(9.5 - 4 * 0.8 * t * (1 - t), within(1e-9));
  }

  @Test
  void aWireThatRunsAlongTheLayIsNotMet() {
    assertThat(new LayPlane(site, 0).wires(-100, 100)).isEmpty();
  }

  @Test
  void theGroundIsStraightBetweenKnownHeightsAndLevelBeyond() {
    LayPlane north = new LayPlane(site, 0);
    assertThat(north.groundAt(0)).isZero();
    assertThat(north.groundAt(29)).as("at A1").isCloseTo(0.9, within(1e-9));
    assertThat(north.groundAt(14.5)).isCloseTo(0.45, within(1e-9));
    assertThat(north.groundAt(-30)).isZero();
    assertThat(north.groundAt(500)).isEqualTo(north.groundAt(100));
  }

  @Test
  void theHouseStandsBehindTheStumpAndTheShedAsideTheLay() {
    List<LayPlane.Standing> north = new LayPlane(site, 0).targets(-25, 25, 4.5);
    LayPlane.Standing house =
        north.stream().filter(t -> t.target().id().equals("House")).findFirst().orElseThrow();
    assertThat(house.to()).isCloseTo(-8.5, within(1e-6));
    assertThat(house.aside()).isZero();
    assertThat(north).noneMatch(t -> t.target().id().equals("Shed"));
    LayPlane.Standing shed =
        new LayPlane(site, 30)
            .targets(0, 25, 4.5).stream()
                .filter(t -> t.target().id().equals("Shed"))
                .findFirst()
                .orElseThrow();
    assertThat(shed.aside()).isBetween(2.0, 4.5);
  }
}
