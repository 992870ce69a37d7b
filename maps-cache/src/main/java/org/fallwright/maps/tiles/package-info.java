/**
 * Pictures of the ground in map tiles: where they come from, and how a piece of ground is drawn
 * from them.
 *
 * <p>Read {@link org.fallwright.maps.tiles.TileStore} first; {@link
 * org.fallwright.maps.tiles.MbTiles} is the store in one file, {@link
 * org.fallwright.maps.tiles.TilePyramid} answers for every tile below the finest one stored, and
 * {@link org.fallwright.maps.tiles.GroundPainter} draws a rectangle of the site plane.
 *
 * <p>Tiles are numbered from the north-west corner of the Web Mercator world: x to the east, y to
 * the south ("XYZ"). Nothing here goes to a network. Everything may read the disk: never call it on
 * the event thread.
 *
 * <p>Must not depend on Swing. A missing tile is an answer, not a fault; a file that cannot be read
 * is an {@link java.io.IOException} with one sentence that names it.
 */
package org.fallwright.maps.tiles;
