package org.fallwright.ui.map.tile;

import static org.assertj.core.api.Assertions.assertThat;

import java.awt.Color;
import java.awt.Graphics2D;
import java.awt.image.BufferedImage;
import java.io.ByteArrayOutputStream;
import java.io.IOException;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.concurrent.BlockingQueue;
import java.util.concurrent.CopyOnWriteArrayList;
import java.util.concurrent.LinkedBlockingQueue;
import java.util.concurrent.TimeUnit;
import javax.imageio.ImageIO;
import javax.swing.JComponent;
import javax.swing.SwingUtilities;
import org.fallwright.maps.tiles.About;
import org.fallwright.maps.tiles.Bounds;
import org.fallwright.maps.tiles.LayeredGround;
import org.fallwright.maps.tiles.TileStore;
import org.junit.jupiter.api.AfterEach;
import org.junit.jupiter.api.Test;
import org.jxmapviewer.JXMapViewer;
import org.jxmapviewer.viewer.GeoPosition;
import org.jxmapviewer.viewer.Tile;

class OfflineTileFactoryTest {
  private static final int PATIENCE_S = 20;

  private final List<String> asked = new CopyOnWriteArrayList<>();
  private final List<String> askedBy = new CopyOnWriteArrayList<>();
  private final BlockingQueue<Tile> loaded = new LinkedBlockingQueue<>();
  private OfflineTileFactory factory;

  @AfterEach
  void away() {
    factory.dispose();
  }

  @Test
  void aTileComesLaterOnTheEventThreadAndIsReadOnAnother() throws Exception {
    factory = factory(Map.of("10/5/6", png(Color.RED)));
    Tile tile = onEventThread(() -> factory.getTile(5, 6, 22 - 10));
    assertThat(loaded()).isSameAs(tile);
    assertThat(tile.isLoaded()).isTrue();
    assertThat(tile.getImage().getRGB(9, 9)).isEqualTo(Color.RED.getRGB());
    assertThat(((StoredTile) tile).blurred()).isFalse();
    assertThat(askedBy).allSatisfy(name -> assertThat(name).startsWith("base map "));
    assertThat(onEventThread(() -> factory.getTile(5, 6, 12))).isSameAs(tile);
    assertThat(onEventThread(() -> factory.getTile(5 + 1024, 6, 12)))
        .as("once round the world")
        .isSameAs(tile);
  }

  @Test
  void closerInThanTheStoreATileIsEnlarged() throws Exception {
    factory = factory(Map.of("10/5/6", png(Color.RED)));
    Tile tile = onEventThread(() -> factory.getTile(5 << 12, 6 << 12, 0));
    assertThat(loaded()).isSameAs(tile);
    assertThat(tile.getImage().getWidth()).isEqualTo(256);
    assertThat(tile.getImage().getRGB(200, 200)).isEqualTo(Color.RED.getRGB());
    assertThat(((StoredTile) tile).blurred()).isTrue();
    assertThat(factory.blurredBelow()).contains(12);
  }

  @Test
  void aMissingTileIsAskedForOnce() throws Exception {
    factory = factory(Map.of("10/5/6", png(Color.RED)));
    StoredTile missing = (StoredTile) onEventThread(() -> factory.getTile(7, 7, 12));
    onEventThread(() -> factory.getTile(5, 6, 12));
    assertThat(loaded().getX()).isEqualTo(5);
    await(missing);
    for (int i = 0; i < 20; i++) {
      assertThat(onEventThread(() -> factory.getTile(7, 7, 12)).isLoaded()).isFalse();
    }
    onEventThread(() -> factory.getTile(5, 6, 12));
    assertThat(asked).containsExactlyInAnyOrder("10/7/7", "9/3/3", "10/5/6");
    assertThat(missing.isLoading()).isFalse();
    assertThat(factory.fault()).isEmpty();
  }

  @Test
  void aStoreThatCannotBeReadIsToldAndNothingBreaks() throws Exception {
    factory = factory(null);
    StoredTile tile = (StoredTile) onEventThread(() -> factory.getTile(5, 6, 12));
    await(tile);
    assertThat(tile.isLoaded()).isFalse();
    assertThat(factory.fault()).contains("base map test is damaged");
  }

