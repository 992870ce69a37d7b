package org.fallwright.core.plan;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.function.BinaryOperator;
import org.fallwright.core.anchor.AnchorCapacity;
import org.fallwright.core.anchor.AnchorLoad;
import org.fallwright.core.anchor.Bridle;
import org.fallwright.core.anchor.Capacity;
import org.fallwright.core.line.LegLoads;
import org.fallwright.core.line.PartStrength;
import org.fallwright.core.line.Point3;
import org.fallwright.core.pull.PullOffer;
import org.fallwright.core.rules.RuleSet;
import org.fallwright.core.site.Anchor;
import org.fallwright.core.site.Gear;
import org.fallwright.core.site.Site;
import org.fallwright.core.statics.Part;

/**
 * Every part of a way but the stem, with its load per newton at the tree.
 *
 * <p>A part's own factors and those of the rule set: the greater counts.
 */
final class GearParts {
  private final Site site;
  private final RuleSet rules;
  private final SiteTables tables;

  private final List<Part> parts = new ArrayList<>();
  private final List<HeldAnchor> anchors = new ArrayList<>();
  private int slings;
  private int connectors;

  GearParts(Site site, RuleSet rules, SiteTables tables) {
    this.site = site;
    this.rules = rules;
    this.tables = tables;
  }

  List<Part> parts() {
    return parts;
  }

  List<HeldAnchor> anchors() {
    return anchors;
  }

  int slings() {
    return slings;
  }

  int connectors() {
    return connectors;
  }

  GearParts collect(Setup setup, Route route, PullOffer offer) {
    LegLoads loads = route.loads();
    double end = loads.sourceEndPerTree();
    Gear.Line line = line(site, setup);
    PartStrength rope = PartStrength.line(line, rules.fibreFactor().value());
    add("line " + line.id(), rope, end, 1);
    for (int i = 0; i < setup.redirects().size(); i++) {
      redirect(site.anchor(setup.redirects().get(i)).orElseThrow(), loads.blocks().get(i));
    }
    Gear.LoadCell cell = site.gear().loadCell();
    if (cell != null) {
      add(
          "load cell " + cell.id(),
          PartStrength.rated(cell.ratedLoadN(), cell.standardFactor()),
          end,
          1);
    }
    site.anchor(setup.place())
        .ifPresent(
            a -> {
              List<Point3> p = route.points();
              Point3 pull = p.get(p.size() - 2).minus(p.get(p.size() - 1));
              fasten(a, pull, end * offer.anchorHauling(), offer.anchorHolding());
            });
    if (setup.driver() != null) {
      site.anchor(setup.driver().place())
          .ifPresent(
              a -> {
                Point3 pull = route.haul().get(0).minus(route.haul().get(1));
                fasten(
                    a,
                    pull,
                    end * Math.abs(offer.anchorHauling() - 1),
                    Math.abs(offer.anchorHolding() - 1));
              });
    }
    for (PullOffer.Part p : offer.parts()) {
      parts.add(
          new Part(
              p.name(),
              p.strengthN(),
              p.designFactor(),
              lastFactor(p.lastFactor()),
              end * p.hauling(),
              p.holding()));
    }
    return this;
  }

  static Gear.Line line(Site site, Setup setup) {
    for (Gear.Line l : site.gear().lines()) {
      if (l.id().equals(setup.line())) {
        return l;
      }
    }
    throw new java.util.NoSuchElementException("no line \"" + setup.line() + "\" is in the gear");
  }

  /**
   * What bears on an anchor, per newton at the tree.
   *
   * @param haulingForce direction of the force while hauling
   * @param holdingForce the same while holding
   * @param hauling its amount while hauling
   * @param holding its amount while holding
   * @param gearLeast least that slings and connectors must bear at the source's most, by rule
   * @param anchorLeast the same of the anchor
   */
  private record Bearing(
      Point3 haulingForce,
      Point3 holdingForce,
      double hauling,
      double holding,
      double gearLeast,
      double anchorLeast) {
    Bearing along(Point3 leg, double haulingShare, double holdingShare) {
      return new Bearing(
          leg,
          leg,
          hauling * haulingShare,
          holding * holdingShare,
          gearLeast * holdingShare,
          anchorLeast * holdingShare);
    }
  }

  private void redirect(Anchor a, LegLoads.Block block) {
    Gear.Block b = Route.block(site);
    add(
        "block at " + a.id(),
        PartStrength.rated(b.ratedLoadN(), b.standardFactor()),
        block.hauling(),
        block.holding());
    bear(
        a,
        new Bearing(
            block.haulingForce(),
            block.holdingForce(),
            block.hauling(),
            block.holding(),
            rules.redirectGearOverSource().value(),
            rules.redirectAnchorTwiceT().value()));
  }

  private void fasten(Anchor a, Point3 pull, double hauling, double holding) {
    if (hauling > 0 || holding > 0) {
      bear(a, new Bearing(pull, pull, hauling, holding, 0, 0));
    }
  }

