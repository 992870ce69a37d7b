package org.fallwright.core.edit;

import java.util.ArrayList;
import java.util.HashSet;
import java.util.List;
import java.util.Objects;
import java.util.Set;
import java.util.function.UnaryOperator;
import org.fallwright.core.edit.Edit.Kind;
import org.fallwright.core.site.Anchor;
import org.fallwright.core.site.Copy;
import org.fallwright.core.site.Gear;
import org.fallwright.core.site.PeoplePoint;
import org.fallwright.core.site.Position;
import org.fallwright.core.site.Site;
import org.fallwright.core.site.Spot;
import org.fallwright.core.site.SubjectTree;
import org.fallwright.core.site.TakenException;

/** The changes there are. Distances [m], angles clockwise [degrees]. */
public final class Edits {
  private Edits() {}

  /** Puts a new thing on the plan. */
  public static Edit place(Record thing) {
    String id = Things.id(thing);
    return new Edit(
        Kind.PLACE,
        id,
        site -> {
          if (Things.named(site, id).isPresent()) {
            throw new IllegalArgumentException(
                "the name \"" + id + "\" is used twice; each thing must have its own");
          }
          return Things.put(site, id, thing);
        });
  }

  /** Moves a thing as a whole. */
  public static Edit move(String id, double eastM, double northM) {
    return changed(
        Kind.MOVE,
        id,
        t ->
            Things.through(
                t,
                Outline.each(
                    Things.points(t), p -> new Position(p.eastM() + eastM, p.northM() + northM))));
  }

  /** Puts one point of a thing elsewhere: a corner, a pole, or the place where it stands. */
  public static Edit point(String id, int index, Position to) {
    return changed(
        Kind.MOVE,
        id,
        t -> Things.through(t, Outline.with(Things.points(t), within(t, index, 0), to)));
  }

  /** Adds a point to an outline, a fence or a wire, before the one of that number. */
  public static Edit addPoint(String id, int index, Position at) {
    return changed(
        Kind.SHAPE,
        id,
        t -> Things.through(t, Outline.inserted(Things.points(t), outlined(t, index, 1), at)));
  }

  /** Takes a point from an outline, a fence or a wire. */
  public static Edit removePoint(String id, int index) {
    return changed(
        Kind.SHAPE,
        id,
        t -> Things.through(t, Outline.without(Things.points(t), outlined(t, index, 0))));
  }

  /** Turns a thing about the middle of its points; a spot turns its heading. */
  public static Edit turn(String id, double deg) {
    return changed(
        Kind.TURN,
        id,
        t -> {
          if (t instanceof Spot s) {
            double heading = ((s.headingDeg() == null ? 0 : s.headingDeg()) + deg) % 360;
            return Copy.with(s, "headingDeg", heading < 0 ? heading + 360 : heading);
          }
          List<Position> points = Things.points(t);
          Position middle = Outline.middle(points);
          return Things.through(t, Outline.each(points, p -> Outline.turned(p, middle, deg)));
        });
  }

  /**
   * Takes a thing off the plan, its name from the places of the gear, and the tapes to it and the
   * exceptions about it. The tree stays; an anchor that holds a leg of another stays as long as
   * that does.
   */
  public static Edit remove(String id) {
    return new Edit(
        Kind.REMOVE,
        id,
        site -> {
          Record thing = there(site, id);
          if (thing instanceof SubjectTree) {
            throw new IllegalArgumentException(
                id + " is the tree that the site is about; it cannot be removed");
          }
          for (Anchor a : site.anchors()) {
            if (a instanceof Anchor.TwoLegs two
                && (two.first().equals(id) || two.second().equals(id))) {
              throw new IllegalArgumentException(
                  id + " holds a leg of " + two.id() + "; remove " + two.id() + " first");
            }
          }
          return Things.put(unnamed(site, id), id, null);
        });
  }

  /** Puts a copy of a thing beside it, under another name. */
  public static Edit copy(String id, String newId, double eastM, double northM) {
    return new Edit(
        Kind.COPY,
        id,
        site -> {
          Record thing = there(site, id);
          if (thing instanceof SubjectTree) {
            throw new IllegalArgumentException(
                id + " is the tree that the site is about; it cannot be copied");
          }
          Record copy =
              Things.through(
                  Copy.with(thing, "id", newId),
                  Outline.each(
                      Things.points(thing),
                      p -> new Position(p.eastM() + eastM, p.northM() + northM)));
          return place(copy).on(site);
        });
  }

  /** Gives a thing another name, wherever it is named. */
  public static Edit rename(String id, String newId) {
    return new Edit(
        Kind.RENAME,
        id,
        site -> {
          Record thing = Copy.with(there(site, id), "id", newId);
          if (!id.equals(newId) && Things.named(site, newId).isPresent()) {
            throw new IllegalArgumentException(
                "the name \"" + newId + "\" is used twice; each thing must have its own");
          }
          // what names it is given up and taken again, so that no name dangles in between
          Site named = named(unnamed(site, id), id, thing);
          return again(named, site, renamed(site, id, newId), newId);
        });
  }

