/**
 * What a winch pulls and holds: hand winches whose wire runs through them, lever hoists, drums
 * turned by hand or by power, and capstans; on an anchor or on a machine that stands on its wheels.
 *
 * <p>Read first: {@link org.fallwright.plugins.winch.Drum} and {@link
 * org.fallwright.plugins.winch.Reel} (layers), {@link org.fallwright.plugins.winch.HandDrive},
 * {@link org.fallwright.plugins.winch.Capstan}, {@link org.fallwright.plugins.winch.Parked}; then
 * {@link org.fallwright.plugins.winch.Bounds}, which takes the least of them, and {@link
 * org.fallwright.plugins.winch.Winch}. {@link org.fallwright.plugins.winch.Plate} is what a site
 * states, held against itself. Units N, m, s; angles in rad unless a name says degrees. The anchor
 * behind the winch is not judged here; its load is stated. The package depends on the plugin
 * interface and the core only.
 */
package org.fallwright.plugins.winch;
