package org.fallwright.core.change;

import java.util.ArrayList;
import java.util.List;
import org.fallwright.core.site.Anchor;
import org.fallwright.core.site.Copy;
import org.fallwright.core.site.Place;
import org.fallwright.core.site.Position;
import org.fallwright.core.site.Site;
import org.fallwright.core.site.Spot;
import org.fallwright.core.site.Strip;
import org.fallwright.core.site.Target;

/** What can be changed on the ground: where it is stood, slings, wet ground, things in the way. */
final class PlaceEdits {
  private static final double STAND_STEP_M = 0.5;
  private static final int STAND_STEPS = 40;

  /** Nearest that a spot is moved to the point before it [m]; planning allowance. */
  private static final double STAND_LEAST_M = 5;

  private static final double SLING_STEP_M = 0.1;
  private static final int SLING_STEPS = 30;

  private final Edits e;

  private PlaceEdits(Edits e) {
    this.e = e;
  }

  static List<Dial> dials(Edits e) {
    PlaceEdits p = new PlaceEdits(e);
    List<Dial> all = new ArrayList<>();
    List<String> places = e.places();
    for (int i = 0; i < places.size(); i++) {
      String id = places.get(i);
      Position before = i == 0 ? e.site.tree().stump().at() : p.at(places.get(i - 1));
      for (int way : new int[] {-1, 1}) {
        e.site.spots().stream()
            .filter(s -> s.id().equals(id)) // other places of a strip are candidates already
            .forEach(
                s ->
                    all.add(
                        new Dial(STAND_STEPS, 4, n -> p.stand(s, before, way * n * STAND_STEP_M))));
        e.site
            .anchor(id)
            .ifPresent(
                a -> all.add(new Dial(SLING_STEPS, 2, n -> p.sling(a, way * n * SLING_STEP_M))));
      }
    }
    for (Target t : e.site.targets()) {
      if (t.movable()) {
        all.add(Dial.once(n -> p.away(t)));
      }
    }
    List<String> wet = places.stream().filter(p::wet).toList();
    wet.forEach(id -> all.add(Dial.once(n -> p.dry(List.of(id)))));
    if (wet.size() > 1) {
      all.add(Dial.once(n -> p.dry(wet)));
    }
    return all;
  }

  private Position at(String id) {
    return e.site
        .anchor(id)
        .map(Anchor::place)
        .or(() -> e.site.spot(id).map(Spot::place))
        .map(Place::at)
        .orElseThrow();
  }

  /** The spot moved along its line; the ground there is taken as it is at the spot. */
  private Edit stand(Spot s, Position before, double by) {
    double far = before.distanceTo(s.place().at()) + by;
    if (far < STAND_LEAST_M) {
      return null;
    }
    Position there = before.along(before.azimuthTo(s.place().at()), far);
    Spot moved = Copy.with(s, "place", Copy.with(s.place(), "at", there));
    return e.changed(
        Kind.STAND,
        Math.abs(by),
        "m",
        "stand "
            + e.in.length(Math.abs(by))
            + (by < 0 ? " nearer" : " farther off")
            + " than "
            + s.id(),
        spots(moved));
  }

  private Edit sling(Anchor a, double by) {
    if (!(a instanceof Record)) {
      return null;
    }
    double height = a.slingHeightM() + by;
    if (height < SLING_STEP_M / 2) {
      return null;
    }
    return e.changed(
        Kind.SLING_HEIGHT,
        Math.abs(by),
        "m",
        "set the sling at " + a.id() + " to " + e.in.length(height) + " above the ground",
        anchors(a.id(), (Anchor) Copy.with((Record) a, "slingHeightM", height)));
  }

  private Edit away(Target t) {
    List<Target> rest = e.site.targets().stream().filter(o -> o != t).toList();
    return e.changed(
        Kind.MOVE_THING,
        1,
        "",
        "move " + t.id() + " away, clear of the tree's fall and of the line",
        Copy.with(e.site, "targets", rest));
  }

  private boolean wet(String id) {
    return e.site.spot(id).map(Spot::wet).orElse(false)
        || e.site.anchor(id).map(a -> !dried(a).equals(a)).orElse(false);
  }

  private static Anchor dried(Anchor a) {
    if (a instanceof Anchor.StandingTree t) {
      return Copy.with(t, "saturated", false);
    }
    if (a instanceof Anchor.Stump s) {
      return Copy.with(s, "saturated", false);
    }
    if (a instanceof Anchor.ParkedVehicle v) {
      return Copy.with(v, "wet", false);
    }
    return a instanceof Anchor.Pickets p ? Copy.with(p, "wet", false) : a;
  }

  private Edit dry(List<String> ids) {
    Site s = e.site;
    List<Spot> spots =
        s.spots().stream().map(o -> ids.contains(o.id()) ? Copy.with(o, "wet", false) : o).toList();
    List<Strip> strips =
        s.strips().stream().map(o -> holdsAny(o, ids) ? Copy.with(o, "wet", false) : o).toList();
    List<Anchor> anchors =
        s.anchors().stream().map(a -> ids.contains(a.id()) ? dried(a) : a).toList();
    return e.changed(
        Kind.DRY,
        ids.size(),
        "",
        "wait for dry ground at " + String.join(" and ", ids),
        Copy.with(Copy.with(Copy.with(s, "spots", spots), "strips", strips), "anchors", anchors));
  }

  private boolean holdsAny(Strip strip, List<String> ids) {
    return strip.places(e.site.tree().stump().at()).stream().anyMatch(p -> ids.contains(p.id()));
  }

  private Site spots(Spot moved) {
    List<Spot> all =
        e.site.spots().stream().map(o -> o.id().equals(moved.id()) ? moved : o).toList();
    return Copy.with(e.site, "spots", all);
  }

  private Site anchors(String id, Anchor other) {
    List<Anchor> all = e.site.anchors().stream().map(a -> a.id().equals(id) ? other : a).toList();
    return Copy.with(e.site, "anchors", all);
  }
}
