/**
 * From what is read off a tape, a clinometer, a plumb line or a compass to the figures that the
 * tree is described by.
 *
 * <p>Read first: {@link org.fallwright.core.tree.field.Reading} (which scale a clinometer was read
 * on is always asked), then {@link org.fallwright.core.tree.field.TapedHeight} and {@link
 * org.fallwright.core.tree.field.Lean}. Lengths in metres, angles in degrees, azimuths clockwise
 * from true north. Plain geometry: nothing here knows of the site, of a species or of a cut.
 */
package org.fallwright.core.tree.field;
