package org.fallwright.core.plan;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.Set;
import java.util.TreeMap;
import java.util.TreeSet;
import org.fallwright.core.pull.PullSource;
import org.fallwright.core.pull.PullSources;
import org.fallwright.core.pull.SourceDescription;
import org.fallwright.core.pull.SourceDescription.PlaceKind;
import org.fallwright.core.pull.SourceFault;
import org.fallwright.core.reference.Allowances;
import org.fallwright.core.site.Anchor;
import org.fallwright.core.site.Gear;
import org.fallwright.core.site.Position;
import org.fallwright.core.site.Site;

/**
 * All candidates of a site: every source in every mode at every place where it can be, direct or
 * over one redirect on every other anchor, with each attach height and hinge thickness on offer,
 * with each pull line, and with two joined where none reaches alone; and every lay. The order is
 * fixed.
 */
final class Ways {
  private final Site site;
  private final PullSources sources;
  private final LeftOut out;
  private final List<String> notes = new ArrayList<>();

  /**
   * @param site the site with the gear at hand alone
   */
  Ways(Site site, PullSources sources, LeftOut out) {
    this.site = site;
    this.sources = sources;
    this.out = out;
  }

  /** What could not be used, a sentence each; filled by {@link #all}. */
  List<String> notes() {
    return List.copyOf(new LinkedHashSet<>(notes));
  }

  /** What the sources of the site's gear say of themselves, by id. */
  Map<String, SourceDescription> described() {
    Map<String, SourceDescription> by = new TreeMap<>();
    for (Gear.Source gear : site.gear().sources()) {
      sources.byId(gear.plugin()).map(PullSource::describe).ifPresent(d -> by.put(d.id(), d));
    }
    return by;
  }

  /** Every way to pull; the lay of each is 0 and means nothing yet. */
  List<Setup> all() {
    List<Setup> ways = new ArrayList<>();
    List<Gear.Line> lines =
        site.gear().lines().stream()
            .filter(Gear.Line::pullLine)
            .sorted(Comparator.comparingDouble(Gear.Line::lengthM))
            .toList();
    if (lines.isEmpty()) {
      notes.add("No pull line is at hand, so nothing can be pulled.");
    }
    for (double attach : site.offer().attachHeightsM()) {
      for (double hinge : site.cut().hingeThicknessesM()) {
        for (Gear.Source source : site.gear().sources()) {
          for (Gear.Line line : lines) {
            ways.addAll(ofWhatWorks(attach, hinge, line, source, lines));
          }
          if (lines.size() > 1) {
            of(attach, hinge, lines.get(0), source).forEach(way -> ways.addAll(joined(way, lines)));
          }
        }
      }
    }
    ways.removeIf(out::uses);
    return ways;
  }

  /** Again without it, where a source fails. */
  private List<Setup> ofWhatWorks(
      double attach, double hinge, Gear.Line line, Gear.Source source, List<Gear.Line> lines) {
    while (true) {
      try {
        return of(attach, hinge, line, source).stream()
            .filter(way -> !aShorterLineDoes(way, lines))
            .toList();
      } catch (SourceFault fault) {
        if (!out.add(fault)) {
          throw fault;
        }
      }
    }
  }

  private List<Setup> of(double attach, double hinge, Gear.Line line, Gear.Source source) {
    Optional<PullSource> kind = kind(source);
    if (kind.isEmpty()) {
      return List.of();
    }
    List<Setup> ways = new ArrayList<>();
    for (String mode : kind.get().modes(source.parameters())) {
      for (String place : source.places()) {
        if (!canBe(kind.get(), source, place)) {
          continue;
        }
        List<Setup.Driver> drivers = new ArrayList<>();
        if (kind.get().describe().needsDriver()) {
          drivers.addAll(drivers(source));
        } else {
          drivers.add(null);
        }
        for (Setup.Driver driver : drivers) {
          if (driver != null && driver.place().equals(place)) {
            continue;
          }
          ways.add(
              new Setup(0, attach, hinge, line.id(), List.of(), source.id(), mode, place, driver));
          if (site.offer().redirects() >= 1 && !site.gear().blocks().isEmpty()) {
            for (Anchor a : site.anchors()) {
              if (!a.id().equals(place)) {
                ways.add(
                    new Setup(
                        0,
                        attach,
                        hinge,
                        line.id(),
                        List.of(a.id()),
                        source.id(),
                        mode,
                        place,
                        driver));
              }
            }
          }
        }
      }
    }
    return ways;
  }

