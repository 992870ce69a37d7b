/**
 * Work off the event thread: shown by its progress, stopped on request, and of several runs only
 * the newest delivers its result.
 *
 * <p>Read {@link org.fallwright.ui.task.NewestWins} first. Must not depend on any other package of
 * the desktop.
 */
package org.fallwright.ui.task;
