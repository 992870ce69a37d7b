package org.fallwright.ui.particulars;

import static org.assertj.core.api.Assertions.assertThat;

import java.io.IOException;
import java.util.ArrayList;
import java.util.List;
import javax.swing.JCheckBox;
import javax.swing.SwingUtilities;
import org.fallwright.core.kit.Kit;
import org.fallwright.core.site.LeftBehind;
import org.fallwright.core.site.Site;
import org.fallwright.core.store.KitFile;
import org.fallwright.ui.demo.DemoSite;
import org.junit.jupiter.api.Test;

class GearPanelTest {
  private final Site site = DemoSite.asItIs().site();
  private final Kit kit = KitFile.beside(site, DemoSite.FILE).orElseThrow();

  GearPanelTest() throws IOException {}

  @Test
  void everyThingHasABoxAndALeftOneIsNotTicked() throws Exception {
    SwingUtilities.invokeAndWait(
        () -> {
          GearPanel panel = new GearPanel();
          List<String> told = new ArrayList<>();
          panel.onTicked((item, atHand) -> told.add(item + " " + atHand));
          panel.show(GearAtHand.of(site, kit, Site.Display.US));
          assertThat(panel.boxes()).hasSize(site.gear().items().size());
          assertThat(panel.boxes()).allMatch(JCheckBox::isSelected);
          JCheckBox first = panel.boxes().get(0);
          first.doClick();
          assertThat(told).containsExactly("L1 false");
          Site left = site.leaving(new LeftBehind("L1", null));
          panel.show(GearAtHand.of(left, kit, Site.Display.US));
          assertThat(panel.boxes().get(0)).isSameAs(first);
          assertThat(first.isSelected()).isFalse();
          panel.show(GearAtHand.of(left, kit, Site.Display.METRIC));
          assertThat(panel.boxes().get(0)).isNotSameAs(first);
          assertThat(panel.boxes().get(0).isSelected()).isFalse();
        });
  }

  @Test
  void theKitIsNamedWithWhatDiffersOrAsNotThere() {
    assertThat(GearAtHand.of(site, kit, Site.Display.US).kit())
        .containsExactly("From the kit two-trucks.fallkit.json.");
    assertThat(GearAtHand.of(site, null, Site.Display.US).kit())
        .singleElement()
        .asString()
        .startsWith("The kit two-trucks.fallkit.json is not beside the site file");
    Site other = DemoSite.asItIs().with(s -> number(s)).site();
    assertThat(GearAtHand.of(other, kit, Site.Display.METRIC).kit())
        .contains("L1: length is 75.0 m on the site and 80.0 m in the kit.");
  }

  private static void number(com.fasterxml.jackson.databind.node.ObjectNode s) {
    ((com.fasterxml.jackson.databind.node.ObjectNode) s.at("/gear/lines/0")).put("length_m", 75.0);
  }
}
