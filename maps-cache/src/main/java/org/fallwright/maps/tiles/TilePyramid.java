package org.fallwright.maps.tiles;

import java.awt.Graphics2D;
import java.awt.RenderingHints;
import java.awt.geom.AffineTransform;
import java.awt.image.BufferedImage;
import java.io.IOException;
import java.util.LinkedHashMap;
import java.util.Map;
import java.util.Optional;
import org.fallwright.core.units.Range;
import org.fallwright.maps.frame.WebMercator;
import org.slf4j.Logger;
import org.slf4j.LoggerFactory;

/**
 * The picture of any tile, also of those a store does not have: cut from the nearest coarser tile
 * stored and enlarged (bilinear). Tiles coarser than the coarsest stored are not made up.
 *
 * <p>What the store was asked for once is not asked again while it is remembered: pictures and
 * missing tiles alike. A tile whose picture cannot be read is reported in the log and counts as
 * missing. Safe for several threads.
 */
public final class TilePyramid {
  private static final Logger LOG = LoggerFactory.getLogger(TilePyramid.class);
  private static final int PICTURES_KEPT = 128;
  private static final int ANSWERS_KEPT = 20_000;

  private record Key(int zoom, int x, int y) {}

  /**
   * The picture of a tile.
   *
   * @param image 256 x 256 pixels; shared, not to be drawn on
   * @param sourceZoom zoom of the stored tile it was made from
   * @param blurred whether it shows less detail than its zoom could, being enlarged
   */
  public record Ground(BufferedImage image, int sourceZoom, boolean blurred) {}

  private final TileStore store;
  private final Map<Key, BufferedImage> pictures = remembering(PICTURES_KEPT);
  private final Map<Key, Boolean> missing = remembering(ANSWERS_KEPT);
  private volatile String fault;

  public TilePyramid(TileStore store) {
    this.store = Range.present("store", store);
  }

  public TileStore store() {
    return store;
  }

  /**
   * The picture of a tile, or empty where the store has nothing at this zoom or coarser.
   *
   * @throws IOException if the store cannot be read
   */
  public Optional<Ground> tile(int zoom, int x, int y) throws IOException {
    int across = WebMercator.tilesAcross(zoom);
    if (x < 0 || y < 0 || x >= across || y >= across) {
      return Optional.empty();
    }
    for (int z = Math.min(zoom, store.maxZoom()); z >= store.minZoom(); z--) {
      int up = zoom - z;
      BufferedImage source = stored(new Key(z, x >> up, y >> up));
      if (source != null) {
        BufferedImage image = up == 0 ? source : cut(source, up, x, y);
        return Optional.of(new Ground(image, z, up > 0));
      }
    }
    return Optional.empty();
  }

  private synchronized BufferedImage stored(Key key) throws IOException {
    BufferedImage known = pictures.get(key);
    if (known != null || missing.containsKey(key)) {
      return known;
    }
    Optional<byte[]> bytes = store.tile(key.zoom, key.x, key.y);
    BufferedImage image = bytes.isPresent() ? read(key, bytes.get()) : null;
    if (image == null) {
      missing.put(key, true);
    } else {
      pictures.put(key, image);
    }
    return image;
  }

  /** The first damaged tile met with so far, as one sentence. */
  public Optional<String> fault() {
    return Optional.ofNullable(fault);
  }

  private BufferedImage read(Key key, byte[] bytes) {
    try {
      return sized(TileImage.read(bytes));
    } catch (IOException e) {
      LOG.debug("tile {}/{}/{}", key.zoom, key.x, key.y, e);
      String found =
          "tile %d/%d/%d of base map %s is left out: %s"
              .formatted(key.zoom, key.x, key.y, store.about().name(), e.getMessage());
      LOG.warn("{}", found);
      fault = fault == null ? found : fault;
      return null;
    }
  }

  /** The picture with 256 pixels a side and a pixel form that draws fast. */
  private static BufferedImage sized(BufferedImage image) {
    AffineTransform fit =
        AffineTransform.getScaleInstance(
            (double) WebMercator.TILE / image.getWidth(),
            (double) WebMercator.TILE / image.getHeight());
    return drawn(image, fit);
  }

  private static BufferedImage cut(BufferedImage source, int up, int x, int y) {
    int parts = 1 << up;
    AffineTransform enlarge =
        AffineTransform.getTranslateInstance(
            -(double) (x & (parts - 1)) * WebMercator.TILE,
            -(double) (y & (parts - 1)) * WebMercator.TILE);
    enlarge.scale(parts, parts);
    return drawn(source, enlarge);
  }

  private static BufferedImage drawn(BufferedImage source, AffineTransform by) {
    int type =
        source.getColorModel().hasAlpha()
            ? BufferedImage.TYPE_INT_ARGB
            : BufferedImage.TYPE_INT_RGB;
    BufferedImage image = new BufferedImage(WebMercator.TILE, WebMercator.TILE, type);
    Graphics2D g = image.createGraphics();
    g.setRenderingHint(
        RenderingHints.KEY_INTERPOLATION, RenderingHints.VALUE_INTERPOLATION_BILINEAR);
    g.drawImage(source, by, null);
    g.dispose();
    return image;
  }

  private static <V> Map<Key, V> remembering(int most) {
    return new LinkedHashMap<>(64, 0.75f, true) {
      private static final long serialVersionUID = 1;

      @Override
      protected boolean removeEldestEntry(Map.Entry<Key, V> eldest) {
        return size() > most;
      }
    };
  }
}
