/**
 * Feeds the map on the screen with tiles from a {@link org.fallwright.maps.tiles.TileStore}:
 * offline, and finer than the store where the person zooms in farther.
 *
 * <p>The map widget counts zoom the other way round: 0 is the most detailed level and stands for
 * tile zoom 22. Tiles are read by two threads of its own and handed over on the event thread. Must
 * not depend on what is drawn over the map.
 */
package org.fallwright.ui.map.tile;
