package org.fallwright.core.plan;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import java.util.concurrent.ConcurrentHashMap;
import java.util.function.Supplier;
import org.fallwright.core.pull.HaulLine;
import org.fallwright.core.pull.PullOffer;
import org.fallwright.core.pull.PullSource;
import org.fallwright.core.pull.PullSources;
import org.fallwright.core.reference.Allowances;
import org.fallwright.core.rules.RuleSet;
import org.fallwright.core.rules.RuleSets;
import org.fallwright.core.site.Gear;
import org.fallwright.core.site.Position;
import org.fallwright.core.site.Site;
import org.fallwright.core.statics.LineSet;
import org.fallwright.core.statics.Part;
import org.fallwright.core.statics.Ratios;
import org.fallwright.core.statics.SourceAtTree;
import org.fallwright.core.statics.Statics;
import org.fallwright.core.statics.TreeSide;
import org.fallwright.core.units.DisplayUnits;

/**
 * Judges one setup by every check there is; none is left out because another fails. Safe for use by
 * several threads.
 *
 * <p>The order of the checks is that of the questions a person asks: can it be judged at all, is
 * each anchor usable, does the lay land clear, does the line run clear, does the kit reach, does
 * every part hold, does the source pull and hold, can people stand clear.
 */
public final class Judge {
  /**
   * More than there are checks: those that cannot be made where the tree does not move all count.
   */
  static final int NOT_MADE = 1000;

  private final Site site;
  private final PullSources sources;
  private final RuleSet rules;
  private final DisplayUnits in;
  private final Places places;
  private final Subject subject;
  private final SiteTables tables = new SiteTables();
  private final Knowledge knowledge;
  private final Landing landing;
  private final LineRun lineRun;
  private final Map<Setup, Route> routes = new ConcurrentHashMap<>();
  private final Map<Pulled, Statics> reckoned = new ConcurrentHashMap<>();

  /**
   * @throws IllegalArgumentException one sentence, where the site names a species, surface or rule
   *     set that is not known
   */
  public Judge(Site given, PullSources sources) {
    site = given.laidOut();
    this.sources = sources;
    for (double height : site.offer().attachHeights()) {
      double above = height - site.cut().heightM();
      if (above <= Allowances.ATTACH_LEAST.value()) {
        throw new IllegalArgumentException(
            String.format(
                Locale.ROOT,
                "offer.attach_heights_m holds %s m, which is %.2f m above the cut; it must be more"
                    + " than %.1f m above it",
                height,
                above,
                Allowances.ATTACH_LEAST.value()));
      }
    }
    rules = RuleSets.shipped().byKey(site.ruleSet());
    in = DisplayUnits.valueOf(site.display().name());
    places = new Places(site);
    subject = new Subject(site);
    knowledge = new Knowledge(site, rules);
    landing = new Landing(site, rules, in, subject, knowledge);
    lineRun = new LineRun(site, in, knowledge);
  }

  /** Notes that hold for every setup of the site, a sentence each. */
  List<String> notes() {
    return subject.notes();
  }

  /** The same checks, with their verdicts and ratios alone. */
  Look quick(Setup setup) {
    Grade grade = new Grade(false);
    Found found = check(grade, setup, false);
    TreeSide tree = found.statics().treeSide();
    int parts = tree.movable() ? found.stopped().ratios().parts().size() : 0;
    return new Look(setup.layDeg(), parts, tree.movable() ? 0 : NOT_MADE, grade.slice());
  }

