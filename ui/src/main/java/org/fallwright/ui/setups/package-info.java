/**
 * The ways to pull the tree: the answer strip over the window, the ranked list with what was ruled
 * out and why, and all checks and loads of one setup.
 *
 * <p>Read {@link org.fallwright.ui.setups.Answer} and {@link org.fallwright.ui.setups.Ways} first:
 * what is said; the panels only show it. Must not depend on the windows of {@code
 * org.fallwright.ui.app}.
 */
package org.fallwright.ui.setups;
