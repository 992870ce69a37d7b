package org.fallwright.ui.cli;

import java.io.PrintWriter;
import org.fallwright.core.answers.Ladder;
import org.fallwright.core.plan.Plan;
import org.fallwright.core.units.DisplayUnits;
import org.fallwright.ui.home.Home;
import picocli.CommandLine.Command;
import picocli.CommandLine.Option;
import picocli.CommandLine.Parameters;

@Command(
    name = "why",
    description = "Say why, or why not: seven rungs for an anchor, a spot, a lay or a setup.")
final class WhyCommand extends AnswerCommand {
  @Parameters(
      index = "1",
      arity = "0..1",
      paramLabel = "PLACE|LAY",
      description = "An anchor, a spot, or a lay in degrees.")
  private String pointed;

  @Option(names = "--setup", paramLabel = "RANK", description = "A setup of the plan by its rank.")
  private Integer rank;

  WhyCommand(Home home) {
    super(home);
  }

  @Override
  Answer answer(Asked asked) {
    if ((pointed == null) == (rank == null)) {
      throw new Refused("Name one of: an anchor, a spot, a lay, or --setup RANK.");
    }
    Plan plan = asked.plan();
    Ladder ladder =
        rank == null
            ? Ladder.of(asked.site(), asked.sources(), plan, pointed)
            : Ladder.ofSetup(asked.site(), ranked(plan, rank), "setup " + rank);
    return new Answer("ladder", ladder, out -> tell(ladder, out), Exit.of(ladder.verdict()));
  }

  private static void tell(Ladder ladder, PrintWriter out) {
    out.println(ladder.sentence());
    out.println();
    for (Ladder.Step s : ladder.steps()) {
      String mark = s.firstMiss() ? ">> " : "   ";
      String ratio = Double.isFinite(s.ratio()) ? " (" + DisplayUnits.ratio(s.ratio()) + ")" : "";
      out.println(
          mark
              + s.rung().word()
              + ": "
              + (s.kept() ? "kept" : "MISSED")
              + ", "
              + s.verdict().word()
              + ratio);
      out.println("     " + s.sentence());
    }
  }
}
