package org.fallwright.core.store;

import com.fasterxml.jackson.databind.JsonNode;
import com.fasterxml.jackson.databind.node.ObjectNode;
import java.util.Locale;
import java.util.Set;

/**
 * The gear of form 1 in the words of form 2: its bare factors become stated ones with the same
 * value, its slings are rated as rigged, its connectors as they are loaded.
 */
final class GearOfFormOne {
  private static final Set<String> FIBRES =
      Set.of("nylon", "polyester", "hmpe", "polypropylene", "manila");
  private static final String SAID = "as entered in a file of form 1";
  private static final int LONGEST_QUOTE = 120;

  private GearOfFormOne() {}

  static void line(ObjectNode line) {
    JsonNode wire = line.remove("wire_rope");
    if (wire == null) {
      return;
    }
    String said = SAID;
    if (line.path("material").isTextual() && wire.isBoolean()) {
      String material = line.get("material").textValue();
      String word = material(material.strip().toLowerCase(Locale.ROOT), wire.booleanValue());
      if (!word.equalsIgnoreCase(material)) {
        said += ", of " + material.substring(0, Math.min(LONGEST_QUOTE, material.length()));
      }
      line.put("material", word);
    }
    JsonNode ends = line.remove("termination_factor");
    for (String end : new String[] {"tree_end", "source_end"}) {
      if (ends != null) {
        stated(line.putObject(end).put("kind", "other"), "stated", ends, said);
      }
    }
    stated(line, "bend", line.remove("bend_factor"), said);
    line.put("wet", false);
    line.put("weathered", false);
    stated(line, "age", line.remove("age_factor"), said);
  }

  /**
   * The word for a material; the weaker core and the fibre that unmarked cordage counts as stand
   * for what has none, since breaking load and stiffness were entered in any case.
   */
  private static String material(String text, boolean wire) {
    if (wire) {
      return text.contains("steel core") ? "wire-steel-core" : "wire-fibre-core";
    }
    return FIBRES.contains(text) ? text : "polypropylene";
  }

  static void block(ObjectNode block) {
    if (block.has("sheave")) {
      return;
    }
    block.put("sheave", "other");
    block.putNull("sheave_diameter_m");
    stated(block, "efficiency", block.remove("efficiency"), SAID);
  }

  static void sling(ObjectNode sling) {
    if (sling.has("kind")) {
      return;
    }
    sling.put("kind", "other").put("hitch", "as-rigged").putNull("diameter_m").putNull("angle_deg");
  }

  static void connector(ObjectNode connector) {
    if (connector.has("kind")) {
      return;
    }
    connector.put("kind", "rated").putNull("body_diameter_m").put("aside_deg", 0);
  }

  private static void stated(ObjectNode in, String field, JsonNode value, String why) {
    if (value != null) {
      in.putObject(field).put("why", why).set("value", value);
    }
  }
}
