package org.fallwright.core.plan;

import java.util.Comparator;
import java.util.HashMap;
import java.util.Map;
import java.util.Optional;
import java.util.concurrent.ConcurrentHashMap;
import org.fallwright.core.line.Sheave;
import org.fallwright.core.pull.HaulLine;
import org.fallwright.core.pull.PullSource;
import org.fallwright.core.site.Anchor;
import org.fallwright.core.site.Gear;
import org.fallwright.core.site.Place;
import org.fallwright.core.site.Site;
import org.fallwright.core.site.Spot;

/** The things of a site by their names, looked up once. Safe for use by several threads. */
final class Places {
  private final Site site;
  private final Map<String, Anchor> anchors = new HashMap<>();
  private final Map<String, Spot> spots = new HashMap<>();
  private final Map<String, Gear.Source> sources = new HashMap<>();
  private final Gear.Block block;
  private final double efficiency;
  private final Map<String, Double> lineHeights = new ConcurrentHashMap<>();
  private final Map<String, Optional<HaulLine>> haulLines = new ConcurrentHashMap<>();

  Places(Site site) {
    this.site = site;
    site.anchors().forEach(a -> anchors.put(a.id(), a));
    site.spots().forEach(s -> spots.put(s.id(), s));
    site.gear().sources().forEach(s -> sources.put(s.id(), s));
    block =
        site.gear().blocks().stream()
            .max(Comparator.comparingDouble(Gear.Block::ratedLoadN))
            .orElse(null);
    efficiency = block == null ? Double.NaN : Sheave.of(block).value();
  }

  Site site() {
    return site;
  }

  /** The anchor of that name; null: there is none. */
  Anchor anchor(String id) {
    return anchors.get(id);
  }

  /** The spot of that name, a strip's among them; null: there is none. */
  Spot spot(String id) {
    return spots.get(id);
  }

  /** Where an anchor or a spot is. */
  Place place(String id) {
    Spot spot = spots.get(id);
    return spot != null ? spot.place() : anchors.get(id).place();
  }

  Gear.Source source(String id) {
    return sources.get(id);
  }

  /** The redirect block used, the strongest there is; null: there is none. */
  Gear.Block block() {
    return block;
  }

  /** What that block passes on while hauling; NaN: there is none. */
  double efficiency() {
    return efficiency;
  }

  // what a source says is not asked for inside a map: a plugin that hangs must not hold a lock

  /** See {@link PullSource#lineHeightM}. */
  double lineHeightM(Gear.Source gear, PullSource source) {
    Double known = lineHeights.get(gear.id());
    if (known == null) {
      known = source.lineHeightM(gear.parameters());
      lineHeights.put(gear.id(), known);
    }
    return known;
  }

  /** See {@link PullSource#haulLine}. */
  HaulLine haulLine(Gear.Source gear, PullSource source, String mode) {
    String key = gear.id() + "\n" + mode;
    Optional<HaulLine> known = haulLines.get(key);
    if (known == null) {
      known = Optional.ofNullable(source.haulLine(gear.parameters(), mode));
      haulLines.put(key, known);
    }
    return known.orElse(null);
  }
}
