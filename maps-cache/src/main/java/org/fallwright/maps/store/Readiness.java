package org.fallwright.maps.store;

import java.awt.geom.Rectangle2D;
import java.io.IOException;
import org.fallwright.maps.frame.LatLon;
import org.fallwright.maps.frame.SiteFrame;
import org.fallwright.maps.frame.WebMercator;
import org.fallwright.maps.tiles.LayeredGround;
import org.fallwright.maps.tiles.TilePyramid;

/**
 * Whether the pictures at hand show all of a site finely enough, so that it can be planned without
 * a signal.
 *
 * @param shown share of the area shown by pictures as fine as {@link #FINE_M}, 0 to 1
 * @param coarse share shown only more coarsely
 * @param fault the first damaged tile met with, one sentence; null: none
 */
public record Readiness(double shown, double coarse, String fault) {
  /** Ground length of a pixel that shows a house's corner or a gate [m]; planning allowance. */
  public static final double FINE_M = 0.6;

  /** Looks at every tile over an area of the site plane. */
  public static Readiness of(LayeredGround ground, SiteFrame frame, Rectangle2D area)
      throws IOException {
    int fine = 0;
    while (fine < WebMercator.DEEPEST
        && WebMercator.metresPerPixel(frame.origin().latDeg(), fine) > FINE_M) {
      fine++;
    }
    LatLon nw = frame.toEarth(area.getMinX(), area.getMaxY());
    LatLon se = frame.toEarth(area.getMaxX(), area.getMinY());
    double side = WebMercator.TILE;
    int x0 = (int) (WebMercator.pixelX(nw.lonDeg(), fine) / side);
    int y0 = (int) (WebMercator.pixelY(nw.latDeg(), fine) / side);
    int x1 = (int) (WebMercator.pixelX(se.lonDeg(), fine) / side);
    int y1 = (int) (WebMercator.pixelY(se.latDeg(), fine) / side);
    double all = 0;
    double sharp = 0;
    double coarse = 0;
    for (int y = y0; y <= y1; y++) {
      for (int x = x0; x <= x1; x++) {
        all++;
        var found = ground.tile(fine, x, y);
        if (found.map(TilePyramid.Ground::blurred).orElse(false)) {
          coarse++;
        } else if (found.isPresent()) {
          sharp++;
        }
      }
    }
    return new Readiness(sharp / all, coarse / all, ground.fault().orElse(null));
  }

  public boolean ready() {
    return shown >= 1 && fault == null;
  }
}
