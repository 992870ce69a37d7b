/**
 * A figure over the ground in equal cells, and the lines where it has one value.
 *
 * <p>Read first: {@link org.fallwright.core.raster.Raster}, then {@link
 * org.fallwright.core.raster.ContourLines}. Positions are metres east and north of the site's
 * origin; a cell without a figure is NaN. The package knows nothing of what the figure means.
 */
package org.fallwright.core.raster;
