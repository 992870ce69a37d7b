package org.fallwright.ui.cli;

import static org.assertj.core.api.Assertions.assertThat;

import java.io.PrintWriter;
import java.io.StringWriter;
import org.fallwright.core.reference.Allowances;
import org.fallwright.core.reference.Figure;
import org.fallwright.core.reference.Hardware;
import org.junit.jupiter.api.Test;
import picocli.CommandLine;

class FiguresCommandTest {
  private final StringWriter out = new StringWriter();
  private final StringWriter err = new StringWriter();

  private int run(String... args) {
    return new CommandLine(new FiguresCommand())
        .setOut(new PrintWriter(out, true))
        .setErr(new PrintWriter(err, true))
        .execute(args);
  }

  @Test
  void everyFigureIsListedWithWhatStandsBehindIt() {
    assertThat(run()).isZero();
    for (Figure f : Hardware.all()) {
      assertThat(out.toString().lines()).anyMatch(l -> l.startsWith(f.key() + " "));
    }
    assertThat(out.toString().lines().filter(l -> l.contains(" planning allowance "))).isNotEmpty();
    assertThat(out.toString().lines())
        .anyMatch(l -> l.startsWith(Allowances.STEM_FACTOR.key() + " "))
        .anyMatch(l -> l.startsWith("49cfr393: 49 CFR 393.108"));
  }

  @Test
  void wordsNarrowTheList() {
    assertThat(run("shackle", "factor")).isZero();
    assertThat(out.toString()).contains("shackle.factor").doesNotContain("hinge-k-least");
  }

  @Test
  void wordsThatNothingHasAreRefused() {
    assertThat(run("unobtainium")).isEqualTo(2);
    assertThat(err.toString()).contains("No figure has all of: unobtainium.");
  }
}
