/**
 * What stands in a scrolled column of the window.
 *
 * <p>Knows nothing of sites and plans; must not depend on any other package of the desktop.
 */
package org.fallwright.ui.column;
