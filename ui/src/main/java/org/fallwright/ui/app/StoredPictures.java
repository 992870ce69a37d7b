package org.fallwright.ui.app;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import org.fallwright.core.site.Site;
import org.fallwright.maps.tiles.MbTiles;
import org.fallwright.maps.tiles.TileStore;
import org.fallwright.ui.text.Messages;

/**
 * Pictures as tile files: looked for beside the site file, then among the base maps.
 *
 * @param baseMaps folder of the base maps
 */
public record StoredPictures(Path baseMaps) implements Wiring.Pictures {
  @Override
  public TileStore open(Site site, Path siteFile) throws IOException {
    if (site.picture() == null) {
      return null;
    }
    Path name = Path.of(site.picture().file());
    if (name.isAbsolute() || name.getNameCount() != 1) {
      throw new IOException(Messages.text("picture.not-a-name", site.picture().file()));
    }
    for (Path p : new Path[] {siteFile.resolveSibling(name), baseMaps.resolve(name)}) {
      if (Files.isRegularFile(p)) {
        return MbTiles.open(p);
      }
    }
    return null;
  }
}
