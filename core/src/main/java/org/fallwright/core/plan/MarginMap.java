package org.fallwright.core.plan;

import java.util.ArrayList;
import java.util.EnumMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import org.fallwright.core.line.Point3;
import org.fallwright.core.raster.Raster;
import org.fallwright.core.site.Position;
import org.fallwright.core.statics.PlanField;

/**
 * The pull margin over the ground: for one lay, line height, hinge, line and source what the margin
 * would be if the source stood there and pulled direct.
 *
 * <p>The ground is taken as at the setup's own spot: its surface, wetness, grade along the line and
 * elevation. Ground where nobody may or can stand is cut out, each cell by the first reason that
 * applies. The pull to plan for is that of the statics; what the source gives is interpolated over
 * the rise of its line, a quarter of a degree apart. Other checks (hold stability, parts, heading,
 * run-out) are not in the picture: plan the place that was picked.
 */
public final class MarginMap {
  /** Why a cell has no margin. */
  public enum Cut {
    /** It has one. */
    OPEN,
    /** The tree can come to lie there, were it to steer not at all. */
    TREE_CAN_LAND,
    /** Nearer to the stump than the rule set lets the operator stand. */
    TOO_NEAR,
    /** A thing stands there, or an anchor, or there is no room beside it. */
    THING_THERE,
    /** A wire is overhead or nearer than its approach distance. */
    WIRE_NEAR,
    /** The line from there has no lever on the tree, or the hinge never lets go. */
    NO_LEVER,
    /** The line does not reach. */
    OUT_OF_REACH,
    /** The line would run over or too near a thing, a crown or a wire. */
    LINE_FOULED
  }

  private final Raster margin;
  private final byte[] cuts;
  private final int best;

  private MarginMap(Raster margin, byte[] cuts) {
    this.margin = margin;
    this.cuts = cuts;
    int most = -1;
    for (int i = 0; i < cuts.length; i++) {
      if (!Double.isNaN(margin.at(i)) && (most < 0 || margin.at(i) > margin.at(most))) {
        most = i;
      }
    }
    best = most;
  }

  /**
   * The map of a setup without redirects and driver, whose source stands on a spot.
   *
   * @param halfM half the side of the square about the stump [m]
   * @param stepM size of a cell [m]
   * @throws IllegalArgumentException one sentence, where the setup has no such map
   */
  public static MarginMap of(Judge judge, Setup direct, double halfM, double stepM) {
    StandingGround ground = judge.standingGround(direct);
    PlanField field = ground.field();
    Position stump = ground.stump();
    int side = (int) Math.floor(2 * halfM / stepM) + 1;
    Position first =
        new Position(
            stump.eastM() - (side - 1) * stepM / 2, stump.northM() - (side - 1) * stepM / 2);
    byte[] cuts = new byte[side * side];
    Raster margin =
        new Raster(
            first,
            stepM,
            side,
            side,
            i -> {
              Position at = Raster.middle(first, stepM, side, i);
              Point3 end = ground.lineEnd(at);
              Cut cut = ground.standing(at);
              if (cut == Cut.OPEN && !ground.reaches(end)) {
                cut = Cut.OUT_OF_REACH;
              }
              double figure = Double.NaN;
              if (cut == Cut.OPEN) {
                Optional<PlanField.Asked> asked = field.at(end);
                if (asked.isEmpty()) {
                  cut = Cut.NO_LEVER;
                } else if (ground.fouled(at)) {
                  cut = Cut.LINE_FOULED;
                } else {
                  figure = ground.givesN(end) / asked.get().planN();
                }
              }
              cuts[i] = (byte) cut.ordinal();
              return figure;
            });
    return new MarginMap(margin, cuts);
  }

  /** Pull margin of each cell; NaN where it is cut out, infinite where no pull is needed. */
  public Raster margin() {
    return margin;
  }

  /** Why a cell has no margin. */
  public Cut cut(int cell) {
    return Cut.values()[cuts[cell]];
  }

  /** Cells by reason. */
  public Map<Cut, Integer> counts() {
    Map<Cut, Integer> counts = new EnumMap<>(Cut.class);
    for (byte c : cuts) {
      counts.merge(Cut.values()[c], 1, Integer::sum);
    }
    return counts;
  }

  /** Middle of the cell with the greatest margin; empty where every cell is cut out. */
  public Optional<Position> best() {
    return best < 0 ? Optional.empty() : Optional.of(margin.middle(best));
  }

  /** Cells with at least a margin, of all that are open: how much of the ground would do. */
  public List<Integer> atLeast(double least) {
    List<Integer> cells = new ArrayList<>();
    for (int i = 0; i < cuts.length; i++) {
      if (margin.at(i) >= least) {
        cells.add(i);
      }
    }
    return cells;
  }
}
