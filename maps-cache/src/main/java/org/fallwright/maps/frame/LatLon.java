package org.fallwright.maps.frame;

import org.fallwright.core.units.Range;

/**
 * A place on the WGS 84 ellipsoid.
 *
 * @param latDeg latitude [degrees north]
 * @param lonDeg longitude [degrees east]
 */
public record LatLon(double latDeg, double lonDeg) {
  public LatLon {
    Range.check("lat_deg", latDeg, -90, 90, "degrees");
    Range.check("lon_deg", lonDeg, -180, 180, "degrees");
  }
}
