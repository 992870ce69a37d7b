/**
 * The site that is open, the plan made for it, and the setup looked at.
 *
 * <p>Read {@link org.fallwright.ui.document.OpenSite} first. Used on the event thread only. Must
 * not depend on the windows of {@code org.fallwright.ui.app}.
 */
package org.fallwright.ui.document;
