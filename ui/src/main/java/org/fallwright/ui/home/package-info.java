/**
 * What the program finds beside itself: plugins, base maps, the demo site, its own version. Start
 * with {@link org.fallwright.ui.home.Home}. It only looks, it writes nothing. Must not depend on
 * windows, the command line or the sheet.
 */
package org.fallwright.ui.home;
