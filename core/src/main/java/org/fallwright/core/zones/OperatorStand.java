package org.fallwright.core.zones;

import java.util.List;
import org.fallwright.core.site.Position;
import org.fallwright.core.units.Range;

/**
 * Where the person who works the pull source stands.
 *
 * @param at the place
 * @param shelter how that is to the axis of the last leg
 */
public record OperatorStand(Position at, Shelter shelter) {
  /** How a place is to the axis of the last leg. */
  public enum Shelter {
    /** Beside the line. */
    OFF_AXIS,
    /** In a vehicle on the axis. */
    IN_VEHICLE,
    /** On the axis, unsheltered: a crew that hauls. */
    ON_AXIS
  }

  /** On the axis, at the end of the line. */
  public static OperatorStand atEnd(List<Position> path, boolean vehicle) {
    return new OperatorStand(
        path.get(path.size() - 1), vehicle ? Shelter.IN_VEHICLE : Shelter.ON_AXIS);
  }

  /**
   * Beside a winch that stands before its anchor, on the side away from the inside of the line's
   * last angle; with a straight line on the side that is farther from the stump, of equals on the
   * right.
   *
   * @param path the line's points in plan, from the tree to the anchor; at least two
   * @param beforeM how far the winch stands before its anchor [m]; at most half the last leg
   * @param asideM how far beside it the person stands [m]
   */
  public static OperatorStand besideWinch(List<Position> path, double beforeM, double asideM) {
    Range.check("before_m", beforeM, 0, 20, "m");
    Range.check("aside_m", asideM, 0, 50, "m");
    int n = path.size();
    Position anchor = path.get(n - 1);
    Position from = path.get(n - 2);
    double toTree = anchor.azimuthTo(from);
    Position winch = anchor.along(toTree, Math.min(beforeM, anchor.distanceTo(from) / 2));
    Position right = winch.along(toTree + 90, asideM);
    Position left = winch.along(toTree - 90, asideM);
    Position away = path.get(n == 2 ? 0 : n - 3);
    boolean goLeft = away.distanceTo(left) > away.distanceTo(right) + 1e-9;
    return new OperatorStand(goLeft ? left : right, Shelter.OFF_AXIS);
  }
}
