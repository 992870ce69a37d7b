package org.fallwright.ui.cli;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import org.fallwright.core.plan.Judged;
import org.fallwright.core.plan.Verdict;
import org.fallwright.core.site.Wire;
import org.fallwright.ui.home.Home;
import org.fallwright.ui.sheet.Paper;
import picocli.CommandLine.Command;
import picocli.CommandLine.Option;

@Command(
    name = "demo",
    description =
        "Plan the demo site, write its plan document and sheet, and open the desktop on it where"
            + " there is a display.")
final class DemoCommand extends Subcommand {
  private final OpenCommand.Desktop desktop;

  @Option(
      names = "--out",
      paramLabel = "FOLDER",
      defaultValue = "demo-plan",
      description = "Where to write (${DEFAULT-VALUE}).")
  private Path folder;

  DemoCommand(Home home, OpenCommand.Desktop desktop) {
    super(home);
    this.desktop = desktop;
  }

  @Override
  public Integer call() {
    Planned demo = Planned.of(home, home.demoSite());
    PlanText text = new PlanText(demo.site(), demo.plan(), out());
    text.head();
    text.setups(5, false);
    text.ruledOut();
    out().println();
    write(demo);
    boolean display = OpenCommand.hasDisplay();
    out()
        .println(
            display
                ? "The desktop opens on the demo site."
                : "There is no display, so the desktop is not opened.");
    out().println(blanked(demo));
    out().flush();
    if (display) {
      desktop.open(demo.file());
    }
    return Exit.of(Exit.standing(demo.plan()));
  }

  private void write(Planned demo) {
    try {
      Files.createDirectories(folder);
    } catch (IOException e) {
      throw new Refused("The folder " + folder + " cannot be made.");
    }
    WholeFile.write(folder.resolve("plan.json"), demo.json());
    Paper paper = SheetCommand.paperFor(null, demo.site());
    for (String name : List.of("sheet.pdf", "sheet.png")) {
      Path file = folder.resolve(name);
      WholeFile.write(file, demo.sheet(1, paper, file));
    }
    out().println("plan.json, sheet.pdf and sheet.png are in " + folder.toAbsolutePath());
  }

  /** What the plan says when nobody has stated the voltage of the wires. */
  private String blanked(Planned demo) {
    List<Wire> unstated = demo.site().wires().stream().map(Wire::unstated).toList();
    Planned copy = Planned.of(home, demo.file(), demo.site().withWires(unstated));
    Verdict verdict = Exit.standing(copy.plan());
    String why =
        copy.plan().ranked().stream().findFirst().map(Judged::sentence).orElse(verdict.word());
    return "The same site with its wires' voltage left blank: "
        + verdict.word()
        + (verdict == Verdict.CANNOT_JUDGE ? why.replaceFirst("^[^.]*\\.", ".") : ". " + why);
  }
}
