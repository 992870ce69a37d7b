package org.fallwright.plugins.blocksystem;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import com.fasterxml.jackson.databind.ObjectMapper;
import com.fasterxml.jackson.databind.node.ArrayNode;
import com.fasterxml.jackson.databind.node.ObjectNode;
import java.io.ByteArrayInputStream;
import java.nio.charset.StandardCharsets;
import java.nio.file.Path;
import java.util.List;
import java.util.Set;
import org.fallwright.core.plan.Check;
import org.fallwright.core.plan.Judge;
import org.fallwright.core.plan.Judged;
import org.fallwright.core.plan.Setup;
import org.fallwright.core.pull.PullOffer;
import org.fallwright.core.pull.PullRequest;
import org.fallwright.core.pull.PullSource;
import org.fallwright.core.pull.SourceDescription;
import org.fallwright.core.pull.Wording;
import org.fallwright.core.store.SiteFile;
import org.junit.jupiter.api.Test;

/** A compound where the planner asks it: on the demo site at A1, hauled from the meadow. */
class CompoundOnSiteTest {
  private static final Path DEMO =
      Path.of("..", "..", "ui", "demo", "oak-behind-the-house.fallsite.json");

  /** Somebody who pulls 1.5 kN, 2 kN at the most, and holds by that force alone. */
  private static final class Puller implements PullSource {
    @Override
    public SourceDescription describe() {
      return new SourceDescription(
          "puller",
          new Wording("puller", "quien jala"),
          Set.of(SourceDescription.PlaceKind.SPOT),
          false,
          List.of());
    }

    @Override
    public List<String> modes(ObjectNode parameters) {
      return List.of("pull");
    }

    @Override
    public PullOffer offer(PullRequest request) {
      Wording told = new Wording("As told.", "Como se dijo.");
      return PullOffer.giving(1500, 2000, new PullOffer.Limit(told, told))
          .holds(1500, false)
          .done();
    }
  }

  @Test
  void pullsByItsProductAndHoldsByItsGrab() throws Exception {
    double first = 1 + 0.92 + 0.92 * 0.92;
    Judged free = judge("");
    assertThat(check(free, "pull").value()).isCloseTo(1500 * first * 0.92 * 1.92, within(1e-6));
    assertThat(check(free, "hold stability").why()).contains("constant force");
    Judged held =
        judge(", \"capture_N\": 12000, \"capture_factor\": 3, \"capture_at\": \"pull-line\"");
    assertThat(check(held, "hold stability").ratio())
        .isGreaterThan(check(free, "hold stability").ratio())
        .isGreaterThan(1);
    assertThat(check(held, "first-tackle-line").ratio()).isGreaterThan(1);
  }

  /** The whole system hangs softer in the path than a simple one of as many parts. */
  @Test
  void holdsLessStiffThanASimpleSystemOfAsManyParts() throws Exception {
    String grab = ", \"capture_N\": 12000, \"capture_factor\": 3, \"capture_at\": \"pull-line\"";
    double compound = check(judge(grab, "3x2"), "hold stability").value();
    double simple = check(judge(grab, "6"), "hold stability").value();
    assertThat(compound).isLessThan(simple);
  }

  private static Judged judge(String capture) throws Exception {
    return judge(capture, "3x2");
  }

  private static Judged judge(String capture, String mode) throws Exception {
    ObjectMapper json = new ObjectMapper();
    ObjectNode site = (ObjectNode) json.readTree(DEMO.toFile());
    ArrayNode sources = (ArrayNode) site.at("/gear/sources");
    sources.removeAll();
    sources.add(
        json.readTree(
            """
            {"id": "blocks", "plugin": "block-system", "places": ["A1"], "drivers": ["puller"],
             "driver_places": ["HC"], "parameters": {"parts": ["6", "3x2"], "form": "fixed",
             "efficiency": 0.92, "block_rated_N": 30000, "block_factor": 4,
             "line_breaking_N": 55000, "line_termination": 0.9, "line_stiffness_N": 220000,
             "line_length_m": 40, "second_line_length_m": 60%s}}"""
                .formatted(capture)));
    sources.add(
        json.readTree(
            """
            {"id": "puller", "plugin": "puller", "places": ["HC"], "drivers": [],
             "driver_places": [], "parameters": {}}"""));
    byte[] bytes = site.toString().getBytes(StandardCharsets.UTF_8);
    return new Judge(
            SiteFile.read(new ByteArrayInputStream(bytes), "demo"),
            () -> List.of(new BlockSystem(), new Puller()))
        .judge(
            new Setup(
                3,
                10.5,
                0.045,
                "L1",
                List.of(),
                "blocks",
                mode,
                "A1",
                new Setup.Driver("puller", "pull", "HC")));
  }

  private static Check check(Judged judged, String id) {
    return judged.checks().stream().filter(c -> c.id().equals(id)).findFirst().orElseThrow();
  }
}
