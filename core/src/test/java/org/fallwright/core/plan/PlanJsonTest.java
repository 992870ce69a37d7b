package org.fallwright.core.plan;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.withinPercentage;

import com.fasterxml.jackson.databind.JsonNode;
import com.fasterxml.jackson.databind.json.JsonMapper;
import com.fasterxml.jackson.databind.node.ObjectNode;
import com.networknt.schema.InputFormat;
import com.networknt.schema.Schema;
import com.networknt.schema.SchemaRegistry;
import com.networknt.schema.SpecificationVersion;
import java.io.IOException;
import java.io.InputStream;
import java.math.BigDecimal;
import java.nio.charset.StandardCharsets;
import java.util.List;
import java.util.Set;
import java.util.regex.Pattern;
import org.fallwright.core.pull.HaulLine;
import org.fallwright.core.pull.PullOffer;
import org.fallwright.core.pull.PullRequest;
import org.fallwright.core.pull.PullSource;
import org.fallwright.core.pull.SourceDescription;
import org.fallwright.core.pull.Wording;
import org.fallwright.core.site.Site;
import org.junit.jupiter.api.BeforeAll;
import org.junit.jupiter.api.Test;

class PlanJsonTest {
  private static final PlanJson.Header HEADER =
      new PlanJson.Header("9.9.9", List.of("A person decides."), List.of("The weather."));

  private static Site site;
  private static Plan plan;
  private static byte[] bytes;
  private static JsonNode doc;

  @BeforeAll
  static void planned() {
    site = site(2_000, 3, 180);
    plan = plan(site);
    bytes = PlanJson.write(site, plan, HEADER);
    doc = read(bytes);
  }

  @Test
  void theDocumentSaysWhatItIs() {
    assertThat(doc.path("format").asText()).isEqualTo("fallwright-plan");
    assertThat(doc.path("version").asInt()).isEqualTo(2);
    assertThat(doc.path("units").asText()).isEqualTo("SI");
    assertThat(doc.path("program").asText()).isEqualTo("9.9.9");
    assertThat(doc.path("site").asText()).isEqualTo("Ash by the barn");
    assertThat(doc.path("rule_set").asText()).isEqualTo("US-OSHA");
    assertThat(doc.path("cautions").get(0).asText()).isEqualTo("A person decides.");
  }

  @Test
  void setupsStandInOrderOfRank() {
    assertThat(doc.path("setups")).hasSize(plan.ranked().size()).hasSize(4);
    for (int i = 0; i < 4; i++) {
      JsonNode setup = doc.path("setups").get(i);
      Judged j = plan.ranked().get(i);
      assertThat(setup.path("rank").asInt()).isEqualTo(i + 1);
      assertThat(setup.path("sentence").asText()).isEqualTo(j.sentence());
      assertThat(setup.path("verdict").asText()).isEqualTo(j.verdict().word());
      same(setup, "standing", j.standing());
    }
    assertThat(plan.bestRejected()).containsOnlyKeys("hinge turning", "lever", "pull", "steering");
    assertThat(doc.path("best_rejected")).hasSize(4);
    plan.bestRejected()
        .forEach(
            (id, j) -> {
              JsonNode setup = doc.path("best_rejected").path(id);
              assertThat(setup.path("rank").isNull()).isTrue();
              assertThat(setup.path("verdict").asText()).isEqualTo("not workable");
              assertThat(firstMissed(setup)).isEqualTo(id);
              assertThat(doc.path("by_binding_check").path(id).asInt())
                  .isEqualTo(plan.byBindingCheck().get(id))
                  .isPositive();
            });
    assertThat(doc.path("setups_judged").asInt()).isEqualTo(plan.judged());
    assertThat(doc.at("/by_verdict/not workable").asInt())
        .isEqualTo(plan.byVerdict().get(Verdict.NOT_WORKABLE))
        .isPositive();
    assertThat(doc.at("/by_verdict/cannot judge yet").asInt()).isZero();
    assertThat(doc.path("notes").get(0).asText()).contains("\"capstan\" is left out");
  }

  private static String firstMissed(JsonNode setup) {
    for (JsonNode check : setup.path("checks")) {
      if (check.path("verdict").asText().equals("not workable")) {
        return check.path("id").asText();
      }
    }
    return "";
  }

