package org.fallwright.core.plan;

import com.fasterxml.jackson.databind.JsonNode;
import com.fasterxml.jackson.databind.node.ArrayNode;
import com.fasterxml.jackson.databind.node.JsonNodeFactory;
import com.fasterxml.jackson.databind.node.ObjectNode;
import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import java.util.Random;
import org.fallwright.core.site.Site;

/**
 * Small sites from a seed, each with few setups: anchors of several kinds, targets, wires, drop
 * zones, spots, strips, sources of every kind, none to two redirects, ranges of heights and hinges.
 * Some things are there twice, so that setups are equally good.
 */
final class PlanSites {
  private static final JsonNodeFactory NODES = JsonNodeFactory.instance;

  private static final String TREE = "tree";

  private final Random random;
  private final List<String> anchors = new ArrayList<>();
  private final List<String> spots = new ArrayList<>();

  private PlanSites(long seed) {
    random = new Random(seed);
  }

  static Site site(long seed) {
    PlanSites of = new PlanSites(seed);
    return TinySite.site(1000, of::fill);
  }

  private double in(double least, double most) {
    return least + random.nextDouble() * (most - least);
  }

  private boolean one(int in) {
    return random.nextInt(in) == 0;
  }

  private String at(double eastFrom, double eastTo, double northFrom, double northTo) {
    return point(in(eastFrom, eastTo), in(northFrom, northTo));
  }

  private static String point(double e, double n) {
    return String.format(Locale.ROOT, "[%.2f, %.2f]", e, n);
  }

  private String place(String at) {
    return String.format(
        Locale.ROOT,
        "{\"at\": %s, \"ground_m\": %.2f, \"fix\": \"tapes\", \"stated_error_m\": %s}",
        at,
        one(5) ? in(-6, 3) : in(-0.5, 0.5),
        one(3) ? "0" : "null");
  }

  private void fill(ObjectNode s) {
    s.put("rule_set", one(3) ? "DE-DGUV" : "US-OSHA");
    ((ObjectNode) s.at("/tree/lean_deg")).put("value", in(0.5, 6));
    ((ObjectNode) s.at("/conditions/gust_mps")).put("value", one(3) ? in(0, 12) : 0);
    ((ObjectNode) s.get("cut")).put("wedges", one(4));
    if (one(6)) {
      s.putArray("looked");
    }
    anchors(s);
    things(s);
    spots(s);
    offer((ObjectNode) s.get("offer"));
    gear((ObjectNode) s.get("gear"));
    stated(s);
  }

  /** What people have said and measured beside the plan. */
  private void stated(ObjectNode s) {
    ObjectNode zones = (ObjectNode) s.get("zones");
    if (one(3)) {
      zones.putNull("energy");
    } else {
      ((ObjectNode) zones.get("energy")).put("up_to_j", in(50, 3_000));
    }
    if (one(4)) {
      zones.put("slide_m", in(0, 5));
    }
    if (one(5)) {
      zones.put("people_radius", in(1, 3));
    }
    ArrayNode exceptions = s.putArray("exceptions");
    for (String check :
        List.of(
            "operator distance",
            "clear of Thing 0",
            "line clear of Thing 0",
            "line clear of Thing 1, leg 2",
            "clear of A0",
            "inside Zone",
            "pull")) {
      if (one(4)) {
        exceptions
            .addObject()
            .put("check", check)
            .put("why", "so")
            .put("by", "A")
            .put("when", "now");
      }
    }
    if (one(4)) {
      JsonNode all =
          s.at("/gear/" + List.of("lines", "slings", "connectors").get(random.nextInt(3)));
      s.putArray("left_behind")
          .addObject()
          .put("item", all.get(random.nextInt(all.size())).get("id").asText())
          .putNull("where");
    }
    if (!s.get("targets").isEmpty() && one(3)) {
      JsonNode at = s.at("/targets/0/shape/points/0");
      tie(s, TREE, at);
      tie(s, "A0", at);
    }
    if (one(8)) {
      ((ObjectNode) s.at("/tree/lean_deg")).put("how", "range").put("plus_minus", in(0, 0.5));
    }
    if (one(8)) {
      ((ObjectNode) s.at("/tree/height_m")).put("how", "range").put("plus_minus", in(0, 1));
    }
  }

  private void tie(ObjectNode s, String from, JsonNode at) {
    ObjectNode tie = ((ArrayNode) s.get("tape_ties")).addObject();
    tie.put("from", from.equals(TREE) ? s.at("/tree/id").asText() : from).putNull("from_at");
    tie.put("to", "Thing 0").set("to_at", at);
    JsonNode end = s.at(from.equals(TREE) ? "/tree/stump/at" : "/anchors/0/place/at");
    double east = at.get(0).asDouble() - end.get(0).asDouble();
    double north = at.get(1).asDouble() - end.get(1).asDouble();
    tie.put("distance_m", Math.hypot(east, north) + (one(3) ? in(0, 2) : 0));
    tie.putNull("stated_error_m");
  }

