package org.fallwright.ui.cli;

import java.util.Locale;
import org.fallwright.plugins.host.LoadedPlugin;
import org.fallwright.plugins.host.NotLoaded;
import org.fallwright.plugins.host.PluginFolder;
import org.fallwright.ui.home.Home;
import picocli.CommandLine.Command;

@Command(
    name = "sources",
    description =
        "List the plugins: those in use with their pull sources, the others with the reason.")
final class SourcesCommand extends Subcommand {
  SourcesCommand(Home home) {
    super(home);
  }

  @Override
  public Integer call() {
    try (PluginFolder folder = PluginFolder.open(home.plugins(), home.version())) {
      out().println("Plugins in use: " + folder.loaded().size());
      for (LoadedPlugin p : folder.loaded()) {
        out()
            .println(
                String.format(
                    Locale.ROOT,
                    "  %s %s: %s",
                    p.id(),
                    p.version(),
                    String.join(", ", p.sourceIds())));
      }
      if (!folder.notLoaded().isEmpty()) {
        out().println("Not in use: " + folder.notLoaded().size());
        for (NotLoaded n : folder.notLoaded()) {
          out().println("  " + n.name() + ": " + n.reason());
        }
      }
    }
    return Exit.DONE;
  }
}
