package org.fallwright.core.plan;

import java.util.ArrayList;
import java.util.List;
import java.util.Set;
import org.fallwright.core.line.LegLoads;
import org.fallwright.core.line.Point3;
import org.fallwright.core.pull.HaulLine;
import org.fallwright.core.pull.PullSource;
import org.fallwright.core.site.Anchor;
import org.fallwright.core.site.Gear;
import org.fallwright.core.site.Place;
import org.fallwright.core.site.Position;
import org.fallwright.core.site.Site;
import org.fallwright.core.site.Spot;
import org.fallwright.core.zones.Leg;

/**
 * Where the line of a way runs in space; the same for every lay.
 *
 * @param points attachment, redirects, end; metres from the stump's centre at hinge level
 * @param loads tensions and loads of those legs
 * @param line the same points on the site
 * @param haul for a block system, its fixed block and its driver, relative; else empty
 * @param haulOnSite the same on the site
 * @param haulLine the line of a block system; null: none
 * @param bearingErrorM position error of the first bearing point [m]
 */
record Route(
    List<Point3> points,
    LegLoads loads,
    List<LinePoint> line,
    List<Point3> haul,
    List<LinePoint> haulOnSite,
    HaulLine haulLine,
    double bearingErrorM) {

  static Route of(Places places, Setup way, PullSource source, PullSource driver) {
    Site site = places.site();
    List<LinePoint> line = new ArrayList<>();
    line.add(attachment(site, way.attachHeightM()));
    Place bearing = null;
    List<Double> efficiencies = new ArrayList<>();
    for (String id : way.redirects()) {
      Anchor a = places.anchor(id);
      bearing = bearing == null ? a.place() : bearing;
      line.add(at(a, LinePoint.Role.REDIRECT));
      efficiencies.add(places.efficiency());
    }
    Gear.Source gear = places.source(way.source());
    LinePoint end =
        end(
            places,
            way.place(),
            gear,
            source,
            way.driver() == null ? LinePoint.Role.SOURCE : LinePoint.Role.BLOCK_SYSTEM);
    line.add(end);
    if (bearing == null) {
      bearing = places.place(way.place());
    }
    List<LinePoint> haul = List.of();
    if (way.driver() != null) {
      Gear.Source hauls = places.source(way.driver().source());
      haul = List.of(end, end(places, way.driver().place(), hauls, driver, LinePoint.Role.SOURCE));
    }
    List<Point3> points = new ArrayList<>(line.size());
    for (LinePoint p : line) {
      points.add(relative(site, p));
    }
    return new Route(
        List.copyOf(points),
        LegLoads.of(points, efficiencies),
        List.copyOf(line),
        haul.stream().map(p -> relative(site, p)).toList(),
        haul,
        way.driver() == null ? null : places.haulLine(gear, source, way.mode()),
        bearing.errorM());
  }

  /** The redirect block used; the strongest there is. */
  static Gear.Block block(Site site) {
    return site.gear().blocks().stream()
        .max(java.util.Comparator.comparingDouble(Gear.Block::ratedLoadN))
        .orElseThrow();
  }

  static Place place(Site site, String id) {
    return site.spot(id).map(Spot::place).orElseGet(() -> site.anchor(id).orElseThrow().place());
  }

  private static LinePoint attachment(Site site, double heightAboveGround) {
    Place stump = site.tree().stump();
    double above = heightAboveGround - site.cut().heightM();
    double off = above * Math.tan(Math.toRadians(site.tree().leanDeg().value()));
    Position at = stump.at().along(site.tree().leanAzimuthDeg().value(), off);
    return new LinePoint(
        at, stump.groundM() + heightAboveGround, LinePoint.Role.ATTACHMENT, site.tree().id());
  }

  /** Where a line is fastened to an anchor. */
  static LinePoint at(Anchor a, LinePoint.Role role) {
    return new LinePoint(a.place().at(), a.place().groundM() + a.slingHeightM(), role, a.id());
  }

  private static LinePoint end(
      Places places, String id, Gear.Source gear, PullSource source, LinePoint.Role role) {
    Spot spot = places.spot(id);
    return spot == null
        ? at(places.anchor(id), role)
        : new LinePoint(
            spot.place().at(), spot.place().groundM() + places.lineHeightM(gear, source), role, id);
  }

  /** Where a line is fastened to an anchor, relative. */
  static Point3 fastening(Site site, Anchor a) {
    return relative(site, at(a, LinePoint.Role.REDIRECT));
  }

  /** A point of the site as metres from the stump's centre at hinge level. */
  static Point3 relative(Site site, LinePoint p) {
    Place stump = site.tree().stump();
    return new Point3(
        p.at().eastM() - stump.at().eastM(),
        p.at().northM() - stump.at().northM(),
        p.elevationM() - stump.groundM() - site.cut().heightM());
  }

  /** Points of line and haul, from the tree outwards. */
  List<LinePoint> all() {
    List<LinePoint> points = new ArrayList<>(line);
    if (!haulOnSite.isEmpty()) {
      points.add(haulOnSite.get(1));
    }
    return points;
  }

  /** The same in plan. */
  List<Position> path() {
    return all().stream().map(LinePoint::at).toList();
  }

  /** The legs between them. */
  List<Leg> legs() {
    List<LinePoint> p = all();
    List<Leg> legs = new ArrayList<>();
    for (int i = 0; i + 1 < p.size(); i++) {
      legs.add(
          new Leg(
              p.get(i).at(),
              p.get(i).elevationM(),
              p.get(i + 1).at(),
              p.get(i + 1).elevationM(),
              Set.of(p.get(i).id(), p.get(i + 1).id())));
    }
    return legs;
  }

  /** Length of the haul leg of a block system [m]; 0: there is none. */
  double haulLegM() {
    return haul.isEmpty() ? 0 : haul.get(0).minus(haul.get(1)).length();
  }
}
