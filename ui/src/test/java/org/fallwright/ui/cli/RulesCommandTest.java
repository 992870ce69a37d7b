package org.fallwright.ui.cli;

import static org.assertj.core.api.Assertions.assertThat;

import java.io.PrintWriter;
import java.io.StringWriter;
import org.fallwright.core.rules.RuleSet;
import org.fallwright.core.rules.RuleSets;
import org.junit.jupiter.api.Test;
import picocli.CommandLine;

class RulesCommandTest {
  private final StringWriter out = new StringWriter();
  private final StringWriter err = new StringWriter();

  private int run(String... args) {
    return new CommandLine(new RulesCommand())
        .setOut(new PrintWriter(out, true))
        .setErr(new PrintWriter(err, true))
        .setExecutionExceptionHandler(
            (e, line, result) -> {
              err.write(e.getMessage());
              return Exit.BAD_INPUT;
            })
        .execute(args);
  }

  @Test
  void withoutAKeyItListsTheSets() {
    assertThat(run()).isZero();
    for (String key : RuleSets.shipped().keys()) {
      assertThat(out.toString()).contains(key, RuleSets.shipped().byKey(key).name());
    }
  }

  @Test
  void everySetShowsEveryRuleWithItsStatus() {
    for (String key : RuleSets.shipped().keys()) {
      assertThat(run(key)).as(key).isZero();
      for (RuleSet.Entry e : RuleSets.shipped().byKey(key).entries()) {
        assertThat(out.toString()).contains(e.item() + ": " + e.basis());
      }
    }
    assertThat(err.toString()).isEmpty();
  }

  @Test
  void aGapSaysWhoseRuleStandsIn() {
    assertThat(run("UK")).isZero();
    assertThat(out.toString())
        .contains("> 2 H, from DE-DGUV as the strictest [read] DGUV Regel 114-018, 3.2.6.6")
        .contains(">= 2 H [from memory, verify] HSE/FISA 301-302 series")
        .contains("refused [read in part]")
        .contains("to 33 kV 3 m; to 132 kV 6 m; to 400 kV 7 m")
        .contains("nothing asked");
  }

  @Test
  void aSetThatThereIsNotIsRefused() {
    assertThat(run("XX")).isEqualTo(Exit.BAD_INPUT);
    assertThat(err.toString()).contains("There is no rule set XX").contains("US-OSHA");
  }
}
