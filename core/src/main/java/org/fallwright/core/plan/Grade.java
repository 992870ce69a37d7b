package org.fallwright.core.plan;

import java.util.ArrayList;
import java.util.List;
import java.util.function.Supplier;
import org.fallwright.core.reference.Allowances;
import org.fallwright.core.site.Position;
import org.fallwright.core.site.TakenException;

/**
 * Gathers the checks of one setup and gives each its verdict.
 *
 * <p>Workable from a ratio of 1.25, tight from 1, else not; a check that holds a design factor
 * already is workable from 1. The standing of a check is its ratio over the ratio from which it is
 * workable, so that checks of both kinds can be ranked together.
 */
final class Grade {
  /**
   * Ratio from which a check without a design factor of its own is workable; planning allowance.
   */
  static final double WORKABLE = Allowances.WORKABLE_RATIO.value();

  private final boolean full;
  private final Exceptions exceptions;
  private final List<Check> checks = new ArrayList<>();
  private final List<Double> standings = new ArrayList<>();

  /**
   * @param full whether each check says why; a quick look leaves that empty
   * @param exceptions what somebody takes an exception to
   */
  Grade(boolean full, Exceptions exceptions) {
    this.full = full;
    this.exceptions = exceptions;
  }

  /** Whether each check says why. */
  boolean full() {
    return full;
  }

  private String said(Supplier<String> why) {
    return full ? why.get() : "";
  }

  /** A check without a design factor inside. */
  void plain(
      String id,
      double value,
      double limit,
      String unit,
      double ratio,
      Position at,
      Supplier<String> why) {
    add(id, value, limit, unit, ratio, WORKABLE, at, why);
  }

  /** A check with a design factor inside. */
  void factored(
      String id,
      double value,
      double limit,
      String unit,
      double ratio,
      Position at,
      Supplier<String> why) {
    add(id, value, limit, unit, ratio, 1, at, why);
  }

  /**
   * A limit of a rule, or one whose allowance is inside it: to meet it is enough, and then it does
   * not rank.
   */
  void rule(
      String id,
      double value,
      double limit,
      String unit,
      double ratio,
      Position at,
      Supplier<String> why) {
    boolean met = ratio >= 1;
    put(
        new Check(
            id,
            value,
            limit,
            unit,
            ratio,
            met ? Verdict.WORKABLE : Verdict.NOT_WORKABLE,
            at,
            said(why)),
        met ? Double.POSITIVE_INFINITY : ratio);
  }

  /** A thing that is allowed but never better than tight. */
  void tightAtBest(
      String id, double value, double limit, String unit, Position at, Supplier<String> why) {
    put(new Check(id, value, limit, unit, 1, Verdict.TIGHT, at, said(why)), 1 / WORKABLE);
  }

  /** A thing that nobody can judge yet. */
  void unknown(String id, Position at, Supplier<String> why) {
    put(
        new Check(id, Double.NaN, Double.NaN, "", Double.NaN, Verdict.CANNOT_JUDGE, at, said(why)),
        Double.NEGATIVE_INFINITY);
  }

  private void add(
      String id,
      double value,
      double limit,
      String unit,
      double ratio,
      double workable,
      Position at,
      Supplier<String> why) {
    if (Double.isNaN(ratio)) {
      // nothing there, nothing asked and yet a thing in the way: not met
      add(id, value, limit, unit, 0, workable, at, why);
      return;
    }
    Verdict v =
        ratio >= workable ? Verdict.WORKABLE : ratio >= 1 ? Verdict.TIGHT : Verdict.NOT_WORKABLE;
    put(new Check(id, value, limit, unit, ratio, v, at, said(why)), ratio / workable);
  }

  /** The same in short. */
  Slice slice() {
    return Slice.of(checks, standings);
  }

  private void put(Check check, double standing) {
    TakenException taken = excepted(check);
    if (taken == null) {
      checks.add(check);
      standings.add(standing);
      return;
    }
    checks.add(
        new Check(
            check.id(),
            check.value(),
            check.limit(),
            check.unit(),
            check.ratio(),
            Verdict.TIGHT,
            check.place(),
            full ? check.why() + " " + Exceptions.said(taken) : ""));
    standings.add(check.verdict() == Verdict.TIGHT ? standing : 1 / WORKABLE);
  }

  private TakenException excepted(Check check) {
    return check.verdict() == Verdict.TIGHT || check.verdict() == Verdict.NOT_WORKABLE
        ? exceptions.to(check).orElse(null)
        : null;
  }

  List<Check> checks() {
    return checks;
  }

  Verdict verdict() {
    return checks.stream().map(Check::verdict).reduce(Verdict.WORKABLE, Verdict::worse);
  }

  /** Index of the weakest link: among the checks of the worst verdict, the lowest standing. */
  private int weakestIndex() {
    Verdict worst = verdict();
    int weakest = -1;
    for (int i = 0; i < checks.size(); i++) {
      if (checks.get(i).verdict() == worst
          && (weakest < 0 || standings.get(i) < standings.get(weakest))) {
        weakest = i;
      }
    }
    return weakest;
  }

  Check weakest() {
    return checks.get(weakestIndex());
  }

  /** How many checks are not workable. */
  int failing() {
    return (int) checks.stream().filter(c -> c.verdict() == Verdict.NOT_WORKABLE).count();
  }

  /** The standings of all checks that have a limit, lowest first. */
  List<Double> standings() {
    return standings.stream().filter(Double::isFinite).sorted().toList();
  }

  double standing() {
    return standings.get(weakestIndex());
  }
}
