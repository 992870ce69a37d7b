package org.fallwright.ui.cli;

import java.io.PrintWriter;
import java.math.BigDecimal;
import java.math.MathContext;
import java.util.List;
import java.util.Locale;
import java.util.TreeSet;
import java.util.concurrent.Callable;
import java.util.stream.Stream;
import org.fallwright.core.reference.Allowances;
import org.fallwright.core.reference.Figure;
import org.fallwright.core.reference.Hardware;
import org.fallwright.core.reference.Kind;
import org.fallwright.core.reference.Sources;
import picocli.CommandLine.Command;
import picocli.CommandLine.Model.CommandSpec;
import picocli.CommandLine.Option;
import picocli.CommandLine.ParameterException;
import picocli.CommandLine.Parameters;
import picocli.CommandLine.Spec;

/** Lists every allowance, rule constant and figure of rope and hardware, each with its source. */
@Command(
    name = "figures",
    description = {
      "List the figures the program reckons with and those of rope, chain, slings, shackles, blocks",
      "and ground anchors, each with its unit, what stands behind it and its source."
    })
final class FiguresCommand implements Callable<Integer> {
  private static final int DIGITS = 6;

  @Spec private CommandSpec spec;

  @Parameters(
      arity = "0..*",
      paramLabel = "WORD",
      description = "Only figures whose key, note or source has every one of these words.")
  private List<String> words = List.of();

  @Option(
      names = {"-h", "--help"},
      usageHelp = true,
      description = "Show this help.")
  private boolean help;

  @Override
  public Integer call() {
    List<Figure> found =
        Stream.concat(Hardware.all().stream(), Allowances.all().stream())
            .filter(f -> words.stream().allMatch(w -> said(f).contains(w.toLowerCase(Locale.ROOT))))
            .toList();
    if (found.isEmpty()) {
      throw new ParameterException(
          spec.commandLine(), "No figure has all of: " + String.join(" ", words) + ".");
    }
    PrintWriter out = spec.commandLine().getOut();
    for (Figure f : found) {
      out.printf(
          Locale.ROOT,
          "%-34s %10s %-8s %-19s %-20s %s%n",
          f.key(),
          number(f.value()),
          f.unit(),
          behind(f.kind()),
          f.source(),
          f.note());
    }
    out.println();
    TreeSet<String> keys = new TreeSet<>(found.stream().map(Figure::source).toList());
    keys.remove("");
    keys.forEach(k -> out.println(k + ": " + Sources.of(k).citation()));
    return Exit.DONE;
  }

  private static String said(Figure f) {
    return (f.key() + " " + f.note() + " " + f.source()).toLowerCase(Locale.ROOT);
  }

  private static String number(double value) {
    return new BigDecimal(value)
        .round(new MathContext(DIGITS))
        .stripTrailingZeros()
        .toPlainString();
  }

  private static String behind(Kind kind) {
    return switch (kind) {
      case PUBLISHED -> "published";
      case COMMON_PRACTICE -> "common practice";
      case PLANNING_ALLOWANCE -> "planning allowance";
      case FROM_MEMORY -> "from memory";
    };
  }
}
