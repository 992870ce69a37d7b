package org.fallwright.core.plan;

import java.util.List;
import java.util.function.DoubleUnaryOperator;
import java.util.function.UnaryOperator;
import org.fallwright.core.line.Point3;
import org.fallwright.core.pull.PullOffer;
import org.fallwright.core.pull.PullRequest;
import org.fallwright.core.pull.PullRequest.Line;
import org.fallwright.core.pull.PullRequest.Pull;
import org.fallwright.core.pull.PullRequest.Stand;
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
   * @param workingN tension at the tree that the plan asks [N]
   */
  record Pulled(double stiffnessNPerM, double takeUpM, double workingN) {
    /** Of a tree that cannot be moved nothing is known, and a source is asked without. */
    static Pulled of(TreeSide t) {
      return t.movable()
          ? new Pulled(t.pathNPerM(), t.takeUpM(), t.workingN())
          : new Pulled(0, 0, 0);
    }
  }

  /** What the source of the way gives at the end of the pull line. */
  static PullOffer of(
      Site site, Setup way, Route route, Pulled pulled, PullSource source, PullSource driver) {
    return of(site, way, route, pulled, source, driver, UnaryOperator.identity());
  }

  /** The same on other ground than the site's, the driver's own too. */
  static PullOffer of(
      Site site,
      Setup way,
      Route route,
      Pulled pulled,
      PullSource source,
      PullSource driver,
      UnaryOperator<Surface> ground) {
    Gear.Source gear = site.source(way.source()).orElseThrow();
    PullOffer haul = null;
    if (way.driver() != null) {
      Gear.Source hauls = site.source(way.driver().source()).orElseThrow();
      double ratio = source.haulLine(gear.parameters(), way.mode()).parts();
      haul =
          driver.offer(
              new PullRequest(
                  hauls.parameters(),
                  way.driver().mode(),
                  stand(site, way.driver().place(), route.haul(), route.haulOnSite(), ground),
                  new Pull(pulled.stiffnessNPerM(), ratio, pulled.takeUpM(), null),
                  null,
                  null));
    }
    return source.offer(request(site, way, route, pulled, haul, ground));
  }

  private static PullRequest request(
      Site site,
      Setup way,
      Route route,
      Pulled pulled,
      PullOffer haul,
      UnaryOperator<Surface> ground) {
    Gear.Source gear = site.source(way.source()).orElseThrow();
    Gear.Line line = GearParts.line(site, way);
    return new PullRequest(
        gear.parameters(),
        way.mode(),
        stand(site, way.place(), route.points(), route.line(), ground),
        new Pull(
            pulled.stiffnessNPerM(),
            1,
            pulled.takeUpM(),
            pulled.workingN() * route.loads().sourceEndPerTree()),
        new Line(
            line.material().wire(),
            line.diameterM(),
            GearParts.lineFigures(site, way).breakingN(),
            line.lengthM(),
            route.loads().lengthM()),
        haul);
  }

  /**
   * What the source of a direct way gives at its least by the rise of its line [rad to N], pulling
   * straight ahead on the ground of its own place.
   */
  static DoubleUnaryOperator lowByRise(
      Site site, Setup way, Route route, Pulled pulled, PullSource source) {
    PullRequest here = request(site, way, route, pulled, null, UnaryOperator.identity());
    Stand at = here.stand();
    return rise -> {
      Stand there =
          new Stand(at.ground(), rise, at.uphillRad(), 0.0, at.heightM(), at.legM(), at.runOutM());
      return source
          .offer(
              new PullRequest(
                  here.parameters(), here.mode(), there, here.pull(), here.line(), null))
          .lowN();
    };
  }

  private static Stand stand(
      Site site,
      String place,
      List<Point3> points,
      List<LinePoint> onSite,
      UnaryOperator<Surface> other) {
    Point3 end = points.get(points.size() - 1);
    Point3 before = points.get(points.size() - 2);
    Point3 leg = before.minus(end);
    double rise = Math.asin(leg.up() / leg.length());
    Spot spot = site.spot(place).orElse(null);
    Surface ground = spot == null ? null : other.apply(SurfaceTable.of(spot.surface(), spot.wet()));
    Double off = null;
    if (spot != null && spot.headingDeg() != null) {
      double pull = Math.atan2(-leg.e(), -leg.n());
      double turn = pull - Math.toRadians(spot.headingDeg());
      off = Math.abs(Math.atan2(Math.sin(turn), Math.cos(turn)));
    }
    double height = onSite.get(onSite.size() - 1).elevationM() - Route.place(site, place).groundM();
    return new Stand(
        ground,
        rise,
        spot == null ? 0 : Math.toRadians(spot.gradeDeg()),
        off,
        height,
        leg.length(),
        spot == null ? null : spot.runOutM());
  }
}
