package org.fallwright.core.zones;

import org.fallwright.core.reference.Allowances;
import java.util.List;
import org.fallwright.core.site.Position;
import org.locationtech.jts.geom.Geometry;

/**
 * Where the tree falls if line or hinge is lost: every azimuth within 60° of the direction in which
 * its mass centre lies from the hinge, as long as the tree and its tip margin. No line arrests a
 * tree that is already going back, so what lies in here is at stake.
 *
 * <p>Source: own reckoning; the 60° are a planning allowance.
 */
public final class SitBackZone {
  /** Half its opening [degrees]: planning allowance. */
  static final double HALF_ANGLE_DEG = Allowances.SIT_BACK_ANGLE.value();

  private final Sector sector;

  private SitBackZone(Sector sector) {
    this.sector = sector;
  }

  /**
   * @param stump middle of the stump
   * @param backAzimuthDeg direction from the hinge to the ground below the mass centre [degrees]
   * @param heightM height of the tree [m]
   */
  public static SitBackZone of(Position stump, double backAzimuthDeg, double heightM) {
    double radius = FallOutline.reachM(heightM);
    return new SitBackZone(new Sector(stump, backAzimuthDeg, HALF_ANGLE_DEG, radius));
  }

  public boolean contains(Position p) {
    return sector.contains(p);
  }

  /** Distance from a point to the zone, 0 inside [m]. */
  public double distanceTo(Position p) {
    return sector.distanceTo(p);
  }

  public Geometry geometry() {
    return sector.geometry();
  }

  /** The targets at stake, with how much of each lies in the zone. */
  public List<LayTargets.Overlap> atStake(LayTargets targets) {
    return targets.in(geometry());
  }
}
