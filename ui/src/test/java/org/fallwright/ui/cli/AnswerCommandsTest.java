package org.fallwright.ui.cli;

import static org.assertj.core.api.Assertions.assertThat;

import com.fasterxml.jackson.databind.JsonNode;
import com.fasterxml.jackson.databind.ObjectMapper;
import java.io.IOException;
import java.io.PrintWriter;
import java.io.StringWriter;
import java.nio.file.Path;
import java.util.List;
import org.fallwright.core.site.Site;
import org.fallwright.core.store.SiteFile;
import org.fallwright.core.store.SiteFileException;
import org.fallwright.ui.demo.DemoSite;
import org.fallwright.ui.home.Home;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

/** The commands that answer a question, on the demo with the winch alone and few lays. */
class AnswerCommandsTest {
  private static final Home HOME =
      new Home(Path.of("target", "plugins"), Path.of("basemaps"), Path.of("demo"), "0.1.0");

  private final StringWriter out = new StringWriter();
  private final StringWriter err = new StringWriter();
  @TempDir private Path folder;
  private Path file;

  @BeforeEach
  void write() throws SiteFileException {
    file = folder.resolve("small.fallsite.json");
    SiteFile.write(DemoSite.asItIs().in(Site.Display.METRIC).only("hand-winch", "A3").site(), file);
  }

  private int run(String command, String... more) {
    out.getBuffer().setLength(0);
    err.getBuffer().setLength(0);
    String[] args = new String[more.length + 2];
    args[0] = command;
    args[1] = file.toString();
    System.arraycopy(more, 0, args, 2, more.length);
    return Fallwright.run(HOME, site -> {}, args, new PrintWriter(out), new PrintWriter(err));
  }

  @Test
  void whyShowsSevenRungsWithTheFirstMissMarked() {
    assertThat(run("why", "A2")).as("%s", err).isEqualTo(3);
    assertThat(out.toString().lines().filter(l -> l.contains(": kept, ") || l.contains(": MISSED")))
        .hasSize(7);
    assertThat(out.toString())
        .contains(">> anchor holds: MISSED, not workable")
        .doesNotContain("NaN");
    assertThat(run("why", "--setup", "1")).as("%s", err).isZero();
    assertThat(out.toString()).doesNotContain(">>");
    assertThat(run("why")).isEqualTo(2);
    assertThat(run("why", "A9")).isEqualTo(2);
    assertThat(err.toString().strip()).contains("\"A9\" is no anchor or spot of the site");
  }

  @Test
  void changeCompareTradeoffCasesAndQuestionsAnswer() {
    assertThat(run("change")).as("%s", err).isZero();
    assertThat(out.toString()).contains("Something on this site works as it is");
    assertThat(run("change", "--setup", "1")).isZero();
    assertThat(out.toString()).contains("Workable as it is");
    assertThat(run("compare", "1", "2")).as("%s", err).isZero();
    assertThat(out.toString()).contains("setup 1").contains("leans on ");
    assertThat(run("compare", "1", "99")).isEqualTo(2);
    assertThat(run("tradeoff")).as("%s", err).isZero();
    assertThat(out.toString()).contains("Groups of near twins").contains("hand-winch (pull) at A3");
    assertThat(run("cases", "--top", "1")).as("%s", err).isZero();
    assertThat(out.toString()).contains("November, leaf off, dusk (down by 16:40): ");
    assertThat(run("questions")).as("%s", err).isZero();
    assertThat(out.toString()).contains("What is the mass really: ").contains(" kg?");
  }

  @Test
  void eachAnswersInJsonToo() throws IOException {
    for (List<String> c :
        List.of(
            List.of("why", "A1"),
            List.of("change", "--setup", "2"),
            List.of("compare", "1", "2"),
            List.of("tradeoff"),
            List.of("cases"),
            List.of("questions"),
            List.of("today", "--line-at", "9.5"))) {
      List<String> args = new java.util.ArrayList<>(c.subList(1, c.size()));
      args.add("--json");
      assertThat(run(c.get(0), args.toArray(String[]::new))).as("%s %s", c, err).isIn(0, 3);
      JsonNode doc = new ObjectMapper().readTree(out.toString());
      assertThat(doc.path("format").asText()).as("%s", c).startsWith("fallwright-");
      assertThat(doc.path("site").asText()).isEqualTo("Oak behind the house");
      assertThat(out.toString().length()).as("%s holds no whole site", c).isLessThan(60_000);
    }
  }

  @Test
  void todayPrintsTheSlipAndRecordsOnlyWhatSomebodyAccepts() throws SiteFileException {
    Site before = SiteFile.read(file);
    assertThat(run("today", "--line-at", "8.0")).as("%s", err).isZero();
    assertThat(out.toString())
        .contains("Revision B, not recorded")
        .contains("line at 8.00 m, was 10.5 m");
    assertThat(SiteFile.read(file)).isEqualTo(before);
    assertThat(run("today", "--line-at", "8.0", "--record", "2026-05-04 09:12")).isEqualTo(2);
    assertThat(err.toString()).contains("somebody must accept it by name");
    assertThat(SiteFile.read(file)).isEqualTo(before);
    assertThat(
            run("today", "--line-at", "8.0", "--record", "2026-05-04 09:12", "--accepted-by", "A"))
        .as("%s", err)
        .isZero();
    assertThat(SiteFile.read(file).revisions()).hasSize(1);
    assertThat(run("today", "--gust", "3", "--record", "2026-05-04 09:40")).as("%s", err).isZero();
    assertThat(out.toString()).contains("Revision C of 2026-05-04 09:40");
    Site after = SiteFile.read(file);
    assertThat(after.revisions()).extracting(r -> r.letter()).containsExactly("B", "C");
    assertThat(after.offer()).isEqualTo(before.offer());
    assertThat(after.conditions()).isEqualTo(before.conditions());
    assertThat(run("today")).isEqualTo(2);
    assertThat(err.toString().strip())
        .isEqualTo("small.fallsite.json: nothing is said to be otherwise than planned.");
  }
}
