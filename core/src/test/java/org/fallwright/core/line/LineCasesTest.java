package org.fallwright.core.line;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import com.fasterxml.jackson.databind.JsonNode;
import com.fasterxml.jackson.databind.ObjectMapper;
import java.io.IOException;
import java.util.ArrayList;
import java.util.List;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;

/** Line paths against figures that a separately written model gave; agreement to 1e-6. */
class LineCasesTest {
  static List<JsonNode> cases() throws IOException {
    JsonNode all =
        new ObjectMapper()
            .readTree(
                LineCasesTest.class.getResourceAsStream("/org/fallwright/core/cases/statics.json"));
    List<JsonNode> withLine = new ArrayList<>();
    for (JsonNode one : all) {
      if (one.get("expected").has("length_m")) {
        withLine.add(one);
      }
    }
    assertThat(withLine).hasSizeGreaterThan(30);
    return withLine;
  }

  @ParameterizedTest
  @MethodSource("cases")
  void agrees(JsonNode one) {
    JsonNode in = one.get("inputs");
    JsonNode expected = one.get("expected");
    double height = in.get("attach_height_m").asDouble();
    double aside = height * Math.tan(Math.toRadians(in.get("lean_deg").asDouble()));
    double azimuth = Math.toRadians(in.get("lean_azimuth_deg").asDouble());
    List<Point3> points = new ArrayList<>();
    points.add(new Point3(aside * Math.sin(azimuth), aside * Math.cos(azimuth), height));
    for (JsonNode p : in.get("points")) {
      points.add(new Point3(p.get(0).asDouble(), p.get(1).asDouble(), p.get(2).asDouble()));
    }
    List<Double> k = new ArrayList<>();
    in.get("block_k").forEach(v -> k.add(v.asDouble()));

    LegLoads loads = LegLoads.of(points, k);

    near(loads.lengthM(), expected.get("length_m").asDouble());
    near(loads.lineRiseDeg(), expected.get("line_rise_deg").asDouble());
    near(loads.sourceEndPerTree(), expected.get("source_end_per_tree").asDouble());
    JsonNode blocks = expected.get("blocks");
    assertThat(loads.blocks()).hasSize(blocks.size());
    for (int i = 0; i < blocks.size(); i++) {
      LegLoads.Block block = loads.blocks().get(i);
      near(block.interiorDeg(), blocks.get(i).get("interior_deg").asDouble());
      near(block.hauling(), blocks.get(i).get("hauling").asDouble());
      near(block.holding(), blocks.get(i).get("holding").asDouble());
    }
  }

  private static void near(double actual, double expected) {
    assertThat(actual).isCloseTo(expected, within(1e-6 * Math.abs(expected) + 1e-9));
  }
}
