package org.fallwright.ui.demo;

import static org.assertj.core.api.Assertions.assertThat;

import com.fasterxml.jackson.databind.node.ObjectNode;
import java.nio.charset.StandardCharsets;
import java.util.List;
import org.fallwright.core.plan.Exhaustive;
import org.fallwright.core.plan.Plan;
import org.fallwright.core.plan.PlanJson;
import org.fallwright.core.plan.Planner;
import org.fallwright.core.site.Site;
import org.junit.jupiter.api.Test;

/** The quick search against the exhaustive one, with the plugins as they are shipped. */
class DemoSearchTest {
  private static void compare(Site site) {
    assertThat(written(site, new Planner(DemoSite.sources()).plan(site)))
        .isEqualTo(written(site, new Exhaustive(DemoSite.sources()).plan(site)));
  }

  private static String written(Site site, Plan plan) {
    PlanJson.Header header = new PlanJson.Header("test", List.of(), List.of());
    return new String(PlanJson.write(site, plan, header), StandardCharsets.UTF_8);
  }

  @Test
  void theDemoIsFoundAlike() {
    compare(DemoSite.asItIs().lays(15, 3, 7, 342).site());
  }

  @Test
  void soItIsWithTwoBlocksAndWithAVoltageThatNobodyStated() {
    compare(
        DemoSite.asItIs()
            .lays(45, 3, 342)
            .voltageBlank()
            .with(s -> ((ObjectNode) s.get("offer")).put("redirects", 2))
            .site());
  }
}
