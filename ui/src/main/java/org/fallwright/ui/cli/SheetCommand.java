package org.fallwright.ui.cli;

import java.nio.file.Path;
import java.util.Locale;
import org.fallwright.core.plan.Judged;
import org.fallwright.core.site.Site;
import org.fallwright.ui.home.Home;
import org.fallwright.ui.sheet.Paper;
import picocli.CommandLine.Command;
import picocli.CommandLine.Option;
import picocli.CommandLine.Parameters;

@Command(name = "sheet", description = "Draw the sheet of one setup, one page true to scale.")
final class SheetCommand extends Subcommand {
  @Parameters(paramLabel = "SITE", description = "The site file.")
  private Path file;

  @Option(
      names = "--setup",
      paramLabel = "RANK",
      required = true,
      description = "Rank of the setup; 1 is the best.")
  private int rank;

  @Option(
      names = "--out",
      paramLabel = "FILE",
      required = true,
      description = "What to write; its name ends in .pdf or .png.")
  private Path out;

  @Option(
      names = "--paper",
      description = "letter or a4; without it letter for a site in US units, else a4.")
  private Paper paper;

  SheetCommand(Home home) {
    super(home);
  }

  @Override
  public Integer call() {
    if (!isPdf(out) && !named(out, ".png")) {
      throw new Refused("--out is " + out + "; its name must end in .pdf or .png.");
    }
    Planned planned = Planned.of(home, file);
    int most = planned.plan().ranked().size();
    if (rank < 1 || rank > most) {
      throw new Refused(
          most == 0
              ? "The plan has no setup, so there is no sheet."
              : "--setup is " + rank + "; this plan has setups 1 to " + most + ".");
    }
    WholeFile.write(out, planned.sheet(rank, paperFor(paper, planned.site()), out));
    Judged j = planned.plan().ranked().get(rank - 1);
    out().println(out + ": setup " + rank + " of " + most + ". " + j.sentence());
    return Exit.of(j.verdict());
  }

  static Paper paperFor(Paper stated, Site site) {
    if (stated != null) {
      return stated;
    }
    return site.display() == Site.Display.US ? Paper.LETTER : Paper.A4;
  }

  static boolean isPdf(Path out) {
    return named(out, ".pdf");
  }

  private static boolean named(Path out, String end) {
    return out.toString().toLowerCase(Locale.ROOT).endsWith(end);
  }
}
