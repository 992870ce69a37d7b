package org.fallwright.ui.cli;

import java.nio.file.Path;
import java.util.List;
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

  @Option(
      names = "--without",
      paramLabel = "ITEM",
      split = ",",
      description = "Try it with these things of the gear left behind; the file stays as it is.")
  private List<String> without = List.of();

  PlanCommand(Home home) {
    super(home);
  }

  @Override
  public Integer call() {
    if (top < 1) {
      throw new Refused("--top is " + top + "; it must be at least 1.");
    }
    Planned planned = Planned.of(home, file, Kits.without(Planned.read(file), file, without));
    if (json != null) {
      WholeFile.write(json, planned.json());
    }
    new PlanText(planned.site(), planned.plan(), out()).all(all ? Integer.MAX_VALUE : top, all);
    return Exit.of(Exit.standing(planned.plan()));
  }
}
