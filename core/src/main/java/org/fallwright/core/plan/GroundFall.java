package org.fallwright.core.plan;

import java.util.ArrayList;
import java.util.List;
import org.fallwright.core.site.Place;
import org.fallwright.core.site.Position;
import org.fallwright.core.site.Site;
import org.locationtech.jts.geom.Coordinate;

/**
 * How the ground about the stump falls: the plane through the stump's ground that lies nearest, by
 * least squares, to all ground heights entered within three tree heights.
 *
 * <p>Leaves out what lies between those heights: a bank or ditch that nobody entered.
 *
 * @param eastward rise per metre to the east
 * @param northward rise per metre to the north
 */
record GroundFall(double eastward, double northward) {
  /** Heights farther off than this many tree heights say nothing; planning allowance. */
  private static final double WITHIN = 3;

  private record Known(Position at, double groundM) {}

  static GroundFall of(Site site) {
    List<Known> known = new ArrayList<>();
    site.anchors().forEach(a -> known.add(new Known(a.place().at(), a.place().groundM())));
    site.spots().forEach(s -> known.add(new Known(s.place().at(), s.place().groundM())));
    site.wires().forEach(w -> w.poles().forEach(p -> known.add(new Known(p.at(), p.groundM()))));
    site.targets()
        .forEach(
            t -> {
              Coordinate c = t.shape().geometry().getCentroid().getCoordinate();
              known.add(new Known(new Position(c.x, c.y), t.groundM()));
            });
    Place stump = site.tree().stump();
    double ee = 0;
    double en = 0;
    double nn = 0;
    double ez = 0;
    double nz = 0;
    for (Known k : known) {
      double e = k.at().eastM() - stump.at().eastM();
      double n = k.at().northM() - stump.at().northM();
      if (Math.hypot(e, n) > WITHIN * site.tree().heightM().value()) {
        continue;
      }
      double z = k.groundM() - stump.groundM();
      ee += e * e;
      en += e * n;
      nn += n * n;
      ez += e * z;
      nz += n * z;
    }
    if (ee + nn == 0) {
      // nothing near enough says how the ground lies
      return new GroundFall(0, 0);
    }
    // a hair of level ground square to the rest keeps heights on one line from tilting it sideways
    double hair = 1e-9 * (ee + nn) + Double.MIN_NORMAL;
    double det = (ee + hair) * (nn + hair) - en * en;
    return new GroundFall((ez * (nn + hair) - nz * en) / det, (nz * (ee + hair) - ez * en) / det);
  }

  /** Steepest fall of the ground, whichever way [degrees]. */
  double steepestDeg() {
    return Math.toDegrees(Math.atan(Math.hypot(eastward, northward)));
  }

  /** Fall of the ground along an azimuth [degrees], positive downhill. */
  double alongDeg(double azimuthDeg) {
    double a = Math.toRadians(azimuthDeg);
    return -Math.toDegrees(Math.atan(eastward * Math.sin(a) + northward * Math.cos(a)));
  }
}
