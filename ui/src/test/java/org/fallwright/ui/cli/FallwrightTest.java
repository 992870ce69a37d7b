package org.fallwright.ui.cli;

import static org.assertj.core.api.Assertions.assertThat;

import com.fasterxml.jackson.databind.JsonNode;
import com.fasterxml.jackson.databind.ObjectMapper;
import com.fasterxml.jackson.databind.node.ObjectNode;
import java.io.IOException;
import java.io.PrintWriter;
import java.io.StringWriter;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.function.Consumer;
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
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

/** The commands in this process, on the demo site cut down to a few setups. */
class FallwrightTest {
  @TempDir private Path folder;

  private final List<Path> opened = new ArrayList<>();
  private Path site;

  private record Said(int status, String out, String err) {}

  @BeforeEach
  void writeSite() throws IOException {
    site = write("oak.fallsite.json", tree -> {});
  }

  @ParameterizedTest
  @ValueSource(
      strings = {"", "plan", "sheet", "worksheet", "check", "sources", "measure", "open", "demo"})
  void everyCommandHasHelp(String command) {
    Said said = command.isEmpty() ? run(home(), "--help") : run(home(), command, "--help");
    assertThat(said.status).isZero();
    assertThat(said.out).contains("Usage: fallwright").contains("--help");
    assertThat(said.err).isEmpty();
  }

  @Test
  void theVersionIsThatOfTheBuild() {
    assertThat(run(home(), "--version").out.strip()).matches("Fallwright \\d+\\.\\d+\\.\\d+");
  }

  @Test
  void aPlanWithAWayThatWorksEndsWithNought() throws IOException {
    Path json = folder.resolve("plan.json");
    Said said = run(home(), "plan", site.toString(), "--json", json.toString());
    assertThat(said.err).isEmpty();
    assertThat(said.status).isZero();
    assertThat(said.out)
        .contains("rules US-OSHA")
        .contains("  1  Workable.")
        .contains("hand-winch")
        .contains("Ruled out")
        .contains("Cautions:")
        .contains("Not checked by any plan:");
    JsonNode doc = new ObjectMapper().readTree(json.toFile());
    assertThat(doc.at("/setups/0/rank").asInt()).isEqualTo(1);
    assertThat(doc.at("/setups/0/verdict").asText()).isEqualTo("workable");
    assertThat(doc.at("/not_by_pulling").isNull()).isTrue();
    byte[] first = Files.readAllBytes(json);
    run(home(), "plan", site.toString(), "--json", json.toString());
    assertThat(Files.readAllBytes(json)).isEqualTo(first);
  }

  @Test
  void topAndAllChooseWhatIsShown() {
    String one = run(home(), "plan", site.toString(), "--top", "1").out;
    String all = run(home(), "plan", site.toString(), "--all").out;
    assertThat(one).contains("  1  ").doesNotContain("\n  2  ");
    assertThat(all.length()).isGreaterThan(one.length());
    assertThat(all).contains("Not workable.");
  }

  @Test
  void nothingWorkableEndsWithThree() throws IOException {
    Path crewOnly = write("crew.fallsite.json", tree -> keepSources(tree, "crew"));
    Path json = folder.resolve("plan.json");
    Said said = run(home(), "plan", crewOnly.toString(), "--json", json.toString());
    assertThat(said.status).isEqualTo(3);
    String method = new ObjectMapper().readTree(json.toFile()).path("not_by_pulling").asText();
    assertThat(method).startsWith("Pulling is not the method here").contains("crane");
    assertThat(said.out).contains("Nothing on this site is workable.").contains(method);
  }

  @Test
  void anUnknownVoltageEndsWithThree() throws IOException {
    Path blank =
        write(
            "blank.fallsite.json",
            tree -> {
              ((ObjectNode) tree.at("/wires/0")).putNull("voltage_kv");
              ((ObjectNode) tree.at("/wires/0")).putNull("voltage_said_by");
            });
    Said said = run(home(), "plan", blank.toString());
    assertThat(said.status).isEqualTo(3);
    assertThat(said.out).contains("Cannot judge yet.").doesNotContain("Pulling is not the method");
  }

