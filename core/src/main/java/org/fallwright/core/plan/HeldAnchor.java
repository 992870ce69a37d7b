package org.fallwright.core.plan;

import org.fallwright.core.anchor.AnchorLoad;
import org.fallwright.core.anchor.Capacity;
import org.fallwright.core.site.Anchor;

/**
 * An anchor of a way and what it holds.
 *
 * @param anchor the anchor
 * @param load direction of the load on it, hauling
 * @param capacity what it holds under this load
 */
public record HeldAnchor(Anchor anchor, AnchorLoad load, Capacity capacity) {}
