package org.fallwright.ui.cli;

import java.io.PrintWriter;
import java.util.Comparator;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import org.fallwright.core.advice.NotByPulling;
import org.fallwright.core.plan.Figures;
import org.fallwright.core.plan.Judged;
import org.fallwright.core.plan.Plan;
import org.fallwright.core.plan.Setup;
import org.fallwright.core.plan.Verdict;
import org.fallwright.core.site.Site;
import org.fallwright.core.units.DisplayUnits;
import org.fallwright.ui.sheet.Cautions;

/** A plan as text for the terminal. */
final class PlanText {
  /** Setups shown where nothing is workable: what comes nearest. */
  private static final int NEAREST = 3;

  private final Site site;
  private final Plan plan;
  private final DisplayUnits in;
  private final PrintWriter out;

  PlanText(Site site, Plan plan, PrintWriter out) {
    this.site = site;
    this.plan = plan;
    this.out = out;
    in = site.display().units();
  }

  /** Everything: setups, what was ruled out, notes, cautions. */
  void all(int top, boolean rejectedToo) {
    head();
    setups(top, rejectedToo);
    ruledOut();
    list("Notes", plan.notes());
    list("Cautions", Cautions.ALWAYS);
    list("Not checked by any plan", Cautions.LEFT_OUT);
  }

  void head() {
    out.println(site.name() + " · rules " + site.ruleSet());
    StringBuilder counts = new StringBuilder(plan.judged() + " setups judged");
    String between = ": ";
    for (Verdict v : Verdict.values()) {
      int n = plan.byVerdict().getOrDefault(v, 0);
      if (n > 0) {
        counts.append(between).append(n).append(' ').append(v.word());
        between = ", ";
      }
    }
    out.println(counts);
  }

  void setups(int top, boolean rejectedToo) {
    Verdict standing = Exit.standing(plan);
    boolean works = Exit.of(standing) == Exit.DONE;
    if (!works) {
      out.println();
      NotByPulling.of(plan).ifPresent(n -> out.println(n.sentence()));
      out.println(
          standing == Verdict.CANNOT_JUDGE
              ? "Cannot judge yet. What stands nearest:"
              : "Nothing on this site is workable. What stands nearest:");
    }
    int shown = 0;
    int most = works || rejectedToo ? top : Math.min(top, NEAREST);
    for (int i = 0; i < plan.ranked().size() && shown < most; i++) {
      Judged j = plan.ranked().get(i);
      if (rejectedToo || !works || Exit.of(j.verdict()) == Exit.DONE) {
        out.println();
        setup(i + 1, j);
        shown++;
      }
    }
  }

  private void setup(int rank, Judged j) {
    Setup s = j.setup();
    Figures f = j.figures();
    row("%3d  %s", rank, j.sentence());
    row(
        "     lay %s, line %s at %s%s",
        degrees(s.layDeg()),
        s.line(),
        in.length(s.attachHeightM()),
        s.redirects().isEmpty() ? "" : ", block at " + String.join(", then ", s.redirects()));
    Setup.Driver d = s.driver();
    row(
        "     %s%s",
        placed(s.source(), s.mode(), s.place()),
        d == null ? "" : ", hauled by " + placed(d.source(), d.mode(), d.place()));
    row(
        "     needs %s, plan for %s, gives %s, margin %s",
        in.forceAtLeast(f.pullNeededN()),
        in.forceAtLeast(f.pullPlanN()),
        in.forceAtMost(f.sourceLowN()),
        ratio(f.pullMargin()));
    String clearance =
        Double.isFinite(f.clearanceM()) && f.clearanceTarget() != null
            ? (f.clearanceM() >= 0
                    ? "clears " + f.clearanceTarget() + " by " + in.length(f.clearanceM())
                    : "hits " + f.clearanceTarget() + " by " + in.length(-f.clearanceM()))
                + "; "
            : "";
    row("     %sweakest: %s, %s", clearance, j.weakest().id(), ratio(j.weakest().ratio()));
  }

  /** What rules the other setups out. */
  void ruledOut() {
    if (plan.byBindingCheck().isEmpty()) {
      return;
    }
    out.println();
    out.println(
        "Ruled out, by the first check missed, with the setup that comes nearest to passing it:");
    plan.byBindingCheck().entrySet().stream()
        .sorted(
            Map.Entry.<String, Integer>comparingByValue(Comparator.reverseOrder())
                .thenComparing(Map.Entry.comparingByKey()))
        .forEach(
            e -> {
              Judged best = plan.bestRejected().get(e.getKey());
              row("%7d  %s", e.getValue(), e.getKey());
              if (best != null) {
                Setup s = best.setup();
                row(
                    "         lay %s, %s: %s",
                    degrees(s.layDeg()),
                    placed(s.source(), s.mode(), s.place()),
                    best.check(e.getKey()).why());
              }
            });
  }

  private void list(String head, List<String> items) {
    if (!items.isEmpty()) {
      out.println();
      out.println(head + ":");
      items.forEach(i -> out.println("  - " + i));
    }
  }

  private void row(String format, Object... values) {
    out.println(String.format(Locale.ROOT, format, values));
  }

  private static String placed(String source, String mode, String place) {
    return source + (mode == null || mode.isBlank() ? "" : ", " + mode) + ", at " + place;
  }

  private static String degrees(double deg) {
    long tenths = Math.floorMod(Math.round(deg * 10), 3600L);
    return tenths % 10 == 0
        ? String.format(Locale.ROOT, "%03d°", tenths / 10)
        : String.format(Locale.ROOT, "%05.1f°", tenths / 10.0);
  }

  private static String ratio(double r) {
    if (Double.isNaN(r)) {
      return "not known";
    }
    return Double.isInfinite(r) ? "nothing asked" : DisplayUnits.ratio(r);
  }
}