  @Test
  void blankGroundHasNoTilesAndNoThreads() throws Exception {
    factory = new OfflineTileFactory(null);
    Tile tile = onEventThread(() -> factory.getTile(5, 6, 12));
    assertThat(tile.isLoaded()).isFalse();
    assertThat(tile.isLoading()).isFalse();
    assertThat(factory.ground()).isEmpty();
    assertThat(factory.blurredBelow()).isEmpty();
  }

  @Test
  void aTileBeyondThePolesIsBlank() throws Exception {
    factory = factory(Map.of());
    assertThat(onEventThread(() -> factory.getTile(5, -1, 12)).isLoaded()).isFalse();
    assertThat(onEventThread(() -> factory.getTile(5, 1024, 12)).isLoaded()).isFalse();
    assertThat(asked).isEmpty();
  }

  /** The widget itself, without a window: painted, told, painted again with the ground in it. */
  @Test
  void theMapWidgetShowsTheGround() throws Exception {
    factory = factory(Map.of("9/199/184", png(Color.RED)));
    JXMapViewer map =
        onEventThread(
            () -> {
              JXMapViewer viewer = new JXMapViewer();
              viewer.setTileFactory(factory);
              viewer.setSize(100, 100);
              viewer.setZoom(1);
              viewer.setAddressLocation(new GeoPosition(45, -40));
              return viewer;
            });
    assertThat(picture(map).getRGB(50, 50)).as("before").isNotEqualTo(Color.RED.getRGB());
    // the view may need up to four tiles; one of them lies under its middle
    for (int i = 0; i < 4 && picture(map).getRGB(50, 50) != Color.RED.getRGB(); i++) {
      loaded();
    }
    assertThat(picture(map).getRGB(50, 50)).isEqualTo(Color.RED.getRGB());
  }

  private static BufferedImage picture(JComponent component) throws Exception {
    return onEventThread(
        () -> {
          BufferedImage image = new BufferedImage(100, 100, BufferedImage.TYPE_INT_RGB);
          Graphics2D g = image.createGraphics();
          component.printAll(g);
          g.dispose();
          return image;
        });
  }

  /** Tiles from a map "zoom/x/y" to file; null: a store that cannot be read. */
  private OfflineTileFactory factory(Map<String, byte[]> tiles) {
    OfflineTileFactory made =
        new OfflineTileFactory(
            LayeredGround.of(
                new TileStore() {
                  @Override
                  public About about() {
                    return new About("test", "", "", "", new Bounds(-180, -85, 180, 85), 9, 10);
                  }

                  @Override
                  public Optional<byte[]> tile(int zoom, int x, int y) throws IOException {
                    asked.add(zoom + "/" + x + "/" + y);
                    askedBy.add(Thread.currentThread().getName());
                    if (tiles == null) {
                      throw new IOException("base map test is damaged");
                    }
                    return Optional.ofNullable(tiles.get(zoom + "/" + x + "/" + y));
                  }

                  @Override
                  public void forEach(Each each) {}

                  @Override
                  public void close() {}
                }));
    made.addTileListener(
        tile -> {
          assertThat(SwingUtilities.isEventDispatchThread()).isTrue();
          loaded.add(tile);
        });
    return made;
  }

  private Tile loaded() throws InterruptedException {
    Tile tile = loaded.poll(PATIENCE_S, TimeUnit.SECONDS);
    assertThat(tile).as("a tile told as loaded").isNotNull();
    return tile;
  }

  private static void await(StoredTile tile) throws InterruptedException {
    for (int i = 0; i < PATIENCE_S * 100 && !tile.answered(); i++) {
      Thread.sleep(10);
    }
    assertThat(tile.answered()).isTrue();
  }

  private interface Work<T> {
    T run() throws Exception;
  }

  private static <T> T onEventThread(Work<T> work) throws Exception {
    BlockingQueue<Optional<T>> result = new LinkedBlockingQueue<>();
    SwingUtilities.invokeAndWait(
        () -> {
          try {
            result.add(Optional.ofNullable(work.run()));
          } catch (Exception e) {
            throw new IllegalStateException(e);
          }
        });
    return result.take().orElse(null);
  }

  private static byte[] png(Color colour) throws IOException {
    BufferedImage image = new BufferedImage(256, 256, BufferedImage.TYPE_INT_RGB);
    Graphics2D g = image.createGraphics();
    g.setColor(colour);
    g.fillRect(0, 0, 256, 256);
    g.dispose();
    ByteArrayOutputStream out = new ByteArrayOutputStream();
    ImageIO.write(image, "png", out);
    return out.toByteArray();
  }
}
