package org.fallwright.maps.frame;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.assertj.core.api.Assertions.within;

import java.util.Random;
import org.fallwright.core.site.Origin;
import org.fallwright.core.site.Position;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

class SiteFrameTest {
  @ParameterizedTest
  @CsvSource({"0, 0", "37.2, -80.5", "45, -40", "60, 24.9", "-45, 179.9999", "84, 10", "-84, -180"})
  void thereAndBackIsTheSamePoint(double lat, double lon) {
    SiteFrame frame = new SiteFrame(new Origin(lat, lon));
    long seed = 4711;
    Random random = new Random(seed);
    for (int i = 0; i < 500; i++) {
      Position p =
          new Position(
              Position.FARTHEST * (2 * random.nextDouble() - 1),
              Position.FARTHEST * (2 * random.nextDouble() - 1));
      Position back = frame.toPlane(frame.toEarth(p));
      assertThat(back.distanceTo(p)).as("seed %d, point %d: %s", seed, i, p).isLessThan(1e-6);
    }
  }

  @Test
  void theOriginIsNoughtAndNorthIsUp() {
    SiteFrame frame = new SiteFrame(new Origin(45, -40));
    Position origin = frame.toPlane(45, -40);
    assertThat(origin.eastM()).isCloseTo(0, within(1e-9));
    assertThat(origin.northM()).isCloseTo(0, within(1e-9));
    assertThat(frame.toPlane(45.0001, -40).northM()).isBetween(11.0, 11.2);
    assertThat(frame.toPlane(45, -39.9999).eastM()).isBetween(7.8, 8.0);
  }

  @Test
  void aSiteOnTheDateLineIsOnePiece() {
    SiteFrame frame = new SiteFrame(new Origin(10, 179.9999));
    Position east = frame.toPlane(10, -179.9999);
    assertThat(east.eastM()).isBetween(21.0, 22.5);
    assertThat(frame.toEarth(east).lonDeg()).isCloseTo(-179.9999, within(1e-9));
  }

  @Test
  void whatIsTooFarIsRefusedInASentence() {
    SiteFrame frame = new SiteFrame(new Origin(45, -40));
    assertThatThrownBy(() -> frame.toPlane(46, -40))
        .isInstanceOf(IllegalArgumentException.class)
        .hasMessageContaining("north is 111")
        .hasMessageContaining("-5000 to 5000 m");
    assertThatThrownBy(() -> frame.toPlane(91, -40)).hasMessageContaining("lat_deg is 91");
    assertThatThrownBy(() -> frame.toPlane(Double.NaN, -40)).hasMessageContaining("not a number");
    assertThatThrownBy(() -> frame.toPlane(0, 140)).isInstanceOf(IllegalArgumentException.class);
  }
}