  private void bear(Anchor a, Bearing on) {
    double gear = Math.max(on.holding(), on.gearLeast());
    if (!(a instanceof Anchor.TwoLegs two)) {
      slings++;
      sling(a.id(), on.hauling(), gear, on.gearLeast() > 0);
      connector(a.id(), on.hauling(), gear, on.gearLeast() > 0);
      hold(a, on.haulingForce(), on.hauling(), Math.max(on.holding(), on.anchorLeast()));
      return;
    }
    connector(a.id(), on.hauling(), gear, on.gearLeast() > 0);
    Anchor first = site.anchor(two.first()).orElseThrow();
    Anchor second = site.anchor(two.second()).orElseThrow();
    Point3 apex = Route.fastening(site, two);
    Point3 one = Route.fastening(site, first);
    Point3 other = Route.fastening(site, second);
    Bridle hauling = Bridle.of(apex, one, other, on.haulingForce());
    Bridle holding = Bridle.of(apex, one, other, on.holdingForce());
    Optional<Capacity> no =
        AnchorCapacity.rejected(two)
            .or(() -> hauling.refused().or(holding::refused).map(Capacity::refuse));
    Point3 pull = on.haulingForce();
    anchors.add(
        new HeldAnchor(
            two, AnchorLoad.of(pull.e(), pull.n(), pull.up()), no.orElseGet(Capacity::shared)));
    if (no.isEmpty()) {
      bear(first, on.along(hauling.firstPull(), hauling.first(), holding.first()));
      bear(second, on.along(hauling.secondPull(), hauling.second(), holding.second()));
    }
  }

  private void hold(Anchor a, Point3 pull, double hauling, double holding) {
    AnchorLoad load = AnchorLoad.of(pull.e(), pull.n(), pull.up());
    Capacity c = AnchorCapacity.of(a, load, tables);
    anchors.add(new HeldAnchor(a, load, c));
    if (!c.refused()) {
      together(
          new Part(
              "anchor " + a.id(),
              c.strengthN(),
              c.designFactor(),
              c.lastFactor(),
              hauling,
              holding));
    }
    AnchorCapacity.ratedPoint(a)
        .ifPresent(
            p ->
                together(
                    new Part(
                        "rated point of " + a.id(),
                        p.strengthN(),
                        p.designFactor(),
                        p.lastFactor(),
                        hauling,
                        holding)));
  }

  private void sling(String at, double hauling, double holding, boolean ratedForSource) {
    site.gear().slings().stream()
        .max(java.util.Comparator.comparingDouble(Gear.Sling::ratedLoadN))
        .ifPresent(
            s ->
                add(
                    "sling at " + at,
                    rated(s.ratedLoadN(), s.standardFactor(), ratedForSource),
                    hauling,
                    holding));
  }

  private void connector(String at, double hauling, double holding, boolean ratedForSource) {
    connectors++;
    site.gear().connectors().stream()
        .max(java.util.Comparator.comparingDouble(Gear.Connector::ratedLoadN))
        .ifPresent(
            s ->
                add(
                    "connector at " + at,
                    rated(s.ratedLoadN(), s.standardFactor(), ratedForSource),
                    hauling,
                    holding));
  }

  /**
   * Adds an anchor that may bear twice in one way: its loads are summed as if they pulled alike,
   * and the weaker direction counts.
   */
  private void together(Part p) {
    merge(
        p,
        (a, b) ->
            new Part(
                a.name(),
                Math.min(a.strengthN(), b.strengthN()),
                Math.max(a.designFactor(), b.designFactor()),
                Math.max(a.lastFactor(), b.lastFactor()),
                a.hauling() + b.hauling(),
                a.holding() + b.holding()));
  }

  private void merge(Part p, BinaryOperator<Part> both) {
    for (int i = 0; i < parts.size(); i++) {
      if (parts.get(i).name().equals(p.name())) {
        parts.set(i, both.apply(parts.get(i), p));
        return;
      }
    }
    parts.add(p);
  }

  /**
   * Where a rule sizes gear by its rating against the most of the source, that is its last factor.
   */
  private static PartStrength rated(double ratedN, double standard, boolean ratedForSource) {
    PartStrength p = PartStrength.rated(ratedN, standard);
    return ratedForSource
        ? new PartStrength(p.strengthN(), p.designFactor(), Math.max(p.lastFactor(), standard))
        : p;
  }

  /** Adds a part; of two alike at one place, as two slings at an anchor, the more loaded counts. */
  private void add(String name, PartStrength p, double hauling, double holding) {
    merge(
        new Part(
            name, p.strengthN(), p.designFactor(), lastFactor(p.lastFactor()), hauling, holding),
        (a, b) ->
            new Part(
                a.name(),
                a.strengthN(),
                a.designFactor(),
                Math.max(a.lastFactor(), b.lastFactor()),
                Math.max(a.hauling(), b.hauling()),
                Math.max(a.holding(), b.holding())));
  }

  private double lastFactor(double own) {
    return Math.max(own, rules.lineTwiceSource().value());
  }
}
