package org.fallwright.core.doubt;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import org.fallwright.core.plan.Reckoned;
import org.fallwright.core.reference.Allowances;
import org.fallwright.core.statics.EachTrial;
import org.fallwright.core.statics.Part;
import org.fallwright.core.statics.Ratios;

/**
 * What becomes of a setup in every trial: its margin, and how far each check of forces is met. A
 * part bears what the trial's tree asks of the line; at the most the source can do it bears the
 * same in every trial. Clearances, reach and people are not in it: no spread of the tree's figures
 * but the steering share moves them, and that one is taken at its 95th percentile.
 */
final class Outcomes {
  private final double[] needPerPull;
  private final double[] margins;
  private final List<Doubt.Failing> fails = new ArrayList<>();
  private String failsFirst = "";
  private int enough;
  private int enoughAtLeast;
  private int never;

  /**
   * @param grips share of the way from the least grip to the most, in every trial
   * @param faceDeg how far the face opens
   */
  Outcomes(Reckoned r, Pull pull, double[] grips, double faceDeg) {
    EachTrial each = r.statics().eachTrial().orElseThrow();
    int count = each.count();
    needPerPull = new double[count];
    margins = new double[count];
    Map<String, int[]> tally = new LinkedHashMap<>();
    Map<String, Integer> nearest = new LinkedHashMap<>();
    for (int i = 0; i < count; i++) {
      double need = Math.max(0, each.needN(i));
      double gives = pull.atN(grips[i]);
      needPerPull[i] = need == 0 ? 0 : gives == 0 ? Double.POSITIVE_INFINITY : need / gives;
      margins[i] = need == 0 ? Double.POSITIVE_INFINITY : gives / need;
      enough += need <= gives ? 1 : 0;
      enoughAtLeast += need <= pull.leastN() ? 1 : 0;
      never += Double.isNaN(each.commitRad(i)) ? 1 : 0;
      note(met(r, each, i, margins[i], faceDeg), tally, nearest);
    }
    for (Map.Entry<String, int[]> e : tally.entrySet()) {
      int[] n = e.getValue();
      if (n[0] > 0) {
        fails.add(new Doubt.Failing(e.getKey(), (double) n[0] / count, (double) n[1] / count));
      }
    }
    fails.sort(Comparator.comparingDouble(Doubt.Failing::chance).reversed());
    failsFirst =
        fails.stream()
            .max(Comparator.comparingDouble(Doubt.Failing::first))
            .map(Doubt.Failing::check)
            .orElseGet(() -> most(nearest));
  }

  private static String most(Map<String, Integer> nearest) {
    return nearest.entrySet().stream()
        .max(Map.Entry.comparingByValue())
        .map(Map.Entry::getKey)
        .orElse("");
  }

  private static void note(
      Map<String, Double> met, Map<String, int[]> tally, Map<String, Integer> nearest) {
    String first = null;
    for (Map.Entry<String, Double> e : met.entrySet()) {
      int[] n = tally.computeIfAbsent(e.getKey(), k -> new int[2]);
      n[0] += e.getValue() < 1 ? 1 : 0;
      if (first == null || e.getValue() < met.get(first)) {
        first = e.getKey();
      }
    }
    if (first != null) {
      tally.get(first)[1] += met.get(first) < 1 ? 1 : 0;
      nearest.merge(first, 1, Integer::sum);
    }
  }

  /** How far each check is met in a trial, capacity over demand; from 1 it is. */
  private static Map<String, Double> met(
      Reckoned r, EachTrial each, int i, double margin, double faceDeg) {
    Map<String, Double> met = new LinkedHashMap<>();
    Ratios ratios = r.ratios();
    double commit = each.commitRad(i);
    double hold = Math.max(0, each.holdN(i));
    double tension = Math.max(hold, Math.max(0, each.needN(i)));
    met.put("hinge lets go", Double.isNaN(commit) ? 0 : Double.POSITIVE_INFINITY);
    if (!Double.isNaN(commit)) {
      met.put(
          "face opening", faceDeg / (Math.toDegrees(commit) + Allowances.FACE_OVER_COMMIT.value()));
    }
    met.put("pull", margin);
    if (ratios.holdAsked()) {
      met.put("hold", ratio(ratios.source().holdN(), hold));
      met.put("hold stability", each.stability(i, ratios.source().captured()) / Ratios.STABILITY);
    }
    met.put("steering", ratio(Ratios.HINGE_SHARE, each.steerShare(i)));
    met.put("hinge turning", ratio(Ratios.HINGE_SHARE, each.turnShare(i)));
    met.put("hinge crushing", ratio(Ratios.CRUSH_SHARE, each.crushShare(i)));
    for (Part p : ratios.parts()) {
      met.put(p.name() + " at plan", ratio(p.strengthN() / p.designFactor(), tension * p.atPlan()));
      met.put(p.name() + " at high", ratios.byCheck().get(p.name() + " at high"));
    }
    return met;
  }

  private static double ratio(double there, double asked) {
    return asked <= 0 ? Double.POSITIVE_INFINITY : there / asked;
  }

  /** Need over pull in every trial. */
  double[] needPerPull() {
    return needPerPull;
  }

  /** Pull over need in every trial; infinite where none is needed. */
  double[] margins() {
    return margins;
  }

  double enough() {
    return (double) enough / margins.length;
  }

  double enoughAtLeast() {
    return (double) enoughAtLeast / margins.length;
  }

  double neverLetsGo() {
    return (double) never / margins.length;
  }

  List<Doubt.Failing> fails() {
    return fails;
  }

  String failsFirst() {
    return failsFirst;
  }
}