  /** The setup as judged, with all that its figures were reckoned from. */
  public Reckoned reckon(Setup setup) {
    PullSource source = source(setup);
    PullSource driver = driver(setup);
    Route route = Route.of(places, setup, source, driver);
    Statics statics = statics(setup, route);
    TreeSide tree = statics.treeSide();
    PullOffer offer = Reach.of(site, setup, route, Reach.Pulled.of(tree), source, driver);
    GearParts parts = new GearParts(site, rules, tables).collect(setup, route, offer);
    return new Reckoned(
        judge(setup),
        subject.species(),
        subject.figures(),
        subject.pull(setup, route),
        statics,
        route.points(),
        route.loads(),
        setup.redirects().isEmpty() ? null : Route.block(site),
        GearParts.line(site, setup),
        offer,
        tree.movable() ? stop(statics, offer, route, parts.parts()).ratios() : null,
        parts.anchors(),
        tables);
  }

  /**
   * Every part of the setup, the stem among them, with its strength and its load per newton at the
   * tree; none where the tree cannot be moved.
   */
  public List<Part> parts(Setup setup) {
    Ratios ratios = reckon(setup).ratios();
    return ratios == null ? List.of() : ratios.parts();
  }

  private PullSource source(Setup setup) {
    return kind(site.source(setup.source()).orElseThrow().plugin());
  }

  private PullSource driver(Setup setup) {
    return setup.driver() == null
        ? null
        : kind(site.source(setup.driver().source()).orElseThrow().plugin());
  }

  /** What the checks of a setup brought to light. */
  private record Found(
      Route route,
      Statics statics,
      PullOffer offer,
      Landing.Zones zones,
      Stopped stopped,
      Supplier<String> name) {}

  /** Every check, in the fixed order. */
  private Found check(Grade grade, Setup setup, boolean full) {
    PullSource source = source(setup);
    PullSource driver = driver(setup);
    Route route =
        routes.computeIfAbsent(setup.withLay(0), w -> Route.of(places, w, source, driver));
    Statics statics = statics(setup, route);
    TreeSide tree = statics.treeSide();
    PullOffer offer = Reach.of(site, setup, route, Reach.Pulled.of(tree), source, driver);
    GearParts parts = parts(setup, route, offer);
    Supplier<String> name = () -> name(setup, source);

    knowledge.check(grade);
    usable(grade, parts);
    Landing.Zones zones = landing.check(grade, setup, route, tree, full);
    lineRun.check(grade, route);
    kit(grade, setup, route, tree, offer, parts);
    movement(grade, setup, tree);
    Stopped stopped = pulled(grade, setup, statics, offer, route, parts.parts(), name);
    people(grade, setup, zones, offer);
    return new Found(route, statics, offer, zones, stopped, name);
  }

  /** The site as it is judged, its strips laid out. */
  Site site() {
    return site;
  }

  Places places() {
    return places;
  }

  Subject subject() {
    return subject;
  }

  Knowledge knowledge() {
    return knowledge;
  }

  Landing landing() {
    return landing;
  }

  LineRun lineRun() {
    return lineRun;
  }

  /** What bears the line of a way. */
  GearParts parts(Setup way, Route route, PullOffer offer) {
    return new GearParts(site, rules, tables).collect(way, route, offer);
  }

  /** A lay pulled over the first support of a route, for a search. */
  Fall fall(Ways.End end, Route route, double layDeg) {
    Setup lay = end.way(List.of(), "").withLay(layDeg);
    Fall.Kept all = kept(lay, route);
    Grade lands = new Grade(false);
    landing.lands(lands, all.landed());
    Grade moves = new Grade(false);
    movement(moves, lay, all.statics().treeSide());
    return new Fall(layDeg, site.cut().wedges(), lands.slice(), moves.slice(), all);
  }

  /** What was not kept of it. */
  Fall.Kept fall(Ways.End end, Route route, Fall fall) {
    return kept(end.way(List.of(), "").withLay(fall.layDeg()), route);
  }

  private Fall.Kept kept(Setup lay, Route route) {
    LineSet line = subject.line(lay.attachHeightM(), route.points().get(1), 1e6);
    Statics statics = new Statics(subject.pull(lay, line, route.bearingErrorM()));
    TreeSide tree = statics.treeSide();
    Landing.Landed landed = landing.lookAt(lay.layDeg(), Landing.steeringShare(tree));
    return new Fall.Kept(
        statics, landed, landing.ends(landed, landing.sitBack(lay.layDeg(), tree)));
  }

