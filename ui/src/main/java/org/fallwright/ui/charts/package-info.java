/**
 * Pictures of figures: bars, distributions and curves.
 *
 * <p>Read {@link org.fallwright.ui.charts.Chart} first. Every painter is a value that draws itself
 * into any graphics, so that screen, picture and paper show the same; it is told apart by shape and
 * grey alone, colour only helps. Lengths and forces come in SI and are shown in the units of the
 * site. Must not depend on the window.
 */
package org.fallwright.ui.charts;