  @Test
  void figuresAreInTheUnitOfTheirName() {
    JsonNode first = doc.at("/setups/0");
    Figures f = plan.ranked().get(0).figures();
    same(first, "pull_needed_N", f.pullNeededN());
    same(first, "pull_plan_N", f.pullPlanN());
    same(first, "hold_tension_N", f.holdN());
    same(first, "working_tension_N", f.workingN());
    same(first, "rest_share", f.restShare());
    same(first, "hold_stability", f.holdStability());
    same(first, "pretension_top_N", f.pretensionTopN());
    same(first, "source_low_N", f.sourceLowN());
    same(first, "source_high_N", f.sourceHighN());
    same(first, "ceiling_N", f.ceilingN());
    same(first, "pull_margin", f.pullMargin());
    same(first, "commit_deg", f.commitDeg());
    same(first, "movement_end_deg", f.movementEndDeg());
    same(first, "take_up_m", f.takeUpM());
    same(first, "line_in_at_commit_m", f.lineInAtCommitM());
    same(first, "source_travel_m", f.sourceTravelM());
    same(first, "line_rise_deg", f.lineRiseDeg());
    same(first, "lever_m", f.leverM());
    same(first, "steering_share", f.steeringShare());
    same(first, "turn_share", f.turnShare());
    same(first, "gape_m", f.gapeM());
    same(first, "line_length_m", f.lineLengthM());
    same(first, "source_end_per_tree", f.sourceEndPerTree());
    assertThat(first.path("ceiling_part").asText()).isEqualTo("stem");
    assertThat(first.path("starts_itself").asText()).isEqualTo("stops");
    assertThat(first.path("hinge_thickness_m").asDouble()).isEqualTo(0.03);
    assertThat(first.at("/weakest/check").asText()).isEqualTo("stem at high");
    assertThat(first.at("/checks/0/place/1").asDouble()).isEqualTo(30);
  }

  @Test
  void whatIsSetUpIsNamedFromTheTreeOutwards() {
    JsonNode second = doc.at("/setups/1");
    assertThat(second.path("blocks").get(0).asText()).isEqualTo("R2");
    assertThat(second.path("source").asText()).isEqualTo("tackle");
    assertThat(second.path("source_mode").asText()).isEqualTo("2:1");
    assertThat(second.path("source_at").asText()).isEqualTo("R1");
    assertThat(second.at("/driver/source").asText()).isEqualTo("steady");
    assertThat(second.at("/driver/source_mode").asText()).isEqualTo("pull");
    assertThat(second.at("/driver/source_at").asText()).isEqualTo("R2");
    assertThat(second.path("path").findValuesAsText("role"))
        .containsExactly("attachment", "redirect", "block_system");
    assertThat(second.path("path").findValuesAsText("id")).containsExactly("T1", "R2", "R1");
    assertThat(second.at("/path/1/at/0").asDouble()).isEqualTo(6);
    assertThat(second.at("/path/1/at/1").asDouble()).isEqualTo(34);
    assertThat(second.path("haul_path").findValuesAsText("id")).containsExactly("R1", "R2");
    assertThat(doc.at("/setups/2/driver").isNull()).isTrue();
  }

  @Test
  void whatIsInfiniteOrCannotBeSaidIsNull() {
    JsonNode first = doc.at("/setups/0");
    Judged j = plan.ranked().get(0);
    assertThat(j.figures().clearanceM()).as("nothing stands there").isNaN();
    assertThat(first.path("clearance_m").isNull()).isTrue();
    assertThat(first.path("clearance_target").isNull()).isTrue();
    assertThat(j.figures().stopReadingN()).as("no load cell").isNaN();
    assertThat(first.path("stop_reading_N").isNull()).isTrue();
    assertThat(first.path("stop_reading_at").isNull()).isTrue();
    assertThat(j.checks().get(0).ratio()).isInfinite();
    assertThat(first.at("/checks/0/ratio").isNull()).isTrue();
    assertThat(text()).doesNotContain("NaN").doesNotContain("Infinity");
  }

  @Test
  void theMarginOfATreeThatNeedsNoPullIsNull() {
    Site easy = site(2_000, 30, 0);
    Plan found = plan(easy);
    assertThat(found.ranked().get(0).figures().pullMargin()).isInfinite();
    byte[] written = PlanJson.write(easy, found, HEADER);
    assertThat(read(written).at("/setups/0/pull_margin").isNull()).isTrue();
    assertThat(new String(written, StandardCharsets.UTF_8))
        .doesNotContain("NaN")
        .doesNotContain("Infinity");
  }

  @Test
  void numbersAreWrittenPlainlyWithNineDigits() {
    assertThat(text()).contains("\"strength_N\" : 8000000,").contains("\"strength_N\" : 120000,");
    List<String> numbers =
        Pattern.compile("(?m)(?:\" : |^ +)(-?[0-9][0-9.eE+-]*),?$")
            .matcher(text())
            .results()
            .map(r -> r.group(1))
            .toList();
    assertThat(numbers).hasSizeGreaterThan(500).allMatch(n -> n.matches("-?\\d+(\\.\\d+)?"));
    List<Integer> digits = numbers.stream().map(n -> new BigDecimal(n).precision()).toList();
    assertThat(digits).contains(9).allMatch(n -> n <= 9);
  }

  @Test
  void theSamePlanGivesTheSameBytes() {
    assertThat(PlanJson.write(site, plan(site), HEADER)).isEqualTo(bytes);
  }

  @Test
  void theDocumentKeepsToItsSchema() throws IOException {
    assertThat(schema().validate(doc.toString(), InputFormat.JSON)).isEmpty();
  }

