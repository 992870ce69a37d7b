package org.fallwright.core.plan;

import java.util.List;
import java.util.function.DoubleUnaryOperator;
import org.fallwright.core.line.Point3;
import org.fallwright.core.pull.PullOffer;
import org.fallwright.core.pull.PullRequest;
import org.fallwright.core.pull.PullSource;
import org.fallwright.core.reference.Surface;
import org.fallwright.core.reference.SurfaceTable;
import org.fallwright.core.site.Gear;
import org.fallwright.core.site.Site;
import org.fallwright.core.site.Spot;
import org.fallwright.core.statics.TreeSide;

/** Asks the sources of a way what they give, now that the geometry and the take-up are known. */
final class Reach {
  private Reach() {}

  /**
   * What the source feels of the tree.
   *
   * @param stiffnessNPerM path stiffness at the tree [N/m]
   * @param takeUpM line to take in at the tree [m]
   */
  record Pulled(double stiffnessNPerM, double takeUpM) {
    /** Of a tree that cannot be moved nothing is known, and a source is asked without. */
    static Pulled of(TreeSide t) {
      return t.movable() ? new Pulled(t.pathNPerM(), t.takeUpM()) : new Pulled(0, 0);
    }
  }

  /** What the source of the way gives at the end of the pull line. */
  static PullOffer of(
      Site site, Setup way, Route route, Pulled pulled, PullSource source, PullSource driver) {
    Gear.Source gear = site.source(way.source()).orElseThrow();
    if (way.driver() == null) {
      return source.offer(
          request(site, gear, way.mode(), way.place(), route.points(), pulled, 1, null));
    }
    double ratio = source.haulLine(gear.parameters(), way.mode()).parts();
    Gear.Source hauls = site.source(way.driver().source()).orElseThrow();
    PullOffer haul =
        driver.offer(
            request(
                site,
                hauls,
                way.driver().mode(),
                way.driver().place(),
                route.haul(),
                pulled,
                ratio,
                null));
    return source.offer(
        request(site, gear, way.mode(), way.place(), route.points(), pulled, 1, haul));
  }

  /**
   * What the source of a direct way gives at its least by the rise of its line [rad to N], pulling
   * straight ahead on the ground of its own place.
   */
  static DoubleUnaryOperator lowByRise(Site site, Setup way, Pulled pulled, PullSource source) {
    Gear.Source gear = site.source(way.source()).orElseThrow();
    Double heading = site.spot(way.place()).map(Spot::headingDeg).orElse(null);
    double ahead = heading == null ? 0 : Math.toRadians(heading);
    return rise -> {
      Point3 tree =
          new Point3(
              -Math.sin(ahead) * Math.cos(rise), -Math.cos(ahead) * Math.cos(rise), Math.sin(rise));
      List<Point3> line = List.of(tree, new Point3(0, 0, 0));
      return source
          .offer(request(site, gear, way.mode(), way.place(), line, pulled, 1, null))
          .lowN();
    };
  }

  private static PullRequest request(
      Site site,
      Gear.Source gear,
      String mode,
      String place,
      List<Point3> points,
      Pulled pulled,
      double travelRatio,
      PullOffer driver) {
    Point3 end = points.get(points.size() - 1);
    Point3 before = points.get(points.size() - 2);
    Point3 leg = before.minus(end);
    double rise = Math.asin(leg.up() / leg.length());
    Spot spot = site.spot(place).orElse(null);
    Surface ground = spot == null ? null : SurfaceTable.of(spot.surface(), spot.wet());
    Double off = null;
    if (spot != null && spot.headingDeg() != null) {
      double pull = Math.atan2(-leg.e(), -leg.n());
      double turn = pull - Math.toRadians(spot.headingDeg());
      off = Math.abs(Math.atan2(Math.sin(turn), Math.cos(turn)));
    }
    return new PullRequest(
        gear.parameters(),
        mode,
        ground,
        rise,
        spot == null ? 0 : Math.toRadians(spot.gradeDeg()),
        off,
        pulled.stiffnessNPerM(),
        travelRatio,
        pulled.takeUpM(),
        spot == null ? null : spot.runOutM(),
        driver);
  }
}
