package org.fallwright.ui.sheet;

import java.awt.Shape;
import java.io.IOException;
import java.io.UncheckedIOException;
import java.nio.file.Path;
import java.util.Optional;
import org.fallwright.core.site.Site;
import org.fallwright.maps.frame.SiteFrame;
import org.fallwright.maps.tiles.MbTiles;
import org.fallwright.ui.home.Home;
import org.fallwright.ui.map.GroundPainter;

/**
 * The aerial picture under a sheet. One that is named but cannot be drawn does not stop the sheet:
 * it says so.
 *
 * @param painter draws it; {@link GroundPainter#NONE} where there is none
 * @param fault why it is not drawn, one sentence; null: it is, or the site names none
 * @param tiles to be closed after drawing; null: none
 */
public record SitePicture(GroundPainter painter, String fault, MbTiles tiles)
    implements AutoCloseable {

  /** Finds and opens the picture that a site names. */
  public static SitePicture open(Home home, Site site, Path siteFile) {
    if (site.picture() == null) {
      return new SitePicture(GroundPainter.NONE, null, null);
    }
    Optional<Path> file = home.picture(site, siteFile);
    if (file.isEmpty()) {
      return new SitePicture(
          GroundPainter.NONE,
          "Blank ground: base map " + site.picture().file() + " was not found.",
          null);
    }
    try {
      MbTiles tiles = MbTiles.open(file.get());
      var ground = new org.fallwright.maps.tiles.GroundPainter(tiles, new SiteFrame(site.origin()));
      return new SitePicture(
          (g, view) -> {
            Shape seen = view.visibleMetres();
            try {
              ground.paint(g, view.transform(), seen.getBounds2D());
            } catch (IOException e) {
              throw new UncheckedIOException(e);
            }
          },
          null,
          tiles);
    } catch (IOException e) {
      return new SitePicture(GroundPainter.NONE, "Blank ground: " + e.getMessage() + ".", null);
    }
  }

  @Override
  public void close() throws IOException {
    if (tiles != null) {
      tiles.close();
    }
  }
}