  @Test
  void theSchemaRefusesWhatTheSpecificationDoesNotAllow() throws IOException {
    ObjectNode wrongVerdict = doc.deepCopy();
    ((ObjectNode) wrongVerdict.at("/setups/0")).put("verdict", "fine");
    assertThat(schema().validate(wrongVerdict.toString(), InputFormat.JSON)).hasSize(1);
    ObjectNode missing = doc.deepCopy();
    ((ObjectNode) missing.at("/setups/0")).remove("ceiling_N");
    assertThat(schema().validate(missing.toString(), InputFormat.JSON)).hasSize(1);
    ObjectNode future = doc.deepCopy();
    future.put("version", 3);
    assertThat(schema().validate(future.toString(), InputFormat.JSON)).hasSize(1);
  }

  @Test
  void whatIsSaidOfTheMethodStandsInTheHead() throws IOException {
    assertThat(doc.path("not_by_pulling").isNull()).isTrue();
    PlanJson.Header header =
        new PlanJson.Header(
            "9.9.9", List.of(), List.of(), "Pulling is not the method here.", List.of());
    JsonNode told = read(PlanJson.write(site, plan, header));
    assertThat(told.path("not_by_pulling").asText()).isEqualTo("Pulling is not the method here.");
    assertThat(schema().validate(told.toString(), InputFormat.JSON)).isEmpty();
  }

  private static Schema schema() throws IOException {
    try (InputStream in = PlanJson.class.getResourceAsStream("plan-2.schema.json")) {
      return SchemaRegistry.withDefaultDialect(SpecificationVersion.DRAFT_2020_12)
          .getSchema(new String(in.readAllBytes(), StandardCharsets.UTF_8), InputFormat.JSON);
    }
  }

  private static void same(JsonNode object, String name, double value) {
    assertThat(object.path(name).asDouble())
        .as(name)
        .isCloseTo(value, withinPercentage(1e-6))
        .isNotZero();
  }

  private static String text() {
    return new String(bytes, StandardCharsets.UTF_8);
  }

  private static JsonNode read(byte[] bytes) {
    try {
      return JsonMapper.builder().build().readTree(bytes);
    } catch (IOException e) {
      throw new AssertionError(e);
    }
  }

  /** A source that a driver hauls: it gives twice what the driver does. */
  private static final class Doubled implements PullSource {
    @Override
    public SourceDescription describe() {
      return new SourceDescription(
          "doubled",
          new Wording("Doubled pull", "tiro doble"),
          Set.of(SourceDescription.PlaceKind.ANCHOR),
          true,
          List.of());
    }

    @Override
    public List<String> modes(ObjectNode parameters) {
      return List.of("2:1");
    }

    @Override
    public HaulLine haulLine(ObjectNode parameters, String mode) {
      return new HaulLine(2, 220_000, 60);
    }

    @Override
    public PullOffer offer(PullRequest request) {
      PullOffer d = request.driver();
      return PullOffer.giving(2 * d.lowN(), 2 * d.highN(), d.limit())
          .holds(2 * d.holdN(), true)
          .travel(2, null)
          .overrun(0.05)
          .done();
    }
  }

  /**
   * Two rated points north of the tree: a source that is doubled at the first, its driver at the
   * second, the line direct or over the second.
   */
  private static Site site(double pullN, double leanDeg, double leanAzimuthDeg) {
    return TinySite.site(
        pullN,
        s -> {
          s.put("name", "Ash by the barn").put("display", "metric");
          ((ObjectNode) s.at("/tree/lean_deg")).put("value", leanDeg);
          ((ObjectNode) s.at("/tree/lean_azimuth_deg")).put("value", leanAzimuthDeg);
          TinySite.add(
              s,
              "anchors",
              """
              {"type": "rated", "id": "R2",
               "place": {"at": [6, 34], "ground_m": 0, "fix": "tapes", "stated_error_m": null},
               "sling_height_m": 1, "rejected": null, "land": null,
               "breaking_load_N": 8000000, "vouched_by": "A"}\
              """);
          ((ObjectNode) s.get("offer")).put("redirects", 1);
          ObjectNode gear = (ObjectNode) s.get("gear");
          gear.putNull("load_cell");
          ((ObjectNode) gear.at("/sources/0")).putArray("places").add("R2");
          TinySite.add(
              gear,
              "sources",
              """
              {"id": "tackle", "plugin": "doubled", "places": ["R1"], "drivers": ["steady"],
               "driver_places": ["R2"], "parameters": {}}\
              """);
          TinySite.add(
              gear,
              "sources",
              """
              {"id": "capstan", "plugin": "capstan", "places": ["R1"], "drivers": [],
               "driver_places": [], "parameters": {}}\
              """);
        });
  }

  private static Plan plan(Site site) {
    return new Planner(() -> List.of(new TinySite.Steady(), new Doubled())).plan(site);
  }
}
