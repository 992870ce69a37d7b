package org.fallwright.ui.sheet;

import static org.assertj.core.api.Assertions.assertThat;

import com.fasterxml.jackson.databind.node.ObjectNode;
import org.fallwright.core.site.Site;
import org.fallwright.ui.demo.DemoSite;
import org.fallwright.ui.demo.WeighedTree;
import org.junit.jupiter.api.Test;

class DoubtsTest {
  @Test
  void weighedPiecesAreNoDefaults() {
    assertThat(defaults(WeighedTree.SITE)).doesNotContain("mass").contains("sound stem");
  }

  @Test
  void aMassNobodyEnteredIsADefault() {
    Site bare =
        DemoSite.asItIs()
            .with(
                tree -> ((ObjectNode) tree.get("tree")).putNull("mass_kg").putNull("mass_centre_m"))
            .site();
    assertThat(defaults(bare)).contains("mass, mass centre, ");
  }

  private static String defaults(Site site) {
    return Entered.doubts(site).stream()
        .filter(l -> l.startsWith("Defaults: "))
        .findFirst()
        .orElseThrow();
  }
}
