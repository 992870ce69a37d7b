/**
 * The window: it puts the regions together, wires them to the open site, and starts the planning.
 *
 * <p>Read {@link org.fallwright.ui.app.MainWindow} first, then {@link org.fallwright.ui.app.Desk}.
 * What it needs from outside comes in as {@link org.fallwright.ui.app.Wiring}. Holds no rules: what
 * is said comes from the models beside the panels.
 */
package org.fallwright.ui.app;
