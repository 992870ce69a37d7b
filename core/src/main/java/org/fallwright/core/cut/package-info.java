/**
 * Face, hinge and back cut: their shape at the stump.
 *
 * <p>Lengths in m; offsets along the lay, from the stump's centre.
 */
package org.fallwright.core.cut;
