package org.fallwright.maps.tiles;

import static org.assertj.core.api.Assertions.assertThat;

import java.awt.Color;
import java.awt.image.BufferedImage;
import java.io.IOException;
import java.util.Arrays;
import java.util.Optional;
import org.junit.jupiter.api.Test;

class TilePyramidTest {
  private static final int RED = Color.RED.getRGB();
  private static final int GREEN = Color.GREEN.getRGB();
  private static final int BLUE = Color.BLUE.getRGB();
  private static final int WHITE = Color.WHITE.getRGB();

  @Test
  void aStoredTileIsGivenAsItIs() throws IOException {
    TilePyramid pyramid = new TilePyramid(new Painted(10, 12).with(12, 5, 9, Painted.quarters()));
    TilePyramid.Ground tile = pyramid.tile(12, 5, 9).orElseThrow();
    assertThat(tile.blurred()).isFalse();
    assertThat(tile.sourceZoom()).isEqualTo(12);
    assertThat(tile.image().getRGB(0, 0)).isEqualTo(RED);
    assertThat(tile.image().getRGB(127, 127)).isEqualTo(RED);
    assertThat(tile.image().getRGB(128, 127)).isEqualTo(GREEN);
    assertThat(tile.image().getRGB(127, 128)).isEqualTo(BLUE);
    assertThat(tile.image().getRGB(255, 255)).isEqualTo(WHITE);
  }

  @Test
  void aFinerTileIsCutFromTheRightPartAndMarked() throws IOException {
    TilePyramid pyramid = new TilePyramid(new Painted(10, 12).with(12, 5, 9, Painted.quarters()));
    int[] expected = {RED, GREEN, BLUE, WHITE};
    for (int i = 0; i < 4; i++) {
      TilePyramid.Ground one = pyramid.tile(13, 10 + i % 2, 18 + i / 2).orElseThrow();
      assertThat(one.blurred()).isTrue();
      assertThat(one.sourceZoom()).isEqualTo(12);
      assertThat(one.image().getRGB(100, 100)).isEqualTo(expected[i]);
      // the outer edges do not fade into nothing
      int outerX = i % 2 == 0 ? 0 : 255;
      int outerY = i / 2 == 0 ? 0 : 255;
      assertThat(one.image().getRGB(outerX, outerY)).isEqualTo(expected[i]);
    }
    // ten steps finer: the pixel just north-west of the middle, then just south-east of it
    int middleX = 6 * 1024 - 512;
    int middleY = 10 * 1024 - 512;
    assertThat(pyramid.tile(22, middleX - 8, middleY - 8).orElseThrow().image().getRGB(9, 9))
        .isEqualTo(RED);
    assertThat(pyramid.tile(22, middleX + 8, middleY + 8).orElseThrow().image().getRGB(9, 9))
        .isEqualTo(WHITE);
  }

  @Test
  void aGapIsFilledFromTheNextCoarserTile() throws IOException {
    Painted store =
        new Painted(10, 12)
            .with(12, 0, 0, Painted.plain(Color.RED))
            .with(10, 0, 0, Painted.plain(Color.GREEN));
    TilePyramid.Ground tile = new TilePyramid(store).tile(12, 1, 0).orElseThrow();
    assertThat(tile.sourceZoom()).isEqualTo(10);
    assertThat(tile.blurred()).isTrue();
    assertThat(tile.image().getRGB(3, 3)).isEqualTo(GREEN);
  }

  @Test
  void nothingIsAskedTwice() throws IOException {
    Painted store = new Painted(10, 12).with(12, 5, 9, Painted.quarters());
    TilePyramid pyramid = new TilePyramid(store);
    for (int i = 0; i < 5; i++) {
      assertThat(pyramid.tile(12, 99, 99)).isEmpty();
      assertThat(pyramid.tile(13, 10, 18)).isPresent();
    }
    assertThat(store.asked).containsExactlyInAnyOrder("12/99/99", "11/49/49", "10/24/24", "12/5/9");
  }

  @Test
  void outsideTheStoreThereIsNothing() throws IOException {
    TilePyramid pyramid = new TilePyramid(new Painted(10, 12).with(12, 5, 9, Painted.quarters()));
    assertThat(pyramid.tile(9, 0, 1)).isEmpty();
    assertThat(pyramid.tile(12, -1, 0)).isEmpty();
    assertThat(pyramid.tile(12, 0, 4096)).isEmpty();
  }

  @Test
  void aDamagedPictureCountsAsMissing() throws IOException {
    byte[] cutShort = Arrays.copyOf(Painted.png(Painted.quarters()), 30);
    Painted store =
        new Painted(11, 12)
            .with(12, 0, 0, cutShort)
            .with(12, 1, 0, new byte[] {1, 2, 3})
            .with(11, 0, 0, Painted.plain(Color.GREEN));
    TilePyramid pyramid = new TilePyramid(store);
    for (int x = 0; x < 2; x++) {
      TilePyramid.Ground tile = pyramid.tile(12, x, 0).orElseThrow();
      assertThat(tile.sourceZoom()).isEqualTo(11);
      assertThat(tile.blurred()).isTrue();
    }
  }

  @Test
  void tilesOfAnotherSizeAreFitted() throws IOException {
    BufferedImage large = new BufferedImage(512, 512, BufferedImage.TYPE_3BYTE_BGR);
    large.setRGB(511, 511, WHITE);
    Optional<TilePyramid.Ground> tile =
        new TilePyramid(new Painted(0, 0).with(0, 0, 0, large)).tile(0, 0, 0);
    assertThat(tile.orElseThrow().image().getWidth()).isEqualTo(256);
    assertThat(tile.orElseThrow().image().getHeight()).isEqualTo(256);
  }
}
