package org.fallwright.ui.map;

import java.awt.Graphics2D;
import java.awt.Image;
import java.awt.Rectangle;
import java.awt.RenderingHints;
import org.jxmapviewer.viewer.Tile;
import org.jxmapviewer.viewer.TileFactory;
import org.jxmapviewer.viewer.TileFactoryInfo;

/**
 * The widget's world at any scale between its steps of two: the tiles of a picture, or of none,
 * drawn at another size than they have. Levels count from the whole world in one tile, upwards.
 */
final class StretchedTiles extends TileFactory {
  /** Side of a tile's image [pixels]. */
  static final int TILE = 256;

  /** Finest level: beyond it, with tiles of twice the size, whole pixel numbers overflow. */
  static final int FINEST = 21;

  /** Coarsest level that is of use for a site. */
  private static final int COARSEST = 12;

  private final TileFactory picture;
  private final int size;

  /**
   * @param picture the tiles; null: none
   * @param size side of a tile as drawn, from 256 to 511 [pixels]
   */
  StretchedTiles(TileFactory picture, int size) {
    super(
        new TileFactoryInfo(
            "plan", 0, FINEST - COARSEST, FINEST, size, true, true, "", "x", "y", "z"));
    this.picture = picture;
    this.size = size;
  }

  /** Draws the tiles of the visible part, as fine as the display can show them. */
  void paint(Graphics2D g, int zoom, Rectangle seen) {
    if (picture == null) {
      return;
    }
    TileFactoryInfo own = picture.getInfo();
    double perTile = size * Math.abs(g.getTransform().getScaleX());
    int finer = perTile > 1.4 * TILE ? perTile > 2.8 * TILE ? 2 : 1 : 0;
    int level = Math.min(FINEST - zoom + finer, own.getTotalMapZoom() - own.getMinimumZoomLevel());
    double side = size / Math.pow(2, level - (FINEST - zoom));
    int ownZoom = own.getTotalMapZoom() - level;
    if (ownZoom > own.getMaximumZoomLevel()) {
      return;
    }
    g.setRenderingHint(
        RenderingHints.KEY_INTERPOLATION, RenderingHints.VALUE_INTERPOLATION_BILINEAR);
    int most = (1 << level) - 1;
    for (int x = Math.max(0, tile(seen.getMinX(), side));
        x <= Math.min(most, tile(seen.getMaxX(), side));
        x++) {
      for (int y = Math.max(0, tile(seen.getMinY(), side));
          y <= Math.min(most, tile(seen.getMaxY(), side));
          y++) {
        Tile t = picture.getTile(x, y, ownZoom);
        Image image = t.isLoaded() ? t.getImage() : null;
        if (image != null) {
          int left = (int) Math.round(x * side - seen.getX());
          int top = (int) Math.round(y * side - seen.getY());
          int right = (int) Math.round((x + 1) * side - seen.getX());
          int bottom = (int) Math.round((y + 1) * side - seen.getY());
          g.drawImage(image, left, top, right - left, bottom - top, null);
        }
      }
    }
  }

  private static int tile(double pixel, double side) {
    return (int) Math.floor(pixel / side);
  }

  @Override
  public Tile getTile(int x, int y, int zoom) {
    return new Tile(x, y, zoom);
  }

  @Override
  public void dispose() {
    // the picture's tiles outlive a change of scale
  }

  @Override
  protected void startLoading(Tile tile) {
    // the picture loads its own tiles
  }
}
