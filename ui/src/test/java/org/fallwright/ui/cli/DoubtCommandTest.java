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
import org.fallwright.ui.home.Home;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

class DoubtCommandTest {
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
    Home home =
        new Home(
            Path.of("target", "plugins"), Path.of("target", "basemaps"), Path.of("demo"), "0.1.0");
    PrintWriter o = new PrintWriter(out, true);
    return Fallwright.run(home, site -> {}, args, o, new PrintWriter(err, true));
  }

  @Test
  void itSaysHowOftenItIsEnoughAndWhatToMeasure() {
    assertThat(run("doubt", file.toString(), "--setup", "1")).as("%s", err).isZero();
    assertThat(out.toString())
        .contains("hand-winch")
        .contains("The pull is enough more than 99 times in 100")
        .contains("What to measure next")
        .contains("  1  Weigh or count out the mass of the tree: a tenth heavier takes the margin")
        .contains("pull to plan for")
        .contains("4096 ways the site may be")
        .doesNotContain("percentile");
  }

  @Test
  void asJsonTheSame() throws IOException {
    assertThat(run("doubt", file.toString(), "--json")).as("%s", err).isZero();
    JsonNode doc = new ObjectMapper().readTree(out.toString());
    assertThat(doc.path("format").asText()).isEqualTo("fallwright-doubt");
    JsonNode doubt = doc.path("doubt");
    assertThat(doubt.path("enough").asDouble()).isGreaterThan(0.99);
    assertThat(doubt.path("measure").get(0).path("input").asText()).isEqualTo("mass");
    assertThat(doubt.path("curve").get(0).path("low_N").asDouble()).isPositive();
  }

  @Test
  void aRankThatIsNotThereIsRefused() {
    assertThat(run("doubt", file.toString(), "--setup", "99")).isEqualTo(2);
    assertThat(err.toString()).contains("this plan has setups 1 to");
  }
}
