package org.fallwright.core.raster;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.assertj.core.api.Assertions.within;

import java.util.List;
import java.util.Random;
import org.fallwright.core.site.Position;
import org.junit.jupiter.api.Test;
import org.locationtech.jts.geom.Coordinate;
import org.locationtech.jts.geom.LineString;

class ContourLinesTest {
  private static final Position AT = new Position(100, -50);

  @Test
  void aPlaneGivesOneStraightLine() {
    Raster plane = raster(5, 4, p -> 2 * p.eastM());
    List<LineString> lines = ContourLines.of(plane, 2 * 101.25);
    assertThat(lines).hasSize(1);
    assertThat(lines.get(0).toText())
        .isIn(
            "LINESTRING (101.25 -50, 101.25 -49, 101.25 -48, 101.25 -47)",
            "LINESTRING (101.25 -47, 101.25 -48, 101.25 -49, 101.25 -50)");
  }

  @Test
  void aHillGivesAClosedRingOfItsRadius() {
    Raster hill = raster(41, 41, p -> Math.hypot(p.eastM() - 120, p.northM() + 30));
    List<LineString> lines = ContourLines.of(hill, 12.3);
    assertThat(lines).hasSize(1);
    assertThat(lines.get(0).isClosed()).isTrue();
    for (Coordinate c : lines.get(0).getCoordinates()) {
      assertThat(Math.hypot(c.x - 120, c.y + 30)).isCloseTo(12.3, within(0.02));
    }
    assertThat(lines.get(0).getLength()).isCloseTo(2 * Math.PI * 12.3, within(0.2));
  }

  @Test
  void aSaddleIsCutTheWayItsMiddleSays() {
    // above in the south-west and north-east; the mean lies above 0.4 and below 0.6
    double[] corners = {1, 0, 0, 1};
    Raster saddle = new Raster(AT, 1, 2, 2, i -> corners[i]);
    assertThat(ContourLines.of(saddle, 0.4))
        .extracting(l -> l.getCentroid().getY() < -49.5 == l.getCentroid().getX() > 100.5)
        .containsExactly(true, true);
    assertThat(ContourLines.of(saddle, 0.6))
        .extracting(l -> l.getCentroid().getY() < -49.5 == l.getCentroid().getX() < 100.5)
        .containsExactly(true, true);
  }

  @Test
  void linesEndWhereTheFigureDoes() {
    Raster holed =
        raster(9, 9, p -> p.eastM() == 104 && p.northM() == -46 ? Double.NaN : p.northM());
    List<LineString> lines = ContourLines.of(holed, -45.5);
    assertThat(lines).hasSize(2);
    assertThat(lines).allSatisfy(l -> assertThat(l.getLength()).isCloseTo(3, within(1e-9)));
  }

  @Test
  void everyLineLiesBetweenAboveAndBelow() {
    long seed = 77;
    Random random = new Random(seed);
    double[] figures = random.doubles(20 * 30).toArray();
    Raster noise = new Raster(AT, 0.5, 20, 30, i -> figures[i]);
    double length = 0;
    for (LineString l : ContourLines.of(noise, 0.5)) {
      length += l.getLength();
      for (Coordinate c : l.getCoordinates()) {
        double e = (c.x - 100) / 0.5;
        double n = (c.y + 50) / 0.5;
        int c0 = (int) Math.floor(e + 1e-9);
        int r0 = (int) Math.floor(n + 1e-9);
        int c1 = Math.min(19, (int) Math.ceil(e - 1e-9));
        int r1 = Math.min(29, (int) Math.ceil(n - 1e-9));
        double a = noise.at(c0, r0);
        double b = noise.at(c1, r1);
        assertThat((a - 0.5) * (b - 0.5)).as("seed %d at %s", seed, c).isLessThanOrEqualTo(0);
      }
    }
    assertThat(length).as("seed " + seed).isGreaterThan(50);
  }

  @Test
  void aRasterOfMoreCellsThanItHoldsIsRefused() {
    assertThatThrownBy(() -> new Raster(AT, 1, 3000, 3000, i -> 0))
        .hasMessageContaining("cells is 9000000")
        .hasMessageContaining("4000000");
  }

  private interface Figure {
    double at(Position p);
  }

  private static Raster raster(int columns, int rows, Figure figure) {
    return new Raster(AT, 1, columns, rows, i -> figure.at(Raster.middle(AT, 1, columns, i)));
  }
}
