package org.fallwright.ui.cli;

import java.io.PrintWriter;
import java.math.BigDecimal;
import java.math.MathContext;
import java.util.List;
import java.util.Locale;
import java.util.concurrent.Callable;
import org.fallwright.core.rules.ApproachTable;
import org.fallwright.core.rules.Rule;
import org.fallwright.core.rules.RuleSet;
import org.fallwright.core.rules.RuleSets;
import picocli.CommandLine.Command;
import picocli.CommandLine.Model.CommandSpec;
import picocli.CommandLine.Option;
import picocli.CommandLine.Parameters;
import picocli.CommandLine.Spec;

/** Lists the rule sets, or all that one of them says. */
@Command(
    name = "rules",
    description = {
      "List the rule sets, or with a key every rule of that set: its figure, how well its text was",
      "read, where it is from, and where a gap is filled by the strictest of all sets."
    })
final class RulesCommand implements Callable<Integer> {
  private static final int DIGITS = 6;

  @Spec private CommandSpec spec;

  @Parameters(arity = "0..1", paramLabel = "KEY", description = "A set's key, as in a site file.")
  private String key;

  @Option(
      names = {"-h", "--help"},
      usageHelp = true,
      description = "Show this help.")
  private boolean help;

  @Override
  public Integer call() {
    RuleSets all = RuleSets.shipped();
    PrintWriter out = spec.commandLine().getOut();
    if (key == null) {
      out.println("Rule sets, their texts last read " + all.dateRead() + ":");
      all.keys().forEach(k -> out.printf("  %-10s %s%n", k, all.byKey(k).name()));
      return Exit.DONE;
    }
    if (!all.keys().contains(key)) {
      throw new Refused("There is no rule set " + key + "; there are " + all.keys() + ".");
    }
    RuleSet set = all.byKey(key);
    out.println(set.key() + ": " + set.name() + ". Texts last read " + all.dateRead() + ".");
    out.println("A figure that is not the set's own is the strictest of all sets and says whose.");
    for (RuleSet.Entry e : set.entries()) {
      out.println();
      out.println(e.item() + ": " + e.basis());
      out.println("    " + e.used().map(RulesCommand::said).orElse("nothing asked"));
    }
    tables(out, "Distances from live wires, the greatest of:", set.approachTables());
    out.println();
    out.println(
        "Never less than by US-EM385, whatever the set; a voltage that is not known stops all.");
    if (set.approachTables().isEmpty()) {
      out.println();
      out.println("No table of distances from live wires: the greatest of all sets' counts.");
    }
    List<ApproachTable> others =
        all.allTables().stream().filter(t -> !set.approachTables().contains(t)).toList();
    tables(out, "Tables of other places and uses:", others);
    return Exit.DONE;
  }

  private static String said(Rule r) {
    return figure(r)
        + (r.fallback() ? ", from " + r.fallbackFrom() + " as the strictest" : "")
        + " ["
        + r.status().words()
        + "] "
        + r.citation();
  }

  private static String figure(Rule r) {
    if (r.unit().equals("yes/no")) {
      return r.yes() ? "yes" : "no";
    }
    if (r.unit().equals(RuleSet.FREE_HAND_UNIT)) {
      return r.value() >= 2 ? "refused" : "flagged";
    }
    String sign =
        switch (r.comparison()) {
          case AT_LEAST -> ">= ";
          case MORE_THAN -> "> ";
          case AT_MOST -> "<= ";
          case LESS_THAN -> "< ";
        };
    return sign + number(r.value()) + (r.unit().isEmpty() ? "" : " " + r.unit());
  }

  private static void tables(PrintWriter out, String head, List<ApproachTable> tables) {
    if (tables.isEmpty()) {
      return;
    }
    out.println();
    out.println(head);
    for (ApproachTable t : tables) {
      out.println("  " + t.key() + ": " + t.basis());
      out.println("    " + distances(t));
      out.println("    [" + t.status().words() + "] " + t.citation());
    }
  }

  private static String distances(ApproachTable t) {
    if (t.bands() != null) {
      StringBuilder b = new StringBuilder();
      for (List<Double> band : t.bands()) {
        b.append(b.isEmpty() ? "" : "; ")
            .append(
                String.format(
                    Locale.ROOT, "to %s kV %s m", number(band.get(0)), number(band.get(1))));
      }
      return b.toString();
    }
    return String.format(
        Locale.ROOT,
        "%s m to %s kV, then %s m more for each 10 kV%s, to %s kV",
        number(t.baseM()),
        number(t.fromKv()),
        number(t.growthM()),
        t.stepped() ? " begun" : "",
        number(t.highestKv()));
  }

  private static String number(double value) {
    return new BigDecimal(value)
        .round(new MathContext(DIGITS))
        .stripTrailingZeros()
        .toPlainString();
  }
}
