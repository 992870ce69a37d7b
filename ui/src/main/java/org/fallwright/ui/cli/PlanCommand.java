package org.fallwright.ui.cli;

import java.nio.file.Path;
import org.fallwright.ui.home.Home;
import picocli.CommandLine.Command;
import picocli.CommandLine.Option;
import picocli.CommandLine.Parameters;

@Command(
    name = "plan",
    description =
        "Plan a site: the ranked setups, what rules the others out, what was not checked.")
final class PlanCommand extends Subcommand {
  @Parameters(paramLabel = "SITE", description = "The site file.")
  private Path file;

  @Option(names = "--json", paramLabel = "FILE", description = "Also write the plan document.")
  private Path json;

  @Option(
      names = "--top",
      paramLabel = "N",
      defaultValue = "10",
      description = "How many setups to show (${DEFAULT-VALUE}).")
  private int top;

  @Option(names = "--all", description = "Show every ranked setup, also those not workable.")
  private boolean all;

  PlanCommand(Home home) {
    super(home);
  }

  @Override
  public Integer call() {
    if (top < 1) {
      throw new Refused("--top is " + top + "; it must be at least 1.");
    }
    Planned planned = Planned.of(home, file);
    if (json != null) {
      WholeFile.write(json, planned.json());
    }
    new PlanText(planned.site(), planned.plan(), out()).all(all ? Integer.MAX_VALUE : top, all);
    return Exit.of(Exit.standing(planned.plan()));
  }
}
