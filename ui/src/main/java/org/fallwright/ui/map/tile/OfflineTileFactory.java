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
import org.fallwright.maps.tiles.TilePyramid;
import org.fallwright.maps.tiles.TileStore;
import org.jxmapviewer.viewer.Tile;
import org.jxmapviewer.viewer.TileFactory;
import org.jxmapviewer.viewer.TileFactoryInfo;
import org.slf4j.Logger;
import org.slf4j.LoggerFactory;

/**
 * Tiles for the map widget from a store on this machine, or none at all (blank ground). Never goes
 * to a network, never reads the disk on the event thread.
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

  private final TileStore store;
  private final TilePyramid pyramid;
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

  /**
   * A factory over a store.
   *
   * @param store the base map, or null for blank ground
   */
  public OfflineTileFactory(TileStore store) {
    super(
        new TileFactoryInfo(
            store == null ? "blank ground" : store.about().name(),
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
    this.store = store;
    this.pyramid = store == null ? null : new TilePyramid(store);
    AtomicInteger count = new AtomicInteger();
    this.readers =
        store == null
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

  /** The base map, if there is one. */
  public Optional<TileStore> store() {
    return Optional.ofNullable(store);
  }

  /**
   * The widget's zoom level below which (closer in) the base map is enlarged beyond its resolution;
   * empty on blank ground.
   */
  public Optional<Integer> blurredBelow() {
    return store().map(s -> turned(s.maxZoom()));
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
    if (pyramid == null || y < 0 || y >= across) {
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
    Optional<TilePyramid.Ground> ground = Optional.empty();
    try {
      ground = pyramid.tile(turned(tile.getZoom()), tile.getX(), tile.getY());
    } catch (IOException e) {
      if (fault == null) {
        LOG.warn("{}", e.getMessage(), e);
      }
      fault = e.getMessage();
    }
    publish(tile, ground.orElse(null));
  }

  private void publish(StoredTile tile, TilePyramid.Ground ground) {
    SwingUtilities.invokeLater(
        () -> {
          if (ground == null) {
            tile.answer(null, false);
          } else {
            tile.answer(ground.image(), ground.blurred());
            fireTileLoadedEvent(tile);
          }
        });
  }
}
