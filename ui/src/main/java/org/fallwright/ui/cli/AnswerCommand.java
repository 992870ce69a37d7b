package org.fallwright.ui.cli;

import java.io.PrintWriter;
import java.nio.charset.StandardCharsets;
import java.nio.file.Path;
import java.util.Locale;
import org.fallwright.core.advice.AdviceJson;
import org.fallwright.core.doubt.Doubted;
import org.fallwright.core.plan.Judged;
import org.fallwright.core.plan.Plan;
import org.fallwright.core.plan.Setup;
import org.fallwright.core.pull.PullSources;
import org.fallwright.core.site.Site;
import org.fallwright.plugins.host.PluginFolder;
import org.fallwright.ui.home.Home;
import picocli.CommandLine.Option;
import picocli.CommandLine.Parameters;

/** A command that answers a question about a site, as text or as JSON. */
abstract class AnswerCommand extends Subcommand {
  @Parameters(index = "0", paramLabel = "SITE", description = "The site file.")
  private Path file;

  @Option(names = "--json", description = "Write the answer as JSON, in SI units.")
  private boolean json;

  AnswerCommand(Home home) {
    super(home);
  }

  /** What the answer is worked out from. */
  record Asked(Path file, Site site, PullSources sources) {
    Plan plan() {
      return Doubted.plan(site, sources);
    }
  }

  /** What is answered: the record for JSON, how it is told, and the exit status. */
  record Answer(String name, Object value, Told told, int status) {}

  /** Tells an answer as text. */
  interface Told {
    void to(PrintWriter out);
  }

  abstract Answer answer(Asked asked);

  @Override
  public Integer call() {
    Site site = Planned.read(file);
    try (PluginFolder sources = PluginFolder.open(home.plugins(), home.version())) {
      Answer a = answer(new Asked(file, site, sources));
      if (json) {
        String format = "fallwright-" + a.name();
        out()
            .print(
                new String(
                    AdviceJson.write(format, site, home.version(), a.name(), a.value()),
                    StandardCharsets.UTF_8));
      } else {
        out().println(site.name());
        a.told().to(out());
      }
      out().flush();
      return a.status();
    } catch (IllegalArgumentException e) {
      throw new Refused(file.getFileName() + ": " + e.getMessage() + ".");
    }
  }

  /** The setup of a rank. */
  static Judged ranked(Plan plan, int rank) {
    int most = plan.ranked().size();
    if (rank < 1 || rank > most) {
      throw new Refused(
          most == 0
              ? "The plan has no setup; nothing on the site can pull."
              : "The rank is " + rank + "; this plan has setups 1 to " + most + ".");
    }
    return plan.ranked().get(rank - 1);
  }

  /** A setup in a few words. */
  static String words(Setup s) {
    String over = s.redirects().isEmpty() ? "" : " over " + String.join(" and ", s.redirects());
    Setup.Driver d = s.driver();
    return String.format(
        Locale.ROOT,
        "lay %05.1f°, %s (%s) at %s%s%s, line %s",
        s.layDeg(),
        s.source(),
        s.mode(),
        s.place(),
        over,
        d == null ? "" : ", hauled by " + d.source() + " (" + d.mode() + ") at " + d.place(),
        s.line());
  }
}
