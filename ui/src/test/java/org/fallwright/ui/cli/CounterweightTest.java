package org.fallwright.ui.cli;

import static org.assertj.core.api.Assertions.assertThat;

import com.fasterxml.jackson.databind.node.ArrayNode;
import com.fasterxml.jackson.databind.node.ObjectNode;
import java.io.IOException;
import java.io.PrintWriter;
import java.io.StringWriter;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.stream.Stream;
import org.apache.pdfbox.Loader;
import org.apache.pdfbox.pdmodel.PDDocument;
import org.apache.pdfbox.text.PDFTextStripper;
import org.fallwright.core.store.SiteFile;
import org.fallwright.ui.demo.DemoSite;
import org.fallwright.ui.home.Home;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

/**
 * The worked example of the guide, from its archive alone: a pull source that the program does not
 * bring and knows nothing of appears by itself wherever sources appear.
 */
class CounterweightTest {
  private static final Path BUILT = Path.of("..", "plugins", "counterweight", "target");

  @TempDir private Path folder;
  private Home home;

  private record Said(int status, String out, String err) {}

  @BeforeEach
  void onlyItsArchive() throws IOException {
    Path plugins = Files.createDirectory(folder.resolve("plugins"));
    try (Stream<Path> built = Files.list(BUILT)) {
      Path jar =
          built
              .filter(
                  f -> f.getFileName().toString().matches("fallwright-counterweight-[0-9.]+jar"))
              .findFirst()
              .orElseThrow();
      Files.copy(jar, plugins.resolve("counterweight.jar"));
    }
    Home found = Home.found();
    home = new Home(plugins, found.baseMaps(), found.demo(), "0.1.0");
  }

  @Test
  void theProgramDoesNotBringIt() throws IOException {
    try (Stream<Path> shipped = Files.list(Path.of("target", "plugins"))) {
      assertThat(shipped.map(f -> f.getFileName().toString()))
          .noneMatch(f -> f.contains("counterweight"));
    }
  }

  @Test
  void theCommandLineListsItWithWhoMadeItAndItsContract() {
    assertThat(run("sources").out)
        .contains("Plugins in use: 1")
        .containsPattern("counterweight [0-9.]+: counterweight \\(by Fallwright, contract 2\\)");
  }

  @Test
  void theCommandLineExplainsItsParametersInBothLanguages() {
    assertThat(run("sources", "counterweight").out)
        .contains("mass_error_share: It may be off by")
        .contains("from 5 to 5000 kg")
        .contains("from 0 to 0.5; a form fills in 0.05")
        .contains("Free height under the weight when the line is tight.");
    assertThat(run("sources", "counterweight", "--es").out)
        .contains("counterweight: contrapeso")
        .contains("mass_error_share: Puede fallar por")
        .contains("de 5 a 5000 kg")
        .contains("de 0 a 0.5; el formulario pone 0.05");
    Said none = run("sources", "winch");
    assertThat(none.status).isEqualTo(2);
    assertThat(none.err).contains("no pull source \"winch\" is in use; there are counterweight");
  }

  @Test
  void aSiteIsPlannedWithItAndItsSheetSaysWhatWasEntered() throws IOException {
    Path site = site(300);
    Said plan = run("plan", site.toString(), "--all");
    assertThat(plan.err).isEmpty();
    assertThat(plan.out).contains("weight, hang, at A1", "A constant force can pull a tree over");
    Path pdf = folder.resolve("sheet.pdf");
    Said sheet = run("sheet", site.toString(), "--setup", "1", "--out", pdf.toString());
    assertThat(sheet.err).isEmpty();
    try (PDDocument doc = Loader.loadPDF(Files.readAllBytes(pdf))) {
      assertThat(new PDFTextStripper().getText(doc).replaceAll("\\s+", " "))
          .contains("Mass of the weight: 661 lb");
    }
  }

  @Test
  void aParameterOutOfItsRangeIsRefusedInOneSentence() throws IOException {
    Said said = run("plan", site(6000).toString());
    assertThat(said.status).isEqualTo(2);
    assertThat(said.err.strip())
        .isEqualTo("site.fallsite.json: mass_kg is 6000 kg; it must be from 5 to 5000 kg");
  }

  /** The demo with one source, and lays only at the steps of a coarse grid. */
  private Path site(double massKg) throws IOException {
    Path file = folder.resolve("site.fallsite.json");
    DemoSite demo =
        DemoSite.asItIs()
            .with(
                tree -> {
                  ArrayNode sources = (ArrayNode) tree.at("/gear/sources");
                  ObjectNode weight = sources.objectNode().put("id", "weight");
                  weight.put("plugin", "counterweight").putArray("places").add("A1").add("A2");
                  weight.putArray("drivers");
                  weight.putArray("driver_places");
                  weight
                      .putObject("parameters")
                      .put("mass_kg", massKg)
                      .put("mass_error_share", 0.05)
                      .put("efficiency", 0.9)
                      .put("drop_m", 6)
                      .put("block_rated_N", 30_000)
                      .put("block_factor", 4);
                  sources.removeAll().add(weight);
                  ((ObjectNode) tree.get("offer")).put("lay_step_deg", 90).putArray("lays_deg");
                });
    SiteFile.write(demo.site(), file);
    return file;
  }

  private Said run(String... args) {
    StringWriter out = new StringWriter();
    StringWriter err = new StringWriter();
    int status = Fallwright.run(home, s -> {}, args, new PrintWriter(out), new PrintWriter(err));
    return new Said(status, out.toString(), err.toString());
  }
}
