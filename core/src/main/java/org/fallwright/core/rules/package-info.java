/**
 * Safety rules of a place, as data.
 *
 * <p>Read {@link org.fallwright.core.rules.RuleSet} first: each accessor answers with a {@link
 * org.fallwright.core.rules.Rule}, the number with its unit, its comparison, its citation and how
 * well it was read. A cell that no rule was found for falls back to the strictest of all sets and
 * says so. {@link org.fallwright.core.rules.RuleSets} reads the figures from the resource {@code
 * rule-sets.json}; {@link org.fallwright.core.rules.ApproachTable} gives distances to live wires,
 * and {@link org.fallwright.core.rules.WireReach} what a wire within reach means.
 *
 * <p>Metres, kV, degrees, and tree lengths H. These are a planner's figures; none of them shows
 * that a law is met. Knows nothing of sites or plans.
 */
package org.fallwright.core.rules;
