/**
 * What a winch pulls and holds: hand winches whose wire runs through them, and drums turned by hand
 * or by power.
 *
 * <p>Read first: {@link org.fallwright.plugins.winch.Drum}, then {@link
 * org.fallwright.plugins.winch.Winch}. Units N, m, s. The anchor behind the winch is not judged
 * here; its load is stated. The package depends on the plugin interface and the core only.
 */
package org.fallwright.plugins.winch;
