package org.fallwright.core.plan;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import java.util.Optional;
import java.util.concurrent.ConcurrentHashMap;
import org.fallwright.core.pull.HaulLine;
import org.fallwright.core.pull.PullOffer;
import org.fallwright.core.pull.PullSource;
import org.fallwright.core.pull.PullSources;
import org.fallwright.core.reference.Allowances;
import org.fallwright.core.rules.RuleSet;
import org.fallwright.core.rules.RuleSets;
import org.fallwright.core.site.Copy;
import org.fallwright.core.site.Gear;
import org.fallwright.core.site.How;
import org.fallwright.core.site.Place;
import org.fallwright.core.site.Site;
import org.fallwright.core.site.SubjectTree;
import org.fallwright.core.statics.Part;
import org.fallwright.core.statics.PlanField;
import org.fallwright.core.statics.PullCase;
import org.fallwright.core.statics.Ratios;
import org.fallwright.core.statics.SourceAtTree;
import org.fallwright.core.statics.Statics;
import org.fallwright.core.statics.TreeSide;
import org.fallwright.core.statics.Trial;
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
  private static final int NOT_MADE = 1000;

  /** The site with the gear at hand alone. */
  private final Site site;

  private final PullSources sources;
  private final List<Trial> trials;
  private final RuleSet rules;
  private final DisplayUnits in;
  private final Subject subject;
  private final SiteTables tables = new SiteTables();
  private final Knowledge knowledge;
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
    site = entered.atHand();
    this.trials = trials == null ? null : List.copyOf(trials);
    this.sources = sources;
    for (double height : site.offer().attachHeightsM()) {
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
    subject = new Subject(site);
    knowledge = new Knowledge(site, rules);
    reaching = reaching(site);
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
    return notes;
  }

  /** The setup with all its checks, its zones and notes. */
  public Judged judge(Setup setup) {
    return judge(setup, true);
  }

  /** The same checks, figures and sentence without zones and notes, which take longer. */
  public Judged quick(Setup setup) {
    return judge(setup, false);
  }

  /** The setup as judged, with all that its figures were reckoned from. */
  public Reckoned reckon(Setup setup) {
    PullSource source = source(setup);
    PullSource driver = driver(setup);
    Route route = Route.of(site, setup, source, driver);
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
        GearParts.lineFigures(site, setup),
        parts.rated(),
        offer,
        tree.movable()
            ? stop(
                    statics,
                    offer,
                    route,
                    parts.parts(),
                    CellLoad.of(site, setup, route.loads().sourceEndPerTree(), offer).isPresent())
                .ratios()
            : null,
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
    Route route = Route.of(site, setup, source, driver);
    Reach.Pulled pulled = Reach.Pulled.of(statics(setup, route).treeSide());
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
    Route route = Route.of(site, setup, source, null);
    Statics statics = statics(setup, route);
    Reach.Pulled pulled = Reach.Pulled.of(statics.treeSide());
    return new StandingGround(
        site,
        rules,
        knowledge,
        setup,
        new PlanField(subject.pull(setup, route)),
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

  private Judged judge(Setup setup, boolean full) {
    PullSource source = source(setup);
    PullSource driver = driver(setup);
    Route route = routes.computeIfAbsent(setup.withLay(0), w -> Route.of(site, w, source, driver));
    Statics statics = statics(setup, route);
    TreeSide tree = statics.treeSide();
    PullOffer offer = Reach.of(site, setup, route, Reach.Pulled.of(tree), source, driver);
    GearParts parts = new GearParts(site, rules, tables).collect(setup, route, offer);
    String name = name(setup, source);

    Grade grade = new Grade(full);
    knowledge.check(grade);
    usable(grade, parts);
    Landing.Zones zones = landing.check(grade, setup, route, tree, full);
    lineRun.check(grade, setup, route);
    new KitChecks(site, spares, in, grade).check(setup, route, tree, offer, parts);
    ForceChecks forces = new ForceChecks(site, in, grade);
    forces.movement(tree, setup.attachHeightM() - site.cut().heightM());
    List<String> notes = new ArrayList<>(zones.notes());
    Figures figures;
    List<PartLoad> loads = List.of();
    if (tree.movable()) {
      Optional<CellLoad> cell = CellLoad.of(site, setup, route.loads().sourceEndPerTree(), offer);
      Stopped stopped = stop(statics, offer, route, parts.parts(), cell.isPresent());
      Ratios r = stopped.ratios();
      forces.pull(r, tree, offer, name);
      forces.parts(r, tree);
      if (stopped.leans()) {
        leaning(grade, offer, r);
      }
      figures =
          FiguresOf.reckon(cell, route, statics, r, offer, stopped.leans(), zones, trials != null);
      loads = loads(r, tree);
      if (full) {
        notes.addAll(SetupNotes.of(site, in, setup, tree, r, offer));
        notes.addAll(GearNotes.of(site, in, setup, parts, cell.isPresent()));
      }
    } else {
      figures = FiguresOf.unmovable(route, tree, zones, trials != null);
    }
    for (PullOffer.Finding f : offer.checks()) {
      grade.rule(
          f.id(), f.value(), f.limit(), f.unit(), f.ratio(), place(setup).at(), () -> f.why());
    }
    new People(reaching, rules, in, grade).check(setup, route, zones, offer);
    notes.addAll(offer.notes());
    if (full) {
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
        full ? Sentence.of(grade.verdict(), weakest, figures, name, in) : "",
        figures,
        grade.checks(),
        loads,
        route.line(),
        route.haulOnSite(),
        zones.ground(),
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
        p -> reckon(subject.pull(s, route)));
  }

  private Statics reckon(PullCase pull) {
    return trials == null ? new Statics(pull) : new Statics(pull, trials);
  }

  /**
   * The ratios after any stop, and whether the setup leans on a person who reads a load cell: it
   * does where a part would give way at the most the source can do, and a load cell is there.
   */
  private record Stopped(Ratios ratios, boolean leans) {}

  private Stopped stop(
      Statics statics, PullOffer offer, Route route, List<Part> parts, boolean cell) {
    TreeSide tree = statics.treeSide();
    double low = offer.lowN() / route.loads().sourceEndPerTree();
    boolean captured = offer.captured() && offer.holdN() >= tree.holdN();
    boolean wedges = site.cut().wedges();
    SourceAtTree free =
        new SourceAtTree(low, offer.holdN(), offer.highN(), captured, SourceAtTree.Stop.NONE, 0);
    Ratios without = Ratios.of(statics, wedges, free, parts);
    // a stop at the ceiling helps only where the plan itself stays below it
    boolean helps = anyBelowOne(without, " at high") && !anyBelowOne(without, " at plan");
    if (!helps || !cell) {
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

  private static boolean anyBelowOne(Ratios r, String checks) {
    return r.byCheck().entrySet().stream()
        .anyMatch(e -> e.getKey().endsWith(checks) && e.getValue() < 1);
  }

  private void leaning(Grade grade, PullOffer offer, Ratios r) {
    String stop = in.both(u -> u.forceAtMost(r.ceiling().tensionN()));
    String why =
        "Works only with a person reading the load cell who stops it at "
            + stop
            + ": beyond that "
            + r.ceiling().part()
            + " is loaded past its factor.";
    if (offer.powered()) {
      grade.tightAtBest(
          "stop reading", r.ceiling().tensionN(), r.source().highN(), "N", null, () -> why);
    } else {
      grade.factored(
          "stop reading",
          r.ceiling().tensionN(),
          r.source().highN(),
          "N",
          Double.POSITIVE_INFINITY,
          null,
          () -> why);
    }
  }

  private void usable(Grade grade, GearParts parts) {
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

  private Place place(Setup s) {
    return Route.place(site, s.driver() == null ? s.place() : s.driver().place());
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
