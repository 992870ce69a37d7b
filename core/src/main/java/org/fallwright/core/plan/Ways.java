package org.fallwright.core.plan;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.HashMap;
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
import org.fallwright.core.reference.Allowances;
import org.fallwright.core.site.Anchor;
import org.fallwright.core.site.Gear;
import org.fallwright.core.site.Position;
import org.fallwright.core.site.Site;

/**
 * All candidates of a site: every source in every mode at every place where it can be, direct or
 * over one redirect or two on every other anchor, with each attach height and hinge thickness on
 * offer, with each pull line, and with two joined where none reaches alone; and every lay. The
 * order is fixed.
 *
 * <p>There can be very many, so they are not listed: an {@link End} stands for all ways that end at
 * one source, and gives them one redirect path at a time.
 */
final class Ways {
  private final Site site;
  private final PullSources sources;
  private final LeftOut out;
  private final List<String> notes = new ArrayList<>();
  private final List<Gear.Line> lines;

  /** Of the lines before each that differ from it in name and length alone, the longest. */
  private final Map<String, Gear.Line> longestAlike = new HashMap<>();

  private final List<End> ends = new ArrayList<>();

  /**
   * A source in one mode at one place, pulling at one height on one hinge.
   *
   * @param source what pulls
   * @param driver what hauls it, or null
   */
  record End(
      double attachHeightM,
      double hingeThicknessM,
      Gear.Source gear,
      String mode,
      String place,
      Setup.Driver by,
      PullSource source,
      PullSource driver) {
    /** The way over those redirects with that line; its lay is 0 and means nothing yet. */
    Setup way(List<String> redirects, String line) {
      return new Setup(
          0, attachHeightM, hingeThicknessM, line, redirects, gear.id(), mode, place, by);
    }
  }

  /**
   * @param site a site with the gear at hand alone, laid out
   * @param out sources that failed
   */
  Ways(Site site, PullSources sources, LeftOut out) {
    this.site = site;
    this.sources = sources;
    this.out = out;
    lines =
        site.gear().lines().stream()
            .filter(Gear.Line::pullLine)
            .sorted(Comparator.comparingDouble(Gear.Line::lengthM))
            .toList();
    if (lines.isEmpty()) {
      notes.add("No pull line is at hand, so nothing can be pulled.");
      return;
    }
    for (int i = 0; i < lines.size(); i++) {
      Gear.Line own = lines.get(i);
      lines.subList(0, i).stream()
          .filter(l -> alike(l, own))
          .forEach(l -> longestAlike.put(own.id(), l));
    }
    for (double attach : site.offer().attachHeights()) {
      for (double hinge : site.hingeThicknesses()) {
        for (Gear.Source source : site.gear().sources()) {
          add(attach, hinge, source);
        }
      }
    }
  }

  /** What could not be used, a sentence each. */
  List<String> notes() {
    return List.copyOf(new LinkedHashSet<>(notes));
  }

  /** All ends, in their order. */
  List<End> ends() {
    return ends;
  }

  /** What the sources of the site's gear say of themselves, by id. */
  Map<String, SourceDescription> described() {
    Map<String, SourceDescription> by = new TreeMap<>();
    for (Gear.Source gear : site.gear().sources()) {
      sources.byId(gear.plugin()).map(PullSource::describe).ifPresent(d -> by.put(d.id(), d));
    }
    return by;
  }

  private void add(double attach, double hinge, Gear.Source gear) {
    Optional<PullSource> kind = kind(gear);
    if (kind.isEmpty()) {
      return;
    }
    for (String mode : kind.get().modes(gear.parameters())) {
      for (String place : gear.places()) {
        if (!canBe(kind.get(), gear, place)) {
          continue;
        }
        if (!kind.get().describe().needsDriver()) {
          ends.add(new End(attach, hinge, gear, mode, place, null, kind.get(), null));
          continue;
        }
        for (Setup.Driver by : drivers(gear)) {
          if (!by.place().equals(place)) {
            PullSource driver = kind(site.source(by.source()).orElseThrow()).orElseThrow();
            ends.add(new End(attach, hinge, gear, mode, place, by, kind.get(), driver));
          }
        }
      }
    }
  }

