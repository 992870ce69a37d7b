package org.fallwright.core.anchor;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import com.fasterxml.jackson.databind.JsonNode;
import com.fasterxml.jackson.databind.ObjectMapper;
import java.io.IOException;
import java.util.ArrayList;
import java.util.List;
import org.fallwright.core.tree.StemVolume;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;

/** Tree anchors against figures that a separately written model gave; agreement to 1e-6. */
class AnchorCasesTest {
  static List<JsonNode> cases() throws IOException {
    JsonNode all =
        new ObjectMapper()
            .readTree(
                AnchorCasesTest.class.getResourceAsStream(
                    "/org/fallwright/core/cases/sources.json"));
    List<JsonNode> trees = new ArrayList<>();
    for (JsonNode one : all) {
      if (one.get("kind").asText().equals("tree_anchor")) {
        trees.add(one);
      }
    }
    assertThat(trees).hasSize(8);
    return trees;
  }

  @ParameterizedTest
  @MethodSource("cases")
  void agrees(JsonNode one) {
    JsonNode in = one.get("inputs");
    JsonNode expected = one.get("expected");
    double mass = in.get("stem_mass").asDouble();
    double dbh = in.get("dbh").asDouble();
    // the height at which the volume equation gives the case's stem mass at 1,000 kg/m³
    double height = 20 * Math.pow(mass / 1000 / StemVolume.PINE.volumeM3(dbh, 20), 1 / 1.079539);
    WoodFigures wood =
        new WoodFigures(
            in.get("mor").asDouble(),
            in.get("mor_cv").asDouble(),
            1000,
            in.get("c").asDouble(),
            StemVolume.PINE);
    boolean downhill = in.get("downhill").asBoolean();
    WoodAnchor holds =
        WoodAnchor.of(
            mass, wood, dbh, in.get("sling").asDouble(), in.get("saturated").asBoolean(), downhill);
    near(holds.rootPlateN(), expected.get("root_plate_N").asDouble());
    near(holds.stemN(), expected.get("stem_N").asDouble());

    Capacity capacity =
        AnchorCapacity.of(
            Anchors.sound(dbh, height, in.get("sling").asDouble(), in.get("saturated").asBoolean()),
            new AnchorLoad(in.get("uplift_deg").asDouble(), downhill),
            Anchors.figures(wood, 0));
    assertThat(capacity.refused()).isEqualTo(expected.get("refused").asBoolean());
    near(capacity.strengthN() / capacity.designFactor(), expected.get("allowed_N").asDouble());
  }

  private static void near(double actual, double expected) {
    // the cases are printed with nine figures
    assertThat(actual).isCloseTo(expected, within(1e-6 * Math.abs(expected) + 1e-9));
  }
}