  @Test
  void aSiteIsReadAndSaid() {
    Said said = run(home(), "check", site.toString());
    assertThat(said.status).isZero();
    assertThat(said.out).contains("Oak behind the house").contains("W1 (12.47 kV)").contains("A3");
  }

  @ParameterizedTest
  @ValueSource(strings = {"check", "plan", "sheet"})
  void badInputIsOneSentenceAndWritesNothing(String command) throws IOException {
    Path bad = folder.resolve("bad.fallsite.json");
    Files.writeString(bad, Files.readString(site).replace("\"lean_deg\"", "\"lean_degrees\""));
    Path out = folder.resolve("out.pdf");
    List<String> call =
        switch (command) {
          case "plan" -> List.of("plan", bad.toString(), "--json", out.toString());
          case "sheet" -> List.of("sheet", bad.toString(), "--setup", "1", "--out", out.toString());
          default -> List.of("check", bad.toString());
        };
    Said said = run(home(), call.toArray(String[]::new));
    assertThat(said.status).isEqualTo(2);
    assertThat(said.out).isEmpty();
    assertThat(said.err.lines().toList()).singleElement().asString().contains("lean_degrees");
    assertThat(out).doesNotExist();
    assertThat(entries()).containsExactly("bad.fallsite.json", "oak.fallsite.json");
  }

  @Test
  void aFileThatIsNotThereIsOneSentence() {
    Said said = run(home(), "plan", folder.resolve("none.json").toString());
    assertThat(said.status).isEqualTo(2);
    assertThat(said.err.lines().toList()).singleElement().asString().contains("none.json");
  }

  @Test
  void anUnwritableOutputIsOneSentence() throws IOException {
    for (Path out : List.of(folder.resolve("none").resolve("plan.json"), folder)) {
      Said said = run(home(), "plan", site.toString(), "--json", out.toString());
      assertThat(said.status).isEqualTo(2);
      assertThat(said.out).isEmpty();
      assertThat(said.err.lines().toList())
          .singleElement()
          .asString()
          .contains(out + " cannot be written");
    }
    assertThat(entries()).containsExactly("oak.fallsite.json");
  }

  @Test
  void theSheetIsWrittenAsItsNameSays() throws IOException {
    Path pdf = folder.resolve("sheet.pdf");
    Path png = folder.resolve("sheet.PNG");
    Said said = run(home(), "sheet", site.toString(), "--setup", "1", "--out", pdf.toString());
    assertThat(said.err).isEmpty();
    assertThat(said.status).isZero();
    try (PDDocument doc = Loader.loadPDF(pdf.toFile())) {
      // the site is in US units
      assertThat(doc.getPage(0).getMediaBox().getWidth()).isEqualTo(612);
      assertThat(new PDFTextStripper().getText(doc)).contains("workable").contains("hand-winch");
    }
    run(home(), "sheet", site.toString(), "--setup", "1", "--out", png.toString(), "--paper", "a4");
    assertThat(Files.readAllBytes(png)).startsWith(0x89, 'P', 'N', 'G');
  }

  @Test
  void aSheetThatCannotBeIsOneSentence() {
    Path pdf = folder.resolve("sheet.pdf");
    Said rank = run(home(), "sheet", site.toString(), "--setup", "9999", "--out", pdf.toString());
    assertThat(rank.status).isEqualTo(2);
    assertThat(rank.err).startsWith("--setup is 9999; this plan has setups 1 to ");
    Said name = run(home(), "sheet", site.toString(), "--setup", "1", "--out", "sheet.doc");
    assertThat(name.status).isEqualTo(2);
    assertThat(name.err).contains("must end in .pdf or .png");
    Said paper =
        run(home(), "sheet", site.toString(), "--setup", "1", "--out", "x.pdf", "--paper", "a3");
    assertThat(paper.status).isEqualTo(2);
    assertThat(pdf).doesNotExist();
  }

  @ParameterizedTest
  @ValueSource(strings = {"--no-such-option", "no-such-command"})
  void aCallThatIsNotKnownIsRefused(String argument) {
    Said said = run(home(), argument);
    assertThat(said.status).isEqualTo(2);
    assertThat(said.out).isEmpty();
    assertThat(said.err).contains(argument).contains("--help").doesNotContain("Exception");
  }

