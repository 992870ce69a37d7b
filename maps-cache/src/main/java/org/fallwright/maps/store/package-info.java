/**
 * The base maps at hand: which there are, how large, how old and from whom, whether each is whole,
 * and whether a site can do without a signal.
 *
 * <p>Read {@link org.fallwright.maps.store.MapShelf} first. Sizes are bytes, areas metres of the
 * site plane. Reads the disk: never call it on the event thread. Must not depend on Swing; nothing
 * here goes to a network.
 */
package org.fallwright.maps.store;
