package org.fallwright.ui.demo;

import com.fasterxml.jackson.databind.node.ArrayNode;
import com.fasterxml.jackson.databind.node.ObjectNode;
import org.fallwright.core.site.Site;

/**
 * The demo site with its tree weighed in pieces and its crown drawn from above: a square of 8 m
 * with its middle 4 m east and 3 m north of the stump.
 */
public final class WeighedTree {
  public static final Site SITE =
      DemoSite.asItIs()
          .with(
              tree -> {
                ObjectNode t = (ObjectNode) tree.get("tree");
                t.putNull("mass_kg").putNull("mass_centre_m");
                t.putArray("sections").addObject().put("mass_kg", 3000).put("mid_height_m", 6);
                ArrayNode points =
                    t.putObject("crown_outline").put("type", "polygon").putArray("points");
                points.addArray().add(16).add(23);
                points.addArray().add(24).add(23);
                points.addArray().add(24).add(31);
                points.addArray().add(16).add(31);
              })
          .site();

  private WeighedTree() {}
}