  private void anchors(ObjectNode s) {
    ((ArrayNode) s.get("anchors")).removeAll();
    int n = 1 + random.nextInt(3);
    for (int i = 0; i < n; i++) {
      String id = "A" + i;
      anchors.add(id);
      // some within the tree's reach, to hang up in
      String place = place(one(5) ? at(-9, 9, 10, 15) : at(-15, 15, 18, 45));
      String rejected = one(8) ? "\"it moved\"" : "null";
      TinySite.add(
          s,
          "anchors",
          switch (random.nextInt(7)) {
            case 0, 1 ->
                String.format(
                    Locale.ROOT,
                    """
                    {"type": "rated", "id": "%s", "place": %s, "sling_height_m": %.2f,
                     "rejected": %s, "land": null, "breaking_load_N": %.0f, "vouched_by": "A"}""",
                    id,
                    place,
                    in(0.2, 2),
                    rejected,
                    in(8_000, 300_000));
            case 2, 3 ->
                String.format(
                    Locale.ROOT,
                    """
                    {"type": "tree", "id": "%s", "place": %s, "sling_height_m": %.2f,
                     "rejected": %s, "land": "owner", "species": "white-oak", "dbh_m": %.2f,
                     "height_m": 16, "crown_base_m": %.2f, "crown_radius_m": 3,
                     "soil": "free-draining-mineral", "deep_rooting": false, "saturated": %s,
                     "condition": "sound", "tie_back": false}""",
                    id,
                    place,
                    in(0.2, 1.5),
                    rejected,
                    in(0.2, 0.7),
                    in(1, 8),
                    one(2));
            case 4 ->
                String.format(
                    Locale.ROOT,
                    """
                    {"type": "vehicle", "id": "%s", "place": %s, "sling_height_m": 0.5,
                     "rejected": %s, "land": null, "mass_kg": %.0f, "surface": "compact-gravel",
                     "wet": %s, "uphill_deg": 0, "rated_point_N": 40000}""",
                    id,
                    place,
                    rejected,
                    in(1_500, 15_000),
                    one(2));
            default ->
                String.format(
                    Locale.ROOT,
                    """
                    {"type": "stump", "id": "%s", "place": %s, "sling_height_m": 0.3,
                     "rejected": %s, "land": "owner", "species": "eastern-white-pine",
                     "diameter_m": 0.4, "once_height_m": 15.0, "once_mass_kg": %.0f,
                     "soil": "free-draining-mineral", "deep_rooting": false, "saturated": false,
                     "condition": "sound"}""",
                    id,
                    place,
                    rejected,
                    in(200, 2_000));
          });
    }
    if (n > 1 && one(4)) {
      anchors.add("both");
      TinySite.add(
          s,
          "anchors",
          String.format(
              Locale.ROOT,
              """
              {"type": "two-legs", "id": "both", "place": %s, "sling_height_m": 0.5,
               "rejected": null, "land": null, "first": "A0", "second": "A1"}""",
              place(at(-10, 10, 15, 18))));
    }
  }

  private void things(ObjectNode s) {
    String[] kinds = {"structure", "fence", "car", "road", "planting", "other"};
    int n = random.nextInt(4);
    for (int i = 0; i < n; i++) {
      double e = in(-25, 25);
      double north = in(-15, 35);
      double w = in(0.5, 6);
      TinySite.add(
          s,
          "targets",
          String.format(
              Locale.ROOT,
              """
              {"id": "Thing %d", "kind": "%s",
               "shape": {"type": "polygon", "points": [%s, %s, %s, %s]}, "fix": "tapes",
               "stated_error_m": null, "ground_m": 0, "height_m": %.1f,
               "required_distance_m": %.1f, "occupied": false, "may_be_hit": %s,
               "movable": false}""",
              i,
              kinds[random.nextInt(kinds.length)],
              point(e, north),
              point(e + w, north),
              point(e + w, north + w),
              point(e, north + w),
              in(0.5, 6),
              one(3) ? 0 : in(0.5, 2),
              one(5)));
    }
    if (one(3)) {
      double e = in(14, 40) * (one(2) ? 1 : -1);
      TinySite.add(
          s,
          "wires",
          String.format(
              Locale.ROOT,
              """
              {"id": "W", "voltage_kv": %s, "voltage_said_by": "its owner", "state": "%s",
               "poles": [{"at": %s, "ground_m": 0, "height_m": 9},
                         {"at": %s, "ground_m": 0, "height_m": 9}],
               "sag_m": 0.8, "fix": "tapes", "stated_error_m": null}""",
              one(4) ? "null" : "12.47",
              one(3) ? "dead-and-earthed" : "energized",
              point(e, -40),
              point(e + in(-9, 9), 50)));
    }
    if (one(4)) {
      double w = in(6, 30);
      TinySite.add(
          s,
          "drop_zones",
          String.format(
              Locale.ROOT,
              """
              {"id": "Zone", "shape": {"type": "polygon", "points": [%s, %s, %s, %s]}}""",
              point(-w, -3.2),
              point(w, -3.2),
              point(w, 22),
              point(-w, 22)));
    }
  }

