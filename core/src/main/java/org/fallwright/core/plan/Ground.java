package org.fallwright.core.plan;

import java.util.List;
import org.fallwright.core.site.Position;
import org.fallwright.core.zones.LayTargets;
import org.locationtech.jts.geom.Geometry;

/**
 * The zones of a setup on the ground; coordinates are metres east and north.
 *
 * @param footprint where the tree can come to lie
 * @param tip where its tip is aimed at, without the margin
 * @param sitBack where it falls if line or hinge is lost
 * @param peopleRadiusM radius about the stump that people without a job keep out of [m]
 * @param bights insides of the line's angles, with their margin
 * @param recoil where parted ends fly; named beside the line, not painted as a narrow zone
 * @param escapes ends of the ways out, best first
 * @param halfAngleDeg aim half-angle [degrees]
 * @param wireReachM radius about the stump within which any wire stops the work [m]
 * @param slide where the felled tree may slide on, beyond where it comes to lie; null: it does not
 * @param bridles insides of the angles of two-legged anchors, with their margin
 * @param atStake what stands in the sit-back zone
 * @param hangUps trees on the site that the falling crown can hang up in
 * @param places where the crew stands, in the order of their numbers
 * @param clearFirst what is to be seen to before the work, nearest first
 */
public record Ground(
    Geometry footprint,
    Position tip,
    Geometry sitBack,
    double peopleRadiusM,
    List<Geometry> bights,
    Geometry recoil,
    List<Position> escapes,
    double halfAngleDeg,
    double wireReachM,
    Geometry slide,
    List<Geometry> bridles,
    List<LayTargets.Overlap> atStake,
    List<String> hangUps,
    List<StandingPlace> places,
    List<ClearFirst> clearFirst) {
  public Ground {
    bights = List.copyOf(bights);
    escapes = List.copyOf(escapes);
    bridles = List.copyOf(bridles);
    atStake = List.copyOf(atStake);
    hangUps = List.copyOf(hangUps);
    places = List.copyOf(places);
    clearFirst = List.copyOf(clearFirst);
  }
}
