/**
 * Which pull sources there are: loads the plugin archives of one folder, keeps a broken one from
 * harming the rest, and says in a sentence why something was not loaded.
 *
 * <p>Read first: {@link org.fallwright.plugins.host.PluginFolder}, then {@link
 * org.fallwright.plugins.host.GuardedSource}. Units are those of {@link
 * org.fallwright.core.pull.PullOffer}. The package reads the folder and writes nothing, and must
 * not depend on any one plugin, on windows or on map files.
 */
package org.fallwright.plugins.host;
