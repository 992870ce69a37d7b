/**
 * What a vehicle pulls that creeps away from the tree, and what it holds with its wheels locked.
 *
 * <p>Read first: {@link org.fallwright.plugins.vehicle.Traction}, then {@link
 * org.fallwright.plugins.vehicle.Footing} for what the wheels pass on, {@link
 * org.fallwright.plugins.vehicle.Soil} and {@link org.fallwright.plugins.vehicle.FieldTraction} for
 * field tyres, {@link org.fallwright.plugins.vehicle.Parked} for holding, and {@link
 * org.fallwright.plugins.vehicle.Vehicle}, which puts them together. Units N, m, kg, rad. A line's
 * rise is positive where it rises towards the tree; a slope is positive where the vehicle must
 * climb away from the tree. The package depends on the plugin interface and the core only.
 */
package org.fallwright.plugins.vehicle;
