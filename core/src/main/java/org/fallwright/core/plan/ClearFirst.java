package org.fallwright.core.plan;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import org.fallwright.core.site.PeoplePoint;
import org.fallwright.core.site.Position;
import org.fallwright.core.site.Site;
import org.fallwright.core.site.Target;
import org.locationtech.jts.geom.Coordinate;

/**
 * A thing to be seen to before the work: it lies in the people ring.
 *
 * @param id its name on the plan
 * @param kind what it is
 * @param nearestM its distance from the stump, position errors taken off [m]
 * @param at its nearest point
 * @param act what is to be done
 */
public record ClearFirst(String id, Kind kind, double nearestM, Position at, String act) {
  /** Kinds of thing. */
  public enum Kind {
    BUILDING,
    DOOR,
    PERSON,
    CAR,
    MOVABLE,
    ROAD
  }

  /** Everything to be seen to inside a radius about the stump, nearest first. */
  static List<ClearFirst> within(Site site, double radiusM) {
    List<ClearFirst> all = new ArrayList<>();
    Position stump = site.tree().stump().at();
    double stumpError = site.tree().stump().errorM();
    for (Target t : site.targets()) {
      Kind kind = kind(t);
      if (kind == null) {
        continue;
      }
      Coordinate[] nearest =
          org.locationtech.jts.operation.distance.DistanceOp.nearestPoints(
              t.shape().geometry(),
              org.fallwright.core.site.Shape.FACTORY.createPoint(
                  new Coordinate(stump.eastM(), stump.northM())));
      Position at = new Position(nearest[0].x, nearest[0].y);
      add(all, radiusM, t.id(), kind, stump, at, t.errorM() + stumpError, act(t, kind));
    }
    for (PeoplePoint p : site.peoplePoints()) {
      boolean door = p.kind() == PeoplePoint.Kind.DOOR;
      add(
          all,
          radiusM,
          p.id(),
          door ? Kind.DOOR : Kind.PERSON,
          stump,
          p.at(),
          p.errorM() + stumpError,
          door ? "knock, then keep it shut or watched" : "ask them to leave");
    }
    all.sort(Comparator.comparingDouble(ClearFirst::nearestM));
    return List.copyOf(all);
  }

  private static void add(
      List<ClearFirst> all,
      double radiusM,
      String id,
      Kind kind,
      Position stump,
      Position at,
      double errorM,
      String act) {
    double nearest = Math.max(0, stump.distanceTo(at) - errorM);
    if (nearest <= radiusM) {
      all.add(new ClearFirst(id, kind, nearest, at, act));
    }
  }

  private static Kind kind(Target t) {
    return switch (t.kind()) {
      case STRUCTURE -> Kind.BUILDING;
      case CAR -> Kind.CAR;
      case PLACE_OF_PEOPLE -> Kind.PERSON;
      case ROAD -> Kind.ROAD;
      case FENCE, PLANTING, TREE, BURIED, OTHER ->
          t.occupied() ? Kind.PERSON : t.movable() ? Kind.MOVABLE : null;
    };
  }

  private static String act(Target t, Kind kind) {
    return switch (kind) {
      case BUILDING -> t.occupied() ? "nobody indoors" : "look inside, nobody in it";
      case CAR, MOVABLE -> t.movable() ? "move it away" : "nobody in or at it; it cannot be moved";
      case PERSON, DOOR -> "nobody there";
      case ROAD -> "close it";
    };
  }
}
