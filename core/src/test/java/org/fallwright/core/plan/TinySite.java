package org.fallwright.core.plan;

import com.fasterxml.jackson.databind.ObjectMapper;
import com.fasterxml.jackson.databind.node.ArrayNode;
import com.fasterxml.jackson.databind.node.ObjectNode;
import java.io.IOException;
import java.io.UncheckedIOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Path;
import java.util.List;
import java.util.Set;
import java.util.function.Consumer;
import org.fallwright.core.pull.Parameter;
import org.fallwright.core.pull.PullOffer;
import org.fallwright.core.pull.PullRequest;
import org.fallwright.core.pull.PullSource;
import org.fallwright.core.pull.PullSources;
import org.fallwright.core.pull.SourceDescription;
import org.fallwright.core.pull.Wording;
import org.fallwright.core.site.Site;
import org.fallwright.core.store.SiteFile;

/**
 * Sites small enough to be worked by hand: a tree of ten metres leaning three degrees to the south,
 * a rated point thirty metres north of it, and a source that gives what it is told to.
 */
final class TinySite {
  private static final Path DEMO =
      Path.of("..", "ui", "demo", "oak-behind-the-house.fallsite.json");

  private static final PullOffer.Limit AS_TOLD =
      new PullOffer.Limit(
          new Wording("as told", "como se dijo"),
          new Wording("It gives what it is told to.", "Da lo que se le dice."));
  private static ObjectNode demo;

  private TinySite() {}

  /** A source that gives a force by its parameter {@code pull_N}, holds it, and never more. */
  static class Steady implements PullSource {
    @Override
    public SourceDescription describe() {
      return new SourceDescription(
          "steady",
          new Wording("Steady pull", "tiro constante"),
          Set.of(SourceDescription.PlaceKind.ANCHOR, SourceDescription.PlaceKind.SPOT),
          false,
          List.of(
              Parameter.number(
                  "pull_N",
                  "N",
                  0,
                  1e6,
                  new Wording("Pull", "Tiro"),
                  new Wording("What it gives.", "Lo que da."))));
    }

    @Override
    public List<String> modes(ObjectNode parameters) {
      return List.of("pull");
    }

    @Override
    public PullOffer offer(PullRequest request) {
      double pull = request.parameters().get("pull_N").asDouble();
      return PullOffer.giving(pull, pull, AS_TOLD).holds(pull, true).overrun(0.05).done();
    }
  }

  static final PullSources SOURCES = () -> List.of(new Steady());

  static Site site(double pullN, Consumer<ObjectNode> change) {
    try {
      ObjectMapper mapper = new ObjectMapper();
      ObjectNode s = demo(mapper).deepCopy();
      ObjectNode tree = (ObjectNode) s.get("tree");
      ((ObjectNode) tree.get("stump")).set("at", mapper.readTree("[0, 0]"));
      number(tree, "dbh_m", 0.28);
      number(tree, "stump_diameter_m", 0.30);
      number(tree, "height_m", 10);
      number(tree, "lean_deg", 3);
      number(tree, "lean_azimuth_deg", 180);
      number(tree, "mass_kg", 500);
      number(tree, "mass_centre_m", 4);
      tree.set("diameters", mapper.createArrayNode());
      tree.put("crown_base_m", 3).put("crown_radius_m", 2).put("crown_area_m2", 10);
      ((ObjectNode) s.get("cut"))
          .put("height_m", 0.2)
          .put("hinge_width_m", 0.24)
          .set("hinge_thicknesses_m", mapper.readTree("[0.03]"));
      number((ObjectNode) s.get("conditions"), "gust_mps", 0);
      for (String list :
          new String[] {"targets", "wires", "drop_zones", "spots", "people_points", "strips"}) {
        s.set(list, mapper.createArrayNode());
      }
      s.set(
          "looked",
          mapper.readTree(
              """
              [{"what": "wires", "found": "none", "by": "A"},
               {"what": "people-indoors", "found": "none", "by": "A"}]"""));
      s.set(
          "anchors",
          mapper.readTree(
              """
              [{"type": "rated", "id": "R1",
                "place": {"at": [0, 30], "ground_m": 0, "fix": "tapes", "stated_error_m": null},
                "sling_height_m": 1, "rejected": null, "land": null,
                "breaking_load_N": 200000, "vouched_by": "A"}]"""));
      s.set(
          "offer",
          mapper.readTree(
              """
              {"attach_heights_m": [6], "attach_how": "measured", "lay_step_deg": 5,
               "lays_deg": [], "redirects": 0, "attach_range": null, "hinge_range": null}"""));
      ((ObjectNode) s.get("gear"))
          .set(
              "sources",
              mapper.readTree(
                  """
                  [{"id": "steady", "plugin": "steady", "places": ["R1"], "drivers": [],
                    "driver_places": [], "parameters": {"pull_N": %s}}]"""
                      .formatted(pullN)));
      change.accept(s);
      return SiteFile.read(s.toString().getBytes(StandardCharsets.UTF_8), "tiny");
    } catch (IOException e) {
      throw new UncheckedIOException(e);
    }
  }

  private static synchronized ObjectNode demo(ObjectMapper mapper) throws IOException {
    if (demo == null) {
      demo = (ObjectNode) mapper.readTree(DEMO.toFile());
    }
    return demo;
  }

  static Site site(double pullN) {
    return site(pullN, s -> {});
  }

  private static void number(ObjectNode of, String field, double value) {
    ((ObjectNode) of.get(field)).put("value", value);
  }

  /** Adds a thing to a list of the site. */
  static void add(ObjectNode site, String list, String json) {
    try {
      ((ArrayNode) site.get(list)).add(new ObjectMapper().readTree(json));
    } catch (IOException e) {
      throw new UncheckedIOException(e);
    }
  }
}
