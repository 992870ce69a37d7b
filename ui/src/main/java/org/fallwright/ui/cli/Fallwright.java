package org.fallwright.ui.cli;

import java.io.FileDescriptor;
import java.io.FileOutputStream;
import java.io.OutputStreamWriter;
import java.io.PrintWriter;
import java.io.UncheckedIOException;
import java.nio.charset.Charset;
import java.nio.charset.StandardCharsets;
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
    int status = run(Home.found(), args, writer(FileDescriptor.out), writer(FileDescriptor.err));
    System.exit(status);
  }

  /**
   * Runs one command.
   *
   * @return the exit status
   */
  static int run(Home home, String[] args, PrintWriter out, PrintWriter err) {
    OpenCommand.Desktop desktop = site -> err.println("This build has no desktop.");
    CommandLine[] line = new CommandLine[1];

    line[0] =
        new CommandLine(
                new Fallwright(
                    () -> {
                      if (OpenCommand.hasDisplay()) {
                        desktop.open(null);
                      } else {
                        line[0].usage(out);
                      }
                    }))
            .addSubcommand(new PlanCommand(home))
            .addSubcommand(new SheetCommand(home))
            .addSubcommand(new CheckCommand(home))
            .addSubcommand(new SourcesCommand(home))
            .addSubcommand(new OpenCommand(home, desktop))
            .addSubcommand(new DemoCommand(home, desktop));
    line[0].getCommandSpec().version("Fallwright " + home.version());
    line[0]
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
      status = line[0].execute(args);
    } catch (LinkageError | OutOfMemoryError | StackOverflowError e) {
      status = fault(e, err);
    }
    out.flush();
    err.flush();
    return status;
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
