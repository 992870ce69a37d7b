/**
 * What a hanging weight pulls: the worked example of the guide for those who add a pull source.
 *
 * <p>Read first: {@link org.fallwright.plugins.counterweight.Counterweight}. Forces in N at the
 * block, lengths in m. The package must not depend on windows, files or other plugins, and is not
 * among the plugins that the program brings.
 */
package org.fallwright.plugins.counterweight;
