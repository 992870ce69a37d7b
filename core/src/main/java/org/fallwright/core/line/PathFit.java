package org.fallwright.core.line;

import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import org.fallwright.core.units.Range;

/**
 * Whether a line, joined to the source's own wire where it has one, reaches along the path and can
 * be hauled without the joint meeting a block or the source.
 *
 * <p>The joint, or the first of several, starts at a distance s along the path from the tree, no
 * farther than the line reaches and no nearer than the wire leaves open; it moves towards the
 * source by the take-up and must keep {@link #CLEAR_M} from every block on the way and from the
 * source at the end. The greatest s that does is taken. Geometry.
 *
 * @param fits whether it does
 * @param neededM length that is needed in all: legs, and what wraps, tails and knots use up [m]
 * @param availableM length that there is: line and the wire that can be out [m]
 * @param jointM where the first joint starts, along the path from the tree; NaN: no joint or no
 *     place [m]
 * @param shortOf what is short, a sentence each; empty where it fits
 */
public record PathFit(
    boolean fits, double neededM, double availableM, double jointM, List<String> shortOf) {
  /** Room that a joint needs beside a block or the source [m]; planning allowance. */
  public static final double CLEAR_M = 0.3;

  public PathFit {
    shortOf = List.copyOf(shortOf);
  }

  /**
   * Fits a line into a path.
   *
   * @param legsM lengths of the legs from the tree outwards [m]
   * @param lineM length of the pull line [m]
   * @param usedUpM what wraps, tails and knots use up of it [m]
   * @param wireM wire that the source can have out; 0: the line itself goes to the source [m]
   * @param takeUpM line to be taken in at the source's end [m]
   */
  public static PathFit of(
      List<Double> legsM, double lineM, double usedUpM, double wireM, double takeUpM) {
    return of(legsM, List.of(lineM), usedUpM, wireM, takeUpM);
  }

  /**
   * Fits lines that are joined end to end into a path: the joints keep their distances, and each
   * must keep clear.
   *
   * @param linesM lengths of the lines from the tree outwards, without what joins them [m]
   */
  public static PathFit of(
      List<Double> legsM, List<Double> linesM, double usedUpM, double wireM, double takeUpM) {
    Range.check("legs", legsM.size(), 1, 20, "");
    Range.check("lines", linesM.size(), 1, 5, "");
    Range.check("used_up_m", usedUpM, 0, 200, "m");
    Range.check("wire_m", wireM, 0, 1000, "m");
    Range.check("take_up_m", takeUpM, 0, 1000, "m");
    List<Double> blocks = new ArrayList<>();
    double total = 0;
    for (double leg : legsM) {
      total += Range.check("leg", leg, 0, 2000, "m");
      blocks.add(total);
    }
    blocks.remove(blocks.size() - 1);
    double lines = 0;
    List<Double> joints = new ArrayList<>();
    for (double line : linesM) {
      lines += Range.check("line_m", line, 0, 2000, "m");
      joints.add(lines - linesM.get(0));
    }
    if (wireM == 0) {
      joints.remove(joints.size() - 1);
    }
    double needed = total + usedUpM;
    double available = lines + wireM;
    List<String> shortOf = new ArrayList<>();
    double joint = Double.NaN;
    if (needed > available) {
      shortOf.add(
          say(
              "line is %.1f m short: %.1f m asked, %.1f there",
              needed - available, needed, available));
    } else if (!joints.isEmpty()) {
      double beyond = available - linesM.get(0);
      double last = joints.get(joints.size() - 1);
      double least = Math.max(0, total - beyond);
      double most = Math.min(linesM.get(0) - usedUpM, total - takeUpM - CLEAR_M - last);
      if (most < least) {
        double out = total - Math.max(most, 0);
        shortOf.add(
            linesM.size() == 1
                ? say("%.1f m of wire must be out at the start and %.1f m can be", out, wireM)
                : say("a joint would meet the source within %.1f m of haul", takeUpM));
      } else {
        joint = clearOfBlocks(blocks, joints, takeUpM, most);
        if (joint < least) {
          joint = Double.NaN;
          shortOf.add(
              say(
                  linesM.size() == 1
                      ? "the joint of line and wire would meet a block within %.1f m of haul"
                      : "a joint would meet a block within %.1f m of haul",
                  takeUpM));
        }
      }
    }
    return new PathFit(shortOf.isEmpty(), needed, available, joint, shortOf);
  }

  /** The greatest start of the first joint at which all keep clear of every block. */
  private static double clearOfBlocks(
      List<Double> blocks, List<Double> joints, double takeUpM, double most) {
    double s = most;
    boolean moved = true;
    while (moved) {
      moved = false;
      for (double block : blocks) {
        for (double joint : joints) {
          double at = s + joint;
          if (at < block + CLEAR_M && at > block - takeUpM - CLEAR_M) {
            // only the arithmetic's last bit could keep it inside
            s = Math.min(Math.nextDown(s), block - takeUpM - CLEAR_M - joint);
            moved = true;
          }
        }
      }
    }
    return s;
  }

  private static String say(String format, Object... values) {
    return String.format(Locale.ROOT, format, values);
  }
}