  /** The line and the gear. */
  void kit(Grade grade, Setup setup, Route route, TreeSide tree, PullOffer offer, GearParts parts) {
    new KitChecks(site, in, grade).check(setup, route, tree, offer, parts);
  }

  /** Whether hinge and line let it move. */
  void movement(Grade grade, Setup setup, TreeSide tree) {
    new ForceChecks(site, in, grade).movement(tree, setup.attachHeightM() - site.cut().heightM());
  }

  /**
   * Whether the source pulls and holds, and every part bears it; then what the source says itself.
   *
   * @return null where the tree does not move, for then none of the first can be said
   */
  Stopped pulled(
      Grade grade,
      Setup setup,
      Statics statics,
      PullOffer offer,
      Route route,
      List<Part> parts,
      Supplier<String> name) {
    TreeSide tree = statics.treeSide();
    Stopped stopped = null;
    if (tree.movable()) {
      ForceChecks forces = new ForceChecks(site, in, grade);
      stopped = stop(statics, offer, route, parts);
      Ratios r = stopped.ratios();
      forces.pull(r, tree, offer, name);
      forces.parts(r, tree);
      if (stopped.leans()) {
        leaning(grade, offer, r);
      }
    }
    Position at =
        places.place(setup.driver() == null ? setup.place() : setup.driver().place()).at();
    for (PullOffer.Finding f : offer.checks()) {
      grade.rule(f.id(), f.value(), f.limit(), f.unit(), f.ratio(), at, () -> f.why());
    }
    return stopped;
  }

  /** Whether people can stand clear. */
  void people(Grade grade, Setup setup, Landing.Zones zones, PullOffer offer) {
    new People(site, rules, in, grade).check(setup, zones, offer);
  }

  /** The setup with all its checks, its zones and notes. */
  public Judged judge(Setup setup) {
    Grade grade = new Grade(true);
    Found found = check(grade, setup, true);
    TreeSide tree = found.statics().treeSide();
    List<String> notes = new ArrayList<>(found.zones().notes());
    Figures figures;
    List<PartLoad> loads = List.of();
    if (tree.movable()) {
      Ratios r = found.stopped().ratios();
      figures =
          FiguresOf.reckon(
              site,
              found.route(),
              found.statics(),
              r,
              found.offer(),
              found.stopped().leans(),
              found.zones());
      loads = loads(r, tree);
      notes.addAll(SetupNotes.of(site, in, setup, tree, r, found.offer()));
    } else {
      figures = FiguresOf.unmovable(found.route(), tree, found.zones());
    }
    notes.addAll(found.offer().notes());
    notes.addAll(LandNotes.of(site, setup));
    Check weakest = grade.weakest();
    return new Judged(
        setup,
        grade.verdict(),
        weakest,
        grade.standing(),
        grade.standings(),
        grade.failing() + (tree.movable() ? 0 : NOT_MADE),
        Sentence.of(grade.verdict(), weakest, figures, found.name().get(), in),
        figures,
        grade.checks(),
        loads,
        found.route().line(),
        found.route().haulOnSite(),
        found.zones().ground(),
        notes);
  }

  /** All that the statics of a setup depend on; the source is no part of it. */
  private record Pulled(
      double layDeg,
      double attachHeightM,
      double hingeThicknessM,
      String line,
      List<LinePoint> points,
      List<LinePoint> haul,
      HaulLine haulLine) {}

  private Statics statics(Setup s, Route route) {
    return reckoned.computeIfAbsent(
        new Pulled(
            s.layDeg(),
            s.attachHeightM(),
            s.hingeThicknessM(),
            s.line(),
            route.line(),
            route.haulOnSite(),
            route.haulLine()),
        p -> new Statics(subject.pull(s, route)));
  }

