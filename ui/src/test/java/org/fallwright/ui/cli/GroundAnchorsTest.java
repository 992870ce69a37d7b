package org.fallwright.ui.cli;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import com.fasterxml.jackson.databind.JsonNode;
import com.fasterxml.jackson.databind.ObjectMapper;
import com.fasterxml.jackson.databind.node.ArrayNode;
import com.fasterxml.jackson.databind.node.ObjectNode;
import java.io.IOException;
import java.io.PrintWriter;
import java.io.StringWriter;
import java.nio.file.Path;
import java.util.List;
import org.fallwright.core.plan.Verdict;
import org.fallwright.core.store.SiteFile;
import org.fallwright.ui.demo.DemoSite;
import org.fallwright.ui.home.Home;
import org.junit.jupiter.api.BeforeAll;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

/**
 * An invented site planned by the command line: the demo's oak in an open field, and a hand winch
 * north of it on pickets, on a buried log and on two legs.
 */
class GroundAnchorsTest {
  @TempDir private static Path folder;
  private static Path site;
  private static JsonNode plan;

  @BeforeAll
  static void planIt() throws IOException {
    site = folder.resolve("field.fallsite.json");
    SiteFile.write(DemoSite.asItIs().with(GroundAnchorsTest::field).site(), site);
    Path out = folder.resolve("plan.json");
    run("plan", site.toString(), "--json", out.toString());
    plan = new ObjectMapper().readTree(out.toFile());
  }

  private static void field(ObjectNode s) {
    for (String list : new String[] {"targets", "wires", "drop_zones", "spots", "anchors"}) {
      ((ArrayNode) s.get(list)).removeAll();
    }
    for (JsonNode l : s.get("looked")) {
      ((ObjectNode) l).put("found", "none").put("by", "A");
    }
    anchor(s, "pickets", "P1", 16, 75, 0.1)
        .put("holdfast", "three-two-one")
        .put("count", 1)
        .put("soil", "undisturbed-loam")
        .put("wet", false);
    anchor(s, "deadman", "D1", 16, 76, 0.1)
        .put("depth_m", 1.6)
        .put("face_height_m", 0.45)
        .put("length_m", 1.8)
        .put("line_run", 4)
        .put("soil", "loam");
    anchor(s, "two-legs", "B1", 16, 74, 0.5).put("first", "R1").put("second", "R2");
    for (int side : new int[] {-1, 1}) {
      anchor(s, "rated", side < 0 ? "R1" : "R2", 16 + 5 * side, 74 + 5 * Math.sqrt(3), 0.5)
          .put("breaking_load_N", side < 0 ? 60000.0 : 30000.0)
          .put("vouched_by", "the owner");
    }
    ArrayNode sources = (ArrayNode) s.at("/gear/sources");
    ObjectNode winch = DemoSite.entry(sources, "hand-winch");
    winch.putArray("places").add("P1").add("D1").add("B1");
    sources.removeAll().add(winch);
    ((ObjectNode) s.get("offer")).put("lay_step_deg", 90.0).put("redirects", 0);
    DemoSite.entry(s.at("/gear/slings"), "Slings").put("count", 3);
  }

  private static ObjectNode anchor(
      ObjectNode s, String type, String id, double e, double n, double sling) {
    ObjectNode a = ((ArrayNode) s.get("anchors")).addObject().put("type", type).put("id", id);
    ObjectNode place = a.putObject("place");
    place.putArray("at").add(e).add(n);
    place.put("ground_m", 0.0).put("fix", "survey").putNull("stated_error_m");
    return a.put("sling_height_m", sling).putNull("rejected").put("land", "owner");
  }

  private static String run(String... args) {
    StringWriter out = new StringWriter();
    StringWriter err = new StringWriter();
    int status =
        Fallwright.run(Home.found(), p -> {}, args, new PrintWriter(out), new PrintWriter(err));
    assertThat(err.toString()).isEmpty();
    return out.toString();
  }

  /** The best setup with the winch at a place, workable or rejected. */
  private static JsonNode setup(String place) {
    for (String list : new String[] {"setups", "best_rejected"}) {
      for (JsonNode j : plan.get(list)) {
        if (j.get("source_at").asText().equals(place)) {
          return j;
        }
      }
    }
    throw new AssertionError(place + " is in no list");
  }

  private static JsonNode named(JsonNode list, String field, String name) {
    for (JsonNode n : list) {
      if (n.get(field).asText().equals(name)) {
        return n;
      }
    }
    throw new AssertionError(name + " is not in " + list);
  }

  private static JsonNode check(String place, String id) {
    return named(setup(place).get("checks"), "id", id);
  }

