/**
 * Zones on the ground: where the tree can come to lie, how near it comes to each target, and where
 * nobody may stand.
 *
 * <p>Read {@link org.fallwright.core.zones.FallFootprint} first, then {@link
 * org.fallwright.core.zones.LayTargets}. The other zones stand alone: {@link
 * org.fallwright.core.zones.SitBackZone}, {@link org.fallwright.core.zones.WireCheck}, {@link
 * org.fallwright.core.zones.LegCheck}, {@link org.fallwright.core.zones.Bight}, {@link
 * org.fallwright.core.zones.Recoil}, {@link org.fallwright.core.zones.EscapeRoutes}.
 *
 * <p>Plan view in metres, x east and y north of the site's origin; elevations in metres above the
 * site's height datum; azimuths in degrees clockwise from true north. A clearance is positive when
 * apart and negative when things overlap. Curved outlines are drawn as polygons around the curve,
 * so a zone is never smaller than its definition.
 *
 * <p>Depends on the site's records and on plane geometry only; knows nothing of statics, plans,
 * rules or drawing.
 */
package org.fallwright.core.zones;
