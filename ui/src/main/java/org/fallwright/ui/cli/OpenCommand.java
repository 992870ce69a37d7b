package org.fallwright.ui.cli;

import java.awt.GraphicsEnvironment;
import java.nio.file.Path;
import org.fallwright.ui.home.Home;
import picocli.CommandLine.Command;
import picocli.CommandLine.Parameters;

@Command(name = "open", description = "Open the desktop.")
final class OpenCommand extends Subcommand {
  /** Opens the desktop's window and comes back at once; the program then lives on with it. */
  interface Desktop {
    /**
     * @param site the site to open; null: none
     */
    void open(Path site);
  }

  private final Desktop desktop;

  @Parameters(paramLabel = "SITE", arity = "0..1", description = "The site file to open.")
  private Path file;

  OpenCommand(Home home, Desktop desktop) {
    super(home);
    this.desktop = desktop;
  }

  @Override
  public Integer call() {
    if (!hasDisplay()) {
      throw new Refused("There is no display, so the desktop cannot be opened.");
    }
    if (file != null) {
      Planned.read(file);
    }
    desktop.open(file);
    return Exit.DONE;
  }

  static boolean hasDisplay() {
    return !GraphicsEnvironment.isHeadless();
  }
}
