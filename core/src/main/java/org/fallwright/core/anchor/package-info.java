/**
 * What an anchor can hold.
 *
 * <p>Read {@link org.fallwright.core.anchor.AnchorCapacity} first: it sends each kind of anchor to
 * its own strength ({@link org.fallwright.core.anchor.WoodAnchor}, {@link
 * org.fallwright.core.anchor.LockedWheels}) and refuses what must not be used. A refusal is a
 * result with strength 0 and a reason. {@link org.fallwright.core.anchor.Pickets} and {@link
 * org.fallwright.core.anchor.Deadman} go by published tables. {@link
 * org.fallwright.core.anchor.Bridle} shares one load between two legs in space, {@link
 * org.fallwright.core.anchor.TwoLegs} in a plane.
 *
 * <p>N, m, kg, N·m, Pa; angles in degrees at the interfaces. The load on an anchor is the resultant
 * of the line's legs on it; its uplift is positive where it pulls the anchor upwards.
 *
 * <p>Knows nothing of plans, rule sets or pull sources.
 */
package org.fallwright.core.anchor;
