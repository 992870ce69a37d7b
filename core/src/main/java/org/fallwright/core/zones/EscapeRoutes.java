package org.fallwright.core.zones;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import org.fallwright.core.reference.Allowances;
import org.fallwright.core.site.Position;
import org.fallwright.core.site.Target;
import org.fallwright.core.units.Range;

/**
 * The feller's ways out from the stump.
 *
 * <p>Directions from 90° to 150° off the lay on either side, every 5°. A way must end outside
 * footprint, sit-back zone, bights and recoil and be clear of buildings, fences, cars, other
 * standing things and the line's further legs over its length. It is as short as that allows, from
 * the rule set's length up to twice the tree's height; a way at 135° through a sit-back zone often
 * must be long, and a flatter one is then shorter. Of the ways to one side the shortest is best;
 * among equals one that keeps 3 m off the sit-back zone; then the one nearest to 135°.
 *
 * <p>Source: 135° off the fall is the usual teaching; weighing it against the sit-back zone, the
 * steps and the 3 m are planning allowances.
 */
public final class EscapeRoutes {
  private static final int LEAST_DEG = (int) Allowances.ESCAPE_LEAST.value();
  private static final int MOST_DEG = (int) Allowances.ESCAPE_MOST.value();
  private static final int STEP_DEG = 5;
  private static final int USUAL_DEG = (int) Allowances.ESCAPE_AZIMUTH.value();

  /** Step by which a way is made longer [m]: planning allowance. */
  private static final double LONGER_M = 1;

  /** Room from the middle of a way to a thing beside it [m]: planning allowance. */
  static final double HALF_WIDTH_M = 0.5;

  /** Distance from the sit-back zone beyond which more is no better [m]: planning allowance. */
  static final double OFF_SIT_BACK_M = 3;

  private final List<Edges> obstacles;

  /** The zones and the line of a setup. */
  public record Zones(
      FallFootprint footprint,
      SitBackZone sitBack,
      List<Bight> bights,
      Recoil recoil,
      List<Leg> legs) {
    public Zones {
      bights = List.copyOf(bights);
      legs = List.copyOf(legs);
    }

    /** Whether a place is outside every zone. */
    boolean free(Position end) {
      return !sitBack.contains(end)
          && !recoil.contains(end)
          && bights.stream().noneMatch(b -> b.contains(end))
          && !footprint.contains(end);
    }
  }

  private record Way(Position end, double lengthM, double shortOfSitBackM, double offUsualDeg) {
    static final Comparator<Way> BEST =
        Comparator.comparingDouble(Way::lengthM)
            .thenComparingDouble(Way::shortOfSitBackM)
            .thenComparingDouble(Way::offUsualDeg);
  }

  /**
   * @param targets the site's targets; those that a person cannot walk over block a way
   */
  public EscapeRoutes(List<Target> targets) {
    obstacles =
        targets.stream()
            .filter(EscapeRoutes::blocks)
            .map(t -> new Edges(t.shape().geometry()))
            .toList();
  }

  private static boolean blocks(Target t) {
    return switch (t.kind()) {
      case STRUCTURE, FENCE, CAR -> true;
      case OTHER -> t.heightM() > 0;
      case ROAD, PLANTING, TREE, BURIED, PLACE_OF_PEOPLE -> false;
    };
  }

  /**
   * Ends of the ways out, at most one to each side, the better first; empty: there is none.
   *
   * @param zones zones and line of the setup
   * @param ruleLengthM least length by the rule set [m]
   * @param heightM height of the tree [m]
   */
  public List<Position> ends(Zones zones, double ruleLengthM, double heightM) {
    Range.check("escape_length_m", ruleLengthM, 1, 200, "m");
    List<Way> best = new ArrayList<>();
    for (int side : new int[] {-1, 1}) {
      Way found = null;
      for (int off = LEAST_DEG; off <= MOST_DEG; off += STEP_DEG) {
        double most = found != null ? found.lengthM : Math.max(ruleLengthM, 2 * heightM);
        Way way = way(zones, side * off, ruleLengthM, most);
        if (way != null && (found == null || Way.BEST.compare(way, found) < 0)) {
          found = way;
        }
      }
      if (found != null) {
        best.add(found);
      }
    }
    best.sort(Way.BEST);
    return best.stream().map(Way::end).toList();
  }

  private Way way(Zones zones, int offDeg, double least, double most) {
    Position stump = zones.footprint.stump();
    double azimuth = zones.footprint.layDeg() + offDeg;
    for (double length = least; length <= most; length += LONGER_M) {
      Position end = stump.along(azimuth, length);
      if (zones.free(end)) {
        if (!walkable(zones, stump, end)) {
          return null;
        }
        double near = Math.max(0, OFF_SIT_BACK_M - zones.sitBack.distanceTo(end));
        return new Way(end, length, near, Math.abs(Math.abs(offDeg) - USUAL_DEG));
      }
    }
    return null;
  }

