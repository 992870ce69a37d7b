package org.fallwright.core.store;

import com.fasterxml.jackson.databind.JsonNode;
import com.fasterxml.jackson.databind.node.ObjectNode;
import java.util.stream.Stream;
import org.fallwright.core.site.Site;

/**
 * Brings a site of an older form to the present one, a step at a time. A step adds what the older
 * form did not have, with the value that says the same as before; it changes no verdict. What is
 * not there or not of the right kind it leaves alone, for the reader to refuse.
 */
final class Migrations {
  private Migrations() {}

  /** The same site in the present form; the tree given is changed. */
  static JsonNode toPresent(JsonNode root) {
    if (root.path("version").intValue() == 1) {
      fromFormOne((ObjectNode) root);
    }
    return root;
  }

  private static void fromFormOne(ObjectNode site) {
    site.put("version", Site.VERSION);
    if (!site.has("kit")) {
      site.putNull("kit");
    }
    if (!site.has("left_behind")) {
      site.putArray("left_behind");
    }
    if (site.path("tree") instanceof ObjectNode tree && !tree.has("mass_by")) {
      tree.put("mass_by", "equation");
    }
    if (site.path("picture") instanceof ObjectNode picture) {
      absent(picture, "shift_east_m", 0);
      absent(picture, "shift_north_m", 0);
      absent(picture, "opacity", 1);
      if (!picture.has("over")) {
        picture.putArray("over");
      }
    }
    JsonNode gear = site.path("gear");
    objects(gear.path("lines")).forEach(GearOfFormOne::line);
    objects(gear.path("blocks")).forEach(GearOfFormOne::block);
    objects(gear.path("slings")).forEach(GearOfFormOne::sling);
    objects(gear.path("connectors")).forEach(GearOfFormOne::connector);
    if (gear.path("load_cell") instanceof ObjectNode cell && !cell.has("at")) {
      cell.put("at", "source-end");
    }
    for (String list :
        new String[] {"cases", "revisions", "tape_ties", "people_points", "exceptions"}) {
      if (!site.has(list)) {
        site.putArray(list);
      }
    }
    if (!site.has("zones")) {
      site.putObject("zones").putNull("slide_m").putNull("people_radius").putNull("energy");
    }
    if (!site.has("strips")) {
      site.putArray("strips");
    }
    if (site.path("offer") instanceof ObjectNode offer) {
      for (String range : new String[] {"attach_range", "hinge_range"}) {
        if (!offer.has(range)) {
          offer.putNull(range);
        }
      }
    }
  }

  private static void absent(ObjectNode in, String field, double value) {
    if (!in.has(field)) {
      in.put(field, value);
    }
  }

  private static Stream<ObjectNode> objects(JsonNode list) {
    return list.valueStream().filter(ObjectNode.class::isInstance).map(ObjectNode.class::cast);
  }
}
