package org.fallwright.ui.cli;

import java.io.PrintWriter;
import java.util.stream.Collectors;
import org.fallwright.core.answers.TradeOff;
import org.fallwright.core.plan.Plan;
import org.fallwright.core.units.DisplayUnits;
import org.fallwright.ui.home.Home;
import picocli.CommandLine.Command;

@Command(
    name = "tradeoff",
    description =
        "Show the setups between which there is a choice of clearance against pull, and near twins.")
final class TradeOffCommand extends AnswerCommand {
  TradeOffCommand(Home home) {
    super(home);
  }

  @Override
  Answer answer(Asked asked) {
    Plan plan = asked.plan();
    TradeOff t = TradeOff.of(plan);
    return new Answer(
        "tradeoff",
        t,
        out -> tell(t, asked.site().display().units(), out),
        Exit.of(Exit.standing(plan)));
  }

  private static void tell(TradeOff t, DisplayUnits in, PrintWriter out) {
    out.println("No other setup is better in one of these without being worse in the other:");
    for (TradeOff.Choice c : t.front()) {
      out.println(
          "  setup "
              + c.rank()
              + ", "
              + c.verdict().word()
              + ": pull margin "
              + (Double.isInfinite(c.pullMargin())
                  ? "not needed"
                  : DisplayUnits.ratio(c.pullMargin()))
              + ", clearance "
              + (Double.isInfinite(c.clearanceM())
                  ? "nothing to miss"
                  : in.length(c.clearanceM())));
    }
    out.println(
        "Groups of near twins, lays within "
            + Math.round(TradeOff.TWIN_LAY_DEG)
            + "° and line heights within "
            + in.length(TradeOff.TWIN_HEIGHT_M)
            + ":");
    for (TradeOff.Group g : t.groups()) {
      out.println(
          "  "
              + g.words()
              + ": setup"
              + (g.ranks().size() == 1 ? " " : "s ")
              + g.ranks().stream().map(String::valueOf).collect(Collectors.joining(", ")));
    }
  }
}