  private boolean walkable(Zones zones, Position from, Position to) {
    Edges way = edges(from, to);
    if (!clearOf(way)) {
      return false;
    }
    for (int i = 1; i < zones.legs.size(); i++) {
      Leg leg = zones.legs.get(i);
      if (way.gapTo(edges(leg.from(), leg.to())).distanceM() < HALF_WIDTH_M) {
        return false;
      }
    }
    return true;
  }

  /** What a line puts in the way of somebody who walks off. */
  public static final class Line {
    private final List<Bight> bights;
    private final Recoil recoil;
    private final List<Edges> further = new ArrayList<>();

    public Line(List<Bight> bights, Recoil recoil, List<Leg> legs) {
      this.bights = bights;
      this.recoil = recoil;
      for (Leg leg : legs.subList(1, legs.size())) {
        further.add(edges(leg.from(), leg.to()));
      }
    }

    private boolean free(Position end) {
      if (recoil.contains(end)) {
        return false;
      }
      for (Bight b : bights) {
        if (b.contains(end)) {
          return false;
        }
      }
      return true;
    }

    private boolean walkable(Edges way) {
      for (Edges leg : further) {
        if (way.gapTo(leg).distanceM() < HALF_WIDTH_M) {
          return false;
        }
      }
      return true;
    }
  }

  /**
   * The ways out from one footprint and sit-back zone, to be asked for many lines: only whether
   * there is one. What the line does not change is worked out once, when first asked for. May be
   * asked by several threads.
   */
  public final class Ends {
    private static final byte NOT_YET = 0;
    private static final byte TAKEN = 1;
    private static final byte FREE = 2;
    private static final byte BLOCKED = 3;

    private final FallFootprint footprint;
    private final SitBackZone sitBack;
    private final double leastM;
    private final double mostM;
    private final byte[] known;
    private final int steps;

    private Ends(FallFootprint footprint, SitBackZone sitBack, double leastM, double heightM) {
      this.footprint = footprint;
      this.sitBack = sitBack;
      this.leastM = leastM;
      mostM = Math.max(leastM, 2 * heightM);
      steps = (int) Math.ceil((mostM - leastM) / LONGER_M) + 1;
      known = new byte[2 * ((MOST_DEG - LEAST_DEG) / STEP_DEG + 1) * steps];
    }

    /** Whether {@link EscapeRoutes#ends} of these zones and that line holds any. */
    public boolean any(Line line) {
      int at = 0;
      for (int side = -1; side <= 1; side += 2) {
        for (int off = LEAST_DEG; off <= MOST_DEG; off += STEP_DEG, at += steps) {
          if (along(at, side * off, line)) {
            return true;
          }
        }
      }
      return false;
    }

    private boolean along(int at, int offDeg, Line line) {
      Position stump = footprint.stump();
      double azimuth = footprint.layDeg() + offDeg;
      double sin = Math.sin(Math.toRadians(azimuth));
      double cos = Math.cos(Math.toRadians(azimuth));
      double covered = 0;
      int i = at;
      for (double length = leastM; length <= mostM; length += LONGER_M, i++) {
        byte state = known[i];
        if (state == TAKEN || length < covered) {
          continue;
        }
        covered = line.recoil.discUntil(stump, sin, cos, length);
        if (length < covered) {
          continue;
        }
        Position end = stump.along(azimuth, length);
        if (state == NOT_YET) {
          boolean free = !sitBack.contains(end) && !footprint.contains(end);
          state = !free ? TAKEN : clearOf(edges(stump, end)) ? FREE : BLOCKED;
          known[i] = state;
        }
        if (state != TAKEN && line.free(end)) {
          return state == FREE && line.walkable(edges(stump, end));
        }
      }
      return false;
    }
  }

  /** The ways out from a footprint and a sit-back zone, to be asked for many lines. */
  public Ends ends(
      FallFootprint footprint, SitBackZone sitBack, double ruleLengthM, double heightM) {
    Range.check("escape_length_m", ruleLengthM, 1, 200, "m");
    return new Ends(footprint, sitBack, ruleLengthM, heightM);
  }

  private boolean clearOf(Edges way) {
    for (Edges o : obstacles) {
      if (way.gapTo(o).distanceM() < HALF_WIDTH_M) {
        return false;
      }
    }
    return true;
  }

  private static Edges edges(Position a, Position b) {
    return new Edges(a.eastM(), a.northM(), b.eastM(), b.northM());
  }
}
