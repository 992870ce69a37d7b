package org.fallwright.maps.picture;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;

import java.awt.geom.Point2D;
import java.awt.image.BufferedImage;
import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.concurrent.atomic.AtomicLong;
import org.fallwright.core.site.Origin;
import org.fallwright.core.site.Position;
import org.fallwright.maps.frame.SiteFrame;
import org.fallwright.maps.tiles.GroundPainter;
import org.fallwright.maps.tiles.MbTiles;
import org.fallwright.maps.tiles.MbTilesWriter;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

class PictureTilesTest {
  private static final SiteFrame SITE = new SiteFrame(new Origin(45, -40));
  private static final BufferedImage IMAGE = PictureTilesReferenceTest.speckled(900, 800);

  @TempDir Path folder;

  @Test
  void aPlainPictureComesOutWhereItsPointsAre() throws IOException {
    Path set = folder.resolve("plan.mbtiles");
    PlaneFit fit = fit(0);
    assertThat(tiles(fit).write(set, "m", (n, of) -> true)).isTrue();
    try (MbTiles store = MbTiles.open(set)) {
      // a pixel of the picture is 0.1 m, its corner lies at 20 m west, 50 m north
      BufferedImage back =
          new GroundPainter(store, SITE)
              .picture(new java.awt.geom.Rectangle2D.Double(-20, -30, 90, 80), 0.1);
      int[][] aside = {{0, 0}, {2, 0}, {-2, 0}, {0, 2}, {0, -2}};
      double[] differences = new double[5];
      for (int k = 0; k < 5; k++) {
        for (int y = 50; y < 750; y++) {
          for (int x = 50; x < 850; x++) {
            int p = back.getRGB(x, y) >> 8 & 255;
            int q = IMAGE.getRGB(x + aside[k][0], y + aside[k][1]) >> 8 & 255;
            differences[k] += Math.abs(p - q);
          }
        }
      }
      for (int k = 1; k < 5; k++) {
        assertThat(differences[0]).isLessThan(0.7 * differences[k]);
      }
    }
  }

  @Test
  void groundOutsideAPictureTurnedStaysBlank() throws IOException {
    Path set = folder.resolve("plan.mbtiles");
    tiles(fit(30)).write(set, "m", (n, of) -> true);
    try (MbTiles store = MbTiles.open(set)) {
      BufferedImage back =
          new GroundPainter(store, SITE)
              .picture(new java.awt.geom.Rectangle2D.Double(-150, -150, 300, 300), 0.2);
      for (int y = 0; y < back.getHeight(); y++) {
        for (int x = 0; x < back.getWidth(); x++) {
          int rgb = back.getRGB(x, y);
          int sum = (rgb >> 16 & 255) + (rgb >> 8 & 255) + (rgb & 255);
          assertThat(sum).as("%d, %d", x, y).isGreaterThan(60);
        }
      }
      assertThat(back.getRGB(2, 2)).isEqualTo(0xffffffff);
    }
  }

  @Test
  void aRunThatWasStoppedGoesOnAndComesToTheSame() throws IOException {
    Path whole = folder.resolve("whole.mbtiles");
    many().write(whole, "m", (n, of) -> true);
    Path set = folder.resolve("plan.mbtiles");
    assertThat(many().write(set, "m", (n, of) -> n < 64)).isFalse();
    assertThat(set).doesNotExist();
    assertThat(MbTilesWriter.building(set)).exists();
    AtomicLong calls = new AtomicLong();
    assertThat(many().write(set, "m", (n, of) -> calls.incrementAndGet() > 0)).isTrue();
    assertThat(MbTilesWriter.building(set)).doesNotExist();
    try (MbTiles a = MbTiles.open(whole);
        MbTiles b = MbTiles.open(set)) {
      long[] count = new long[2];
      a.forEach((z, x, y) -> count[0]++);
      b.forEach((z, x, y) -> count[1]++);
      assertThat(count[0]).isEqualTo(count[1]).isGreaterThan(64);
      int z = a.maxZoom();
      double[] xy = {0, 0};
      a.forEach(
          (zoom, x, y) -> {
            if (zoom == z) {
              xy[0] = x;
              xy[1] = y;
            }
          });
      assertThat(b.tile(z, (int) xy[0], (int) xy[1]))
          .hasValueSatisfying(
              t -> {
                try {
                  assertThat(t).isEqualTo(a.tile(z, (int) xy[0], (int) xy[1]).orElseThrow());
                } catch (IOException e) {
                  throw new java.io.UncheckedIOException(e);
                }
              });
    }
  }

  @Test
  void anUnfinishedSetOfAnotherPictureIsNotGoneOnWith() throws IOException {
    Path set = folder.resolve("plan.mbtiles");
    many().write(set, "one", (n, of) -> n < 64);
    long before = Files.size(MbTilesWriter.building(set));
    many().write(set, "two", (n, of) -> false);
    assertThat(Files.size(MbTilesWriter.building(set))).isLessThan(before);
  }

  @Test
  void aPictureThatShowsNothingMakesNoBaseMap() {
    BufferedImage clear = new BufferedImage(50, 50, BufferedImage.TYPE_INT_ARGB);
    GroundPicture picture = GroundPicture.plain(HeldRaster.of(clear), SITE, fit(0));
    PictureTiles tiles = new PictureTiles(picture, "clear", "us", "", 0);
    assertThatThrownBy(() -> tiles.write(folder.resolve("c.mbtiles"), "m", (n, of) -> true))
        .hasMessageContaining("shows nothing");
  }

  /** Fine enough to be stopped half way. */
  private static PictureTiles many() {
    return new PictureTiles(
        GroundPicture.plain(HeldRaster.of(IMAGE), SITE, fit(10)), "plan", "us", "", 22);
  }

  private static PictureTiles tiles(PlaneFit fit) {
    return new PictureTiles(
        GroundPicture.plain(HeldRaster.of(IMAGE), SITE, fit), "plan", "us", "", 0);
  }

  private static PlaneFit fit(double north) {
    return PlaneFit.ofLength(
        new Point2D.Double(0, 0),
        new Point2D.Double(100, 0),
        10,
        north,
        new ControlPoint(0, 0, new Position(-20, 50)));
  }
}
