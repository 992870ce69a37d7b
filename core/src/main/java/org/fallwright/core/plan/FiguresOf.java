package org.fallwright.core.plan;

import org.fallwright.core.pull.PullOffer;
import org.fallwright.core.site.Site;
import org.fallwright.core.statics.Ratios;
import org.fallwright.core.statics.Statics;
import org.fallwright.core.statics.TreeSide;

/** Gathers the figures of a setup. */
final class FiguresOf {
  private FiguresOf() {}

  static Figures reckon(
      Site site,
      Route route,
      Statics statics,
      Ratios r,
      PullOffer offer,
      boolean leans,
      Landing.Zones zones) {
    TreeSide t = statics.treeSide();
    boolean cell = site.gear().loadCell() != null;
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
        // the reading as if the sheaves lost nothing: never later than the ceiling at the tree
        cell ? r.ceiling().tensionN() : Double.NaN,
        cell ? "source end of the pull line" : "",
        route.loads().sourceEndPerTree(),
        t.neededN() / t.pathNPerM() > t.shorteningToCommitM());
  }

  static Figures unmovable(Route route, TreeSide t, Landing.Zones zones) {
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
        false);
  }
}