  /** How many groups of redirect paths an end has: see {@link #paths}. */
  int groups() {
    return redirects() < 2 ? 1 : 1 + site.anchors().size();
  }

  private int redirects() {
    return site.gear().blocks().isEmpty() ? 0 : site.offer().redirects();
  }

  /**
   * The redirect paths of one group: of the first the straight one and those over one block, of
   * each further one those over two blocks, whose first is on one anchor.
   */
  List<List<String>> paths(End end, int group) {
    List<List<String>> paths = new ArrayList<>();
    if (group == 0) {
      paths.add(List.of());
      if (redirects() >= 1) {
        for (Anchor a : site.anchors()) {
          if (!a.id().equals(end.place())) {
            paths.add(List.of(a.id()));
          }
        }
      }
      return paths;
    }
    String first = site.anchors().get(group - 1).id();
    if (!first.equals(end.place())) {
      for (Anchor a : site.anchors()) {
        if (!a.id().equals(end.place()) && !a.id().equals(first)) {
          paths.add(List.of(first, a.id()));
        }
      }
    }
    return paths;
  }

  /**
   * The lines worth trying along a path, from the shortest: not one that is longer than another
   * which is otherwise the same and reaches by itself, for it does the same; then each two joined
   * that reach, where no line does by itself.
   */
  List<String> lines(End end, List<String> path, Route route) {
    if (lines.size() == 1) {
      return List.of(lines.get(0).id());
    }
    double needed = route.loads().lengthM() + Allowances.LINE_SPARE.value();
    List<String> worth = new ArrayList<>(lines.size());
    for (Gear.Line own : lines) {
      Gear.Line shorter = longestAlike.get(own.id());
      if (shorter == null || shorter.lengthM() < needed) {
        worth.add(own.id());
      }
    }
    double longest = lines.get(lines.size() - 1).lengthM();
    if (needed > longest) {
      Setup way = end.way(path, lines.get(0).id());
      double wire =
          Reach.of(site, way, route, new Reach.Pulled(0, 0, 0), end.source(), end.driver()).wireM();
      if (needed > longest + wire) {
        joined(worth, needed - wire);
      }
    }
    return worth;
  }

  private void joined(List<String> worth, double needed) {
    for (Gear.Line a : lines) {
      for (Gear.Line b : lines) {
        if (a != b && a.lengthM() + b.lengthM() >= needed) {
          worth.add(JoinedLines.name(a, b));
        }
      }
    }
  }

  /** Whether two lines differ in name and length alone. */
  private static boolean alike(Gear.Line a, Gear.Line b) {
    return b.equals(
        new Gear.Line(
            b.id(),
            a.material(),
            a.diameterM(),
            b.lengthM(),
            a.breakingLoadN(),
            a.treeEnd(),
            a.sourceEnd(),
            a.bend(),
            a.wet(),
            a.weathered(),
            a.age(),
            a.stiffnessN(),
            b.pullLine()));
  }

  private List<Setup.Driver> drivers(Gear.Source tackle) {
    List<Setup.Driver> drivers = new ArrayList<>();
    List<String> allowed = tackle.driverPlaces();
    for (String id : tackle.drivers()) {
      Gear.Source driver = site.source(id).orElseThrow();
      Optional<PullSource> kind = kind(driver);
      if (kind.isEmpty() || kind.get().describe().needsDriver()) {
        continue;
      }
      for (String place : driver.places()) {
        if ((allowed.isEmpty() || allowed.contains(place)) && canBe(kind.get(), driver, place)) {
          for (String mode : kind.get().modes(driver.parameters())) {
            drivers.add(new Setup.Driver(id, mode, place));
          }
        }
      }
    }
    return drivers;
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
  double[] lays() {
    Set<Double> lays = new TreeSet<>();
    double step = site.offer().layStepDeg();
    for (int i = 0; i * step < 360; i++) {
      lays.add(i * step);
    }
    site.offer().laysDeg().forEach(l -> lays.add(l % 360));
    Position stump = site.tree().stump().at();
    site.anchors().forEach(a -> lays.add(stump.azimuthTo(a.place().at())));
    site.spots().forEach(s -> lays.add(stump.azimuthTo(s.place().at())));
    return lays.stream().mapToDouble(Double::doubleValue).toArray();
  }
}
