package org.fallwright.ui.cli;

import static org.assertj.core.api.Assertions.assertThat;

import java.io.PrintWriter;
import java.io.StringWriter;
import org.fallwright.core.reference.Species;
import org.fallwright.core.reference.SpeciesTable;
import org.junit.jupiter.api.Test;
import picocli.CommandLine;

class SpeciesCommandTest {
  private final StringWriter out = new StringWriter();
  private final StringWriter err = new StringWriter();

  private int run(String... args) {
    return new CommandLine(new SpeciesCommand())
        .setOut(new PrintWriter(out, true))
        .setErr(new PrintWriter(err, true))
        .execute(args);
  }

  @Test
  void theListHasEverySpeciesWithItsRangesAndMarks() {
    assertThat(run()).isZero();
    for (Species s : SpeciesTable.all()) {
      assertThat(out.toString().lines())
          .anyMatch(l -> l.startsWith(s.key() + " ") && l.contains(s.name()));
    }
    assertThat(out.toString())
        .containsPattern("sitka-spruce +529-850 s +34\\.0-39\\.3 s +Sitka spruce")
        .containsPattern("northern-red-oak +1026 r +57\\.0 s +northern red oak")
        .containsPattern("american-elm +892 r +49\\.6 m ")
        .containsPattern("horse-chestnut +657-892 a +34\\.5-49\\.6 a ");
  }

  @Test
  void oneSpeciesShowsEveryFigureWithItsSource() {
    assertThat(run("sitka-spruce")).isZero();
    assertThat(out.toString())
        .startsWith("sitka-spruce: Sitka spruce | pícea de Sitka (Picea sitchensis)")
        .containsPattern(
            "rupture in bending, green +34 MPa \\(4931 psi\\) +second hand +lavers-1969")
        .containsPattern("rupture in bending, green +39\\.3 MPa \\(5700 psi\\) +from memory ")
        .contains("34 MPa counts where it holds")
        .contains("lavers-1969: Lavers 1969, ");
    assertThat(out.toString().lines().filter(l -> l.contains("root plate"))).hasSize(8);
  }

  /** Every figure of every species has a word in both languages. */
  @Test
  void everySpeciesCanBeShownInBothLanguages() {
    for (Species s : SpeciesTable.all()) {
      assertThat(run(s.key())).as(s.key()).isZero();
      assertThat(run(s.key(), "--es")).as(s.key()).isZero();
    }
    assertThat(out.toString()).contains("de memoria", "margen de planificación", "Fuentes");
    assertThat(err.toString()).isEmpty();
  }

  @Test
  void anUnknownKeyIsRefusedWithWhatComesNear() {
    assertThat(run("red-oak")).isEqualTo(2);
    assertThat(err.toString())
        .startsWith("species is \"red-oak\"; it must be one of the table, such as ")
        .contains("northern-red-oak");
    assertThat(out.toString()).isEmpty();
  }
}
