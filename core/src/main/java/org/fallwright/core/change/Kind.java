package org.fallwright.core.change;

import com.fasterxml.jackson.annotation.JsonValue;

/**
 * Kinds of change, in the order of the effort they cost: what a word settles, what is only planned
 * otherwise, what is done at the tree, what is fetched from the truck, what is moved, what must be
 * brought, and what must be waited for. A planning allowance of ours; within a kind the smaller
 * change comes first.
 */
public enum Kind {
  ANSWER("answer an open question"),
  LAY("turn the lay"),
  HINGE("hinge thinner or thicker"),
  FACE("open the face wider"),
  WEDGES("set wedges behind the tree"),
  LINE_HEIGHT("line higher or lower"),
  MODE("run the source otherwise"),
  OTHER_LINE("take another line of the kit"),
  SLING_HEIGHT("sling higher or lower"),
  MOVE_THING("move a thing away"),
  STAND("stand nearer or farther"),
  PEOPLE("more people"),
  LOAD_CELL("a load cell with somebody who reads it"),
  LONGER_LINE("a longer line"),
  MORE_GEAR("more of the gear"),
  WIND("wait for less wind"),
  DRY("wait for drier ground");

  private final String word;

  Kind(String word) {
    this.word = word;
  }

  /** What it is called. */
  @JsonValue
  public String word() {
    return word;
  }
}
