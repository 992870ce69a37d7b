/**
 * The line: its path in space, the loads it puts on every block and anchor, and what its parts
 * hold.
 *
 * <p>Read {@link org.fallwright.core.line.LegLoads} first (loads by the angles of the path), then
 * {@link org.fallwright.core.line.PathFit} (is there line enough) and {@link
 * org.fallwright.core.line.PartStrength} (ultimate strength and factors of a part), worked out from
 * what was entered by {@link org.fallwright.core.line.LineFigures} and {@link
 * org.fallwright.core.line.RatedFigures}. The other classes answer for ropes, chains, ends, slings,
 * sheaves and wraps, each by rows of {@link org.fallwright.core.reference.Hardware}.
 *
 * <p>Points in metres east, north and up; forces per newton at the tree where a name says so.
 * Searches nothing and knows nothing of plans or rule sets.
 */
package org.fallwright.core.line;
