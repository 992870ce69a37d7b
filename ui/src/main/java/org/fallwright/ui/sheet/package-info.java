/**
 * The sheet: one page on paper, true to scale, with one setup of a plan and what the crew has to
 * know of it. Start with {@link org.fallwright.ui.sheet.SheetFile}, which writes it as PDF or PNG;
 * {@link org.fallwright.ui.sheet.SheetContent} holds every word and figure on it and {@link
 * org.fallwright.ui.sheet.SheetPainter} lays them out.
 *
 * <p>Lengths on the page are points, 1/72 inch; x to the right, y down. Must not depend on windows,
 * the command line or plugins.
 */
package org.fallwright.ui.sheet;
