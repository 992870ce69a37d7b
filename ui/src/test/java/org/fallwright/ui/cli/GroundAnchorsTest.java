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
import java.util.List;
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

  @Test
  void look() throws IOException {
    System.out.println(plan.toPrettyString().length());
    System.out.println(run("plan", site.toString()));
    for (String n : List.of("1", "2", "3")) {
      java.nio.file.Files.writeString(
          Path.of("/tmp/gw" + n + ".md"), run("worksheet", site.toString(), "--setup", n));
    }
    java.nio.file.Files.writeString(Path.of("/tmp/gplan.json"), plan.toPrettyString());
  }
}
