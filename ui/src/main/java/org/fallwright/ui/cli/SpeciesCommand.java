package org.fallwright.ui.cli;

import java.io.PrintWriter;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Locale;
import java.util.ResourceBundle;
import java.util.Set;
import java.util.concurrent.Callable;
import org.fallwright.core.reference.Figure;
import org.fallwright.core.reference.Kind;
import org.fallwright.core.reference.Moisture;
import org.fallwright.core.reference.Sources;
import org.fallwright.core.reference.Species;
import org.fallwright.core.reference.SpeciesTable;
import org.fallwright.core.units.Units;
import picocli.CommandLine.Command;
import picocli.CommandLine.Model.CommandSpec;
import picocli.CommandLine.Option;
import picocli.CommandLine.ParameterException;
import picocli.CommandLine.Parameters;
import picocli.CommandLine.Spec;

/** Lists the species library: every figure with its source, and how far it can be trusted. */
@Command(
    name = "species",
    description = "List the species library, or one species with every figure and its source.")
final class SpeciesCommand implements Callable<Integer> {
  @Spec private CommandSpec spec;

  @Parameters(
      arity = "0..1",
      paramLabel = "KEY",
      description = "Key of one species, as the site file has it.")
  private String key;

  @Option(names = "--es", description = "Names and words in Spanish.")
  private boolean spanish;

  @Option(
      names = {"-h", "--help"},
      usageHelp = true,
      description = "Show this help.")
  private boolean help;

  private ResourceBundle words;

  @Override
  public Integer call() {
    words =
        ResourceBundle.getBundle(
            "org.fallwright.ui.cli.species",
            spanish ? Locale.forLanguageTag("es") : Locale.ROOT,
            ResourceBundle.Control.getNoFallbackControl(ResourceBundle.Control.FORMAT_PROPERTIES));
    PrintWriter out = spec.commandLine().getOut();
    if (key == null) {
      list(out);
    } else {
      one(out, species());
    }
    return 0;
  }

  private Species species() {
    try {
      return SpeciesTable.of(key);
    } catch (IllegalArgumentException e) {
      throw new ParameterException(spec.commandLine(), e.getMessage() + ".", e);
    }
  }

  private void list(PrintWriter out) {
    List<Species> all = SpeciesTable.all();
    out.println(
        line(
            words.getString("head.key"),
            words.getString("head.density"),
            words.getString("head.rupture"),
            words.getString("head.name")));
    for (Species s : all) {
      out.println(
          line(
              s.key(),
              range(s.densityLow(), s.densityHigh(), "%.0f") + mark(s.greenDensity()),
              range(s.morHolds() / 1e6, s.morResists() / 1e6, "%.1f") + mark(s.morPa()),
              (spanish ? s.spanish() : s.name()) + " (" + s.latin() + ")"));
    }
    out.println();
    out.println(said("count", all.size()));
    for (String kind : List.of("read", "secondary", "memory", "allowance")) {
      out.println("  " + words.getString("mark." + kind) + "  " + words.getString(kind));
    }
    out.println(words.getString("ranges"));
  }

  private void one(PrintWriter out, Species s) {
    out.println(
        s.key()
            + ": "
            + (spanish ? s.spanish() + " | " + s.name() : s.name() + " | " + s.spanish())
            + " ("
            + s.latin()
            + ")");
    Set<String> sources = new LinkedHashSet<>();
    for (Figure f : s.figures()) {
      String label = words.getString(f.key().substring(s.key().length() + 1));
      out.println(
          "  %-38s %-28s %-20s %s"
              .formatted(label, amount(f), words.getString(kind(f)), f.source())
              .stripTrailing());
      if (!f.source().isEmpty()) {
        sources.add(f.source());
      }
    }
    Moisture wet = s.moisture();
    if (wet != null) {
      out.println(said("wet", number(wet.densityLow()), number(wet.densityHigh())));
    }
    if (s.morHolds() < s.morResists()) {
      out.println(said("disagree", number(s.morHolds() / 1e6), number(s.morResists() / 1e6)));
    }
    out.println(words.getString("sources"));
    for (String source : sources) {
      Sources.Source from = Sources.of(source);
      String through = from.through().isEmpty() ? "" : " (" + said("through", from.through()) + ")";
      out.println("  " + source + ": " + from.citation() + through);
    }
  }

  private static String line(String key, String density, String rupture, String name) {
    return "%-23s %-12s %-13s %s".formatted(key, density, rupture, name);
  }

  private static String range(double low, double high, String format) {
    String least = String.format(Locale.ROOT, format, low);
    String most = String.format(Locale.ROOT, format, high);
    return least.equals(most) ? least : least + "-" + most;
  }

  private String mark(Figure f) {
    return " " + words.getString("mark." + kind(f));
  }

  /** How far a figure can be trusted: a word of the list at the end. */
  private static String kind(Figure f) {
    if (f.kind() == Kind.PUBLISHED) {
      return Sources.of(f.source()).seen() == Sources.Seen.READ ? "read" : "secondary";
    }
    return f.kind() == Kind.FROM_MEMORY ? "memory" : "allowance";
  }

  private static String amount(Figure f) {
    double v = f.value();
    return switch (f.unit()) {
      case "Pa" ->
          v >= 2e9
              ? "%s GPa (%s 10^6 psi)".formatted(number(v / 1e9), number(v / Units.PSI / 1e6))
              : "%s MPa (%.0f psi)".formatted(number(v / 1e6), v / Units.PSI);
      case "kg/m³" -> "%s kg/m³ (%.0f lb/ft³)".formatted(number(v), v / Units.POUND_PER_CUBIC_FOOT);
      default -> (number(v) + " " + f.unit()).stripTrailing();
    };
  }

  private static String number(double v) {
    String digits = v >= 100 ? "%.0f" : v >= 10 ? "%.1f" : "%.3f";
    String text = String.format(Locale.ROOT, digits, v);
    return text.contains(".") ? text.replaceAll("\\.?0+$", "") : text;
  }

  private String said(String word, Object... values) {
    return words.getString(word).formatted(values);
  }
}
