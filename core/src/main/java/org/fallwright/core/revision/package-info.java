/**
 * The setup as it is really set on the day: the verdict at once, old beside new, and a revision
 * kept beside the plan, never over it.
 *
 * <p>Read {@link org.fallwright.core.revision.Today} first. A worse verdict is taken only with the
 * name of who accepts it. Time is what the person says it is; no clock is read. SI inside. It
 * depends on the site, the plan and the answers; the plan may not depend on it.
 */
package org.fallwright.core.revision;
