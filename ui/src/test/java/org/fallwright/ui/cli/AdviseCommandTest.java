package org.fallwright.ui.cli;

import static org.assertj.core.api.Assertions.assertThat;

import com.fasterxml.jackson.databind.JsonNode;
import com.fasterxml.jackson.databind.ObjectMapper;
import com.fasterxml.jackson.databind.node.ArrayNode;
import com.fasterxml.jackson.databind.node.ObjectNode;
import java.io.IOException;
import java.io.PrintWriter;
import java.io.StringWriter;
import java.nio.file.Path;
import org.fallwright.core.store.SiteFile;
import org.fallwright.core.store.SiteFileException;
import org.fallwright.ui.demo.DemoSite;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import picocli.CommandLine;

class AdviseCommandTest {
  private final StringWriter out = new StringWriter();
  private final StringWriter err = new StringWriter();
  @TempDir private Path folder;
  private Path file;

  /** The demo with the winch alone and few lays, so that planning it takes no time. */
  @BeforeEach
  void write() throws SiteFileException {
    file = folder.resolve("small.fallsite.json");
    SiteFile.write(
        DemoSite.asItIs()
            .with(
                s -> {
                  ArrayNode sources = (ArrayNode) s.at("/gear/sources");
                  for (int i = sources.size() - 1; i >= 0; i--) {
                    if (!sources.get(i).get("id").asText().equals("hand-winch")) {
                      sources.remove(i);
                    }
                  }
                  ObjectNode offer = (ObjectNode) s.get("offer");
                  offer.put("lay_step_deg", 90);
                  offer.putArray("lays_deg").add(3.0);
                })
            .site(),
        file);
  }

  private int run(String... args) {
    return new CommandLine(new AdviseCommand(Path.of("target", "plugins"), "0.1.0"))
        .setOut(new PrintWriter(out, true))
        .setErr(new PrintWriter(err, true))
        .execute(args);
  }

  @Test
  void itSaysAllOfItInTheSitesUnits() {
    assertThat(run(file.toString())).as("%s", err).isZero();
    assertThat(out.toString())
        .contains("hand-winch over A1 at A3")
        .contains("\nHinge: Workable with a hinge from 0.8 in (20 mm)")
        .contains("\nLine height: ")
        .contains("\nWind: Workable in gusts up to 13.")
        .contains("\nWhen it goes: It goes when 6 ft ")
        .contains("\nWhat gives first: ")
        .contains("\nProof pull: Before any cut pull to ")
        .contains("\nLoad cell: ")
        .contains("source end (A1 to A3), standing")
        .contains("\nLimits card: ")
        .contains("x not workable")
        .doesNotContain("NaN");
    assertThat(err.toString()).isEmpty();
  }

  @Test
  void asJsonItIsInSi() throws IOException {
    assertThat(run(file.toString(), "--json")).as("%s", err).isZero();
    JsonNode doc = new ObjectMapper().readTree(out.toString());
    assertThat(doc.path("site").asText()).isEqualTo("Oak behind the house");
    assertThat(doc.at("/advice/rank").asInt()).isEqualTo(1);
    assertThat(doc.at("/advice/judged/setup/place").asText()).isEqualTo("A3");
    assertThat(doc.at("/advice/hinge/workable/highest").asDouble()).isBetween(0.05, 0.07);
  }

  @Test
  void nothingToWorkByIsGivenForASetupThatIsNotWorkable() {
    int status = 0;
    for (int rank = 1; status == 0; rank++) {
      out.getBuffer().setLength(0);
      status = run(file.toString(), "--setup", String.valueOf(rank));
    }
    assertThat(status).as("%s", err).isEqualTo(3);
    assertThat(out.toString())
        .contains("\nWork: This setup is not workable")
        .doesNotContain("Proof pull:")
        .doesNotContain("Load cell:");
  }

  @Test
  void aRankBeyondThePlanAndAFileThatIsNotThereAreRefusedInOneSentence() {
    assertThat(run(file.toString(), "--setup", "9999")).isEqualTo(2);
    assertThat(err.toString().strip())
        .startsWith("small.fallsite.json: rank is 9999; it must be from 1 to ");
    assertThat(run(folder.resolve("none.fallsite.json").toString())).isEqualTo(2);
    assertThat(out.toString()).isEmpty();
  }
}
