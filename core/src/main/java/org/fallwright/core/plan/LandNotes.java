package org.fallwright.core.plan;

import java.util.LinkedHashSet;
import java.util.List;
import java.util.Set;
import java.util.stream.Stream;
import org.fallwright.core.site.Anchor;
import org.fallwright.core.site.Site;

/** Whom to ask, and what else to see to, at the anchors and places that a setup uses. */
final class LandNotes {
  private LandNotes() {}

  static List<String> of(Site site, Setup setup) {
    Set<String> used = new LinkedHashSet<>(setup.redirects());
    used.add(setup.place());
    if (setup.driver() != null) {
      used.add(setup.driver().place());
    }
    return used.stream()
        .flatMap(
            id ->
                site.anchor(id)
                    .map(a -> anchor(site, a))
                    .orElseGet(() -> site.spot(id).stream().flatMap(s -> ask(id, s.land()))))
        .distinct()
        .toList();
  }

  private static Stream<String> anchor(Site site, Anchor a) {
    if (!(a instanceof Anchor.TwoLegs two)) {
      return ask(a.id(), a.land());
    }
    return Stream.concat(
        Stream.of(
            "Both legs of "
                + a.id()
                + " are under load: nobody inside their angle or past their ends."),
        Stream.of(two.first(), two.second())
            .flatMap(id -> ask(id, site.anchor(id).orElseThrow().land())));
  }

  private static Stream<String> ask(String id, String land) {
    return land == null || land.isBlank()
        ? Stream.of("Ask whose land " + id + " is on; it is not stated.")
        : Stream.empty();
  }
}
