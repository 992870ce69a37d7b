package org.fallwright.core.statics;

import org.fallwright.core.reference.Allowances;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;

/**
 * Every ratio of a pull, capacity over demand; infinite where nothing is demanded.
 *
 * @param source the source after any stop at the ceiling
 * @param ceiling the ceiling
 * @param holding how the tree behaves at the hold tension
 * @param holdAsked whether hold and hold stability are asked: not where the tree sitting back still
 *     rests on its stump, nor where it needs no hold
 * @param parts every part, the stem among them
 * @param byCheck ratio by the check's id, in a fixed order
 */
public record Ratios(
    SourceAtTree source,
    Ceiling ceiling,
    Holding holding,
    boolean holdAsked,
    List<Part> parts,
    Map<String, Double> byCheck) {

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
    boolean asked = side.holdN() > 0 && side.restShare() >= (wedges ? REST_WEDGED : REST);
    Map<String, Double> by = new LinkedHashMap<>();
    by.put("pull", ratio(source.lowN(), side.planN()));
    by.put("hold", asked ? ratio(source.holdN(), side.holdN()) : Double.POSITIVE_INFINITY);
    by.put("hold stability", asked ? holding.stability() / STABILITY : Double.POSITIVE_INFINITY);
    by.put("steering", ratio(HINGE_SHARE, side.steerShare()));
    by.put("hinge turning", ratio(HINGE_SHARE, side.turnShare()));
    by.put("hinge crushing", ratio(CRUSH_SHARE, side.crushShare()));
    for (Part p : parts) {
      by.put(
          p.name() + " at plan",
          ratio(p.strengthN() / p.designFactor(), side.workingN() * p.atPlan()));
      by.put(
          p.name() + " at high",
          ratio(p.strengthN() / p.lastFactor(), source.highN() * p.holding()));
    }
    return new Ratios(source, ceiling, holding, asked, List.copyOf(parts), by);
  }

  /** Capacity over demand; a demand below a billionth of the capacity is none. */
  static double ratio(double capacity, double demand) {
    return demand <= NOTHING * capacity ? Double.POSITIVE_INFINITY : capacity / demand;
  }
}
