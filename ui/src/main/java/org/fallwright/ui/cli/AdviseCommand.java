package org.fallwright.ui.cli;

import java.io.PrintWriter;
import java.nio.charset.StandardCharsets;
import java.nio.file.Path;
import java.util.concurrent.Callable;
import org.fallwright.core.advice.Advice;
import org.fallwright.core.advice.AdviceJson;
import org.fallwright.core.doubt.Doubted;
import org.fallwright.core.plan.Verdict;
import org.fallwright.core.site.Site;
import org.fallwright.core.store.SiteFile;
import org.fallwright.core.store.SiteFileException;
import org.fallwright.plugins.host.PluginFolder;
import picocli.CommandLine.Command;
import picocli.CommandLine.Model.CommandSpec;
import picocli.CommandLine.Option;
import picocli.CommandLine.Parameters;
import picocli.CommandLine.Spec;

@Command(
    name = "advise",
    description = {
      "Say how far one setup of a site bears being different from what was planned:",
      "hinge, line height, wind, weight and lean; what to read and see; what gives first."
    })
final class AdviseCommand implements Callable<Integer> {
  private final Path plugins;
  private final String program;

  @Spec private CommandSpec spec;

  @Option(
      names = {"-h", "--help"},
      usageHelp = true,
      description = "Show this help.")
  private boolean help;

  @Parameters(paramLabel = "SITE", description = "The site file.")
  private Path file;

  @Option(
      names = "--setup",
      paramLabel = "RANK",
      defaultValue = "1",
      description = "Rank of the setup in the plan (${DEFAULT-VALUE}).")
  private int rank;

  @Option(names = "--json", description = "Write the advice as JSON, in SI units.")
  private boolean json;

  /**
   * @param plugins folder of the plugins
   * @param program version of the program
   */
  AdviseCommand(Path plugins, String program) {
    this.plugins = plugins;
    this.program = program;
  }

  @Override
  public Integer call() {
    PrintWriter out = spec.commandLine().getOut();
    try (PluginFolder sources = PluginFolder.open(plugins, program)) {
      Site site = SiteFile.read(file);
      Advice advice = Advice.of(site, sources, Doubted.plan(site, sources), rank);
      if (json) {
        out.print(new String(AdviceJson.write(site, advice, program), StandardCharsets.UTF_8));
      } else {
        new AdviceText(site, advice, out).all();
      }
      out.flush();
      return advice.judged().verdict().compareTo(Verdict.TIGHT) <= 0 ? 0 : 3;
    } catch (SiteFileException e) {
      return refused(e.getMessage());
    } catch (IllegalArgumentException e) {
      return refused(file.getFileName() + ": " + e.getMessage() + ".");
    }
  }

  private int refused(String sentence) {
    spec.commandLine().getErr().println(sentence);
    return 2;
  }
}
