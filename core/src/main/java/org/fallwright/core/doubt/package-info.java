/**
 * How far the figures of a plan can be trusted: what everything entered may really be, what that
 * does to the margin, and what to measure next.
 *
 * <p>Read {@link org.fallwright.core.doubt.Sampler} first (what is drawn, and how), then {@link
 * org.fallwright.core.doubt.Doubt} (what it comes to for one setup) and {@link
 * org.fallwright.core.doubt.Doubted} (the plan with its leading setups judged by the trials).
 * Tensions are at the tree, in newtons; margins are source over need, pure numbers; an input off
 * its mean is in standard deviations, or for an even spread a share of its width from 0 to 1.
 * Nothing here has a formula of statics of its own, and nothing may depend on a window or a file.
 */
package org.fallwright.core.doubt;
