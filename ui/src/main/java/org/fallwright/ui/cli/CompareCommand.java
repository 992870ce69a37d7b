package org.fallwright.ui.cli;

import java.io.PrintWriter;
import java.util.Locale;
import org.fallwright.core.answers.Comparison;
import org.fallwright.core.plan.Plan;
import org.fallwright.ui.home.Home;
import picocli.CommandLine.Command;
import picocli.CommandLine.Parameters;

@Command(
    name = "compare",
    description = "Put two setups of the plan beside each other: only what differs.")
final class CompareCommand extends AnswerCommand {
  @Parameters(index = "1", paramLabel = "RANK", description = "Rank of the first setup.")
  private int first;

  @Parameters(index = "2", paramLabel = "RANK", description = "Rank of the second.")
  private int second;

  CompareCommand(Home home) {
    super(home);
  }

  @Override
  Answer answer(Asked asked) {
    Plan plan = asked.plan();
    Comparison c = Comparison.of(asked.site(), asked.sources(), plan, first, second);
    return new Answer("comparison", c, out -> tell(c, out), Exit.DONE);
  }

  private static void tell(Comparison c, PrintWriter out) {
    row(out, "", "setup " + c.firstRank(), "setup " + c.secondRank());
    c.rows().forEach(r -> row(out, r.name(), r.first(), r.second()));
    out.println();
    out.println(c.saves());
    out.println(c.leansOn());
  }

  private static void row(PrintWriter out, String name, String first, String second) {
    out.println(String.format(Locale.ROOT, "%-24s %-40s %s", name, first, second).stripTrailing());
  }
}
