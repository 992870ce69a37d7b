/**
 * The command line: reads sites, plans them, writes plan documents and sheets, lists the plugins.
 * Start with {@link org.fallwright.ui.cli.Fallwright}. Results go to the standard output, messages
 * to the standard error; no call shows a stack trace. Amounts are shown in the site's own units.
 * Must not hold rules of planning.
 */
package org.fallwright.ui.cli;
