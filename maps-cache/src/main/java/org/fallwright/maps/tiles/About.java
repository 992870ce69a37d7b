package org.fallwright.maps.tiles;

import org.fallwright.core.units.Range;
import org.fallwright.maps.frame.WebMercator;

/**
 * What a tile set says of itself.
 *
 * @param name what it is called
 * @param attribution whom the picture is owed to; empty: not stated
 * @param taken when the picture was taken, as its source states it; empty: not stated
 * @param description more about it; empty: none
 * @param bounds the ground shown
 * @param minZoom coarsest zoom stored
 * @param maxZoom finest zoom stored
 */
public record About(
    String name,
    String attribution,
    String taken,
    String description,
    Bounds bounds,
    int minZoom,
    int maxZoom) {
  public About {
    Range.present("name", name);
    Range.present("attribution", attribution);
    Range.present("date", taken);
    Range.present("description", description);
    Range.present("bounds", bounds);
    Range.check("minzoom", minZoom, 0, WebMercator.DEEPEST, "");
    Range.check("maxzoom", maxZoom, minZoom, WebMercator.DEEPEST, "");
  }

  /** Ground length of a pixel of the finest zoom stored [m], to 0.7 %. */
  public double metresPerPixel() {
    return WebMercator.metresPerPixel(bounds.centre().latDeg(), maxZoom);
  }
}
