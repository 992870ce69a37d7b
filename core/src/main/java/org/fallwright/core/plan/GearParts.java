package org.fallwright.core.plan;

import java.util.ArrayList;
import java.util.List;
import org.fallwright.core.anchor.AnchorCapacity;
import org.fallwright.core.anchor.AnchorLoad;
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
    return site.gear().lines().stream()
        .filter(l -> l.id().equals(setup.line()))
        .findFirst()
        .orElseThrow();
  }

  private void redirect(Anchor a, LegLoads.Block block) {
    double gearOverSource = rules.redirectGearOverSource().value();
    double anchorOverSource = rules.redirectAnchorTwiceT().value();
    Gear.Block b = Route.block(site);
    add(
        "block at " + a.id(),
        PartStrength.rated(b.ratedLoadN(), b.standardFactor()),
        block.hauling(),
        block.holding());
    hardware(
        a.id(), block.hauling(), Math.max(block.holding(), gearOverSource), gearOverSource > 0);
    hold(a, block.haulingForce(), block.hauling(), Math.max(block.holding(), anchorOverSource));
  }

  private void fasten(Anchor a, Point3 pull, double hauling, double holding) {
    if (hauling <= 0 && holding <= 0) {
      return;
    }
    hardware(a.id(), hauling, holding, false);
    hold(a, pull, hauling, holding);
  }

  private void hold(Anchor a, Point3 pull, double hauling, double holding) {
    AnchorLoad load = AnchorLoad.of(pull.e(), pull.n(), pull.up());
    Capacity c = AnchorCapacity.of(a, load, tables);
    anchors.add(new HeldAnchor(a, load, c));
    if (!c.refused()) {
      parts.add(
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
                parts.add(
                    new Part(
                        "rated point of " + a.id(),
                        p.strengthN(),
                        p.designFactor(),
                        p.lastFactor(),
                        hauling,
                        holding)));
  }

  private void hardware(String at, double hauling, double holding, boolean ratedForSource) {
    slings++;
    connectors++;
    site.gear().slings().stream()
        .max(java.util.Comparator.comparingDouble(Gear.Sling::ratedLoadN))
        .ifPresent(
            s ->
                add(
                    "sling at " + at,
                    rated(s.ratedLoadN(), s.standardFactor(), ratedForSource),
                    hauling,
                    holding));
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
   * Where a rule sizes gear by its rating against the most of the source, that is its last factor.
   */
  private static PartStrength rated(double ratedN, double standard, boolean ratedForSource) {
    PartStrength p = PartStrength.rated(ratedN, standard);
    return ratedForSource
        ? new PartStrength(p.strengthN(), p.designFactor(), Math.max(p.lastFactor(), standard))
        : p;
  }

  private void add(String name, PartStrength p, double hauling, double holding) {
    parts.add(
        new Part(
            name, p.strengthN(), p.designFactor(), lastFactor(p.lastFactor()), hauling, holding));
  }

  private double lastFactor(double own) {
    return Math.max(own, rules.lineTwiceSource().value());
  }
}
