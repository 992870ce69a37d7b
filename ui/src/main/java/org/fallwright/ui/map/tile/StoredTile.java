package org.fallwright.ui.map.tile;

import java.awt.image.BufferedImage;
import org.jxmapviewer.viewer.Tile;

/** A tile of the map on the screen. Its state is changed on the event thread only. */
final class StoredTile extends Tile {
  private volatile BufferedImage image;
  private volatile boolean answered;
  private volatile boolean blurred;

  StoredTile(int x, int y, int zoom) {
    super(x, y, zoom);
  }

  /** Whether the store has answered, be it with a picture or with none. */
  boolean answered() {
    return answered;
  }

  /** Whether the picture is enlarged beyond its source's resolution. */
  boolean blurred() {
    return blurred;
  }

  @Override
  public boolean isLoaded() {
    return image != null;
  }

  @Override
  public BufferedImage getImage() {
    return image;
  }

  void answer(BufferedImage picture, boolean enlarged) {
    image = picture;
    blurred = enlarged;
    answered = true;
    setLoading(false);
  }
}
