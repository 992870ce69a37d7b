package org.fallwright.core.plan;

import static org.assertj.core.api.Assertions.assertThat;

import com.fasterxml.jackson.databind.JsonNode;
import com.fasterxml.jackson.databind.json.JsonMapper;
import com.fasterxml.jackson.databind.node.ObjectNode;
import com.networknt.schema.InputFormat;
import com.networknt.schema.Schema;
import com.networknt.schema.SchemaRegistry;
import com.networknt.schema.SpecificationVersion;
import java.io.IOException;
import java.io.InputStream;
import java.nio.charset.StandardCharsets;
import java.util.List;
import java.util.Map;
import org.fallwright.core.site.Conditions;
import org.fallwright.core.site.CutPlan;
import org.fallwright.core.site.Fix;
import org.fallwright.core.site.Gear;
import org.fallwright.core.site.How;
import org.fallwright.core.site.Offer;
import org.fallwright.core.site.Origin;
import org.fallwright.core.site.Place;
import org.fallwright.core.site.Position;
import org.fallwright.core.site.Quantity;
import org.fallwright.core.site.Site;
import org.fallwright.core.site.SubjectTree;
import org.junit.jupiter.api.Test;

class PlanJsonTest {
  private static final PlanJson.Header HEADER =
      new PlanJson.Header("9.9.9", List.of("A person decides."), List.of("The weather."));

  private final JsonNode doc = read(PlanJson.write(site(), plan(), HEADER));

  @Test
  void theDocumentSaysWhatItIs() {
    assertThat(doc.path("format").asText()).isEqualTo("fallwright-plan");
    assertThat(doc.path("version").asInt()).isEqualTo(1);
    assertThat(doc.path("units").asText()).isEqualTo("SI");
    assertThat(doc.path("program").asText()).isEqualTo("9.9.9");
    assertThat(doc.path("site").asText()).isEqualTo("Ash by the barn");
    assertThat(doc.path("rule_set").asText()).isEqualTo("US-OSHA");
    assertThat(doc.path("cautions").get(0).asText()).isEqualTo("A person decides.");
  }

  @Test
  void setupsStandInOrderOfRank() {
    assertThat(doc.path("setups")).hasSize(2);
    assertThat(doc.at("/setups/0/rank").asInt()).isEqualTo(1);
    assertThat(doc.at("/setups/1/rank").asInt()).isEqualTo(2);
    assertThat(doc.at("/setups/1/verdict").asText()).isEqualTo("tight");
    assertThat(doc.at("/best_rejected/anchor/rank").isNull()).isTrue();
    assertThat(doc.at("/by_binding_check/anchor").asInt()).isEqualTo(7);
    assertThat(doc.at("/by_verdict/not workable").asInt()).isEqualTo(8);
    assertThat(doc.at("/by_verdict/cannot judge yet").asInt()).isZero();
  }

  @Test
  void figuresAreInTheUnitOfTheirName() {
    JsonNode first = doc.at("/setups/0");
    assertThat(first.path("pull_needed_N").asDouble()).isEqualTo(4731.25);
    assertThat(first.path("hinge_thickness_m").asDouble()).isEqualTo(0.045);
    assertThat(first.path("blocks").get(0).asText()).isEqualTo("A1");
    assertThat(first.at("/driver/source_at").asText()).isEqualTo("V1");
    assertThat(first.at("/weakest/check").asText()).isEqualTo("pull");
    assertThat(first.at("/path/1/at/1").asDouble()).isEqualTo(53);
    assertThat(first.at("/checks/0/place/0").asDouble()).isEqualTo(17.5);
  }

  @Test
  void whatIsInfiniteOrCannotBeSaidIsNull() {
    assertThat(doc.at("/setups/1/pull_margin").isNull()).isTrue();
    assertThat(doc.at("/setups/1/clearance_m").isNull()).isTrue();
    assertThat(doc.at("/setups/1/stop_reading_N").isNull()).isTrue();
    assertThat(new String(PlanJson.write(site(), plan(), HEADER), StandardCharsets.UTF_8))
        .doesNotContain("NaN")
        .doesNotContain("Infinity");
  }

  @Test
  void numbersAreWrittenPlainlyWithNineDigits() {
    assertThat(new String(PlanJson.write(site(), plan(), HEADER), StandardCharsets.UTF_8))
        .contains("\"lever_m\" : 9.87654321,")
        .contains("\"ceiling_N\" : 15700000,");
  }

  @Test
  void theSamePlanGivesTheSameBytes() {
    assertThat(PlanJson.write(site(), plan(), HEADER))
        .isEqualTo(PlanJson.write(site(), plan(), HEADER));
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
    future.put("version", 2);
    assertThat(schema().validate(future.toString(), InputFormat.JSON)).hasSize(1);
  }

