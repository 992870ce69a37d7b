package org.fallwright.maps.frame;

import org.fallwright.core.units.Range;

/**
 * The square world of web map tiles (EPSG:3857, tiles of 256 pixels, 2^zoom tiles along each side).
 *
 * <p>World pixel of a place, with S = 256 · 2^zoom [pixels], φ latitude and λ longitude:
 *
 * <pre>
 * x = S (λ + 180°) / 360°
 * y = S (1 − ln(tan φ + 1 / cos φ) / π) / 2
 * </pre>
 *
 * x grows east from the 180th meridian, y grows south from 85.0511° north. The ellipsoidal latitude
 * is treated as if it were spherical (that is the standard), so the scale differs between east and
 * north by up to 0.7 %: for drawing only, never for lengths.
 *
 * <p>Source: EPSG method 1024, Popular Visualisation Pseudo-Mercator; the tile numbering is that of
 * the OGC Two Dimensional Tile Matrix Set standard, set WebMercatorQuad.
 */
public final class WebMercator {
  /** Side of a tile [pixels]. */
  public static final int TILE = 256;

  /** Deepest zoom any part of the program uses; 2^22 tiles of 256 pixels are 2^30 pixels. */
  public static final int DEEPEST = 22;

  /** Latitude of the upper edge of the square world [degrees]: arctan(sinh π). */
  public static final double EDGE_LAT_DEG = Math.toDegrees(Math.atan(Math.sinh(Math.PI)));

  private static final double EQUATOR_M = 2 * Math.PI * 6378137.0;

  private WebMercator() {}

  /** Tiles along one side of the world at a zoom. */
  public static int tilesAcross(int zoom) {
    return 1 << checked(zoom);
  }

  /** World pixel x [pixels east of the 180th meridian] of a longitude [degrees east]. */
  public static double pixelX(double lonDeg, int zoom) {
    Range.check("lon_deg", lonDeg, -180, 180, "degrees");
    return (double) TILE * tilesAcross(zoom) * (lonDeg + 180) / 360;
  }

  /** World pixel y [pixels south of the upper edge] of a latitude [degrees north]. */
  public static double pixelY(double latDeg, int zoom) {
    Range.check("lat_deg", latDeg, -EDGE_LAT_DEG, EDGE_LAT_DEG, "degrees");
    double lat = Math.toRadians(latDeg);
    double up = Math.log(Math.tan(lat) + 1 / Math.cos(lat)) / Math.PI;
    return (double) TILE * tilesAcross(zoom) * (1 - up) / 2;
  }

  /** The place at a world pixel. */
  public static LatLon place(double pixelX, double pixelY, int zoom) {
    double side = (double) TILE * tilesAcross(zoom);
    Range.check("pixel x", pixelX, 0, side, "pixels");
    Range.check("pixel y", pixelY, 0, side, "pixels");
    double lat = Math.atan(Math.sinh(Math.PI * (1 - 2 * pixelY / side)));
    return new LatLon(Math.toDegrees(lat), pixelX / side * 360 - 180);
  }

  /**
   * About the ground length of a pixel [m], for choosing a zoom and for telling how fine a picture
   * is; off by up to 0.7 % (see above).
   */
  public static double metresPerPixel(double latDeg, int zoom) {
    return EQUATOR_M * Math.cos(Math.toRadians(latDeg)) / ((double) TILE * tilesAcross(zoom));
  }

  private static int checked(int zoom) {
    Range.check("zoom", zoom, 0, DEEPEST, "");
    return zoom;
  }
}
