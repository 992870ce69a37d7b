/**
 * What was entered about the site, as the rail at the left says it.
 *
 * <p>Read {@link org.fallwright.ui.particulars.Entered} first. Must not depend on the windows of
 * {@code org.fallwright.ui.app}.
 */
package org.fallwright.ui.particulars;
