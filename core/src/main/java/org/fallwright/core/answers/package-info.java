/**
 * Answers about setups that were planned: why not this anchor, spot or lay; how two setups differ;
 * which trade clearance against pull; how they stand on another day; what is still open and what it
 * decides.
 *
 * <p>Read {@link org.fallwright.core.answers.Ladder} first. Every answer comes from judging with
 * the planner's own {@link org.fallwright.core.plan.Judge}; nothing is reckoned here. SI inside:
 * lengths in m, forces in N at the tree, lays in degrees from true north. It depends on the site,
 * the plan and the changes; nothing of the plan may depend on it.
 */
package org.fallwright.core.answers;