  /**
   * Whether a shorter line that is otherwise the same reaches by itself; then a longer one is no
   * candidate, for it does the same.
   */
  private boolean aShorterLineDoes(Setup way, List<Gear.Line> lines) {
    Gear.Line own = GearParts.line(site, way);
    PullSource source = kind(site.source(way.source()).orElseThrow()).orElseThrow();
    PullSource driver =
        way.driver() == null
            ? null
            : kind(site.source(way.driver().source()).orElseThrow()).orElseThrow();
    double needed =
        Route.of(site, way, source, driver).loads().lengthM() + Allowances.LINE_SPARE.value();
    return lines.stream()
        .takeWhile(l -> l != own)
        .anyMatch(
            l ->
                l.lengthM() >= needed
                    && own.equals(
                        new Gear.Line(
                            own.id(),
                            l.material(),
                            l.diameterM(),
                            own.lengthM(),
                            l.breakingLoadN(),
                            l.treeEnd(),
                            l.sourceEnd(),
                            l.bend(),
                            l.wet(),
                            l.weathered(),
                            l.age(),
                            l.stiffnessN(),
                            own.pullLine())));
  }

  private List<Setup.Driver> drivers(Gear.Source tackle) {
    List<Setup.Driver> drivers = new ArrayList<>();
    for (String id : tackle.drivers()) {
      Gear.Source driver = site.source(id).orElseThrow();
      Optional<PullSource> kind = kind(driver);
      if (kind.isEmpty() || kind.get().describe().needsDriver()) {
        continue;
      }
      for (String place : driver.places()) {
        boolean allowed = tackle.driverPlaces().isEmpty() || tackle.driverPlaces().contains(place);
        if (allowed && canBe(kind.get(), driver, place)) {
          for (String mode : kind.get().modes(driver.parameters())) {
            drivers.add(new Setup.Driver(id, mode, place));
          }
        }
      }
    }
    return drivers;
  }

  /** The way with each two lines joined that reach, where no line does by itself. */
  private List<Setup> joined(Setup way, List<Gear.Line> lines) {
    PullSource source = kind(site.source(way.source()).orElseThrow()).orElseThrow();
    PullSource driver =
        way.driver() == null
            ? null
            : kind(site.source(way.driver().source()).orElseThrow()).orElseThrow();
    Route route = Route.of(site, way, source, driver);
    double needed = route.loads().lengthM() + Allowances.LINE_SPARE.value();
    List<Setup> ways = new ArrayList<>();
    if (needed <= lines.get(lines.size() - 1).lengthM()) {
      return ways;
    }
    double wire = Reach.of(site, way, route, new Reach.Pulled(0, 0, 0), source, driver).wireM();
    if (needed > lines.get(lines.size() - 1).lengthM() + wire) {
      for (Gear.Line a : lines) {
        for (Gear.Line b : lines) {
          if (a != b && a.lengthM() + b.lengthM() + wire >= needed) {
            ways.add(way.withLine(JoinedLines.name(a, b)));
          }
        }
      }
    }
    return ways;
  }

  private Optional<PullSource> kind(Gear.Source source) {
    if (out.has(source.plugin())) {
      return Optional.empty();
    }
    Optional<PullSource> kind = sources.byId(source.plugin());
    if (kind.isEmpty()) {
      notes.add(
          "Source \""
              + source.id()
              + "\" is left out: no plugin \""
              + source.plugin()
              + "\" is loaded.");
    }
    return kind;
  }

  private boolean canBe(PullSource kind, Gear.Source source, String place) {
    PlaceKind at = site.spot(place).isPresent() ? PlaceKind.SPOT : PlaceKind.ANCHOR;
    boolean can = kind.describe().places().contains(at);
    if (!can) {
      notes.add(
          "Source \""
              + source.id()
              + "\" cannot be at \""
              + place
              + "\": it needs "
              + (at == PlaceKind.SPOT ? "an anchor." : "a spot."));
    }
    return can;
  }

  /** Every lay: the grid, those asked for, and straight to every place a line can lead to. */
  List<Double> lays() {
    Set<Double> lays = new TreeSet<>();
    double step = site.offer().layStepDeg();
    for (int i = 0; i * step < 360; i++) {
      lays.add(i * step);
    }
    site.offer().laysDeg().forEach(l -> lays.add(l % 360));
    Position stump = site.tree().stump().at();
    site.anchors().forEach(a -> lays.add(stump.azimuthTo(a.place().at())));
    site.spots().forEach(s -> lays.add(stump.azimuthTo(s.place().at())));
    return List.copyOf(lays);
  }
}
