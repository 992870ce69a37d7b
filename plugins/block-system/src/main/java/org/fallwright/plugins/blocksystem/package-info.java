/**
 * What a block system makes of the source that hauls it.
 *
 * <p>Read first: {@link org.fallwright.plugins.blocksystem.Tackle}, then {@link
 * org.fallwright.plugins.blocksystem.BlockSystem}. Forces in N, ratios per newton at the load. The
 * line's own stretch and length are not judged here. The package depends on the plugin interface
 * and the core only.
 */
package org.fallwright.plugins.blocksystem;