  private void spots(ObjectNode s) {
    int n = random.nextInt(3);
    for (int i = 0; i < n; i++) {
      spots.add("S" + i);
      TinySite.add(
          s,
          "spots",
          String.format(
              Locale.ROOT,
              """
              {"id": "S%d", "place": %s, "heading_deg": %s, "surface": "grass", "wet": false,
               "grade_deg": 0, "run_out_m": null, "land": null}""",
              i,
              place(at(-12, 12, 20, 50)),
              one(2) ? "null" : "" + random.nextInt(40)));
    }
    if (one(3)) {
      spots.add("Lane");
      TinySite.add(
          s,
          "strips",
          String.format(
              Locale.ROOT,
              """
              {"id": "Lane", "points": [%s, %s], "fix": "tapes", "stated_error_m": null,
               "ground_from_m": 0, "ground_to_m": %.2f, "width_m": %s, "step_m": 12,
               "one_way": %s, "surface": "compact-gravel", "wet": false, "land": null}""",
              at(-8, 8, 22, 26),
              at(-8, 8, 34, 44),
              in(-1, 2),
              one(4) ? "18" : "3",
              one(2)));
    }
  }

  private void offer(ObjectNode offer) {
    offer.putArray("attach_heights_m").add(in(3, 7));
    offer.put("redirects", random.nextInt(3));
    offer.put("lay_step_deg", one(4) ? 45 : 90);
    offer.putArray("lays_deg").add(in(-10, 10) + 180 + (one(2) ? -180 + 10 : 170));
    if (one(10)) {
      offer.set("attach_range", steps(4, 6, 2));
    }
    if (one(10)) {
      offer.set("hinge_range", steps(0.02, 0.03, 0.01));
    }
  }

  private static ObjectNode steps(double from, double to, double step) {
    return NODES.objectNode().put("from_m", from).put("to_m", to).put("step_m", step);
  }

  private void gear(ObjectNode gear) {
    if (one(4)) {
      ((ArrayNode) gear.get("blocks")).addAll((ArrayNode) gear.get("blocks").deepCopy());
      ((ObjectNode) gear.at("/blocks/1")).put("id", "Another");
    }
    ((ObjectNode) gear.at("/lines/1")).put("length_m", in(20, 70));
    if (one(3)) {
      // two must be joined where the path is long
      ((ObjectNode) gear.at("/lines/0")).put("length_m", in(20, 50));
      ((ObjectNode) gear.at("/lines/2")).put("length_m", in(20, 50));
    }
    if (one(3)) {
      gear.putNull("load_cell");
    } else if (one(3)) {
      String[] at = {"source-end", "tree-end", "haul-part", "anchor"};
      ((ObjectNode) gear.get("load_cell")).put("at", at[random.nextInt(at.length)]);
    }
    if (one(3)) {
      ((ObjectNode) gear.at("/lines/1")).put("stiffness_N", in(1e5, 1e6));
    }
    ArrayNode sources = gear.putArray("sources");
    int n = 1 + random.nextInt(2);
    for (int i = 0; i < n; i++) {
      boolean spot = !spots.isEmpty() && one(2);
      String plugin =
          spot
              ? one(3) ? "swaying" : one(2) ? "steady" : "surging"
              : one(2) ? "steady" : one(2) ? "wired" : "elastic";
      source(sources, "source " + i, plugin, spot ? spots : anchors);
      if (one(8)) {
        // twins are equally good
        ObjectNode twin = sources.get(sources.size() - 1).deepCopy();
        sources.add(twin.put("id", "twin " + i));
      }
    }
    if (one(3)) {
      ObjectNode tackle = source(sources, "tackle", "doubled", anchors);
      tackle.putArray("drivers").add("source 0");
    }
  }

  private ObjectNode source(ArrayNode sources, String id, String plugin, List<String> places) {
    ObjectNode source = sources.addObject();
    source.put("id", id).put("plugin", plugin);
    ArrayNode at = source.putArray("places");
    at.add(places.get(random.nextInt(places.size())));
    if (one(3)) {
      String other = places.get(random.nextInt(places.size()));
      if (!other.equals(at.get(0).asText())) {
        at.add(other);
      }
    }
    source.putArray("drivers");
    source.putArray("driver_places");
    source.putObject("parameters").put("pull_N", Math.exp(in(Math.log(200), Math.log(30_000))));
    return source;
  }
}
