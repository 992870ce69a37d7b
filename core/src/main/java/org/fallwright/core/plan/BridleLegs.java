package org.fallwright.core.plan;

import java.util.ArrayList;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Set;
import org.fallwright.core.site.Anchor;
import org.fallwright.core.site.Position;
import org.fallwright.core.site.Site;
import org.fallwright.core.zones.Leg;

/**
 * The loaded legs of a two-legged anchor that a setup uses, drawn as they lie: a loaded bridle
 * swings a little to the pull.
 *
 * @param id id of the anchor
 * @param first where one leg ends
 * @param apex where both meet
 * @param second where the other ends
 */
record BridleLegs(String id, LinePoint first, LinePoint apex, LinePoint second) {
  /** Those of a setup, each once. */
  static List<BridleLegs> of(Site site, Setup setup) {
    if (site.anchors().stream().noneMatch(a -> a instanceof Anchor.TwoLegs)) {
      return List.of();
    }
    Set<String> used = new LinkedHashSet<>(setup.redirects());
    used.add(setup.place());
    if (setup.driver() != null) {
      used.add(setup.driver().place());
    }
    List<BridleLegs> all = new ArrayList<>();
    for (String id : used) {
      site.anchor(id)
          .filter(a -> a instanceof Anchor.TwoLegs)
          .map(a -> (Anchor.TwoLegs) a)
          .ifPresent(
              a ->
                  all.add(
                      new BridleLegs(
                          id,
                          Route.at(site.anchor(a.first()).orElseThrow(), LinePoint.Role.SOURCE),
                          Route.at(a, LinePoint.Role.SOURCE),
                          Route.at(site.anchor(a.second()).orElseThrow(), LinePoint.Role.SOURCE))));
    }
    return all;
  }

  /** In plan, from end to end. */
  List<Position> path() {
    return List.of(first.at(), apex.at(), second.at());
  }

  List<Leg> legs() {
    return List.of(leg(first), leg(second));
  }

  private Leg leg(LinePoint end) {
    return new Leg(
        apex.at(), apex.elevationM(), end.at(), end.elevationM(), Set.of(apex.id(), end.id()));
  }
}
