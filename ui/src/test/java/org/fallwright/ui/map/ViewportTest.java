package org.fallwright.ui.map;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.assertj.core.api.Assertions.within;

import java.awt.geom.AffineTransform;
import java.awt.geom.Point2D;
import java.awt.geom.Rectangle2D;
import java.util.Random;
import org.fallwright.core.site.Position;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;
import org.locationtech.jts.geom.Envelope;

class ViewportTest {
  private static final Rectangle2D FRAME = new Rectangle2D.Double(10, 20, 400, 200);

  @Test
  void northIsUpAndEastIsToTheRight() {
    Viewport v = Viewport.centred(new Position(16, 24), 2, 0, FRAME);
    assertPoint(v.toPixel(16, 24), 210, 120);
    assertPoint(v.toPixel(26, 24), 230, 120);
    assertPoint(v.toPixel(16, 34), 210, 100);
    assertThat(v.pixels(3)).isCloseTo(6, within(1e-12));
  }

  @Test
  void aTurnedViewHasItsAzimuthUp() {
    Viewport v = Viewport.centred(new Position(0, 0), 1, 90, FRAME);
    assertPoint(v.toPixel(10, 0), 210, 110);
    assertPoint(v.toPixel(0, 10), 200, 120);
    assertPoint(v.direction(90), 0, -1);
  }

  @Test
  void paperIsTrueToScale() {
    Viewport v = Viewport.onPaper(new Position(0, 0), 200, 30, FRAME);
    // 20 m at 1:200 are 100 mm, 283.46 points
    assertThat(v.pixels(20)).isCloseTo(283.4646, within(1e-3));
    assertThat(v.toPixel(0, 0).distance(v.toPixel(20, 0))).isCloseTo(283.4646, within(1e-3));
    assertThat(v.paperScale()).isCloseTo(200, within(1e-9));
  }

  @ParameterizedTest
  @ValueSource(longs = {1, 2, 3, 4, 5, 6, 7, 8})
  void pixelsAndMetresAreInverse(long seed) {
    Random r = new Random(seed);
    Viewport v =
        Viewport.centred(
            new Position(r.nextDouble() * 100, r.nextDouble() * 100),
            0.1 + 20 * r.nextDouble(),
            360 * r.nextDouble(),
            FRAME);
    double e = 200 * r.nextDouble() - 100;
    double n = 200 * r.nextDouble() - 100;
    Point2D back = v.toMetres(v.toPixel(e, n));
    assertThat(back.distance(e, n)).as("seed " + seed).isLessThan(1e-9);
  }

  @ParameterizedTest
  @ValueSource(doubles = {0, 30, 90, 135, 271})
  void aFittingViewShowsAllOfTheArea(double up) {
    Envelope area = new Envelope(-14, 42, -5, 95);
    Viewport v = Viewport.fitting(area, up, FRAME);
    Rectangle2D seen = new Rectangle2D.Double(9.99, 19.99, 400.02, 200.02);
    for (double e : new double[] {-14, 42}) {
      for (double n : new double[] {-5, 95}) {
        assertThat(seen.contains(v.toPixel(e, n))).as(up + " " + e + " " + n).isTrue();
      }
    }
  }

  @Test
  void threeKnownPointsGiveTheViewEvenWhereEastAndNorthDiffer() {
    Viewport v =
        Viewport.through(
            new Point2D.Double(50, 60),
            new Point2D.Double(150, 60),
            new Point2D.Double(50, -41),
            100,
            FRAME);
    assertPoint(v.toPixel(50, 50), 100, 9.5);
  }

  @Test
  void aViewThatShowsNoAreaIsRefused() {
    assertThatThrownBy(() -> new Viewport(new AffineTransform(1, 0, 2, 0, 0, 0), FRAME))
        .isInstanceOf(IllegalArgumentException.class);
    assertThatThrownBy(() -> Viewport.onPaper(new Position(0, 0), 0, 0, FRAME))
        .hasMessageContaining("scale");
  }

  private static void assertPoint(Point2D p, double x, double y) {
    assertThat(p.distance(x, y)).as(p + " is " + x + ", " + y).isLessThan(1e-9);
  }
}
