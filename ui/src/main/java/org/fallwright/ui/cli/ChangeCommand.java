package org.fallwright.ui.cli;

import java.io.PrintWriter;
import org.fallwright.core.change.Remedies;
import org.fallwright.core.change.SiteRemedies;
import org.fallwright.core.plan.Judged;
import org.fallwright.core.plan.Plan;
import org.fallwright.ui.home.Home;
import picocli.CommandLine.Command;
import picocli.CommandLine.Option;

@Command(
    name = "change",
    description =
        "Say which smallest changes would make a setup, or anything on the site, work; each is judged.")
final class ChangeCommand extends AnswerCommand {
  @Option(
      names = "--setup",
      paramLabel = "RANK",
      description = "A setup of the plan by its rank; without it the site as a whole.")
  private Integer rank;

  ChangeCommand(Home home) {
    super(home);
  }

  @Override
  Answer answer(Asked asked) {
    Plan plan = asked.plan();
    if (rank == null) {
      SiteRemedies all = SiteRemedies.of(asked.site(), asked.sources(), plan);
      return new Answer("changes", all, out -> tell(all, out), Exit.of(Exit.standing(plan)));
    }
    Judged judged = ranked(plan, rank);
    Remedies one = Remedies.of(asked.site(), asked.sources(), judged.setup());
    return new Answer("changes", one, out -> tell(one, judged, out), Exit.of(judged.verdict()));
  }

  private static void tell(SiteRemedies all, PrintWriter out) {
    out.println(all.sentence());
    all.binding()
        .forEach(b -> out.println("  ruled out first by " + b.check() + ": " + b.setups()));
    all.remedies()
        .forEach(
            f -> {
              out.println("  - " + f.remedy().sentence());
              out.println("      " + words(f.setup()));
            });
  }

  private static void tell(Remedies one, Judged judged, PrintWriter out) {
    out.println(words(one.setup()) + ": " + judged.sentence());
    if (!one.stops().isEmpty()) {
      out.println("In the way: " + String.join(", ", one.stops()) + ".");
    }
    out.println(one.sentence());
    one.remedies().forEach(r -> out.println("  - " + r.sentence()));
  }
}
