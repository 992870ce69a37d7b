package org.fallwright.core.plan;

import org.fallwright.core.site.Position;

/**
 * Where one of the crew stands, by number.
 *
 * @param number its number on plan and sheet, from 1
 * @param role who stands there
 * @param at where
 * @param why why it is clear, or what it lacks, one line
 */
public record StandingPlace(int number, Role role, Position at, String why) {
  /** Who stands at a place. */
  public enum Role {
    /** At the stump while cutting. */
    FELLER("feller, cutting"),
    /** Where the feller goes once the tree moves, the better way first. */
    WAY_OUT("feller, way out"),
    /** Who works the pull source. */
    OPERATOR("source"),
    /** Who watches tree, line and people. */
    LOOK_OUT("look-out");

    private final String word;

    Role(String word) {
      this.word = word;
    }

    /** The word on screen, paper and in the plan file. */
    public String word() {
      return word;
    }
  }
}
