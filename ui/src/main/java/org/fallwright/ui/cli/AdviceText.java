package org.fallwright.ui.cli;

import java.io.PrintWriter;
import java.util.Locale;
import org.fallwright.core.advice.Advice;
import org.fallwright.core.advice.LimitsCard;
import org.fallwright.core.advice.ProofPull;
import org.fallwright.core.advice.Readings;
import org.fallwright.core.plan.Setup;
import org.fallwright.core.plan.Verdict;
import org.fallwright.core.site.Site;
import org.fallwright.core.units.DisplayUnits;

/** The advice around one setup as text for the terminal, in the site's own units. */
final class AdviceText {
  private final Site site;
  private final DisplayUnits in;
  private final Advice advice;
  private final PrintWriter out;

  AdviceText(Site site, Advice advice, PrintWriter out) {
    this.site = site;
    this.advice = advice;
    this.out = out;
    in = site.display().units();
  }

  void all() {
    Setup s = advice.judged().setup();
    out.println(site.name() + " · setup " + advice.rank());
    out.println(
        String.format(
            Locale.ROOT,
            "lay %.1f°, line at %s, hinge %s, %s%s at %s",
            s.layDeg(),
            in.length(s.attachHeightM()),
            in.smallLength(s.hingeThicknessM()),
            s.source(),
            s.redirects().isEmpty() ? "" : " over " + String.join(", ", s.redirects()),
            s.place()));
    out.println(advice.judged().sentence());
    if (advice.notByPulling() != null) {
      part("Method", advice.notByPulling().sentence());
    }
    part("Hinge", advice.hinge().sentence());
    part("Line height", advice.lineHeight().sentence());
    part("Wind", advice.wind().sentence());
    part("What gives first", advice.firstToGive().sentence());
    part("Limits card", advice.card().sentence());
    card();
    windCard();
    if (advice.judged().verdict().compareTo(Verdict.TIGHT) > 0) {
      part(
          "Work",
          "This setup is "
              + advice.judged().verdict().word()
              + ", so no proof pull, readings or signs to work by are given.");
      return;
    }
    part("When it goes", advice.observables().sentence());
    if (advice.proofPull() != null) {
      proofPull(advice.proofPull());
    }
    part("Load cell", advice.readings().sentence());
    readings();
  }

  private void part(String title, String sentence) {
    out.println();
    out.println(title + ": " + sentence);
  }

  private void proofPull(ProofPull p) {
    part("Proof pull", p.sentence());
    p.watch().forEach(w -> out.println("  watch " + w));
    out.println(
        "  roots of "
            + site.tree().id()
            + ": the proof pull puts "
            + in.moment(p.momentNm())
            + " on them; by the least published constant they bear "
            + in.moment(p.rootPlateNm())
            + ". No check, so watch them.");
  }

  private void readings() {
    row("", "hold", "plan for", "ceiling", "never pass");
    for (Readings.Reading r : advice.readings().places()) {
      Readings.Shown ceiling = r.ceiling();
      row(
          r.at() + ", coming in",
          in.forceAtLeast(r.hold().haulingN()),
          in.forceAtLeast(r.plan().haulingN()),
          in.forceAtMost(ceiling.haulingN()),
          in.forceAtMost(ceiling.notPassedN()));
      row(
          r.at() + ", standing",
          in.forceAtLeast(r.hold().holdingN()),
          in.forceAtLeast(r.plan().holdingN()),
          in.forceAtMost(ceiling.holdingN()),
          in.forceAtMost(ceiling.notPassedN()));
    }
  }

  private void row(String at, String hold, String plan, String ceiling, String never) {
    out.println(
        String.format(Locale.ROOT, "  %-44s %11s %11s %11s %11s", at, hold, plan, ceiling, never));
  }

  private void windCard() {
    out.println("  and with more lean and wind:");
    for (LimitsCard.WindRow r : advice.card().wind()) {
      StringBuilder line =
          new StringBuilder(
              String.format(Locale.ROOT, "  lean %-7s", in.angle(Math.toRadians(r.leanDeg()))));
      for (LimitsCard.WindCell c : r.cells()) {
        String cell =
            "gust "
                + in.speed(c.gustMps())
                + " "
                + mark(c.verdict())
                + (c.verdict() == Verdict.WORKABLE ? "" : " " + c.weakest());
        line.append(String.format(Locale.ROOT, " %-23s", cell));
      }
      out.println(line.toString().stripTrailing());
    }
  }

  private void card() {
    StringBuilder head = new StringBuilder(String.format(Locale.ROOT, "  %-12s", "line at"));
    for (LimitsCard.Tree t : LimitsCard.Tree.values()) {
      head.append(String.format(Locale.ROOT, " %-23s", t.word()));
    }
    out.println(head.toString().stripTrailing());
    for (LimitsCard.Row r : advice.card().rows()) {
      StringBuilder line =
          new StringBuilder(String.format(Locale.ROOT, "  %-12s", in.length(r.heightM())));
      for (LimitsCard.Cell c : r.cells()) {
        String cell =
            mark(c.verdict())
                + " "
                + in.forceAtLeast(c.pullPlanN())
                + (c.verdict() == Verdict.WORKABLE ? "" : " " + c.weakest());
        line.append(String.format(Locale.ROOT, " %-23s", cell));
      }
      out.println(line.toString().stripTrailing());
    }
    out.println("  . workable   + tight   x not workable   ? cannot judge yet");
  }

  private static String mark(Verdict v) {
    return switch (v) {
      case WORKABLE -> ".";
      case TIGHT -> "+";
      case NOT_WORKABLE -> "x";
      case CANNOT_JUDGE -> "?";
    };
  }
}
