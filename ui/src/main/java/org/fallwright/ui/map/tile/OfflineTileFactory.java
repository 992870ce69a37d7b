package org.fallwright.ui.map.tile;

import java.io.IOException;
import java.util.LinkedHashMap;
import java.util.Map;
import java.util.Optional;
import java.util.concurrent.ExecutorService;
import java.util.concurrent.Executors;
import java.util.concurrent.RejectedExecutionException;
import java.util.concurrent.atomic.AtomicInteger;
import javax.swing.SwingUtilities;
import org.fallwright.maps.frame.WebMercator;
import org.fallwright.maps.tiles.LayeredGround;
import org.fallwright.maps.tiles.TilePyramid;
import org.jxmapviewer.viewer.Tile;
import org.jxmapviewer.viewer.TileFactory;
import org.jxmapviewer.viewer.TileFactoryInfo;
import org.slf4j.Logger;
import org.slf4j.LoggerFactory;

/**
 * Tiles for the map widget from base maps on this machine, or none at all (blank ground). Never
 * goes to a network, never reads the disk on the event thread.
 *
 * <p>{@link #getTile} is called on the event thread while the map is painted: it answers at once,
 * with a tile that is filled later and then told to the tile listeners, on the event thread. Tiles
 * finer than the store's finest are enlarged from it; see {@link #blurredBelow}. A tile the store
 * does not have is remembered as such. The store is not closed here.
 */
public final class OfflineTileFactory extends TileFactory {
  private static final Logger LOG = LoggerFactory.getLogger(OfflineTileFactory.class);
  private static final int TILES_KEPT = 600;
  private static final int THREADS = 2;

  private final LayeredGround ground;
  private final ExecutorService readers;
  private final Map<Long, StoredTile> tiles =
      new LinkedHashMap<>(128, 0.75f, true) {
        private static final long serialVersionUID = 1;

        @Override
        protected boolean removeEldestEntry(Map.Entry<Long, StoredTile> eldest) {
          return size() > TILES_KEPT;
        }
      };
  private volatile String fault;
  private volatile Runnable faulty = () -> {};

  /**
   * A factory over base maps.
   *
   * @param ground the base maps, or null for blank ground
   */
  public OfflineTileFactory(LayeredGround ground) {
    super(
        new TileFactoryInfo(
            ground == null ? "blank ground" : ground.name(),
            0,
            WebMercator.DEEPEST,
            WebMercator.DEEPEST,
            WebMercator.TILE,
            true,
            true,
            "",
            "x",
            "y",
            "z"));
    this.ground = ground;
    AtomicInteger count = new AtomicInteger();
    this.readers =
        ground == null
            ? null
            : Executors.newFixedThreadPool(
                THREADS,
                task -> {
                  Thread thread = new Thread(task, "base map " + count.incrementAndGet());
                  thread.setDaemon(true);
                  return thread;
                });
  }

  /**
   * Tile zoom (0: the world in one tile) of a zoom level of the widget, and the other way round.
   */
  public static int turned(int zoom) {
    return WebMercator.DEEPEST - zoom;
  }

  /** The base maps, if there are any. */
  public Optional<LayeredGround> ground() {
    return Optional.ofNullable(ground);
  }

  /** Who is told, on the event thread, when the first part that cannot be read is met. */
  public void onFault(Runnable listener) {
    faulty = listener;
  }

  /**
   * The widget's zoom level below which (closer in) the base map is enlarged beyond its resolution;
   * empty on blank ground.
   */
  public Optional<Integer> blurredBelow() {
    return ground().map(g -> turned(g.maxZoom()));
  }

  /** Why the base map could not be read, as one sentence, if that happened. */
  public Optional<String> fault() {
    return Optional.ofNullable(fault);
  }

  @Override
  public Tile getTile(int x, int y, int zoom) {
    int z = turned(zoom);
    int across = WebMercator.tilesAcross(z);
    int within = Math.floorMod(x, across);
    long key = ((long) z << 56) | ((long) within << 28) | (y & 0xfffffffL);
    StoredTile tile;
    synchronized (tiles) {
      tile = tiles.get(key);
      if (tile != null) {
        return tile;
      }
      tile = new StoredTile(within, y, zoom);
      tiles.put(key, tile);
    }
    if (ground == null || y < 0 || y >= across) {
      tile.answer(null, false);
    } else {
      startLoading(tile);
    }
    return tile;
  }

  @Override
  protected void startLoading(Tile tile) {
    tile.setLoading(true);
    try {
      readers.execute(() -> load((StoredTile) tile));
    } catch (RejectedExecutionException e) {
      LOG.debug("a tile was asked for after the base map had been put away", e);
      tile.setLoading(false);
    }
  }

  @Override
  public void dispose() {
    if (readers != null) {
      readers.shutdownNow();
    }
    synchronized (tiles) {
      tiles.clear();
    }
  }

  private void load(StoredTile tile) {
    Optional<TilePyramid.Ground> found = Optional.empty();
    try {
      found = ground.tile(turned(tile.getZoom()), tile.getX(), tile.getY());
    } catch (IOException e) {
      if (fault == null) {
        LOG.warn("{}", e.getMessage(), e);
      }
      fault(e.getMessage());
    }
    ground.fault().ifPresent(this::fault);
    publish(tile, found.orElse(null));
  }

  private void fault(String sentence) {
    if (fault == null) {
      fault = sentence;
      SwingUtilities.invokeLater(faulty);
    }
  }

  private void publish(StoredTile tile, TilePyramid.Ground found) {
    SwingUtilities.invokeLater(
        () -> {
          if (found == null) {
            tile.answer(null, false);
          } else {
            tile.answer(found.image(), found.blurred());
            fireTileLoadedEvent(tile);
          }
        });
  }
}
