/**
 * Advice around one setup: how far its hinge, its line height, the wind and the tree may stray from
 * what was entered, what to read and to see while it is pulled, and what gives first.
 *
 * <p>Read {@link org.fallwright.core.advice.Advice} first. Every answer comes from judging the
 * changed site or setup with the planner's own {@link org.fallwright.core.plan.Judge}, never from a
 * formula alone; {@code Scan} does the looking. SI inside: lengths in m, forces in N at the tree
 * unless a place is named, heights above the ground at the stump, angles in degrees. It depends on
 * the site, the statics and the plan; nothing in the core may depend on it.
 */
package org.fallwright.core.advice;