  /**
   * The ratios after any stop, and whether the setup leans on a person who reads a load cell: it
   * does where a part would give way at the most the source can do, and a load cell is there.
   */
  record Stopped(Ratios ratios, boolean leans) {}

  private Stopped stop(Statics statics, PullOffer offer, Route route, List<Part> parts) {
    TreeSide tree = statics.treeSide();
    double low = offer.lowN() / route.loads().sourceEndPerTree();
    boolean captured = offer.captured() && offer.holdN() >= tree.holdN();
    boolean wedges = site.cut().wedges();
    SourceAtTree free =
        new SourceAtTree(low, offer.holdN(), offer.highN(), captured, SourceAtTree.Stop.NONE, 0);
    Ratios without = Ratios.of(statics, wedges, free, parts);
    // a stop at the ceiling helps only where the plan itself stays below it
    boolean helps = !without.holdsAtHigh() && without.holdsAtPlan();
    if (!helps || site.gear().loadCell() == null) {
      return new Stopped(without, false);
    }
    SourceAtTree read =
        new SourceAtTree(
            low,
            offer.holdN(),
            offer.highN(),
            captured,
            SourceAtTree.Stop.READER,
            offer.overrunM());
    return new Stopped(Ratios.of(statics, wedges, read, parts), true);
  }

  private void leaning(Grade grade, PullOffer offer, Ratios r) {
    Supplier<String> why =
        () ->
            "Works only with a person reading the load cell who stops it at "
                + in.both(u -> u.forceAtMost(r.ceiling().tensionN()))
                + ": beyond that "
                + r.ceiling().part()
                + " is loaded past its factor.";
    if (offer.powered()) {
      grade.tightAtBest("stop reading", r.ceiling().tensionN(), r.source().highN(), "N", null, why);
    } else {
      grade.factored(
          "stop reading",
          r.ceiling().tensionN(),
          r.source().highN(),
          "N",
          Double.POSITIVE_INFINITY,
          null,
          why);
    }
  }

  /** Whether each anchor may be used. */
  void usable(Grade grade, GearParts parts) {
    Map<String, HeldAnchor> byAnchor = new LinkedHashMap<>();
    for (HeldAnchor h : parts.anchors()) {
      byAnchor.merge(h.anchor().id(), h, (a, b) -> a.capacity().refused() ? a : b);
    }
    for (HeldAnchor h : byAnchor.values()) {
      boolean no = h.capacity().refused();
      grade.factored(
          "usable " + h.anchor().id(),
          no ? 0 : 1,
          1,
          "",
          no ? 0 : Double.POSITIVE_INFINITY,
          h.anchor().place().at(),
          () ->
              no
                  ? h.anchor().id() + " is refused: " + h.capacity().why() + "."
                  : h.anchor().id() + " may be used: " + h.capacity().why() + ".");
    }
  }

  private static List<PartLoad> loads(Ratios r, TreeSide t) {
    return r.parts().stream()
        .map(
            p ->
                new PartLoad(
                    p.name(),
                    t.workingN() * p.atPlan(),
                    r.source().highN() * p.holding(),
                    r.ceiling().tensionN() * p.atPlan(),
                    p.strengthN(),
                    p.designFactor(),
                    p.lastFactor()))
        .toList();
  }

  private String name(Setup s, PullSource source) {
    Gear.Source gear = site.source(s.source()).orElseThrow();
    String mode = source.modes(gear.parameters()).size() > 1 ? " (" + s.mode() + ")" : "";
    String own = s.source() + mode;
    return s.driver() == null ? own : own + " hauled by " + s.driver().source();
  }

  private PullSource kind(String plugin) {
    return sources
        .byId(plugin)
        .orElseThrow(() -> new IllegalArgumentException("no plugin \"" + plugin + "\" is loaded"));
  }
}
