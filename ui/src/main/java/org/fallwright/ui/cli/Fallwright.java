package org.fallwright.ui.cli;

import java.io.FileDescriptor;
import java.io.FileOutputStream;
import java.io.OutputStreamWriter;
import java.io.PrintWriter;
import java.io.UncheckedIOException;
import java.nio.charset.Charset;
import java.nio.charset.StandardCharsets;
import org.fallwright.plugins.host.PluginFolder;
import org.fallwright.ui.app.Start;
import org.fallwright.ui.home.Home;
import org.slf4j.bridge.SLF4JBridgeHandler;
import picocli.CommandLine;
import picocli.CommandLine.Command;
import picocli.CommandLine.Option;

/** Start of the program: reads the command line and runs what it asks for. */
@Command(
    name = "fallwright",
    description = {
      "Plans how to pull over a tree that leans the wrong way.",
      "A planning aid: the person on the site decides, and may always say no."
    },
    footer = {
      "",
      "Exit status: 0 something is workable or tight, or what was asked is done;",
      "3 nothing is workable or it cannot be judged yet; 2 bad input; 1 a fault of the program.",
      "Results go to the standard output, messages to the standard error."
    })
public final class Fallwright implements Runnable {
  @Option(
      names = {"-h", "--help"},
      usageHelp = true,
      description = "Show this help.")
  private boolean help;

  @Option(
      names = {"-V", "--version"},
      versionHelp = true,
      description = "Show the version.")
  private boolean version;

  private final Runnable without;

  private Fallwright(Runnable without) {
    this.without = without;
  }

  public static void main(String[] args) {
    SLF4JBridgeHandler.removeHandlersForRootLogger();
    SLF4JBridgeHandler.install();
    Home home = Home.found();
    boolean[] open = {false};
    OpenCommand.Desktop desktop =
        site -> {
          Start.open(
              PluginFolder.open(home.plugins(), home.version()),
              home.demoSite(),
              home.baseMaps(),
              site);
          open[0] = true;
        };
    int status = run(home, desktop, args, writer(FileDescriptor.out), writer(FileDescriptor.err));
    if (!open[0]) {
      System.exit(status);
    }
  }

  /**
   * Runs one command.
   *
   * @param desktop opens the window where one is asked for
   * @return the exit status
   */
  static int run(
      Home home, OpenCommand.Desktop desktop, String[] args, PrintWriter out, PrintWriter err) {
    Runnable without =
        () -> {
          if (OpenCommand.hasDisplay()) {
            desktop.open(null);
          } else {
            line(home, desktop, () -> {}).usage(out);
          }
        };
    CommandLine line =
        line(home, desktop, without)
            .setOut(out)
            .setErr(err)
            .setCaseInsensitiveEnumValuesAllowed(true)
            .setParameterExceptionHandler(
                (e, given) -> {
                  err.println(e.getMessage());
                  err.println(
                      "See: " + e.getCommandLine().getCommandSpec().qualifiedName() + " --help");
                  return Exit.BAD_INPUT;
                })
            .setExecutionExceptionHandler((e, command, result) -> fault(e, err));
    int status;
    try {
      status = line.execute(args);
    } catch (LinkageError | OutOfMemoryError | StackOverflowError e) {
      status = fault(e, err);
    }
    out.flush();
    err.flush();
    return status;
  }

  private static CommandLine line(Home home, OpenCommand.Desktop desktop, Runnable without) {
    CommandLine line =
        new CommandLine(new Fallwright(without))
            .addSubcommand(new PlanCommand(home))
            .addSubcommand(new SheetCommand(home))
            .addSubcommand(new WorksheetCommand(home))
            .addSubcommand(new StandCommand(home))
            .addSubcommand(new LoadOutCommand(home))
            .addSubcommand(new KitCommand(home))
            .addSubcommand(new CheckCommand(home))
            .addSubcommand(new SourcesCommand(home))
            .addSubcommand(new AdviseCommand(home.plugins(), home.version()))
            .addSubcommand(new WhyCommand(home))
            .addSubcommand(new DoubtCommand(home))
            .addSubcommand(new ChangeCommand(home))
            .addSubcommand(new CompareCommand(home))
            .addSubcommand(new TradeOffCommand(home))
            .addSubcommand(new CasesCommand(home))
            .addSubcommand(new QuestionsCommand(home))
            .addSubcommand(new TodayCommand(home))
            .addSubcommand(new SpeciesCommand())
            .addSubcommand(new FiguresCommand())
            .addSubcommand(new RulesCommand())
            .addSubcommand(new MeasureCommand())
            .addSubcommand(BasemapCommand.line(home))
            .addSubcommand(new OpenCommand(home, desktop))
            .addSubcommand(new DemoCommand(home, desktop));
    line.getCommandSpec().version("Fallwright " + home.version());
    return line;
  }

  @Override
  public void run() {
    without.run();
  }

  private static int fault(Throwable e, PrintWriter err) {
    if (e instanceof Refused) {
      err.println(e.getMessage());
      return Exit.BAD_INPUT;
    }
    if (e instanceof UncheckedIOException) {
      err.println(e.getCause().getMessage() + ".");
      return Exit.BAD_INPUT;
    }
    err.println(
        "The program failed, a fault of its own: "
            + e.getClass().getSimpleName()
            + (e.getMessage() == null ? "" : ", " + e.getMessage().lines().findFirst().orElse(""))
            + ".");
    return Exit.FAULT;
  }

  /** A writer in the terminal's signs, or UTF-8 where those are only ASCII. */
  private static PrintWriter writer(FileDescriptor to) {
    Charset usual = Charset.defaultCharset();
    Charset signs = usual.equals(StandardCharsets.US_ASCII) ? StandardCharsets.UTF_8 : usual;
    return new PrintWriter(new OutputStreamWriter(new FileOutputStream(to), signs), true);
  }
}
