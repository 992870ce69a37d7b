/**
 * The profile along the lay: ground, tree, line and what stands in the way, in the vertical plane
 * through the stump.
 *
 * <p>Read {@link org.fallwright.ui.side.ProfilePainter} first. Distances s are metres along the lay
 * from the middle of the stump, r to the right of it, heights z above the ground at the stump. Must
 * not depend on the windows of {@code org.fallwright.ui.app}.
 */
package org.fallwright.ui.side;
