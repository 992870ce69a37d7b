package org.fallwright.core.plan;

import org.fallwright.core.site.Position;

/**
 * A point of the line in space.
 *
 * @param at position on the site plane
 * @param elevationM elevation above the site's height datum [m]
 * @param role what is there
 * @param id id of the tree, anchor or spot
 */
public record LinePoint(Position at, double elevationM, Role role, String id) {
  /** Roles of a point. */
  public enum Role {
    ATTACHMENT,
    REDIRECT,
    /** The fixed block of a block system. */
    BLOCK_SYSTEM,
    SOURCE
  }
}
