package org.fallwright.ui.cli;

import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Path;
import java.util.List;
import java.util.Locale;
import org.fallwright.core.kit.Kit;
import org.fallwright.core.kit.LoadOut;
import org.fallwright.core.kit.LoadOutText;
import org.fallwright.core.plan.Judged;
import org.fallwright.ui.home.Home;
import org.fallwright.ui.sheet.LoadOutPages;
import org.fallwright.ui.sheet.Paper;
import picocli.CommandLine.Command;
import picocli.CommandLine.Option;
import picocli.CommandLine.Parameters;

@Command(
    name = "loadout",
    description = "List what to load for a setup, by truck and shelf, with boxes to tick.")
final class LoadOutCommand extends Subcommand {
  @Parameters(paramLabel = "SITE", description = "The site file.")
  private Path file;

  @Option(
      names = "--setup",
      paramLabel = "RANK",
      description =
          "Rank of the setup; 1 is the best. Without it the list is for every setup that is"
              + " workable or tight.")
  private Integer rank;

  @Option(
      names = "--kit",
      paramLabel = "KIT",
      description = "The kit file; without it the one that the site names, if it lies beside it.")
  private Path kitFile;

  @Option(
      names = "--out",
      paramLabel = "FILE",
      description =
          "What to write; its name ends in .md, .txt or .pdf. Without it the list goes to the"
              + " standard output.")
  private Path out;

  @Option(
      names = "--paper",
      description = "letter or a4; without it letter for a site in US units, else a4.")
  private Paper paper;

  LoadOutCommand(Home home) {
    super(home);
  }

  @Override
  public Integer call() {
    boolean pdf = out != null && SheetCommand.isPdf(out);
    if (out != null && !pdf && !out.toString().toLowerCase(Locale.ROOT).matches(".*\\.(md|txt)")) {
      throw new Refused("--out is " + out + "; its name must end in .md, .txt or .pdf.");
    }
    Planned planned = Planned.of(home, file);
    List<Judged> setups = setups(planned);
    Kit kit = kitFile == null ? Kits.of(planned.site(), file).orElse(null) : Kits.read(kitFile);
    LoadOut list = LoadOut.of(planned.site(), setups, kit);
    if (out == null) {
      out().print(LoadOutText.of(list));
      return Exit.DONE;
    }
    WholeFile.write(
        out,
        pdf
            ? pages(list, SheetCommand.paperFor(paper, planned.site()))
            : LoadOutText.of(list).getBytes(StandardCharsets.UTF_8));
    int rows = list.trucks().stream().mapToInt(t -> t.needed().size()).sum();
    out()
        .println(
            out
                + ": "
                + rows
                + " things to load for "
                + (rank == null ? setups.size() + " setups" : "setup " + rank)
                + ".");
    return Exit.DONE;
  }

  private List<Judged> setups(Planned planned) {
    List<Judged> ranked = planned.plan().ranked();
    if (rank == null) {
      List<Judged> possible =
          ranked.stream().filter(j -> Exit.of(j.verdict()) == Exit.DONE).toList();
      if (possible.isEmpty()) {
        throw new Refused("No setup is workable or tight, so there is nothing to load for.");
      }
      return possible;
    }
    if (rank < 1 || rank > ranked.size()) {
      throw new Refused(
          ranked.isEmpty()
              ? "The plan has no setup, so there is no list."
              : "--setup is " + rank + "; this plan has setups 1 to " + ranked.size() + ".");
    }
    return List.of(ranked.get(rank - 1));
  }

  private byte[] pages(LoadOut list, Paper size) {
    try {
      return new LoadOutPages(size, list, home.version()).pdf();
    } catch (IOException e) {
      throw new Refused("The list cannot be drawn: " + e.getMessage() + ".");
    }
  }
}