  private static JsonNode load(String place, String part) {
    return named(setup(place).get("loads"), "part", part);
  }

  /**
   * Three, two, one in loam: 4,000 lbf = 17,793 N in all. A third, 5,931 N, is allowed as planned
   * and 6.1 kN are planned; half, 8,896 N, if the winch stalls, which then pulls 14.7 kN × 1.2 =
   * 17.64.
   */
  @Test
  void picketsAreTooWeakAsPlannedAndByFarIfTheWinchStalls() {
    double plan = setup("P1").get("pull_plan_N").asDouble();
    assertThat(plan).isBetween(6000.0, 6200.0);
    assertThat(load("P1", "anchor P1").get("strength_N").asDouble()).isCloseTo(17_793, within(1.0));
    JsonNode planned = check("P1", "anchor P1 at plan");
    assertThat(planned.get("ratio").asDouble()).isCloseTo(5931 / plan, within(1e-3));
    assertThat(planned.get("verdict").asText()).isEqualTo(Verdict.NOT_WORKABLE.word());
    JsonNode stalled = check("P1", "anchor P1 at high");
    assertThat(stalled.get("ratio").asDouble()).isCloseTo(8896.4 / 17_640, within(1e-4));
    assertThat(stalled.get("why").asText())
        .isEqualTo(
            "Anchor P1 bears 3,970 lbf (17.7 kN) if the source stalls, slips or jerks; 2,000 lbf"
                + " (8.89 kN) are the most.");
    assertThat(setup("P1").get("verdict").asText()).isEqualTo(Verdict.NOT_WORKABLE.word());
  }

  /**
   * 1.6 m deep counts as 5 ft; the line rises 10.4 m on 53 m, flatter than 1 in 4: 4,100 lbf/ft².
   * 0.45 m = 1.4764 ft of face, 1.8 m = 5.9055 ft less 1 ft of trench: 4,100 × 1.4764 × 4.9055 =
   * 29,694 lbf = 132.08 kN. A third, 44.03 kN, as planned.
   */
  @Test
  void aBuriedLogHolds() {
    assertThat(load("D1", "anchor D1").get("strength_N").asDouble())
        .isCloseTo(132_085, within(5.0));
    JsonNode planned = check("D1", "anchor D1 at plan");
    assertThat(planned.get("value").asDouble()).isCloseTo(44_028, within(5.0));
    assertThat(planned.get("verdict").asText()).isEqualTo(Verdict.WORKABLE.word());
    assertThat(check("D1", "usable D1").get("why").asText())
        .isEqualTo("D1 may be used: the ground before the buried log gives way.");
    assertThat(setup("D1").get("verdict").asText()).isEqualTo(Verdict.WORKABLE.word());
  }

  /**
   * Legs 10 m long, 30° to either side of north. The line's end on the tree is 0.124 m west of the
   * point where they meet and 51.857 m off: 0.137° to the west. R1, the western anchor, bears
   * sin(30° − 0.137°)/sin 60° = 0.57496 of the pull, R2 sin(30.137°)/sin 60° = 0.57974; R2 holds 30
   * kN, a half of it if the winch stalls: 15 kN against 0.57974 × 17.64 = 10.23 kN.
   */
  @Test
  void twoLegsShareTheLoadByTheirAngles() {
    double plan = setup("B1").get("pull_plan_N").asDouble();
    assertThat(load("B1", "anchor R1").get("at_plan_N").asDouble() / plan)
        .isCloseTo(0.57496, within(2e-5));
    assertThat(load("B1", "anchor R2").get("at_plan_N").asDouble() / plan)
        .isCloseTo(0.57974, within(2e-5));
    assertThat(check("B1", "anchor R2 at high").get("ratio").asDouble())
        .isCloseTo(15 / 10.2267, within(1e-3));
    assertThat(setup("B1").get("verdict").asText()).isEqualTo(Verdict.WORKABLE.word());
  }

  @Test
  void theWorksheetsNameWhatEachAnchorHolds() {
    String all = "";
    for (String n : List.of("1", "2", "3")) {
      all += run("worksheet", site.toString(), "--setup", n);
    }
    assertThat(all)
        .contains("Its legs share its load by the angles between them; R1 and R2 bear their own.")
        .contains("| strength: breaking load vouched for by the owner |")
        .contains("`P_a1 × f_a1 × (l_a1 − 1)` | `4100 × 1.47638 × (5.90551 − 1)`")
        .contains(
            "| strength: its table's figure taken as all it holds |  |  | `4000` | lbf | published: navy-14251")
        .doesNotContain("| `0` | lbf |");
  }
}
