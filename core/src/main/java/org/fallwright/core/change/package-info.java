/**
 * What a small change of site or setup would do: the changes that a crew can make, how much effort
 * each is, and which of them make a setup work, each found by judging the changed site.
 *
 * <p>Read {@link org.fallwright.core.change.Remedies} first. Only physical changes and answers to
 * open questions are proposed: never a smaller distance, another rule or another factor. SI inside.
 * It depends on the site, the plan and the advice; the plan may not depend on it.
 */
package org.fallwright.core.change;
