package org.fallwright.ui.sheet;

import java.awt.Graphics2D;
import java.io.IOException;
import java.nio.file.Path;
import org.fallwright.core.site.Site;
import org.fallwright.maps.frame.SiteFrame;
import org.fallwright.maps.tiles.LayeredGround;
import org.fallwright.ui.home.Home;
import org.fallwright.ui.home.SiteMaps;
import org.fallwright.ui.map.GroundPainter;
import org.fallwright.ui.map.Viewport;

/**
 * The aerial pictures under a sheet. What is named but cannot be drawn does not stop the sheet: it
 * says so.
 *
 * @param painter draws them; {@link GroundPainter#NONE} where there is none
 * @param fault what is not drawn and why, in sentences; null: all is, or the site names none
 * @param tiles to be closed after drawing; null: none
 */
public record SitePicture(GroundPainter painter, String fault, LayeredGround tiles)
    implements AutoCloseable {

  /** Finds and opens the pictures that a site names. */
  public static SitePicture open(Home home, Site site, Path siteFile) {
    SiteMaps.Opened opened = home.maps().open(site, siteFile);
    return new SitePicture(
        opened.ground() == null
            ? GroundPainter.NONE
            : new Drawn(opened.ground(), new SiteFrame(site.origin())),
        opened.fault(),
        opened.ground());
  }

  /** Draws the pictures, and keeps what could not be read. */
  private static final class Drawn implements GroundPainter {
    private final LayeredGround ground;
    private final org.fallwright.maps.tiles.GroundPainter painter;
    private String fault;

    Drawn(LayeredGround ground, SiteFrame frame) {
      this.ground = ground;
      this.painter = new org.fallwright.maps.tiles.GroundPainter(ground, frame);
    }

    @Override
    public void paint(Graphics2D g, Viewport view) {
      try {
        painter.paint(g, view.transform(), view.visibleMetres().getBounds2D());
      } catch (IOException e) {
        fault = e.getMessage();
      }
      fault = ground.fault().orElse(fault);
    }

    @Override
    public String fault() {
      return fault == null ? null : "Picture not whole: " + fault + ".";
    }
  }

  @Override
  public void close() throws IOException {
    if (tiles != null) {
      tiles.close();
    }
  }
}
