/**
 * Where the site plane lies on the earth: metres east and north of the site's origin to WGS 84
 * degrees and back, the square world of the map tiles, and foreign coordinate systems by their EPSG
 * code.
 *
 * <p>Read {@link org.fallwright.maps.frame.SiteFrame} first. All calculation is done in the site
 * plane, whose scale is 1 at the origin and whose north is true north there; the tile world is for
 * drawing only, because its scale changes with latitude and differs between east and north.
 *
 * <p>Plane: metres, east and north positive. Earth: degrees, north and east positive. Tile world:
 * pixels, x growing east, y growing <em>south</em>.
 *
 * <p>Must not depend on the tile stores, on Swing or on anything drawn.
 */
package org.fallwright.maps.frame;
