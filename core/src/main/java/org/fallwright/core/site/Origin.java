package org.fallwright.core.site;

import org.fallwright.core.units.Range;

/**
 * WGS 84 position of the site plane's origin.
 *
 * @param latDeg latitude [degrees north]
 * @param lonDeg longitude [degrees east]
 */
public record Origin(double latDeg, double lonDeg) {
  public Origin {
    Range.check("lat_deg", latDeg, -84, 84, "degrees");
    Range.check("lon_deg", lonDeg, -180, 180, "degrees");
  }
}
