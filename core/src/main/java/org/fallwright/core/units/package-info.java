/**
 * How numbers are held, checked and shown: SI doubles inside, and other units at fields, files and
 * paper only.
 *
 * <p>Read first: {@link org.fallwright.core.units.Units} (conversion factors), then {@link
 * org.fallwright.core.units.DisplayUnits} (what a person sees) and {@link
 * org.fallwright.core.units.Range} (what a number may be). It must not depend on any other package.
 */
package org.fallwright.core.units;
