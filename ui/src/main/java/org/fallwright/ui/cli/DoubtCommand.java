package org.fallwright.ui.cli;

import java.io.PrintWriter;
import java.util.Locale;
import org.fallwright.core.doubt.Doubt;
import org.fallwright.core.doubt.Doubts;
import org.fallwright.core.plan.Judged;
import org.fallwright.core.units.DisplayUnits;
import org.fallwright.ui.home.Home;
import picocli.CommandLine.Command;
import picocli.CommandLine.Option;

@Command(
    name = "doubt",
    description = {
      "Say how far the figures of one setup can be trusted: how often its pull is enough,",
      "what gives first, and what to measure next."
    })
final class DoubtCommand extends AnswerCommand {
  @Option(
      names = "--setup",
      paramLabel = "RANK",
      defaultValue = "1",
      description = "Rank of the setup in the plan (${DEFAULT-VALUE}).")
  private int rank;

  DoubtCommand(Home home) {
    super(home);
  }

  @Override
  Answer answer(Asked asked) {
    Judged judged = ranked(asked.plan(), rank);
    Doubt doubt = new Doubts(asked.site(), asked.sources()).of(judged.setup());
    DisplayUnits in = asked.site().display().units();
    return new Answer("doubt", doubt, out -> tell(doubt, in, out), Exit.of(doubt.verdict()));
  }

  private static void tell(Doubt d, DisplayUnits in, PrintWriter out) {
    out.println(words(d.setup()));
    out.println();
    out.println(d.sentence());
    row(out, "margin, as the verdict has it", ratio(d.margin()));
    row(out, "margin, everything as entered", ratio(d.marginAsEntered()));
    row(out, "margin on a poor day, one in twenty", ratio(d.poorDayMargin()));
    if (!d.fails().isEmpty()) {
      out.println();
      out.println("What can give:");
      for (Doubt.Failing f : d.fails()) {
        row(out, f.check(), percent(f.chance()) + ", first " + percent(f.first()));
      }
    }
    out.println();
    out.println("What to measure next, what decides most first:");
    int n = 0;
    for (Doubt.Measure m : d.measure()) {
      out.println(String.format(Locale.ROOT, "%3d  %s", ++n, m.sentence()));
    }
    out.println();
    out.println("The margin, were one thing known to be at its low or high end:");
    for (Doubt.Bar b : d.bars()) {
      row(
          out,
          b.input().word() + " " + b.low() + " to " + b.high(),
          ratio(b.marginAtLow()) + " to " + ratio(b.marginAtHigh()));
    }
    out.println();
    out.println("One input at a time, and over " + d.trials() + " ways the site may be:");
    for (Doubt.Compared c : d.compared()) {
      row(
          out,
          c.name(),
          amount(c.oneAtATime(), c.unit(), in) + ", " + amount(c.sampled(), c.unit(), in));
    }
  }

  private static void row(PrintWriter out, String name, String value) {
    out.println(String.format(Locale.ROOT, "  %-52s %s", name, value));
  }

  private static String ratio(double margin) {
    return Double.isFinite(margin) ? DisplayUnits.ratio(margin) : "no pull needed";
  }

  private static String percent(double chance) {
    return String.format(Locale.ROOT, "%.1f %%", 100 * chance);
  }

  private static String amount(double value, String unit, DisplayUnits in) {
    return switch (unit) {
      case "N" -> in.force(value);
      case "deg" -> in.angle(Math.toRadians(value));
      default -> String.format(Locale.ROOT, "%.3f", value);
    };
  }
}
