package org.fallwright.maps.tiles;

import static org.assertj.core.api.Assertions.assertThat;

import java.awt.image.BufferedImage;
import java.io.ByteArrayOutputStream;
import java.io.IOException;
import java.util.Arrays;
import java.util.List;
import javax.imageio.ImageIO;
import org.fallwright.core.site.Origin;
import org.fallwright.maps.frame.LatLon;
import org.fallwright.maps.frame.SiteFrame;
import org.fallwright.maps.frame.WebMercator;
import org.junit.jupiter.api.Test;

class LayeredGroundTest {
  private static final SiteFrame SITE = new SiteFrame(new Origin(45, -40));
  private static final int ZOOM = 18;

  @Test
  void aShiftMovesThePictureByItsMetres() throws IOException {
    LatLon at = SITE.toEarth(0, 0);
    int x = (int) (WebMercator.pixelX(at.lonDeg(), ZOOM) / 256);
    int y = (int) (WebMercator.pixelY(at.latDeg(), ZOOM) / 256);
    Painted store = new Painted(ZOOM, ZOOM);
    for (int i = -1; i <= 1; i++) {
      for (int j = -1; j <= 1; j++) {
        store.with(ZOOM, x + i, y + j, Painted.quarters());
      }
    }
    // 10 m east and 5 m south, in pixels of that zoom by the ground length of one, to 0.7 %
    double pixel = WebMercator.metresPerPixel(45, ZOOM);
    LayeredGround ground =
        new LayeredGround(List.of(new LayeredGround.Layer(store, 10, -5, 1)), SITE);
    BufferedImage moved = ground.tile(ZOOM, x, y).orElseThrow().image();
    int right = (int) Math.round(10 / pixel);
    int down = (int) Math.round(5 / pixel);
    // the middle, where four colours meet, has gone there
    assertThat(moved.getRGB(128 + right - 2, 128 + down - 2)).isEqualTo(0xffff0000);
    assertThat(moved.getRGB(128 + right + 1, 128 + down + 1)).isEqualTo(0xffffffff);
    assertThat(moved.getRGB(128 + right - 2, 128 + down + 1)).isEqualTo(0xff0000ff);
    // and what is left free is filled from the neighbour
    assertThat(moved.getRGB(0, 0) >>> 24).isEqualTo(255);
  }

  @Test
  void aLayerSeenThroughMixesWithTheOneUnderIt() throws IOException {
    Painted under = new Painted(5, 5).with(5, 1, 1, filled(0xff000000));
    Painted over = new Painted(5, 5).with(5, 1, 1, filled(0xffffffff));
    LayeredGround ground =
        new LayeredGround(
            List.of(
                new LayeredGround.Layer(under, 0, 0, 1), new LayeredGround.Layer(over, 0, 0, 0.25)),
            null);
    int rgb = ground.tile(5, 1, 1).orElseThrow().image().getRGB(9, 9);
    assertThat(rgb >>> 24).isEqualTo(255);
    assertThat(rgb & 255).isBetween(62, 66);
    assertThat(ground.tile(5, 2, 1)).isEmpty();
  }

  @Test
  void aTileCutShortIsNamedAndLeftOut() throws IOException {
    ByteArrayOutputStream jpeg = new ByteArrayOutputStream();
    ImageIO.write(Painted.quarters(), "jpg", jpeg);
    byte[] all = jpeg.toByteArray();
    for (int part = 0; part < 10; part++) {
      Painted store =
          new Painted(4, 5)
              .with(4, 1, 1, filled(0xff00ff00))
              .with(5, 2, 2, Arrays.copyOf(all, all.length * part / 10));
      LayeredGround ground = LayeredGround.of(store);
      BufferedImage image = ground.tile(5, 2, 2).orElseThrow().image();
      assertThat(image.getRGB(200, 250)).as("from the coarser tile").isEqualTo(0xff00ff00);
      assertThat(ground.fault().orElseThrow())
          .startsWith("tile 5/2/2 of base map painted is left out: it");
    }
  }

  private static BufferedImage filled(int argb) {
    BufferedImage image = new BufferedImage(256, 256, BufferedImage.TYPE_INT_RGB);
    for (int y = 0; y < 256; y++) {
      for (int x = 0; x < 256; x++) {
        image.setRGB(x, y, argb);
      }
    }
    return image;
  }
}
