package org.fallwright.ui.cli;

import static org.assertj.core.api.Assertions.assertThat;

import com.fasterxml.jackson.databind.JsonNode;
import com.fasterxml.jackson.databind.ObjectMapper;
import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import java.util.stream.Stream;
import org.fallwright.core.plan.PlanJson;
import org.fallwright.core.site.Site;
import org.fallwright.ui.demo.DemoSite;
import org.fallwright.ui.sheet.Cautions;
import org.junit.jupiter.api.BeforeAll;
import org.junit.jupiter.api.Test;

/** The plan document has the fields that its specification names, in that order, and no other. */
class PlanFileTest {
  private static String specification;
  private static JsonNode doc;

  @BeforeAll
  static void read() throws IOException {
    specification = Files.readString(Path.of("plan-file.md"));
    DemoSite demo = DemoSite.coarse(Site.Display.US);
    doc =
        new ObjectMapper()
            .readTree(
                PlanJson.write(
                    demo.site(),
                    demo.plan(),
                    new PlanJson.Header("9.9.9", Cautions.ALWAYS, Cautions.LEFT_OUT)));
  }

  @Test
  void theHead() {
    assertThat(names(doc)).isEqualTo(table("## Head"));
  }

  @Test
  void everySetupRankedOrRejected() {
    List<String> documented = table("## A setup");
    assertThat(documented).contains("standing");
    assertThat(setups()).hasSizeGreaterThan(50);
    assertThat(setups()).allSatisfy(s -> assertThat(names(s)).isEqualTo(documented));
  }

  @Test
  void driverAndWeakest() {
    assertThat(setups().stream().map(s -> s.get("driver")).filter(d -> !d.isNull()))
        .isNotEmpty()
        .allSatisfy(
            d -> assertThat(names(d)).containsExactly("source", "source_mode", "source_at"));
    assertThat(setups())
        .allSatisfy(s -> assertThat(names(s.get("weakest"))).containsExactly("check", "ratio"));
  }

  @Test
  void checksLoadsAndPoints() {
    each("check", "checks");
    each("load", "loads");
    each("point", "path");
    each("point", "haul_path");
  }

  private static void each(String kind, String list) {
    List<String> documented = sentence(kind);
    assertThat(setups().stream().flatMap(s -> all(s.get(list))))
        .isNotEmpty()
        .allSatisfy(n -> assertThat(names(n)).isEqualTo(documented));
  }

  private static List<JsonNode> setups() {
    return Stream.concat(all(doc.get("setups")), all(doc.get("best_rejected"))).toList();
  }

  private static Stream<JsonNode> all(JsonNode list) {
    List<JsonNode> items = new ArrayList<>();
    list.forEach(items::add);
    return items.stream();
  }

  private static List<String> names(JsonNode object) {
    List<String> names = new ArrayList<>();
    object.fieldNames().forEachRemaining(names::add);
    return names;
  }

  /** The names in the first column of the table under a heading. */
  private static List<String> table(String heading) {
    String after = specification.substring(specification.indexOf(heading) + heading.length());
    return after
        .lines()
        .dropWhile(l -> !l.startsWith("|---"))
        .skip(1)
        .takeWhile(l -> l.startsWith("|"))
        .flatMap(l -> quoted(l.substring(0, l.indexOf('|', 1))))
        .toList();
  }

  /** The names in the sentence about a kind of object; what stands in brackets explains them. */
  private static List<String> sentence(String kind) {
    int from = specification.indexOf("A **" + kind + "** has");
    String said = specification.substring(from).split("\n\n|: it holds|, one line", 2)[0];
    return quoted(said.replaceAll("\\([^)]*\\)", "")).toList();
  }

  private static Stream<String> quoted(String text) {
    Matcher m = Pattern.compile("`([^`]+)`").matcher(text);
    return m.results().map(r -> r.group(1));
  }
}
