package org.fallwright.core.advice;

import java.util.ArrayList;
import java.util.Collections;
import java.util.List;
import org.fallwright.core.line.LegLoads;
import org.fallwright.core.line.Point3;
import org.fallwright.core.plan.CellLoad;
import org.fallwright.core.plan.Figures;
import org.fallwright.core.plan.Judge;
import org.fallwright.core.plan.Judged;
import org.fallwright.core.plan.LinePoint;
import org.fallwright.core.plan.Reckoned;
import org.fallwright.core.site.Site;
import org.fallwright.core.units.DisplayUnits;

/**
 * What a load cell shows, wherever along the pull line it is put.
 *
 * <p>Hauling, each leg nearer the source carries the tension before it over the block's efficiency;
 * holding, all legs carry the same, for friction is never credited. A sling at a block carries the
 * resultant of both legs. The haul part of a block system carries its share of the source end's
 * tension: hauling over sheaves that pass on as little as is reckoned with, holding over sheaves
 * without friction.
 *
 * @param places the places from the tree outwards, the load cell's own among them; empty where the
 *     tree cannot be moved
 * @param sentence how to use them, in one sentence
 */
public record Readings(List<Reading> places, String sentence) {
  /**
   * Readings at one place.
   *
   * @param at the place
   * @param hold at the hold tension
   * @param plan at the pull to plan for
   * @param ceiling at the ceiling
   */
  public record Reading(String at, Shown hold, Shown plan, Shown ceiling) {}

  /**
   * One tension as the cell shows it.
   *
   * @param haulingN while the line comes in [N]
   * @param holdingN while it stands [N]
   */
  public record Shown(double haulingN, double holdingN) {
    /** The reading from which it is surely there: the greater of the two [N]. */
    public double surelyN() {
      return Math.max(haulingN, holdingN);
    }

    /** The reading until which it is surely not passed: the lesser of the two [N]. */
    public double notPassedN() {
      return Math.min(haulingN, holdingN);
    }
  }

  public Readings {
    places = List.copyOf(places);
  }

  /** The readings of a judged setup. */
  public static Readings of(Site site, Judge judge, Judged judged) {
    if (Double.isNaN(judged.figures().pullPlanN())) {
      return new Readings(
          List.of(), "The tree cannot be moved by this setup, so there is nothing to read.");
    }
    List<Reading> places = places(judged);
    Reading last = places.get(places.size() - 1);
    String end = judged.setup().place();
    Reckoned r = judge.reckon(judged.setup());
    if (site.anchor(end).isPresent()) {
      r.ratios().parts().stream()
          .filter(p -> p.name().equals("sling at " + end))
          .findFirst()
          .ifPresent(
              p -> places.add(reading(p.name(), judged.figures(), p.hauling(), p.holding())));
    }
    double perTree = r.loads().sourceEndPerTree();
    CellLoad.haulPart(judged.setup(), perTree, r.offer())
        .ifPresent(c -> places.add(reading(judged, c)));
    Reading own =
        CellLoad.of(site, judged.setup(), perTree, r.offer())
            .map(c -> reading(judged, c))
            .orElse(last);
    return new Readings(places, sentence(site.display().units(), own));
  }

  private static String sentence(DisplayUnits in, Reading at) {
    return "A pull is there when the greater of its two readings shows, and the ceiling is reached as"
        + " soon as the lesser shows: at the "
        + at.at()
        + " plan for "
        + in.both(u -> u.forceAtLeast(at.plan().surelyN()))
        + " and never pass "
        + in.both(u -> u.forceAtMost(at.ceiling().notPassedN()))
        + ".";
  }

  /** The legs and blocks from the tree outwards, the last leg last. */
  private static List<Reading> places(Judged judged) {
    List<LinePoint> line = judged.line();
    int blocks = line.size() - 2;
    // one kind of block serves at every redirect, so each passes on the same share
    double efficiency =
        blocks == 0 ? 1 : Math.pow(1 / judged.figures().sourceEndPerTree(), 1.0 / blocks);
    LegLoads loads =
        LegLoads.of(
            line.stream().map(Readings::point).toList(), Collections.nCopies(blocks, efficiency));
    List<Reading> places = new ArrayList<>();
    for (int i = 0; i < loads.legs().size(); i++) {
      String between = " (" + line.get(i).id() + " to " + line.get(i + 1).id() + ")";
      String name =
          (blocks == 0
                  ? "tree end and source end"
                  : i == 0 ? "tree end" : i == blocks ? "source end" : "leg " + (i + 1))
              + between;
      places.add(reading(name, judged.figures(), loads.legs().get(i).haulingPerTree(), 1));
      if (i < blocks) {
        LegLoads.Block b = loads.blocks().get(i);
        places.add(
            reading(
                "sling at " + line.get(i + 1).id(), judged.figures(), b.hauling(), b.holding()));
      }
    }
    return places;
  }

  private static Reading reading(Judged j, CellLoad c) {
    return reading(c.place(), j.figures(), c.hauling(), c.holding());
  }

  private static Reading reading(String at, Figures f, double hauling, double holding) {
    return new Reading(
        at,
        new Shown(f.holdN() * hauling, f.holdN() * holding),
        new Shown(f.pullPlanN() * hauling, f.pullPlanN() * holding),
        new Shown(f.ceilingN() * hauling, f.ceilingN() * holding));
  }

  private static Point3 point(LinePoint p) {
    return new Point3(p.at().eastM(), p.at().northM(), p.elevationM());
  }
}
