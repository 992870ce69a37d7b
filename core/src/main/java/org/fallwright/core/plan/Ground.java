package org.fallwright.core.plan;

import java.util.List;
import org.fallwright.core.site.Position;
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
    double wireReachM) {}
