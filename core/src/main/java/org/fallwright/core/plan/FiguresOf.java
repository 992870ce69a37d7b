package org.fallwright.core.plan;

import java.util.Optional;
import org.fallwright.core.pull.PullOffer;
import org.fallwright.core.statics.Ratios;
import org.fallwright.core.statics.Statics;
import org.fallwright.core.statics.TreeSide;

/** Gathers the figures of a setup. */
final class FiguresOf {
  private FiguresOf() {}

  static Figures reckon(
      Optional<CellLoad> cell,
      Route route,
      Statics statics,
      Ratios r,
      PullOffer offer,
      boolean leans,
      Landing.Zones zones,
      boolean sampled) {
    TreeSide t = statics.treeSide();
    double slack = t.takeUpM() - t.shorteningM() - t.workingN() / t.pathNPerM();
    return new Figures(
        t.neededN(),
        t.planN(),
        t.holdN(),
        t.workingN(),
        t.restShare(),
        r.holding().stability(),
        r.holding().start().word(),
        r.holding().pretensionTopN(),
        r.source().lowN(),
        r.source().highN(),
        r.ceiling().tensionN(),
        r.ceiling().part(),
        t.planN() == 0 ? Double.POSITIVE_INFINITY : r.source().lowN() / t.planN(),
        zones.clearanceM(),
        zones.clearanceTarget(),
        Math.toDegrees(t.commitRad()),
        Math.toDegrees(t.endRad()),
        t.takeUpM(),
        slack + t.shorteningToCommitM(),
        offer.travel().handM(t.takeUpM()),
        Math.toDegrees(t.riseRad()),
        t.leverM(),
        t.steerShare(),
        t.turnShare(),
        t.gapeM(),
        t.lengthM(),
        leans,
        // the lesser of its two readings: never later than the ceiling at the tree
        cell.map(c -> c.least() * r.ceiling().tensionN()).orElse(Double.NaN),
        cell.map(CellLoad::place).orElse(""),
        route.loads().sourceEndPerTree(),
        t.neededN() / t.pathNPerM() > t.shorteningToCommitM(),
        sampled);
  }

  static Figures unmovable(Route route, TreeSide t, Landing.Zones zones, boolean sampled) {
    double none = Double.NaN;
    return new Figures(
        none,
        none,
        none,
        none,
        none,
        none,
        "",
        none,
        none,
        none,
        none,
        "",
        none,
        zones.clearanceM(),
        zones.clearanceTarget(),
        Math.toDegrees(t.commitRad()),
        Math.toDegrees(t.endRad()),
        none,
        none,
        none,
        route.loads().lineRiseDeg(),
        t.leverM(),
        none,
        none,
        none,
        route.loads().lengthM(),
        false,
        none,
        "",
        route.loads().sourceEndPerTree(),
        false,
        sampled);
  }
}
