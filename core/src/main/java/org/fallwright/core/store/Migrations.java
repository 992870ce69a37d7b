package org.fallwright.core.store;

import com.fasterxml.jackson.databind.JsonNode;
import com.fasterxml.jackson.databind.node.ObjectNode;
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
    absent(site, "strips", site.arrayNode());
    if (site.path("offer") instanceof ObjectNode offer) {
      absent(offer, "attach_range", offer.nullNode());
      absent(offer, "hinge_range", offer.nullNode());
    }
  }

  private static void absent(ObjectNode of, String field, JsonNode value) {
    if (!of.has(field)) {
      of.set(field, value);
    }
  }
}
