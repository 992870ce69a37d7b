/**
 * Pictures of the ground that are not cut in tiles yet: how one is read, where each of its pixels
 * lies on the earth, and how it becomes a tile set.
 *
 * <p>Read {@link org.fallwright.maps.picture.PictureTiles} first. A {@link
 * org.fallwright.maps.picture.Raster} gives pixels, a {@link org.fallwright.maps.picture.Placing}
 * says where they lie: by a coordinate system and an affine map (GeoTIFF, world file), or on a
 * site's plane by control points or a known length ({@link org.fallwright.maps.picture.PlaneFit}).
 *
 * <p>Pixels are counted from the upper left corner of the picture, x to the right, y downwards;
 * whole numbers are corners of pixels, their middles lie at halves. A file that is cut short or
 * damaged is an {@link java.io.IOException} with one sentence that names it; nothing of it is shown
 * as black ground. Everything here may take long: never call it on the event thread. Must not
 * depend on Swing.
 */
package org.fallwright.maps.picture;
