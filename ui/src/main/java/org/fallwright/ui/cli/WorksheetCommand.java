package org.fallwright.ui.cli;

import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Path;
import java.util.Locale;
import java.util.stream.Collectors;
import org.fallwright.core.plan.Judged;
import org.fallwright.core.worksheet.Compared;
import org.fallwright.core.worksheet.Line;
import org.fallwright.core.worksheet.MarkdownSheet;
import org.fallwright.core.worksheet.Worksheet;
import org.fallwright.core.worksheet.Worksheets;
import org.fallwright.plugins.host.PluginFolder;
import org.fallwright.ui.home.Home;
import org.fallwright.ui.sheet.Cautions;
import org.fallwright.ui.sheet.Paper;
import org.fallwright.ui.sheet.WorksheetPages;
import picocli.CommandLine.Command;
import picocli.CommandLine.Option;
import picocli.CommandLine.Parameters;

@Command(
    name = "worksheet",
    description =
        "Show how every figure of one setup is worked, line by line, to be followed with a"
            + " calculator.")
final class WorksheetCommand extends Subcommand {
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
      description =
          "What to write; its name ends in .md or .pdf. Without it Markdown goes to the standard"
              + " output.")
  private Path out;

  @Option(
      names = "--sum",
      paramLabel = "NAME",
      description =
          "Only the figure of that sign or name, such as T_plan or \"pull to plan for\", and the"
              + " lines it rests on.")
  private String sum;

  @Option(
      names = "--paper",
      description = "letter or a4; without it letter for a site in US units, else a4.")
  private Paper paper;

  WorksheetCommand(Home home) {
    super(home);
  }

  @Override
  public Integer call() {
    boolean pdf = out != null && SheetCommand.isPdf(out);
    if (out != null && !pdf && !out.toString().toLowerCase(Locale.ROOT).endsWith(".md")) {
      throw new Refused("--out is " + out + "; its name must end in .md or .pdf.");
    }
    Planned planned = Planned.of(home, file);
    int most = planned.plan().ranked().size();
    if (rank < 1 || rank > most) {
      throw new Refused(
          most == 0
              ? "The plan has no setup, so there is no worksheet."
              : "--setup is " + rank + "; this plan has setups 1 to " + most + ".");
    }
    Judged judged = planned.plan().ranked().get(rank - 1);
    Worksheet sheet = asked(whole(planned, judged));
    if (out == null) {
      out().print(MarkdownSheet.write(sheet));
    } else {
      WholeFile.write(
          out,
          pdf
              ? pages(sheet, SheetCommand.paperFor(paper, planned.site()))
              : MarkdownSheet.write(sheet).getBytes(StandardCharsets.UTF_8));
      out().println(out + ": setup " + rank + " of " + most + ". " + judged.sentence());
    }
    return Exit.of(judged.verdict());
  }

  private Worksheet whole(Planned planned, Judged judged) {
    try (PluginFolder sources = PluginFolder.open(home.plugins(), home.version())) {
      return Worksheets.of(planned.site(), judged.setup(), sources);
    }
  }

  private Worksheet asked(Worksheet whole) {
    if (sum == null) {
      return whole.withCautions(Cautions.ALWAYS);
    }
    Line line =
        whole
            .line(sum)
            .orElseThrow(
                () ->
                    new Refused(
                        "--sum is \""
                            + sum
                            + "\"; this worksheet has no such sign or name. Its main figures are: "
                            + whole.compared().stream()
                                .map(Compared::symbol)
                                .filter(s -> !s.matches(".*\\d"))
                                .collect(Collectors.joining(" "))
                            + "."));
    return whole.sum(line).withCautions(Cautions.ALWAYS.subList(0, 2));
  }

  private byte[] pages(Worksheet sheet, Paper size) {
    try {
      return new WorksheetPages(size, sheet, home.version()).pdf();
    } catch (IOException e) {
      throw new Refused("The worksheet cannot be drawn: " + e.getMessage() + ".");
    }
  }
}
