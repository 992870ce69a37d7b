package org.fallwright.core.zones;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.Random;
import org.fallwright.core.site.Shape;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;
import org.locationtech.jts.geom.Coordinate;

class DepthTest {
  private static final Edges TEN = new Edges(Things.polygon(0, 0, 10, 0, 10, 10, 0, 10).geometry());

  private static double inside(Shape thing) {
    return Depth.inside(new Edges(thing.geometry()), TEN).depthM();
  }

  private static double outside(Shape thing) {
    return Depth.outside(new Edges(thing.geometry()), TEN).depthM();
  }

  @Test
  void aThingThatReachesInIsAsDeepAsItsDeepestPoint() {
    assertThat(inside(Things.polygon(-5, 4, 2, 4, 2, 6, -5, 6))).isCloseTo(2, within(0.01));
    assertThat(inside(Things.line(-5, 5, 3, 5))).isCloseTo(3, within(0.01));
  }

  @Test
  void aThingThatCoversTheMiddleHasTheInscribedCirclesDepth() {
    assertThat(inside(Things.polygon(-5, -5, 15, -5, 15, 15, -5, 15))).isCloseTo(5, within(0.01));
    assertThat(inside(Things.line(5, -5, 5, 15))).isCloseTo(5, within(0.01));
    assertThat(inside(Things.polygon(3, 3, 6, 3, 6, 6, 3, 6))).isCloseTo(5, within(0.01));
  }

  @Test
  void aThingApartHasNone() {
    Depth.Deepest none =
        Depth.inside(new Edges(Things.polygon(12, 0, 14, 0, 14, 3).geometry()), TEN);
    assertThat(none.depthM()).isZero();
    assertThat(none.at()).isNull();
  }

  @Test
  void sticksOutAsFarAsItsFarthestPoint() {
    assertThat(outside(Things.polygon(5, 4, 13, 4, 13, 6, 5, 6))).isCloseTo(3, within(0.01));
    assertThat(outside(Things.polygon(9, 9, 13, 9, 13, 14, 9, 14))).isCloseTo(5, within(0.01));
    assertThat(outside(Things.polygon(1, 1, 2, 1, 2, 2))).isZero();
  }

  @ParameterizedTest
  @ValueSource(longs = {1, 2, 3, 4, 5, 6, 7, 8, 9, 10, 11, 12})
  void agreesWithAFineGrid(long seed) {
    Random r = new Random(seed);
    FallFootprint f =
        FallFootprint.of(Things.OAK, Things.at(0, 0), 360 * r.nextDouble(), r.nextDouble(), 0);
    double x = 20 * r.nextDouble() - 10;
    double y = 20 * r.nextDouble() - 10;
    double w = 1 + 10 * r.nextDouble();
    Edges box = new Edges(Things.polygon(x, y, x + w, y, x + w, y + w, x, y + w).geometry());
    double most = 0;
    int n = 300;
    for (int i = 0; i <= n; i++) {
      for (int j = 0; j <= n; j++) {
        Coordinate c = new Coordinate(x + w * i / n, y + w * j / n);
        if (f.edges().contains(c)) {
          most = Math.max(most, f.edges().toEdge(c));
        }
      }
    }
    double found = Depth.inside(box, f.edges()).depthM();
    // A point of the grid lies within w / n of every point of the box.
    assertThat(found).as("seed " + seed).isBetween(most - 0.011, most + w / n);
  }
}
