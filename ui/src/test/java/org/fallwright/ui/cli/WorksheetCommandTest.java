package org.fallwright.ui.cli;

import static org.assertj.core.api.Assertions.assertThat;

import com.fasterxml.jackson.databind.node.ObjectNode;
import java.io.IOException;
import java.io.PrintWriter;
import java.io.StringWriter;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import org.apache.pdfbox.Loader;
import org.apache.pdfbox.pdmodel.PDDocument;
import org.apache.pdfbox.text.PDFTextStripper;
import org.fallwright.core.store.SiteFile;
import org.fallwright.ui.demo.DemoSite;
import org.fallwright.ui.home.Home;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

/** The worksheet command on the demo site with one source and few lays. */
class WorksheetCommandTest {
  @TempDir private Path folder;
  private Path site;

  private record Said(int status, String out, String err) {}

  @BeforeEach
  void writeSite() throws IOException {
    site = folder.resolve("oak.fallsite.json");
    SiteFile.write(
        DemoSite.asItIs()
            .with(
                tree -> {
                  var sources = tree.get("gear").get("sources").elements();
                  while (sources.hasNext()) {
                    if (!sources.next().get("id").asText().equals("hand-winch")) {
                      sources.remove();
                    }
                  }
                  ObjectNode offer = (ObjectNode) tree.get("offer");
                  offer.put("lay_step_deg", 90.0);
                  offer.putArray("lays_deg").add(3.0);
                })
            .site(),
        site);
  }

  private Said worksheet(String... more) {
    List<String> args = new java.util.ArrayList<>(List.of("worksheet", site.toString()));
    args.addAll(List.of(more));
    StringWriter out = new StringWriter();
    StringWriter err = new StringWriter();
    int status =
        Fallwright.run(
            Home.found(),
            p -> {},
            args.toArray(String[]::new),
            new PrintWriter(out),
            new PrintWriter(err));
    return new Said(status, out.toString(), err.toString());
  }

  @Test
  void withoutAFileItPrintsMarkdown() {
    Said said = worksheet("--setup", "1");
    assertThat(said.err).isEmpty();
    assertThat(said.status).isZero();
    assertThat(said.out)
        .startsWith("# Worksheet")
        .contains("A planning aid. It approves nothing")
        .contains("| `T_plan` | pull to plan for |")
        .contains("Clearances, zones and distances are results of geometry")
        .contains("## Against the program's own figures")
        .contains("- gtr282-5-3a: USDA Forest Products Laboratory");
  }

  @Test
  void aSumShowsOnlyThatFigureAndWhatItRestsOn() {
    String byName = worksheet("--setup", "1", "--sum", "pull needed").out;
    assertThat(byName).isEqualTo(worksheet("--setup", "1", "--sum", "t_need").out);
    assertThat(byName)
        .contains("| `T_need` |")
        .contains("| `M_h` |")
        .doesNotContain("`T_plan`")
        .doesNotContain("nicoll-2006");
    Said unknown = worksheet("--setup", "1", "--sum", "nonsense");
    assertThat(unknown.status).isEqualTo(Exit.BAD_INPUT);
    assertThat(unknown.err).contains("--sum is \"nonsense\"").contains("T_plan");
  }

  @Test
  void pagesHoldEveryLineInWholeWithCautionsFirst() throws IOException {
    Path md = folder.resolve("w.md");
    Path pdf = folder.resolve("w.pdf");
    assertThat(worksheet("--setup", "1", "--out", md.toString()).status).isZero();
    assertThat(worksheet("--setup", "1", "--out", pdf.toString(), "--paper", "a4").status).isZero();
    byte[] first = Files.readAllBytes(pdf);
    worksheet("--setup", "1", "--out", pdf.toString(), "--paper", "a4");
    assertThat(Files.readAllBytes(pdf)).isEqualTo(first);
    try (PDDocument doc = Loader.loadPDF(first)) {
      int pages = doc.getNumberOfPages();
      PDFTextStripper stripper = new PDFTextStripper();
      String all = squeezed(stripper.getText(doc));
      for (String line : Files.readString(md).split("\n")) {
        if (line.startsWith("| `")) {
          for (String cell : line.split("\\|")) {
            assertThat(all).contains(squeezed(cell));
          }
        }
      }
      assertThat(all).contains("page" + pages + "of" + pages).doesNotContain("…");
      stripper.setEndPage(1);
      assertThat(squeezed(stripper.getText(doc))).contains("Cautions").contains("approvesnothing");
      assertThat(doc.getPage(0).getMediaBox().getWidth()).isBetween(595f, 596f);
    }
  }

  /** Without blanks and the marks of code, so that it does not matter where a line is broken. */
  private static String squeezed(String text) {
    return text.replaceAll("[\\s`]+", "");
  }

  @Test
  void whatCannotBeDoneIsOneSentence() {
    assertThat(worksheet("--setup", "999").err)
        .contains("--setup is 999; this plan has setups 1 to");
    assertThat(worksheet("--setup", "1", "--out", "w.doc").err).contains("must end in .md or .pdf");
    assertThat(worksheet("--setup", "999").status).isEqualTo(Exit.BAD_INPUT);
  }
}
