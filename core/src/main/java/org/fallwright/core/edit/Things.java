package org.fallwright.core.edit;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.stream.Stream;
import org.fallwright.core.site.Anchor;
import org.fallwright.core.site.Copy;
import org.fallwright.core.site.DropZone;
import org.fallwright.core.site.PeoplePoint;
import org.fallwright.core.site.Place;
import org.fallwright.core.site.Position;
import org.fallwright.core.site.Shape;
import org.fallwright.core.site.Site;
import org.fallwright.core.site.Spot;
import org.fallwright.core.site.Strip;
import org.fallwright.core.site.SubjectTree;
import org.fallwright.core.site.Target;
import org.fallwright.core.site.Wire;

/** The things on the plan, each with a name and points, whatever kind of record it is. */
public final class Things {
  private Things() {}

  /** Everything that stands on the plan; the tree first. */
  public static List<Record> of(Site site) {
    return Stream.of(
            Stream.of(site.tree()),
            site.targets().stream(),
            site.wires().stream(),
            site.dropZones().stream(),
            site.anchors().stream().map(a -> (Record) a),
            site.spots().stream(),
            site.peoplePoints().stream(),
            site.strips().stream())
        .flatMap(s -> s)
        .map(Record.class::cast)
        .toList();
  }

  /** The thing of that name. */
  public static Optional<Record> named(Site site, String id) {
    return of(site).stream().filter(t -> id(t).equals(id)).findFirst();
  }

  /** Its name. */
  public static String id(Record thing) {
    if (thing instanceof SubjectTree t) {
      return t.id();
    }
    if (thing instanceof Target t) {
      return t.id();
    }
    if (thing instanceof Wire w) {
      return w.id();
    }
    if (thing instanceof DropZone d) {
      return d.id();
    }
    if (thing instanceof Anchor a) {
      return a.id();
    }
    if (thing instanceof Spot s) {
      return s.id();
    }
    if (thing instanceof PeoplePoint p) {
      return p.id();
    }
    if (thing instanceof Strip s) {
      return s.id();
    }
    throw new IllegalArgumentException(thing.getClass().getSimpleName() + " is no thing on a plan");
  }

  /** Its points: corners, poles, or the one place where it stands. */
  public static List<Position> points(Record thing) {
    if (thing instanceof Wire w) {
      return w.poles().stream().map(Wire.Pole::at).toList();
    }
    if (thing instanceof PeoplePoint p) {
      return List.of(p.at());
    }
    if (thing instanceof Strip s) {
      return s.points();
    }
    return shape(thing).map(Outline::points).orElseGet(() -> List.of(place(thing).at()));
  }

  /** Whether points can be added to it and taken from it. */
  public static boolean hasOutline(Record thing) {
    return thing instanceof Wire
        || thing instanceof Strip
        || shape(thing).filter(s -> !(s instanceof Shape.Circle)).isPresent();
  }

  /** The same thing through other points; a wire's further poles are like their neighbours. */
  static Record through(Record thing, List<Position> points) {
    if (thing instanceof Wire w) {
      return Copy.with(w, "poles", poles(w.poles(), points));
    }
    if (thing instanceof Strip) {
      return Copy.with(thing, "points", points);
    }
    Optional<Shape> shape = shape(thing);
    if (shape.isPresent()) {
      return Copy.with(thing, "shape", Outline.through(shape.get(), points));
    }
    if (thing instanceof SubjectTree t) {
      return tree(t, points.get(0));
    }
    if (thing instanceof PeoplePoint p) {
      return Copy.with(p, "at", points.get(0));
    }
    return Copy.with(thing, "place", Copy.with(place(thing), "at", points.get(0)));
  }

  /** The same site with a thing in place of the one of that name, or with one more; null: none. */
  static Site put(Site site, String id, Record thing) {
    if (thing instanceof SubjectTree || site.tree().id().equals(id)) {
      return Copy.with(site, "tree", thing);
    }
    String list = list(thing == null ? named(site, id).orElseThrow() : thing);
    List<Record> changed = new ArrayList<>();
    boolean there = false;
    for (Record r : of(site)) {
      if (!(r instanceof SubjectTree) && list(r).equals(list)) {
        boolean own = id(r).equals(id);
        there |= own;
        if (!own) {
          changed.add(r);
        } else if (thing != null) {
          changed.add(thing);
        }
      }
    }
    if (!there && thing != null) {
      changed.add(thing);
    }
    return Copy.with(site, list, changed);
  }

  private static String list(Record thing) {
    if (thing instanceof Target) {
      return "targets";
    }
    if (thing instanceof Wire) {
      return "wires";
    }
    if (thing instanceof DropZone) {
      return "dropZones";
    }
    if (thing instanceof PeoplePoint) {
      return "peoplePoints";
    }
    if (thing instanceof Strip) {
      return "strips";
    }
    return thing instanceof Anchor ? "anchors" : "spots";
  }

  private static Optional<Shape> shape(Record thing) {
    if (thing instanceof Target t) {
      return Optional.of(t.shape());
    }
    return thing instanceof DropZone d ? Optional.of(d.shape()) : Optional.empty();
  }

  private static Place place(Record thing) {
    if (thing instanceof SubjectTree t) {
      return t.stump();
    }
    return thing instanceof Anchor a ? a.place() : ((Spot) thing).place();
  }

  /** The crown goes with its tree. */
  private static SubjectTree tree(SubjectTree t, Position to) {
    double east = to.eastM() - t.stump().at().eastM();
    double north = to.northM() - t.stump().at().northM();
    Place stump = Copy.with(t.stump(), "at", to);
    if (t.crownOutline() == null) {
      return Copy.with(t, "stump", stump);
    }
    Shape.Polygon crown =
        new Shape.Polygon(
            Outline.each(
                t.crownOutline().points(),
                p -> new Position(p.eastM() + east, p.northM() + north)));
    // in two steps, the outline away in between: far from its stump it would be refused
    SubjectTree bare = Copy.with(Copy.with(t, "crownOutline", null), "stump", stump);
    return Copy.with(bare, "crownOutline", crown);
  }

  private static List<Wire.Pole> poles(List<Wire.Pole> before, List<Position> points) {
    List<Wire.Pole> poles = new ArrayList<>();
    for (Position p : points) {
      Wire.Pole like =
          before.stream()
              .min((a, b) -> Double.compare(a.at().distanceTo(p), b.at().distanceTo(p)))
              .orElseThrow();
      poles.add(Copy.with(like, "at", p));
    }
    if (points.size() == before.size()) {
      for (int i = 0; i < points.size(); i++) {
        poles.set(i, Copy.with(before.get(i), "at", points.get(i)));
      }
    }
    return poles;
  }
}
