package org.fallwright.ui.cli;

import java.io.PrintWriter;
import java.util.concurrent.Callable;
import org.fallwright.ui.home.Home;
import picocli.CommandLine.Model.CommandSpec;
import picocli.CommandLine.Option;
import picocli.CommandLine.Spec;

/** What every command has: its home, help, and where to write. */
abstract class Subcommand implements Callable<Integer> {
  final Home home;

  @Spec private CommandSpec spec;

  @Option(
      names = {"-h", "--help"},
      usageHelp = true,
      description = "Show this help.")
  private boolean help;

  Subcommand(Home home) {
    this.home = home;
  }

  final PrintWriter out() {
    return spec.commandLine().getOut();
  }

  final PrintWriter err() {
    return spec.commandLine().getErr();
  }
}
