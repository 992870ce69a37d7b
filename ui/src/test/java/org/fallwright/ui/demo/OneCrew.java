package org.fallwright.ui.demo;

import com.fasterxml.jackson.databind.node.ObjectNode;
import org.fallwright.core.plan.Plan;
import org.fallwright.core.plan.Planner;
import org.fallwright.core.site.Site;

/** The demo site with nobody but a crew on a hand line, which cannot pull it over: all fails. */
public final class OneCrew {
  public static final Site SITE =
      DemoSite.asItIs()
          .with(
              tree -> {
                var sources = tree.get("gear").get("sources").elements();
                while (sources.hasNext()) {
                  if (!sources.next().get("id").asText().equals("crew")) {
                    sources.remove();
                  }
                }
                ObjectNode offer = (ObjectNode) tree.get("offer");
                offer.put("lay_step_deg", 90.0);
                offer.putArray("lays_deg").add(3.0);
              })
          .site();

  public static final Plan PLAN = new Planner(DemoSite.sources()).plan(SITE);

  private OneCrew() {}
}