  private static Site named(Site bare, String id, Record thing) {
    if (!(thing instanceof Anchor)) {
      return Things.put(bare, id, thing);
    }
    List<Anchor> anchors =
        bare.anchors().stream()
            .map(a -> a.id().equals(id) ? (Anchor) thing : renamedLegs(a, id, Things.id(thing)))
            .toList();
    return Copy.with(bare, "anchors", anchors);
  }

  /** What each name is after a thing has another; the places of a strip begin with its name. */
  private static UnaryOperator<String> renamed(Site site, String id, String newId) {
    Set<String> own = names(site, id);
    return n -> own.contains(n) ? newId + n.substring(id.length()) : n;
  }

  /** The name of a thing, and those of its places where it is a strip. */
  private static Set<String> names(Site site, String id) {
    Set<String> names = new HashSet<>(Set.of(id));
    site.strips().stream()
        .filter(s -> s.id().equals(id))
        .flatMap(s -> s.places(site.tree().stump().at()).stream())
        .forEach(p -> names.add(p.id()));
    return names;
  }

  /** The site without whatever names a thing: places of the gear, tapes, doors, exceptions. */
  private static Site unnamed(Site site, String id) {
    Set<String> own = names(site, id);
    Site bare = Copy.with(site, "gear", places(site.gear(), p -> own.contains(p) ? null : p));
    bare =
        Copy.with(
            bare,
            "tapeTies",
            site.tapeTies().stream()
                .filter(t -> !t.from().equals(id) && !t.to().equals(id))
                .toList());
    bare =
        Copy.with(
            bare,
            "peoplePoints",
            site.peoplePoints().stream()
                .map(p -> id.equals(p.of()) ? Copy.with(p, "of", null) : p)
                .toList());
    return Copy.with(
        bare,
        "exceptions",
        site.exceptions().stream().filter(e -> !e.check().endsWith(" " + id)).toList());
  }

  /** The site with what named a thing before, under its new name. */
  private static Site again(Site bare, Site before, UnaryOperator<String> name, String newId) {
    Site site = Copy.with(bare, "gear", places(before.gear(), name));
    site =
        Copy.with(
            site,
            "tapeTies",
            before.tapeTies().stream()
                .map(t -> Copy.with(t, "from", name.apply(t.from())))
                .map(t -> Copy.with(t, "to", name.apply(t.to())))
                .toList());
    List<PeoplePoint> points = new ArrayList<>();
    for (int i = 0; i < before.peoplePoints().size(); i++) {
      String of = name.apply(before.peoplePoints().get(i).of());
      points.add(Copy.with(bare.peoplePoints().get(i), "of", of));
    }
    site = Copy.with(site, "peoplePoints", points);
    return Copy.with(
        site,
        "exceptions",
        before.exceptions().stream().map(e -> renamed(e, name, newId)).toList());
  }

  private static TakenException renamed(
      TakenException e, UnaryOperator<String> name, String newId) {
    int space = e.check().indexOf(' ');
    for (int i = space; i >= 0; i = e.check().indexOf(' ', i + 1)) {
      if (name.apply(e.check().substring(i + 1)).equals(newId)) {
        return Copy.with(e, "check", e.check().substring(0, i + 1) + newId);
      }
    }
    return e;
  }

  /** Puts a thing's whole entry in place of the one of its name. */
  public static Edit enter(Record thing) {
    String id = Things.id(thing);
    return changed(Kind.ENTER, id, t -> thing);
  }

  /** Enters something of the site that is no thing on the plan: the cut, the gear, the day. */
  public static Edit enter(String field, String component, Object value) {
    return new Edit(Kind.ENTER, field, site -> Copy.with(site, component, value));
  }

  private static Edit changed(Kind kind, String id, UnaryOperator<Record> change) {
    return new Edit(kind, id, site -> Things.put(site, id, change.apply(there(site, id))));
  }

  private static Record there(Site site, String id) {
    return Things.named(site, id)
        .orElseThrow(
            () -> new IllegalArgumentException("nothing on the site has the name \"" + id + "\""));
  }

  private static int within(Record thing, int index, int beyond) {
    int points = Things.points(thing).size();
    if (index < 0 || index >= points + beyond) {
      throw new IllegalArgumentException(
          Things.id(thing) + " has " + points + " points; there is no point number " + (index + 1));
    }
    return index;
  }

  private static int outlined(Record thing, int index, int beyond) {
    if (!Things.hasOutline(thing)) {
      throw new IllegalArgumentException(
          Things.id(thing) + " has no outline that points could be added to or taken from");
    }
    return within(thing, index, beyond);
  }

  private static Anchor renamedLegs(Anchor a, String id, String newId) {
    if (a instanceof Anchor.TwoLegs two) {
      Anchor.TwoLegs first = two.first().equals(id) ? Copy.with(two, "first", newId) : two;
      return first.second().equals(id) ? Copy.with(first, "second", newId) : first;
    }
    return a;
  }

  private static Gear places(Gear gear, UnaryOperator<String> change) {
    return Copy.with(
        gear,
        "sources",
        gear.sources().stream()
            .map(s -> Copy.with(s, "places", each(s.places(), change)))
            .map(s -> Copy.with(s, "driverPlaces", each(s.driverPlaces(), change)))
            .toList());
  }

  private static List<String> each(List<String> places, UnaryOperator<String> change) {
    return places.stream().map(change).filter(Objects::nonNull).toList();
  }
}