  @Test
  void thePluginsOfTheBuildAreListed() {
    Said said = run(home(), "sources");
    assertThat(said.status).isZero();
    assertThat(said.out)
        .contains("Plugins in use: 4")
        .containsPattern("hand-line \\d+\\.\\d+\\.\\d+: hand-line")
        .contains("vehicle")
        .contains("winch")
        .contains("block-system")
        .doesNotContain("Not in use");
  }

  @Test
  void aPluginThatIsBrokenIsListedWithTheReason() throws IOException {
    Path plugins = Files.createDirectory(folder.resolve("plugins"));
    Files.writeString(plugins.resolve("broken.jar"), "no archive");
    Home home = new Home(plugins, home().baseMaps(), home().demo(), "0.1.0");
    Said said = run(home, "sources");
    assertThat(said.status).isZero();
    assertThat(said.out).contains("Plugins in use: 0").containsPattern("broken.jar: .+\\.");
  }

  @Test
  void withoutPluginsNothingIsWorkableAndThePlanSaysWhy() {
    Home bare = new Home(folder.resolve("none"), home().baseMaps(), home().demo(), "0.1.0");
    Said said = run(bare, "plan", site.toString());
    assertThat(said.status).isEqualTo(3);
    assertThat(said.out).contains("Notes:").contains("winch");
  }

  @Test
  void theDemoWritesItsFilesAndEndsWithTheBlankedCopy() throws IOException {
    Files.move(site, folder.resolve("oak-behind-the-house.fallsite.json"));
    Path out = folder.resolve("written");
    Home home = new Home(home().plugins(), home().baseMaps(), folder, "0.1.0");
    Said said = run(home, "demo", "--out", out.toString());
    assertThat(said.err).isEmpty();
    assertThat(said.status).isZero();
    try (Stream<Path> files = Files.list(out)) {
      assertThat(files.map(f -> f.getFileName().toString()))
          .containsExactlyInAnyOrder("plan.json", "sheet.pdf", "sheet.png");
    }
    assertThat(out.resolve("plan.json")).isNotEmptyFile();
    assertThat(out.resolve("sheet.pdf")).isNotEmptyFile();
    assertThat(out.resolve("sheet.png")).isNotEmptyFile();
    List<String> lines = said.out.lines().toList();
    assertThat(lines).anyMatch(l -> l.contains(out.toString()));
    assertThat(lines.get(lines.size() - 1)).contains("left blank: cannot judge yet. ");
    assertThat(opened).hasSize(OpenCommand.hasDisplay() ? 1 : 0);
  }

  private Said run(Home home, String... args) {
    StringWriter out = new StringWriter();
    StringWriter err = new StringWriter();
    int status =
        Fallwright.run(home, opened::add, args, new PrintWriter(out), new PrintWriter(err));
    return new Said(status, out.toString(), err.toString());
  }

  private static Home home() {
    return Home.found();
  }

  /** The demo site with the winch and the crew, and lays only at the steps of a coarse grid. */
  private Path write(String name, Consumer<ObjectNode> change) throws IOException {
    Path file = folder.resolve(name);
    DemoSite few =
        DemoSite.asItIs()
            .with(
                tree -> {
                  keepSources(tree, "hand-winch", "crew");
                  ObjectNode offer = (ObjectNode) tree.get("offer");
                  offer.put("lay_step_deg", 90.0);
                  offer.putArray("lays_deg").add(3.0);
                })
            .with(change);
    SiteFile.write(few.site(), file);
    assertThat(Files.readString(file, StandardCharsets.UTF_8)).endsWith("\n");
    return file;
  }

  private static void keepSources(ObjectNode tree, String... ids) {
    List<String> kept = List.of(ids);
    var sources = tree.get("gear").get("sources").elements();
    while (sources.hasNext()) {
      if (!kept.contains(sources.next().get("id").asText())) {
        sources.remove();
      }
    }
  }

  private List<String> entries() throws IOException {
    try (Stream<Path> files = Files.list(folder)) {
      return files.map(f -> f.getFileName().toString()).sorted().toList();
    }
  }
}
