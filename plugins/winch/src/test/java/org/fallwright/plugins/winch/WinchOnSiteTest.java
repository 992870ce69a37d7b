package org.fallwright.plugins.winch;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import com.fasterxml.jackson.databind.ObjectMapper;
import com.fasterxml.jackson.databind.node.ArrayNode;
import com.fasterxml.jackson.databind.node.ObjectNode;
import java.io.ByteArrayInputStream;
import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Path;
import java.util.List;
import org.fallwright.core.plan.Check;
import org.fallwright.core.plan.Judge;
import org.fallwright.core.plan.Judged;
import org.fallwright.core.plan.Setup;
import org.fallwright.core.plan.Verdict;
import org.fallwright.core.site.Site;
import org.fallwright.core.store.SiteFile;
import org.fallwright.core.store.SiteFileException;
import org.junit.jupiter.api.Test;

/** The winch where the planner asks it: on the demo site, pulling from the driveway at V1. */
class WinchOnSiteTest {
  private static final Path DEMO =
      Path.of("..", "..", "ui", "demo", "oak-behind-the-house.fallsite.json");

  private static final String MACHINE =
      """
      {"kind": "powered-drum", "rated_N": 12000, "wire_m": 60, "drum_m": 0.16, "rope_m": 0.01,
       "layer": 4, "line_speed_mps": 0.1, "line_height_m": 0.6, "machine_kg": %s}""";

  private static final String CAPSTAN =
      """
      {"kind": "capstan", "rated_N": 10000, "line_speed_mps": 0.2, "contact": "wire-dry",
       "turns": 6, "tail_N": 100%s}""";

  @Test
  void aHeavyMachineHoldsItsWinchOnGravel() throws Exception {
    Judged heavy = judge(MACHINE.formatted(6000), "V1");
    assertThat(check(heavy, "pull").value())
        .as("rated 12 kN on layer 4")
        .isCloseTo(12_000 * 85 / 115.0, within(1e-6));
    assertThat(check(heavy, "pull").verdict()).isEqualTo(Verdict.WORKABLE);
  }

  @Test
  void aLightMachineSlides() throws Exception {
    Judged light = judge(MACHINE.formatted(1500), "V1");
    assertThat(check(light, "pull").value()).isLessThan(1500 * 9.80665 * 0.35);
    assertThat(check(light, "pull").why()).contains("machine slides on its locked wheels");
    assertThat(check(light, "pull").verdict()).isEqualTo(Verdict.NOT_WORKABLE);
  }

  @Test
  void aCapstanCannotHoldTheTreeUnlessAGrabDoes() throws Exception {
    Judged by = judge(CAPSTAN.formatted(""), "A1");
    assertThat(check(by, "hold stability").ratio()).isLessThan(1);
    assertThat(check(by, "hold stability").why()).contains("constant force");
    Judged grab = judge(CAPSTAN.formatted(", \"grab_N\": 12000, \"grab_factor\": 4"), "A1");
    assertThat(check(grab, "hold stability").ratio()).isGreaterThan(1);
  }

  private static Judged judge(String parameters, String place) throws Exception {
    ObjectNode site = (ObjectNode) new ObjectMapper().readTree(DEMO.toFile());
    ObjectNode source = new ObjectMapper().createObjectNode();
    source.put("id", "tested").put("plugin", "winch").putArray("places").add(place);
    source.putArray("drivers");
    source.putArray("driver_places");
    source.set("parameters", new ObjectMapper().readTree(parameters));
    ((ArrayNode) site.at("/gear/sources")).removeAll().add(source);
    return new Judge(read(site), () -> List.of(new Winch()))
        .judge(new Setup(5, 10.5, 0.045, "L1", List.of(), "tested", "pull", place, null));
  }

  private static Site read(ObjectNode site) throws SiteFileException, IOException {
    return SiteFile.read(
        new ByteArrayInputStream(site.toString().getBytes(StandardCharsets.UTF_8)), "demo");
  }

  private static Check check(Judged judged, String id) {
    return judged.checks().stream().filter(c -> c.id().equals(id)).findFirst().orElseThrow();
  }
}
