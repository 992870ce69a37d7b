package org.fallwright.ui.map;

import java.awt.image.BufferedImage;
import org.jxmapviewer.viewer.Tile;
import org.jxmapviewer.viewer.TileFactory;
import org.jxmapviewer.viewer.TileFactoryInfo;

/** Tiles for ground without a picture: none is ever drawn, none is ever fetched. */
final class BlankTiles extends TileFactory {
  /** Finest zoom of the map widget: beyond it whole pixel numbers overflow. */
  private static final int TOTAL = 22;

  BlankTiles() {
    super(new TileFactoryInfo("blank", 0, TOTAL - 2, TOTAL, 256, true, true, "", "x", "y", "z"));
  }

  @Override
  public Tile getTile(int x, int y, int zoom) {
    return new Tile(x, y, zoom) {
      @Override
      public synchronized boolean isLoaded() {
        return true;
      }

      @Override
      public BufferedImage getImage() {
        return null;
      }
    };
  }

  @Override
  public void dispose() {
    // holds nothing
  }

  @Override
  protected void startLoading(Tile tile) {
    // nothing to load
  }
}
