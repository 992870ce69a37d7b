package org.fallwright.maps.tiles;

import java.io.IOException;
import java.util.Optional;

/** A set of square map tiles of 256 pixels in the Web Mercator world. Safe for several threads. */
public interface TileStore extends AutoCloseable {

  /** What the set says of itself. */
  About about();

  /**
   * The picture file (PNG or JPEG) of a tile, or empty if the set has none.
   *
   * @param zoom zoom level
   * @param x tiles east of the 180th meridian
   * @param y tiles south of the upper edge of the world
   * @throws IOException one sentence naming the file that cannot be read
   */
  Optional<byte[]> tile(int zoom, int x, int y) throws IOException;

  /** What is done with each tile. */
  @FunctionalInterface
  interface Each {
    void tile(int zoom, int x, int y) throws IOException;
  }

  /** Goes through all tiles stored, coarsest first. */
  void forEach(Each each) throws IOException;

  @Override
  void close() throws IOException;

  /** The coarsest zoom stored. */
  default int minZoom() {
    return about().minZoom();
  }

  /** The finest zoom stored. */
  default int maxZoom() {
    return about().maxZoom();
  }
}
