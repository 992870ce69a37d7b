package org.fallwright.ui.particulars;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.List;
import org.fallwright.core.site.Site;
import org.fallwright.ui.demo.DemoSite;
import org.fallwright.ui.demo.WeighedTree;
import org.fallwright.ui.text.Amounts;
import org.fallwright.ui.text.Messages;
import org.junit.jupiter.api.Test;

class WeighedEnteredTest {
  private static List<String> defaults(Site site) {
    return Entered.of(site, new Amounts(site.display())).defaults();
  }

  @Test
  void whatIsWeighedOrDrawnIsNoDefault() {
    assertThat(defaults(WeighedTree.SITE))
        .doesNotContain(
            Messages.text("default.mass"),
            Messages.text("default.mass-centre"),
            Messages.text("default.crown-offset"),
            Messages.text("default.crown-share"))
        .contains(Messages.text("default.crown-share-by-dbh"));
  }

  @Test
  void aTreeWithoutMassOrCrownOffsetStandsOnDefaults() {
    Site bare =
        DemoSite.asItIs()
            .with(
                tree ->
                    ((com.fasterxml.jackson.databind.node.ObjectNode) tree.get("tree"))
                        .putNull("mass_kg")
                        .putNull("mass_centre_m"))
            .site();
    assertThat(defaults(bare))
        .contains(
            Messages.text("default.mass"),
            Messages.text("default.mass-centre"),
            Messages.text("default.crown-offset"),
            Messages.text("default.crown-share"));
  }
}
