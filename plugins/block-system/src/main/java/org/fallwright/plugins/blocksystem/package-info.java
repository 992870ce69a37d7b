/**
 * What a block system makes of the source that hauls it: simple tackles, and compounds of two.
 *
 * <p>Read first: {@link org.fallwright.plugins.blocksystem.Tackle}, {@link
 * org.fallwright.plugins.blocksystem.Rig}, {@link org.fallwright.plugins.blocksystem.Throw}; then
 * {@link org.fallwright.plugins.blocksystem.BlockSystem}. {@link
 * org.fallwright.plugins.blocksystem.Kit} is what a site states, held against itself. Forces in N,
 * ratios per newton at the load. The stretch of its line is told as one leg that gives way as the
 * system does; the line's length is judged by the core, but for the first tackle of a compound. The
 * package depends on the plugin interface and the core only.
 */
package org.fallwright.plugins.blocksystem;
