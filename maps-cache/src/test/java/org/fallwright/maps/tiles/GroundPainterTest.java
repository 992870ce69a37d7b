package org.fallwright.maps.tiles;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.assertj.core.api.Assertions.within;

import java.awt.Color;
import java.awt.Graphics2D;
import java.awt.geom.AffineTransform;
import java.awt.geom.Point2D;
import java.awt.geom.Rectangle2D;
import java.awt.image.BufferedImage;
import java.io.IOException;
import java.util.Random;
import org.fallwright.core.site.Origin;
import org.fallwright.maps.frame.LatLon;
import org.fallwright.maps.frame.SiteFrame;
import org.fallwright.maps.frame.WebMercator;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

class GroundPainterTest {
  private static final Rectangle2D AREA = new Rectangle2D.Double(-60, -50, 130, 110);

  @ParameterizedTest
  @CsvSource({"0, 0", "37.2, -80.5", "45, -40", "60, 24.9", "-60, 179.999"})
  void everyPointOfATileIsWithinFiveCentimetresOfItsPlace(double lat, double lon) {
    SiteFrame frame = new SiteFrame(new Origin(lat, lon));
    for (int zoom = 16; zoom <= WebMercator.DEEPEST; zoom++) {
      // the tile under a point 500 m north-east of the origin
      LatLon far = frame.toEarth(350, 350);
      int x = (int) (WebMercator.pixelX(far.lonDeg(), zoom) / 256);
      int y = (int) (WebMercator.pixelY(far.latDeg(), zoom) / 256);
      AffineTransform laid = GroundPainter.tileToPlane(frame, zoom, x, y);
      for (int i = 0; i <= 256; i += 64) {
        for (int j = 0; j <= 256; j += 64) {
          Point2D drawn = laid.transform(new Point2D.Double(i, j), null);
          LatLon place = WebMercator.place(x * 256.0 + i, y * 256.0 + j, zoom);
          assertThat(drawn.distance(frame.toPlanePoint(place)))
              .as("zoom %d, pixel %d %d", zoom, i, j)
              .isLessThan(0.05);
        }
      }
    }
  }

  /** The corner where four tiles of four colours meet is drawn where the frame says it lies. */
  @ParameterizedTest
  @CsvSource({"45, -40, 0", "45, -40, 37", "60, 24.9, 200", "-33.9, 179.9999, 90"})
  void theGroundIsDrawnInItsPlaceWhicheverWayThePlanIsTurned(double lat, double lon, double turn)
      throws IOException {
    SiteFrame frame = new SiteFrame(new Origin(lat, lon));
    int zoom = 19;
    int across = WebMercator.tilesAcross(zoom);
    int x = (int) Math.round(WebMercator.pixelX(lon, zoom) / 256);
    int y = (int) Math.round(WebMercator.pixelY(lat, zoom) / 256);
    Painted store = new Painted(zoom, zoom);
    Color[] colours = {Color.RED, Color.GREEN, Color.BLUE, Color.YELLOW};
    for (int dx = -3; dx < 3; dx++) {
      for (int dy = -3; dy < 3; dy++) {
        Color c = colours[(dx < 0 ? 0 : 1) + (dy < 0 ? 0 : 2)];
        store.with(zoom, Math.floorMod(x + dx, across), y + dy, Painted.plain(c));
      }
    }
    Point2D corner =
        frame.toPlanePoint(WebMercator.place(Math.floorMod(x, across) * 256.0, y * 256.0, zoom));

    double perMetre = 4;
    AffineTransform planeToUser = AffineTransform.getTranslateInstance(300, 300);
    planeToUser.rotate(Math.toRadians(turn));
    planeToUser.scale(perMetre, -perMetre);
    planeToUser.translate(-corner.getX(), -corner.getY());
    BufferedImage image = new BufferedImage(600, 600, BufferedImage.TYPE_INT_RGB);
    Graphics2D g = image.createGraphics();
    g.setColor(Color.MAGENTA);
    g.fillRect(0, 0, 600, 600);
    GroundPainter.Drawn drawn =
        new GroundPainter(store, frame)
            .paint(
                g,
                planeToUser,
                new Rectangle2D.Double(corner.getX() - 40, corner.getY() - 40, 80, 80));
    g.dispose();

    assertThat(drawn.tiles()).isGreaterThanOrEqualTo(4);
    double[][] offsets = {{-0.75, 0.75}, {0.75, 0.75}, {-0.75, -0.75}, {0.75, -0.75}};
    for (int i = 0; i < 4; i++) {
      Point2D p =
          planeToUser.transform(
              new Point2D.Double(corner.getX() + offsets[i][0], corner.getY() + offsets[i][1]),
              null);
      assertThat(new Color(image.getRGB((int) p.getX(), (int) p.getY())))
          .as("quarter %d", i)
          .isEqualTo(colours[i]);
    }
    int gaps = 0;
    for (int i = 200; i < 400; i++) {
      for (int j = 200; j < 400; j++) {
        gaps += image.getRGB(i, j) == Color.MAGENTA.getRGB() ? 1 : 0;
      }
    }
    assertThat(gaps).as("pixels between tiles left bare").isZero();
    Point2D beyond =
        planeToUser.transform(new Point2D.Double(corner.getX() + 42, corner.getY()), null);
    assertThat(image.getRGB((int) beyond.getX(), (int) beyond.getY()))
        .as("outside the rectangle")
        .isEqualTo(Color.MAGENTA.getRGB());
  }

