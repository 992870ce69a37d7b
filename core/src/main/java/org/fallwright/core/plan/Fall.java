package org.fallwright.core.plan;

import java.lang.ref.Reference;
import java.lang.ref.SoftReference;
import org.fallwright.core.statics.Ratios;
import org.fallwright.core.statics.Statics;
import org.fallwright.core.statics.TreeSide;
import org.fallwright.core.zones.EscapeRoutes;

/**
 * One lay pulled over one first support: all that is the same whatever the line does beyond it,
 * where the tree lands and whether it moves among it.
 */
final class Fall {
  private final double layDeg;
  private final TreeSide tree;
  private final Slice lands;
  private final Slice moves;
  private final boolean holdAsked;
  private final int hingeFails;
  private final double hingeLeast;
  private volatile Reference<Kept> kept;
  private final Kept held;

  /**
   * What takes much room, and is kept only of a lay that lands clear.
   *
   * @param statics the pull, over a line that ends at the first support
   * @param landed the footprint and what it meets
   * @param ways the ways out
   */
  record Kept(Statics statics, Landing.Landed landed, EscapeRoutes.Ends ways) {}

  Fall(double layDeg, boolean wedges, Slice lands, Slice moves, Kept all) {
    this.layDeg = layDeg;
    tree = all.statics().treeSide();
    this.lands = lands;
    this.moves = moves;
    held = lands.passes() ? all : null;
    holdAsked = tree.movable() && Ratios.holdAsked(tree, wedges);
    int fails = 0;
    double least = Double.POSITIVE_INFINITY;
    if (tree.movable()) {
      double[] standings = {
        Ratios.ratio(Ratios.HINGE_SHARE, tree.steerShare()) / Grade.WORKABLE,
        Ratios.ratio(Ratios.HINGE_SHARE, tree.turnShare()),
        Ratios.ratio(Ratios.CRUSH_SHARE, tree.crushShare())
      };
      double[] from = {1 / Grade.WORKABLE, 1, 1};
      for (int i = 0; i < standings.length; i++) {
        if (standings[i] < from[i] * (1 - HAIR)) {
          fails++;
          least = Math.min(least, standings[i]);
        }
      }
    }
    hingeFails = fails;
    hingeLeast = least;
  }

  /** Rounding that a bound leaves to the figure it bounds. */
  static final double HAIR = 1e-9;

  double layDeg() {
    return layDeg;
  }

  /** What the tree asks; over another line stiffness, length and take-up differ. */
  TreeSide tree() {
    return tree;
  }

  /** Targets, drop zone and wires. */
  Slice lands() {
    return lands;
  }

  /** Hinge and lever. */
  Slice moves() {
    return moves;
  }

  /** What is kept of it; null: nothing. */
  Kept kept() {
    Reference<Kept> lent = kept;
    return held != null ? held : lent == null ? null : lent.get();
  }

  /** Keeps it again, as long as there is room. */
  Kept keep(Kept again) {
    kept = new SoftReference<>(again);
    return again;
  }

  /** A bound on how a way stands on this lay. */
  static final class Bound {
    private int failing;
    private double standing;

    int failing() {
      return failing;
    }

    double standing() {
      return standing;
    }

    private void fails(double atBest) {
      failing++;
      standing = Math.min(standing, atBest * (1 + HAIR));
    }
  }

  /**
   * At least how many checks a way fails on this lay, and the most that its weakest link can stand
   * at. Nothing is asked of the source again.
   *
   * @param way what is known of the way
   */
  void bound(Bound b, Run.Known way) {
    b.failing = way.failing() + lands.failing() + moves.failing();
    b.standing =
        Math.min(
            way.least(),
            Math.min(lands.least(Verdict.NOT_WORKABLE), moves.least(Verdict.NOT_WORKABLE)));
    if (!tree.movable()) {
      b.failing += Judge.NOT_MADE;
      return;
    }
    b.failing += hingeFails;
    b.standing = Math.min(b.standing, hingeLeast);
    if (way.lowN() < tree.planN() * (1 - HAIR)) {
      b.fails(way.lowN() / tree.planN() / Grade.WORKABLE);
    }
    if (holdAsked && way.holdN() < tree.holdN() * (1 - HAIR)) {
      b.fails(way.holdN() / tree.holdN() / Grade.WORKABLE);
    }
    double ceiling = Math.min(way.ceilingN(), tree.stemBreakN() / Ratios.STEM_DESIGN);
    if (ceiling < tree.workingN() * (1 - HAIR)) {
      b.fails(ceiling / tree.workingN());
    }
  }
}