  @Test
  void whatIsSaidOfTheMethodStandsInTheHead() throws IOException {
    assertThat(doc.path("not_by_pulling").isNull()).isTrue();
    PlanJson.Header header =
        new PlanJson.Header("9.9.9", List.of(), List.of(), "Pulling is not the method here.");
    JsonNode told = read(PlanJson.write(site(), plan(), header));
    assertThat(told.path("not_by_pulling").asText()).isEqualTo("Pulling is not the method here.");
    assertThat(schema().validate(told.toString(), InputFormat.JSON)).isEmpty();
  }

  private static Schema schema() throws IOException {
    try (InputStream in = PlanJson.class.getResourceAsStream("plan-1.schema.json")) {
      return SchemaRegistry.withDefaultDialect(SpecificationVersion.DRAFT_2020_12)
          .getSchema(new String(in.readAllBytes(), StandardCharsets.UTF_8), InputFormat.JSON);
    }
  }

  private static JsonNode read(byte[] bytes) {
    try {
      return JsonMapper.builder().build().readTree(bytes);
    } catch (IOException e) {
      throw new AssertionError(e);
    }
  }

  private static Plan plan() {
    Judged good = judged(Verdict.WORKABLE, 1.46, 1.12, 12_300);
    Judged tight = judged(Verdict.TIGHT, Double.POSITIVE_INFINITY, Double.NaN, Double.NaN);
    Judged bad = judged(Verdict.NOT_WORKABLE, 0.2, -3.1, 900);
    return new Plan(
        List.of(good, tight),
        10,
        Map.of(Verdict.WORKABLE, 1, Verdict.TIGHT, 1, Verdict.NOT_WORKABLE, 8),
        Map.of("pull", 1, "anchor", 7),
        Map.of("anchor", bad, "pull", bad),
        List.of("One source has no plugin."));
  }

  private static Judged judged(Verdict v, double margin, double clearance, double stop) {
    Check pull = new Check("pull", 9310, 6360, "N", margin, v, new Position(17.5, 53), "why");
    Figures f =
        new Figures(
            4731.25,
            6360,
            5050,
            6360,
            2.97,
            12.5,
            "stops",
            9590,
            9310,
            17_600,
            15_700_000,
            "stem",
            margin,
            clearance,
            null,
            8.96,
            12.1,
            2.86,
            1.8,
            2.86,
            16.7,
            9.876543210987,
            0.143,
            0.01,
            0.071,
            56,
            false,
            stop,
            "",
            1.05,
            false);
    return new Judged(
        new Setup(
            3,
            10.5,
            0.045,
            "L1",
            List.of("A1"),
            "tackle",
            "3:1",
            "A3",
            new Setup.Driver("pick-up", "4WD", "V1")),
        v,
        pull,
        1,
        List.of(),
        0,
        v.word(),
        f,
        List.of(pull, new Check("wires", Double.NaN, 3.05, "m", Double.NaN, v, null, "unknown")),
        List.of(new PartLoad("line", 6360, 17_600, 108_000, 5, 1.5)),
        List.of(
            new LinePoint(new Position(16, 24), 10.5, LinePoint.Role.ATTACHMENT, "T1"),
            new LinePoint(new Position(17.5, 53), 1.5, LinePoint.Role.REDIRECT, "A1")),
        List.of(),
        null,
        List.of());
  }

  private static Site site() {
    Place stump = new Place(new Position(16, 24), 0, Fix.TAPES, null);
    return new Site(
        1,
        "Ash by the barn",
        new Origin(45, -40),
        Site.Display.METRIC,
        "US-OSHA",
        null,
        null,
        new SubjectTree(
            "T1",
            "quercus-rubra",
            stump,
            Quantity.measured(0.52),
            null,
            List.of(),
            Quantity.measured(17.5),
            6,
            4.5,
            Quantity.measured(5),
            Quantity.measured(188),
            null,
            null,
            null,
            null,
            null,
            null,
            null,
            null,
            false,
            true,
            false),
        new CutPlan(0.3, 0.25, 70, List.of(0.045), How.MEASURED, null, 0.01, false),
        List.of(),
        List.of(),
        List.of(),
        List.of(),
        List.of(),
        List.of(),
        new Gear(List.of(), List.of(), List.of(), List.of(), null, List.of()),
        new Conditions(Quantity.estimated(4), null, null, null),
        new Offer(List.of(10.5), How.MEASURED, 5, List.of(), 1));
  }
}
