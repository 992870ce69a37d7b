package org.fallwright.maps.tiles;

import org.fallwright.core.units.Range;
import org.fallwright.maps.frame.LatLon;
import org.fallwright.maps.frame.WebMercator;

/**
 * The ground a tile set shows, in WGS 84 degrees.
 *
 * @param west least longitude
 * @param south least latitude
 * @param east greatest longitude
 * @param north greatest latitude
 */
public record Bounds(double west, double south, double east, double north) {
  public Bounds {
    Range.check("west", west, -180, 180, "degrees");
    Range.check("south", south, -90, 90, "degrees");
    Range.check("east", east, west, 180, "degrees");
    Range.check("north", north, south, 90, "degrees");
  }

  /** The bounds of the tiles from (x0, y0) to (x1, y1), both included. */
  public static Bounds ofTiles(int zoom, int x0, int y0, int x1, int y1) {
    double side = WebMercator.TILE;
    LatLon northWest = WebMercator.place(x0 * side, y0 * side, zoom);
    LatLon southEast = WebMercator.place((x1 + 1) * side, (y1 + 1) * side, zoom);
    return new Bounds(
        northWest.lonDeg(), southEast.latDeg(), southEast.lonDeg(), northWest.latDeg());
  }

  public LatLon centre() {
    return new LatLon((south + north) / 2, (west + east) / 2);
  }

  public boolean contains(LatLon p) {
    return p.latDeg() >= south && p.latDeg() <= north && p.lonDeg() >= west && p.lonDeg() <= east;
  }
}
