/**
 * Which figures the planner stands on, and where each comes from.
 *
 * <p>Read first: {@link org.fallwright.core.reference.Figure} (a value with unit, kind and source),
 * then {@link org.fallwright.core.reference.Allowances} (every rule constant), {@link
 * org.fallwright.core.reference.Spreads} (how far an entered quantity may be off), {@link
 * org.fallwright.core.reference.SpeciesTable} and {@link
 * org.fallwright.core.reference.SurfaceTable} (tables), {@link
 * org.fallwright.core.reference.Sources} (the one list of sources).
 *
 * <p>Units are SI and stand in each figure; a share or factor has the empty unit. Nothing here
 * reckons a plan: it must not depend on any package but {@code units} and {@code site}.
 */
package org.fallwright.core.reference;
