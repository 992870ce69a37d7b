package org.fallwright.core.zones;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import com.fasterxml.jackson.databind.JsonNode;
import com.fasterxml.jackson.databind.ObjectMapper;
import java.io.IOException;
import java.io.InputStream;
import java.util.ArrayList;
import java.util.List;
import java.util.stream.Stream;
import java.util.stream.StreamSupport;
import org.fallwright.core.site.Fix;
import org.fallwright.core.site.Place;
import org.fallwright.core.site.Position;
import org.fallwright.core.site.Shape;
import org.fallwright.core.site.Target;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;

/**
 * Footprints of invented trees against a second implementation that sweeps by turning copies; the
 * tolerances are those of its polygons: 0.5 % of an area, 0.03 m of a distance, 1 % or 0.1 m² of an
 * overlap.
 */
class FallFootprintReferenceTest {
  static Stream<JsonNode> cases() throws IOException {
    try (InputStream in =
        FallFootprintReferenceTest.class.getResourceAsStream(
            "/org/fallwright/core/cases/zones.json")) {
      JsonNode all = new ObjectMapper().readTree(in);
      assertThat(all.size()).isEqualTo(16);
      return StreamSupport.stream(all.spliterator(), false);
    }
  }

  @ParameterizedTest
  @MethodSource("cases")
  void agreesWithTheOtherImplementation(JsonNode c) {
    JsonNode in = c.get("inputs");
    JsonNode out = c.get("expected");
    String name = c.get("name").asText();
    FallOutline tree =
        new FallOutline(
            in.get("height_m").asDouble(),
            in.get("crown_base_m").asDouble(),
            in.get("crown_radius_m").asDouble(),
            in.get("stump_diameter_m").asDouble(),
            in.get("lean_deg").asDouble(),
            in.get("lean_azimuth_deg").asDouble());
    FallFootprint footprint =
        FallFootprint.of(
            tree,
            new Position(0, 0),
            in.get("lay_deg").asDouble(),
            in.get("steer_share").asDouble(),
            0);
    assertThat(footprint.halfAngleDeg())
        .as(name)
        .isCloseTo(out.get("half_angle_deg").asDouble(), within(1e-9));
    assertThat(footprint.lengthM())
        .as(name)
        .isCloseTo(out.get("length_m").asDouble(), within(1e-4));
    double area = out.get("area_m2").asDouble();
    assertThat(footprint.geometry().getArea()).as(name).isCloseTo(area, within(0.005 * area));

    List<Target> targets = new ArrayList<>();
    for (JsonNode t : in.get("targets")) {
      List<Position> p = new ArrayList<>();
      t.forEach(q -> p.add(new Position(q.get(0).asDouble(), q.get(1).asDouble())));
      targets.add(Things.target("t" + targets.size(), new Shape.Polygon(p), 1));
    }
    List<TargetClearance> found =
        new LayTargets(targets, new Place(new Position(0, 0), 0, Fix.TAPES, null))
            .clearances(footprint);
    for (int i = 0; i < found.size(); i++) {
      JsonNode e = out.get("targets").get(i);
      String what = name + " target " + i;
      assertThat(Math.max(0, found.get(i).clearanceM()))
          .as(what)
          .isCloseTo(e.get("distance_m").asDouble(), within(0.03));
      double overlap = e.get("overlap_m2").asDouble();
      assertThat(found.get(i).overlapAmount())
          .as(what)
          .isCloseTo(overlap, within(Math.max(0.1, 0.01 * overlap)));
    }
  }
}
