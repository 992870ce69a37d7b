package org.fallwright.core.plan;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import java.util.Optional;
import java.util.concurrent.ConcurrentHashMap;
import java.util.function.Supplier;
import org.fallwright.core.pull.HaulLine;
import org.fallwright.core.pull.PullOffer;
import org.fallwright.core.pull.PullSource;
import org.fallwright.core.pull.PullSources;
import org.fallwright.core.pull.SourceFault;
import org.fallwright.core.reference.Allowances;
import org.fallwright.core.rules.RuleSet;
import org.fallwright.core.rules.RuleSets;
import org.fallwright.core.site.Copy;
import org.fallwright.core.site.Gear;
import org.fallwright.core.site.How;
import org.fallwright.core.site.Position;
import org.fallwright.core.site.Site;
import org.fallwright.core.site.SubjectTree;
import org.fallwright.core.statics.LineSet;
import org.fallwright.core.statics.Part;
import org.fallwright.core.statics.PlanField;
import org.fallwright.core.statics.PullCase;
import org.fallwright.core.statics.Ratios;
import org.fallwright.core.statics.SourceAtTree;
import org.fallwright.core.statics.Statics;
import org.fallwright.core.statics.TreeSide;
import org.fallwright.core.statics.Trial;
import org.fallwright.core.units.DisplayUnits;
import org.fallwright.core.zones.OperatorStand;

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

  /** The site with the gear at hand alone. */
  private final Site site;

  private final PullSources sources;
  private final List<Trial> trials;
  private final RuleSet rules;
  private final DisplayUnits in;
  private final Places places;
  private final Subject subject;
  private final SiteTables tables = new SiteTables();
  private final Knowledge knowledge;
  private final Exceptions exceptions;
  private final Landing landing;

  /** The site with the tree as tall and as far over as its ranges allow, for the zones. */
  private final Site reaching;

  private final LineRun lineRun;
  private final Spares spares;
  private final Map<Setup, Route> routes = new ConcurrentHashMap<>();
  private final Map<Pulled, Statics> reckoned = new ConcurrentHashMap<>();

  /**
   * @throws IllegalArgumentException one sentence, where the site names a species, surface or rule
   *     set that is not known
   */
  public Judge(Site entered, PullSources sources) {
    this(entered, sources, null);
  }

  /**
   * A judge who takes every percentile over trials instead of one input at a time: slower, and it
   * decides.
   *
   * @param trials ways that the site may really be; null: one input at a time
   */
  public Judge(Site entered, PullSources sources, List<Trial> trials) {
    site = entered.atHand().laidOut();
    this.trials = trials == null ? null : List.copyOf(trials);
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
    reaching = reaching(site);
    exceptions = new Exceptions(site, rules);
    landing = new Landing(reaching, rules, in, subject, knowledge);
    spares = new Spares(entered, in);
    lineRun = new LineRun(site, in, knowledge);
  }

  private static Site reaching(Site site) {
    SubjectTree t = site.tree();
    if (t.heightM().how() != How.RANGE && t.leanDeg().how() != How.RANGE) {
      return site;
    }
    SubjectTree tall = Copy.with(t, "heightM", t.heightM().withHigh());
    return Copy.with(site, "tree", Copy.with(tall, "leanDeg", t.leanDeg().withHigh()));
  }

  /** Notes that hold for every setup of the site, a sentence each. */
  List<String> notes() {
    List<String> notes = new ArrayList<>(subject.notes());
    spares.note().ifPresent(notes::add);
    notes.addAll(exceptions.notes());
    notes.addAll(landing.words().ofSite());
    notes.addAll(RuleNotes.of(site, rules, in));
    return notes;
  }

  /** Every check, with its verdict and ratio alone. */
  Look look(Setup setup) {
    Grade grade = quickly();
    Found found = check(grade, setup, false);
    TreeSide tree = found.statics().treeSide();
    int parts = tree.movable() ? found.stopped().ratios().parts().size() : 0;
    return new Look(setup.layDeg(), parts, tree.movable() ? 0 : NOT_MADE, grade.slice());
  }

  /** Gathers checks without a sentence. */
  Grade quickly() {
    return new Grade(false, exceptions);
  }

  /** The setup as judged, with all that its figures were reckoned from. */
  public Reckoned reckon(Setup setup) {
    PullSource source = source(setup);
    PullSource driver = driver(setup);
    Route route = Route.of(places, setup, source, driver);
    Asked asked = ask(setup, route, source, driver);
    Statics statics = asked.statics();
    TreeSide tree = statics.treeSide();
    PullOffer offer = asked.offer();
    GearParts parts = new GearParts(site, rules, tables).collect(setup, route, offer);
    return new Reckoned(
        judge(setup),
        subject.species(),
        subject.figures(),
        subject.pull(setup, route, offer.stiffnessNPerM()),
        statics,
        route.points(),
        route.loads(),
        setup.redirects().isEmpty() ? null : Route.block(site),
        GearParts.lineFigures(site, setup),
        parts.rated(),
        offer,
        tree.movable() ? stop(setup, statics, offer, route, parts.parts()).ratios() : null,
        parts.anchors(),
        tables);
  }

  /**
   * What the source of a setup gives at the tree at its least, by how well tyres or boots grip [N];
   * no stop is counted.
   *
   * @param grips shares of the way from the least grip of the ground to its most, 0 to 1
   */
  public List<Double> lowsByGrip(Setup setup, List<Double> grips) {
    PullSource source = source(setup);
    PullSource driver = driver(setup);
    Route route = Route.of(places, setup, source, driver);
    Reach.Pulled pulled = Reach.Pulled.of(ask(setup, route, source, driver).statics().treeSide());
    return grips.stream()
        .map(g -> Reach.of(site, setup, route, pulled, source, driver, s -> Grip.of(s, g)).lowN())
        .map(low -> low / route.loads().sourceEndPerTree())
        .toList();
  }

  /**
   * Every part of the setup, the stem among them, with its strength and its load per newton at the
   * tree; none where the tree cannot be moved.
   */
  public List<Part> parts(Setup setup) {
    Ratios ratios = reckon(setup).ratios();
    return ratios == null ? List.of() : ratios.parts();
  }

  /**
   * Where the source of a direct setup could stand instead.
   *
   * @throws IllegalArgumentException one sentence, where the setup is none that can be moved about
   */
  StandingGround standingGround(Setup setup) {
    if (!setup.redirects().isEmpty() || setup.driver() != null) {
      throw new IllegalArgumentException(
          "a margin map is of a source that pulls direct; this setup leads its line over an"
              + " anchor");
    }
    if (site.spot(setup.place()).isEmpty()) {
      throw new IllegalArgumentException(
          "a margin map is of a source that stands on a spot; "
              + setup.place()
              + " is an anchor, and its places are the anchors");
    }
    PullSource source = source(setup);
    Route route = Route.of(places, setup, source, null);
    Statics statics = statics(setup, route, null);
    Reach.Pulled pulled = Reach.Pulled.of(statics.treeSide());
    return new StandingGround(
        site,
        rules,
        knowledge,
        setup,
        new PlanField(subject.pull(setup, route, null)),
        Reach.lowByRise(site, setup, route, pulled, source),
        route,
        landing.widest(setup.layDeg()),
        GearParts.line(site, setup).lengthM()
            + Reach.of(site, setup, route, pulled, source, null).wireM());
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
      GearParts parts,
      Landing.Zones zones,
      Stopped stopped,
      OperatorStand stand,
      Supplier<String> name) {}

  /**
   * Every check, in the fixed order.
   *
   * @param exact whether figures are worked out that no verdict hangs on
   */
  private Found check(Grade grade, Setup setup, boolean exact) {
    PullSource source = source(setup);
    PullSource driver = driver(setup);
    Route route = routes.get(setup.withLay(0));
    if (route == null) { // not computed inside the map: a plugin that hangs must not hold a lock
      route = Route.of(places, setup, source, driver);
      routes.put(setup.withLay(0), route);
    }
    Asked asked = ask(setup, route, source, driver);
    Statics statics = asked.statics();
    TreeSide tree = statics.treeSide();
    PullOffer offer = asked.offer();
    GearParts parts = parts(setup, route, offer);
    Supplier<String> name = () -> name(setup, source);

    knowledge.check(grade);
    usable(grade, parts);
    Landing.Zones zones = landing.check(grade, setup, route, tree, exact);
    lineRun.check(grade, setup, route);
    kit(grade, setup, route, tree, offer, parts);
    movement(grade, setup, tree);
    Stopped stopped = pulled(grade, setup, statics, offer, route, parts.parts(), name);
    OperatorStand stand = people(grade, setup, route, zones, offer, tree);
    return new Found(route, statics, offer, parts, zones, stopped, stand, name);
  }

  /** The site as it is judged: the gear at hand alone, its strips laid out. */
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
    Grade lands = quickly();
    landing.lands(lands, all.landed());
    Grade moves = quickly();
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
    new KitChecks(site, spares, in, grade).check(setup, route, tree, offer, parts);
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
      stopped = stop(setup, statics, offer, route, parts);
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

  /** Whether people can stand clear; where the source is worked, null: nobody works it. */
  OperatorStand people(
      Grade grade, Setup setup, Route route, Landing.Zones zones, PullOffer offer, TreeSide tree) {
    People people = new People(reaching, rules, in, grade);
    OperatorStand stand = people.stand(setup, route, offer);
    people.check(setup, route, stand, zones, offer, tree);
    return stand;
  }

  /** The setup with all its checks, its zones and notes. */
  public Judged judge(Setup setup) {
    return judge(setup, true);
  }

  /** The same checks and figures without sentences, zones and notes, which take longer. */
  public Judged quick(Setup setup) {
    return judge(setup, false);
  }

  private Judged judge(Setup setup, boolean full) {
    Grade grade = full ? new Grade(true, exceptions) : quickly();
    Found found = check(grade, setup, true);
    TreeSide tree = found.statics().treeSide();
    List<String> notes = new ArrayList<>(found.zones().notes());
    Figures figures;
    List<PartLoad> loads = List.of();
    if (tree.movable()) {
      Ratios r = found.stopped().ratios();
      figures =
          FiguresOf.reckon(
              found.stopped().cell(),
              found.route(),
              found.statics(),
              r,
              found.offer(),
              found.stopped().leans(),
              found.zones(),
              trials != null);
      loads = loads(r, tree);
      if (full) {
        notes.addAll(SetupNotes.of(site, in, setup, tree, r, found.offer()));
        boolean cell = found.stopped().cell().isPresent();
        notes.addAll(GearNotes.of(site, in, setup, found.parts(), cell));
      }
    } else {
      figures = FiguresOf.unmovable(found.route(), tree, found.zones(), trials != null);
    }
    notes.addAll(found.offer().notes());
    Ground ground = full ? landing.ground(setup, found.zones(), found.stand()) : null;
    if (full) {
      notes.addAll(landing.words().ofCrew(ground));
      notes.addAll(LandNotes.of(site, setup));
    }
    Check weakest = grade.weakest();
    return new Judged(
        setup,
        grade.verdict(),
        weakest,
        grade.standing(),
        grade.standings(),
        grade.failing() + (tree.movable() ? 0 : NOT_MADE),
        full ? Sentence.of(grade.verdict(), weakest, figures, found.name().get(), in) : "",
        figures,
        grade.checks(),
        loads,
        found.route().line(),
        found.route().haulOnSite(),
        ground,
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
      HaulLine haulLine,
      Double sourceNPerM) {}

  private record Asked(Statics statics, PullOffer offer) {}

  /** What the source gives; one that is elastic itself is asked again with its own give in it. */
  private Asked ask(Setup setup, Route route, PullSource source, PullSource driver) {
    Statics statics = statics(setup, route, null);
    PullOffer offer = offer(setup, route, statics, source, driver);
    if (offer.stiffnessNPerM() == null) {
      return new Asked(statics, offer);
    }
    Statics softer = statics(setup, route, offer.stiffnessNPerM());
    PullOffer again = offer(setup, route, softer, source, driver);
    if (!offer.stiffnessNPerM().equals(again.stiffnessNPerM())) {
      throw new SourceFault(
          source.describe().id(),
          "The pull source \""
              + source.describe().id()
              + "\" changes its own stiffness with the line's, which it must not.",
          null);
    }
    return new Asked(softer, again);
  }

  private PullOffer offer(
      Setup setup, Route route, Statics statics, PullSource source, PullSource driver) {
    return Reach.of(site, setup, route, Reach.Pulled.of(statics.treeSide()), source, driver);
  }

  private Statics statics(Setup s, Route route, Double sourceNPerM) {
    return reckoned.computeIfAbsent(
        new Pulled(
            s.layDeg(),
            s.attachHeightM(),
            s.hingeThicknessM(),
            s.line(),
            route.line(),
            route.haulOnSite(),
            route.haulLine(),
            sourceNPerM),
        p -> reckon(subject.pull(s, route, sourceNPerM)));
  }

  private Statics reckon(PullCase pull) {
    return trials == null ? new Statics(pull) : new Statics(pull, trials);
  }

  /**
   * The ratios after any stop, and whether the setup leans on a person who reads a load cell: it
   * does where a part would give way at the most the source can do, and a load cell is there.
   */
  record Stopped(Ratios ratios, boolean leans, Optional<CellLoad> cell) {}

  private Stopped stop(
      Setup setup, Statics statics, PullOffer offer, Route route, List<Part> parts) {
    Optional<CellLoad> cell = CellLoad.of(site, setup, route.loads().sourceEndPerTree(), offer);
    TreeSide tree = statics.treeSide();
    double low = offer.lowN() / route.loads().sourceEndPerTree();
    boolean captured = offer.captured() && offer.holdN() >= tree.holdN();
    boolean wedges = site.cut().wedges();
    SourceAtTree free =
        new SourceAtTree(low, offer.holdN(), offer.highN(), captured, SourceAtTree.Stop.NONE, 0);
    Ratios without = Ratios.of(statics, wedges, free, parts);
    // a stop at the ceiling helps only where the plan itself stays below it
    boolean helps = !without.holdsAtHigh() && without.holdsAtPlan();
    if (!helps || cell.isEmpty()) {
      return new Stopped(without, false, cell);
    }
    SourceAtTree read =
        new SourceAtTree(
            low,
            offer.holdN(),
            offer.highN(),
            captured,
            SourceAtTree.Stop.READER,
            offer.overrunM());
    return new Stopped(Ratios.of(statics, wedges, read, parts), true, cell);
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
