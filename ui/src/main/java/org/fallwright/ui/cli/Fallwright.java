package org.fallwright.ui.cli;

import java.nio.file.Path;
import picocli.CommandLine;
import picocli.CommandLine.Command;

/** Start of the program. */
@Command(name = "fallwright")
public final class Fallwright {
  private Fallwright() {}

  public static void main(String[] args) {
    Path plugins = Path.of("plugins");
    System.exit(
        new CommandLine(new Fallwright())
            .addSubcommand(new AdviseCommand(plugins, "0.1.0"))
            .execute(args));
  }
}
