/**
 * What the tree to be pulled weighs, where its mass sits and how thick its stem is, from what was
 * measured on it.
 *
 * <p>Read first: {@link org.fallwright.core.tree.TreeFigures} (mass and mass centre with their
 * spreads), then {@link org.fallwright.core.tree.StemTaper}; how a tape or a clinometer is read is
 * in the package field below. Heights are above the ground at the stump [m], diameters in metres,
 * masses in kg. DBH is the diameter over bark, taken square to the stem 1.3 m along it from the
 * ground: on a leaning stem along its underside, the side it leans towards; on a slope from the
 * uphill side. The balance of forces is elsewhere: nothing here knows of a lay, a hinge or a line.
 */
package org.fallwright.core.tree;
