package org.fallwright.ui.map;

import java.awt.Graphics2D;

/** Paints what lies under the plan: an aerial picture, or nothing. */
@FunctionalInterface
public interface GroundPainter {
  /** Nothing under the plan. */
  GroundPainter NONE = (g, view) -> {};

  void paint(Graphics2D g, Viewport view);

  /** What could not be drawn and why, in sentences, known after painting; null: nothing. */
  default String fault() {
    return null;
  }
}
