package org.fallwright.core.statics;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import org.fallwright.core.reference.Allowances;

/**
 * Every ratio of a pull, capacity over demand; infinite where nothing is demanded.
 *
 * @param source the source after any stop at the ceiling
 * @param ceiling the ceiling
 * @param holding how the tree behaves at the hold tension
 * @param holdAsked whether hold and hold stability are asked: not where the tree sitting back still
 *     rests on its stump, nor where it needs no hold
 * @param parts every part, the stem among them
 * @param pull of the pull
 * @param hold of what the source holds
 * @param holdStability of the hold's stability
 * @param steering of the hinge's side strength
 * @param turning of the hinge's strength about the vertical
 * @param crushing of the hinge's strength along the stem
 * @param atPlan of each part, in their order, at the plan
 * @param atHigh the same at the most that the source can do
 */
public record Ratios(
    SourceAtTree source,
    Ceiling ceiling,
    Holding holding,
    boolean holdAsked,
    List<Part> parts,
    double pull,
    double hold,
    double holdStability,
    double steering,
    double turning,
    double crushing,
    double[] atPlan,
    double[] atHigh) {

  /**
   * Greatest share of the hinge's strength that steering, and turning, may take (planning
   * allowance).
   */
  public static final double HINGE_SHARE = Allowances.STEERING_MOST.value();

  /** Greatest share of the compression strength in the hinge (planning allowance). */
  public static final double CRUSH_SHARE = Allowances.CRUSHING_MOST.value();

  /** Hold stability asked (planning allowance). */
  public static final double STABILITY = Allowances.HOLD_STABILITY_ASKED.value();

  /** Rest share below which the tree still rests on its stump (planning allowance). */
  public static final double REST = Allowances.REST_LEAST.value();

  /** The same where wedges are set. */
  public static final double REST_WEDGED = Allowances.REST_LEAST_WEDGED.value();

  /** Design factor of the stem (planning allowance). */
  public static final double STEM_DESIGN = Allowances.STEM_FACTOR.value();

  /** Last factor of the stem (planning allowance). */
  public static final double STEM_LAST = Allowances.LAST_FACTOR.value();

  private static final double NOTHING = Allowances.DEMAND_NONE.value();

  /** The stem below the line as a part. */
  public static Part stem(TreeSide side) {
    return new Part("stem", side.stemBreakN(), STEM_DESIGN, STEM_LAST, 1, 1);
  }

  /**
   * The ratios of a case that can be moved.
   *
   * @param s the statics
   * @param wedges whether wedges are set behind the tree
   * @param given what the source gives at the tree, before any stop
   * @param gear parts other than the stem
   */
  public static Ratios of(Statics s, boolean wedges, SourceAtTree given, List<Part> gear) {
    TreeSide side = s.treeSide();
    List<Part> parts = new ArrayList<>(gear);
    if (Double.isFinite(side.stemBreakN())) {
      parts.add(stem(side));
    }
    Ceiling ceiling = Ceiling.of(parts);
    SourceAtTree source = StopReading.apply(given, ceiling.tensionN(), side.pathNPerM());
    Holding holding = s.holding(source.captured());
    boolean asked = holdAsked(side, wedges);
    int n = parts.size();
    double[] atPlan = new double[n];
    double[] atHigh = new double[n];
    for (int i = 0; i < n; i++) {
      Part p = parts.get(i);
      atPlan[i] = ratio(p.strengthN() / p.designFactor(), side.workingN() * p.atPlan());
      atHigh[i] = ratio(p.strengthN() / p.lastFactor(), source.highN() * p.holding());
    }
    return new Ratios(
        source,
        ceiling,
        holding,
        asked,
        List.copyOf(parts),
        ratio(source.lowN(), side.planN()),
        asked ? ratio(source.holdN(), side.holdN()) : Double.POSITIVE_INFINITY,
        asked ? holding.stability() / STABILITY : Double.POSITIVE_INFINITY,
        ratio(HINGE_SHARE, side.steerShare()),
        ratio(HINGE_SHARE, side.turnShare()),
        ratio(CRUSH_SHARE, side.crushShare()),
        atPlan,
        atHigh);
  }

  /**
   * Whether hold and hold stability are asked of a tree that can be moved.
   *
   * @param wedges whether wedges are set behind the tree
   */
  public static boolean holdAsked(TreeSide side, boolean wedges) {
    return side.holdN() > 0 && side.restShare() >= (wedges ? REST_WEDGED : REST);
  }

  /** Ratio by the check's id, in a fixed order. */
  public Map<String, Double> byCheck() {
    Map<String, Double> by = new LinkedHashMap<>();
    by.put("pull", pull);
    by.put("hold", hold);
    by.put("hold stability", holdStability);
    by.put("steering", steering);
    by.put("hinge turning", turning);
    by.put("hinge crushing", crushing);
    for (int i = 0; i < parts.size(); i++) {
      by.put(parts.get(i).name() + " at plan", atPlan[i]);
      by.put(parts.get(i).name() + " at high", atHigh[i]);
    }
    return by;
  }

  /** Whether every part bears the plan. */
  public boolean holdsAtPlan() {
    return allFrom(1, atPlan);
  }

  /** Whether every part bears the most that the source can do. */
  public boolean holdsAtHigh() {
    return allFrom(1, atHigh);
  }

  private static boolean allFrom(double least, double[] ratios) {
    for (double r : ratios) {
      if (r < least) {
        return false;
      }
    }
    return true;
  }

  /** Capacity over demand; a demand below a billionth of the capacity is none. */
  public static double ratio(double capacity, double demand) {
    return demand <= NOTHING * capacity ? Double.POSITIVE_INFINITY : capacity / demand;
  }
}
