package org.fallwright.ui.particulars;

import static org.assertj.core.api.Assertions.assertThat;

import com.fasterxml.jackson.databind.node.ObjectNode;
import org.fallwright.core.site.Site;
import org.fallwright.ui.demo.DemoSite;
import org.fallwright.ui.text.Amounts;
import org.junit.jupiter.api.Test;

class EnteredTest {
  private final Entered metric = metric(DemoSite.asItIs());

  private static Entered metric(DemoSite demo) {
    return Entered.of(demo.site(), new Amounts(Site.Display.METRIC));
  }

  @Test
  void theFiveFieldNumbersComeWithHowTheyWereGot() {
    assertThat(metric.numbers())
        .extracting(Entered.Line::name)
        .containsExactly("Girth", "Height", "Lean", "Towards", "Line at");
    assertThat(metric.numbers().get(0).value()).isEqualTo("163.4 cm (DBH 52.0 cm)");
    assertThat(metric.numbers()).extracting(Entered.Line::note).containsOnly("measured");
  }

  @Test
  void whatNobodyLookedForIsNotNone() {
    Entered two = metric(DemoSite.asItIs().notLooked("buried-services").notLooked("other-targets"));
    assertThat(two.looked()).hasSize(4);
    assertThat(two.notSaid()).isEqualTo(2);
    assertThat(two.looked().stream().filter(Entered.Line::open))
        .hasSize(2)
        .extracting(Entered.Line::value)
        .containsOnly("not said");
    assertThat(metric.notSaid()).isZero();
    assertThat(metric.looked()).hasSize(4).noneMatch(Entered.Line::open);
  }

  @Test
  void everyFigureThatTheToolFillsInIsNamed() {
    Entered bare =
        metric(
            DemoSite.asItIs()
                .with(
                    s -> {
                      ObjectNode tree = (ObjectNode) s.get("tree");
                      tree.putNull("mass_centre_m").putNull("crown_area_m2");
                      ((ObjectNode) s.get("cut")).putNull("hinge_width_m");
                    }));
    assertThat(metric.defaults()).hasSize(6);
    assertThat(bare.defaults())
        .hasSize(9)
        .containsAll(metric.defaults())
        .contains("wind from the worst side")
        .doesNotContain("mass from the equation");
  }
}
