package org.fallwright.maps.tiles;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;

/** Opens a tile set of either kind, in place. */
public final class TileSets {
  private TileSets() {}

  /**
   * Opens a file in the MBTiles form, or a folder of z/x/y pictures.
   *
   * @throws IOException one sentence naming it, if it is missing, damaged or no tile set
   */
  public static TileStore open(Path place) throws IOException {
    return Files.isDirectory(place) ? FolderTiles.open(place) : MbTiles.open(place);
  }
}
