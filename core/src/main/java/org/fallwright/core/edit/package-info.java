/**
 * Changes that a person makes to a site: each a pure function from site to site with a name, and
 * the history that takes them back.
 *
 * <p>Read first: {@link org.fallwright.core.edit.Edit}, then {@link org.fallwright.core.edit.Edits}
 * and {@link org.fallwright.core.edit.History}. Positions are metres east and north of the site's
 * origin, angles degrees clockwise. A change that the site's own records refuse is refused with
 * their sentence, and the site stays as it was. No windows here.
 */
package org.fallwright.core.edit;