  @Test
  void tilesLeaveNoBareLineBetweenThem() throws IOException {
    SiteFrame frame = new SiteFrame(new Origin(45, -40));
    GroundPainter painter = new GroundPainter(world(frame, 18, 20), frame);
    long seed = 77;
    Random random = new Random(seed);
    for (int i = 0; i < 40; i++) {
      double turn = i % 2 == 0 ? 0 : 2 * Math.PI * random.nextDouble();
      double metresPerPixel = 0.08 + 0.3 * random.nextDouble();
      AffineTransform planeToUser = AffineTransform.getTranslateInstance(150, 150);
      planeToUser.rotate(turn);
      planeToUser.scale(1 / metresPerPixel, -1 / metresPerPixel);
      BufferedImage image = new BufferedImage(300, 300, BufferedImage.TYPE_INT_RGB);
      Graphics2D g = image.createGraphics();
      g.setColor(Color.MAGENTA);
      g.fillRect(0, 0, 300, 300);
      painter.paint(g, planeToUser, new Rectangle2D.Double(-20, -20, 40, 40));
      g.dispose();
      int bare = 0;
      int half = (int) (12 / metresPerPixel);
      for (int x = Math.max(0, 150 - half); x < Math.min(300, 150 + half); x++) {
        for (int y = Math.max(0, 150 - half); y < Math.min(300, 150 + half); y++) {
          bare += image.getRGB(x, y) == Color.MAGENTA.getRGB() ? 1 : 0;
        }
      }
      assertThat(bare).as("seed %d, drawing %d", seed, i).isZero();
    }
  }

  @Test
  void theZoomFollowsTheScaleAndBlurIsTold() throws IOException {
    SiteFrame frame = new SiteFrame(new Origin(45, -40));
    Painted store = world(frame, 16, 19);
    GroundPainter painter = new GroundPainter(store, frame);

    GroundPainter.Drawn coarse = painted(painter, 1.6);
    assertThat(coarse.sourceMetresPerPixel()).isCloseTo(1.689, within(0.001));
    assertThat(coarse.blurred()).isFalse();
    GroundPainter.Drawn finest = painted(painter, 0.2);
    assertThat(finest.sourceMetresPerPixel()).isCloseTo(0.2111, within(0.0001));
    assertThat(finest.blurred()).isFalse();
    GroundPainter.Drawn enlarged = painted(painter, 0.05);
    assertThat(enlarged.sourceMetresPerPixel()).isCloseTo(0.2111, within(0.0001));
    assertThat(enlarged.blurred()).isTrue();
    GroundPainter.Drawn tooCoarse = painted(painter, 100);
    assertThat(tooCoarse.tiles()).isZero();
  }

  @Test
  void bareGroundIsWhiteAndNothingIsClaimed() throws IOException {
    SiteFrame frame = new SiteFrame(new Origin(45, -40));
    GroundPainter painter = new GroundPainter(new Painted(16, 19), frame);
    BufferedImage image = painter.picture(AREA, 0.5);
    assertThat(image.getWidth()).isEqualTo(260);
    assertThat(image.getHeight()).isEqualTo(220);
    assertThat(image.getRGB(100, 100)).isEqualTo(Color.WHITE.getRGB());
    GroundPainter.Drawn drawn = painted(painter, 0.2);
    assertThat(drawn).isEqualTo(new GroundPainter.Drawn(0, false, 0));
  }

  @Test
  void aPictureTooLargeIsRefused() {
    GroundPainter painter =
        new GroundPainter(new Painted(16, 19), new SiteFrame(new Origin(45, -40)));
    assertThatThrownBy(() -> painter.picture(AREA, 0.001))
        .hasMessageContaining("pixels of the picture");
  }

  private static GroundPainter.Drawn painted(GroundPainter painter, double metresPerPixel)
      throws IOException {
    BufferedImage image = new BufferedImage(40, 40, BufferedImage.TYPE_INT_RGB);
    Graphics2D g = image.createGraphics();
    AffineTransform planeToUser = AffineTransform.getTranslateInstance(20, 20);
    planeToUser.scale(1 / metresPerPixel, -1 / metresPerPixel);
    double half = 20 * metresPerPixel;
    GroundPainter.Drawn drawn =
        painter.paint(g, planeToUser, new Rectangle2D.Double(-half, -half, 2 * half, 2 * half));
    g.dispose();
    return drawn;
  }

  private static Painted world(SiteFrame frame, int minZoom, int maxZoom) {
    Painted store = new Painted(minZoom, maxZoom);
    for (int zoom = minZoom; zoom <= maxZoom; zoom++) {
      int x = (int) (WebMercator.pixelX(frame.origin().lonDeg(), zoom) / 256);
      int y = (int) (WebMercator.pixelY(frame.origin().latDeg(), zoom) / 256);
      for (int dx = -1; dx <= 1; dx++) {
        for (int dy = -1; dy <= 1; dy++) {
          store.with(zoom, x + dx, y + dy, Painted.quarters());
        }
      }
    }
    return store;
  }
}
