package org.fallwright.ui.cli;

import org.fallwright.ui.home.Home;
import picocli.CommandLine;
import picocli.CommandLine.Command;

@Command(
    name = "basemap",
    description = "Take in, list, check, lay under a site, move and remove pictures of the ground.")
final class BasemapCommand extends Subcommand {
  private BasemapCommand(Home home) {
    super(home);
  }

  /** The command with its own commands. */
  static CommandLine line(Home home) {
    return new CommandLine(new BasemapCommand(home))
        .addSubcommand(new BasemapAdd(home))
        .addSubcommand(new BasemapList(home))
        .addSubcommand(new BasemapVerify(home))
        .addSubcommand(new BasemapRemove(home))
        .addSubcommand(new BasemapLay(home))
        .addSubcommand(new BasemapShift(home));
  }

  @Override
  public Integer call() {
    throw new Refused(
        "basemap needs one of its commands: add, list, verify, remove, lay or shift.");
  }
}
