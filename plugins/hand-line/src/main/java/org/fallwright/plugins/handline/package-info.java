/**
 * What people on a hand line pull.
 *
 * <p>Read first: {@link org.fallwright.plugins.handline.PersonPull}, then {@link
 * org.fallwright.plugins.handline.Crew} for many together, {@link
 * org.fallwright.plugins.handline.Capture} for holding, {@link
 * org.fallwright.plugins.handline.Gang} for what a site says of them, and {@link
 * org.fallwright.plugins.handline.HandLine}, which puts them together. Units N, m, kg, rad. A
 * line's rise is positive where it rises towards the tree; a slope is positive where the ground
 * falls towards the tree; distances along the ground are measured from the feet and positive away
 * from the tree. The package depends on the plugin interface and the core only.
 */
package org.fallwright.plugins.handline;
