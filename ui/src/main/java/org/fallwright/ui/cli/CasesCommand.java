package org.fallwright.ui.cli;

import java.io.PrintWriter;
import java.util.List;
import org.fallwright.core.answers.DayVerdicts;
import org.fallwright.core.plan.Judged;
import org.fallwright.core.plan.Setup;
import org.fallwright.ui.home.Home;
import picocli.CommandLine.Command;
import picocli.CommandLine.Option;

@Command(
    name = "cases",
    description =
        "Judge the leading setups in every named case of the site: wet or dry, bare or in leaf.")
final class CasesCommand extends AnswerCommand {
  @Option(
      names = "--top",
      paramLabel = "N",
      defaultValue = "5",
      description = "How many setups (${DEFAULT-VALUE}).")
  private int top;

  CasesCommand(Home home) {
    super(home);
  }

  @Override
  Answer answer(Asked asked) {
    List<Setup> setups =
        asked.plan().ranked().stream().limit(Math.max(1, top)).map(Judged::setup).toList();
    List<DayVerdicts> all = DayVerdicts.of(asked.site(), asked.sources(), setups);
    boolean works =
        all.stream()
            .flatMap(v -> v.days().stream())
            .anyMatch(d -> Exit.of(d.verdict()) == Exit.DONE);
    return new Answer(
        "cases", all, out -> tell(all, out), works ? Exit.DONE : Exit.NOTHING_WORKABLE);
  }

  private static void tell(List<DayVerdicts> all, PrintWriter out) {
    int rank = 0;
    for (DayVerdicts v : all) {
      out.println();
      out.println(++rank + "  " + words(v.setup()));
      out.println("   " + v.sentence());
      for (DayVerdicts.Day d : v.days()) {
        out.println(
            "   - "
                + d.id()
                + (d.finishBy() == null ? "" : " (down by " + d.finishBy() + ")")
                + ": "
                + d.why());
      }
    }
  }
}
