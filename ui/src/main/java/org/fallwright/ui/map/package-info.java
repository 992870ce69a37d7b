/**
 * The plan from above: what stands on the site and what the chosen setup does there, drawn into any
 * {@link java.awt.Graphics2D}, so that screen, picture and paper cannot differ.
 *
 * <p>Read {@link org.fallwright.ui.map.PlanPainter} first; {@link org.fallwright.ui.map.Viewport}
 * alone turns metres east and north into pixels. The painters need no window and hold no rules: all
 * they show has been judged before. Must not depend on the windows of {@code
 * org.fallwright.ui.app}.
 */
package org.fallwright.ui.map;
