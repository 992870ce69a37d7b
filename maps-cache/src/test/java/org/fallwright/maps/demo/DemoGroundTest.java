package org.fallwright.maps.demo;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.awt.Color;
import java.awt.geom.Rectangle2D;
import java.awt.image.BufferedImage;
import java.io.ByteArrayInputStream;
import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import javax.imageio.ImageIO;
import org.fallwright.core.site.Position;
import org.fallwright.maps.frame.LatLon;
import org.fallwright.maps.frame.SiteFrame;
import org.fallwright.maps.frame.WebMercator;
import org.fallwright.maps.tiles.GroundPainter;
import org.fallwright.maps.tiles.MbTiles;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/** The base map that goes out with the program. */
class DemoGroundTest {
  private static final Path FILE = Path.of("basemaps/oak-behind-the-house.mbtiles");

  private final SiteFrame frame = new SiteFrame(DemoGround.ORIGIN);

  @Test
  void itIsSmallAndSaysWhatItIs() throws IOException {
    assertThat(Files.size(FILE)).isLessThan(4_000_000);
    try (MbTiles tiles = MbTiles.open(FILE)) {
      assertThat(tiles.minZoom()).isEqualTo(16);
      assertThat(tiles.maxZoom()).isEqualTo(21);
      assertThat(tiles.about().name()).isEqualTo("Oak behind the house");
      assertThat(tiles.about().taken()).contains("drawn");
      assertThat(tiles.about().attribution()).contains("no real place");
      Position southWest =
          frame.toPlane(tiles.about().bounds().south(), tiles.about().bounds().west());
      assertThat(southWest.distanceTo(new Position(-110, -80))).isLessThan(0.01);
      Position northEast =
          frame.toPlane(tiles.about().bounds().north(), tiles.about().bounds().east());
      assertThat(northEast.distanceTo(new Position(130, 160))).isLessThan(0.01);
    }
  }

  /** Drawn anew, a tile is the one stored, but for what JPEG loses and rounding changes. */
  @ParameterizedTest
  @CsvSource({
    "21, 16, 24",
    "21, 8, 3",
    "21, -9, 54.5",
    "20, 22.6, 57.5",
    "19, 60, 60",
    "17, 10, 40"
  })
  void theProgramStillDrawsIt(int zoom, double east, double north) throws IOException {
    LatLon place = frame.toEarth(east, north);
    int x = (int) WebMercator.pixelX(place.lonDeg(), zoom) / 256;
    int y = (int) WebMercator.pixelY(place.latDeg(), zoom) / 256;
    BufferedImage drawn = new DemoGround().tile(zoom, x, y);
    BufferedImage stored;
    try (MbTiles tiles = MbTiles.open(FILE)) {
      stored = ImageIO.read(new ByteArrayInputStream(tiles.tile(zoom, x, y).orElseThrow()));
    }
    double sum = 0;
    for (int i = 0; i < 256; i++) {
      for (int j = 0; j < 256; j++) {
        Color a = new Color(drawn.getRGB(i, j));
        Color b = new Color(stored.getRGB(i, j));
        sum +=
            Math.abs(a.getRed() - b.getRed())
                + Math.abs(a.getGreen() - b.getGreen())
                + Math.abs(a.getBlue() - b.getBlue());
      }
    }
    assertThat(sum / (3 * 256 * 256)).as("mean difference of 255").isLessThan(6);
  }

  /** Corners of the house: red roof inside, ground outside; JPEG smears colour over two pixels. */
  @ParameterizedTest
  @CsvSource({"19, 1.0", "20, 0.5", "21, 0.3"})
  void theHouseStandsWhereItsCoordinatesSay(int zoom, double step) throws IOException {
    try (MbTiles tiles = MbTiles.open(FILE)) {
      double[][] corners = {{6, 2, 1, 1}, {27, 2, -1, 1}, {27, 13, -1, -1}};
      for (double[] c : corners) {
        Color in = at(tiles, zoom, c[0] + step * c[2], c[1] + step * c[3]);
        assertThat(in.getRed()).as("roof at %s %s", c[0], c[1]).isGreaterThan(in.getGreen() + 20);
        Color beside = at(tiles, zoom, c[0] - step * c[2], c[1] + step * c[3]);
        assertThat(beside.getRed()).isLessThan(beside.getGreen() + 10);
        Color below = at(tiles, zoom, c[0] + step * c[2], c[1] - step * c[3]);
        assertThat(below.getRed()).isLessThan(below.getGreen() + 10);
      }
    }
  }

  @Test
  void shadowsFallToTheNorthWest() throws IOException {
    try (MbTiles tiles = MbTiles.open(FILE)) {
      Color shaded = at(tiles, 20, 28.0, 38.3);
      Color lit = at(tiles, 20, 28.0, 33.0);
      assertThat(shaded.getGreen()).as("behind the shed").isLessThan(lit.getGreen() * 2 / 3);
    }
  }

  @Test
  void theWholeAreaIsCoveredWithoutGaps() throws IOException {
    try (MbTiles tiles = MbTiles.open(FILE)) {
      Rectangle2D area = DemoGround.AREA;
      BufferedImage picture = new GroundPainter(tiles, frame).picture(area, 0.22);
      int bare = 0;
      for (int i = 0; i < picture.getWidth(); i++) {
        for (int j = 0; j < picture.getHeight(); j++) {
          bare += picture.getRGB(i, j) == Color.WHITE.getRGB() ? 1 : 0;
        }
      }
      assertThat(bare).isZero();
      assertThat(picture.getWidth() * 0.22).isCloseTo(240, within(0.22));
    }
  }

  private Color at(MbTiles tiles, int zoom, double east, double north) throws IOException {
    LatLon place = frame.toEarth(east, north);
    int x = (int) WebMercator.pixelX(place.lonDeg(), zoom);
    int y = (int) WebMercator.pixelY(place.latDeg(), zoom);
    byte[] tile = tiles.tile(zoom, x / 256, y / 256).orElseThrow();
    return new Color(ImageIO.read(new ByteArrayInputStream(tile)).getRGB(x % 256, y % 256));
  }
}
