/**
 * The force balance of a pulled back-leaner: weight, wind, hinge and line; its movement, its hold,
 * its hinge and every part by one rule.
 *
 * <p>Read {@link org.fallwright.core.statics.Statics} first, then {@code ForceBalance}. Forces in N
 * at the tree, in the leg that leaves the attachment; moments in N·m, weight positive towards the
 * lay; heights above the hinge; angles φ in rad, positive towards the lay. Must not know of
 * sources, plugins, files or windows.
 */
package org.fallwright.core.statics;
