package org.fallwright.ui.cli;

import java.util.Locale;
import org.fallwright.core.pull.PullSource;
import org.fallwright.plugins.host.LoadedPlugin;
import org.fallwright.plugins.host.NotLoaded;
import org.fallwright.plugins.host.PluginFolder;
import org.fallwright.ui.home.Home;
import org.fallwright.ui.text.SourceText;
import picocli.CommandLine.Command;
import picocli.CommandLine.Option;
import picocli.CommandLine.Parameters;

@Command(
    name = "sources",
    description =
        "List the plugins: those in use with their pull sources, the others with the reason; or"
            + " explain the parameters of one pull source.")
final class SourcesCommand extends Subcommand {
  @Parameters(
      arity = "0..1",
      paramLabel = "SOURCE",
      description = "Id of one pull source, as the site file has it under plugin.")
  private String source;

  @Option(names = "--es", description = "Names and words of its parameters in Spanish.")
  private boolean spanish;

  SourcesCommand(Home home) {
    super(home);
  }

  @Override
  public Integer call() {
    try (PluginFolder folder = PluginFolder.open(home.plugins(), home.version())) {
      if (source == null) {
        list(folder);
      } else {
        explain(
            folder
                .byId(source)
                .orElseThrow(
                    () ->
                        new Refused(
                            "no pull source \""
                                + source
                                + "\" is in use; there are "
                                + String.join(
                                    ", ",
                                    folder.all().stream().map(s -> s.describe().id()).toList()))));
      }
    }
    return Exit.DONE;
  }

  private void explain(PullSource one) {
    Locale in = spanish ? Locale.forLanguageTag("es") : Locale.ENGLISH;
    SourceText.explained(one.describe(), in).forEach(out()::println);
  }

  private void list(PluginFolder folder) {
    out().println("Plugins in use: " + folder.loaded().size());
    for (LoadedPlugin p : folder.loaded()) {
      out()
          .println(
              String.format(
                  Locale.ROOT,
                  "  %s %s: %s (by %s, contract %d)",
                  p.id(),
                  p.version(),
                  String.join(", ", p.sourceIds()),
                  p.provider().isEmpty() ? "somebody who is not named" : p.provider(),
                  p.contract()));
    }
    if (!folder.notLoaded().isEmpty()) {
      out().println("Not in use: " + folder.notLoaded().size());
      for (NotLoaded n : folder.notLoaded()) {
        out().println("  " + n.name() + ": " + n.reason());
      }
    }
  }
}
