package org.fallwright.ui.demo;

import static org.assertj.core.api.Assertions.assertThat;

import java.io.IOException;
import java.util.List;
import org.fallwright.core.kit.Differences;
import org.fallwright.core.kit.Kit;
import org.fallwright.core.kit.LoadOut;
import org.fallwright.core.plan.Check;
import org.fallwright.core.plan.Judge;
import org.fallwright.core.plan.Judged;
import org.fallwright.core.plan.Setup;
import org.fallwright.core.plan.Verdict;
import org.fallwright.core.site.LeftBehind;
import org.fallwright.core.site.Site;
import org.fallwright.core.store.KitFile;
import org.junit.jupiter.api.Test;

/** The demo's kit, and the demo without its long line. */
class KitDemoTest {
  private final Site whole = DemoSite.asItIs().in(Site.Display.METRIC).site();
  private final Site without = whole.leaving(new LeftBehind("L1", "Truck 2"));

  private static Setup on(String line, Setup s) {
    return new Setup(
        s.layDeg(),
        s.attachHeightM(),
        s.hingeThicknessM(),
        line,
        s.redirects(),
        s.source(),
        s.mode(),
        s.place(),
        s.driver());
  }

  private static Judged judged(Site site, Setup setup) {
    return new Judge(site, DemoSite.sources()).judge(setup);
  }

  private static Check length(Judged j) {
    return j.checks().stream().filter(c -> c.id().equals("line length")).findFirst().orElseThrow();
  }

  @Test
  void theKitBesideTheDemoIsTheDemosGear() throws IOException {
    Kit kit = KitFile.beside(whole, DemoSite.FILE).orElseThrow();
    assertThat(kit.trucks()).hasSize(2);
    assertThat(Differences.of(whole, kit)).isEmpty();
    assertThat(kit.trucksOf("L1")).contains("Truck 2");
  }

  @Test
  void withoutTheLongLineTheWinchStillReachesByItsWire() {
    Judged row6 = judged(without, on("L2", DemoSite.ROW_6));
    assertThat(row6.verdict()).isEqualTo(Verdict.WORKABLE);
    assertThat(length(row6).value()).isEqualTo(65);
    assertThat(length(row6).limit()).isBetween(59.5, 60.0);
    assertThat(row6.checks()).extracting(Check::id).doesNotContain("joint");
  }

  @Test
  void withoutTheLongLineThePickUpMustStandNearer() {
    Judged row4 = judged(without, on("L2", DemoSite.ROW_4));
    assertThat(row4.verdict()).isEqualTo(Verdict.NOT_WORKABLE);
    assertThat(length(row4).limit()).isBetween(46.0, 46.5);
    assertThat(length(row4).why())
        .isEqualTo(
            "Line L2 reaches 45.0 m; the path with wraps and tails needs 46.1 m: stand 1.50 m"
                + " nearer, or take L1 (80.0 m, on Truck 2).");
    assertThat(length(judged(without.in(Site.Display.US), on("L2", DemoSite.ROW_4))).why())
        .endsWith(": stand 4 ft 0 in nearer, or take L1 (262 ft, on Truck 2).");
    assertThat(judged(whole, on("L1", DemoSite.ROW_4)).verdict()).isEqualTo(Verdict.WORKABLE);
  }

  @Test
  void standingThatMuchNearerIsEnough() {
    Site nearer =
        DemoSite.asItIs()
            .with(
                s ->
                    ((com.fasterxml.jackson.databind.node.ObjectNode) s.at("/spots/0/place"))
                        .putArray("at")
                        .add(21.5 - 1.5 * 0.13)
                        .add(66.0 - 1.5 * 0.99))
            .site()
            .leaving(new LeftBehind("L1", null));
    Check fits = length(judged(nearer, on("L2", DemoSite.ROW_4)));
    assertThat(fits.verdict()).isEqualTo(Verdict.WORKABLE);
    assertThat(fits.ratio()).isBetween(1.0, 1.02);
  }

  @Test
  void theLoadOutOfTheWinchNamesWhatItNeedsByTruck() throws IOException {
    Kit kit = KitFile.beside(whole, DemoSite.FILE).orElseThrow();
    LoadOut list = LoadOut.of(without, List.of(judged(without, on("L2", DemoSite.ROW_6))), kit);
    LoadOut.Truck first = list.trucks().get(0);
    assertThat(first.needed())
        .extracting(LoadOut.Row::item)
        .containsExactly("LC1", "L2", "Block", "Slings", "Shackles", "hand-winch");
    assertThat(first.needed()).extracting(LoadOut.Row::count).containsExactly(1, 1, 1, 2, 2, 1);
    assertThat(first.needed().get(1))
        .extracting(LoadOut.Row::length, LoadOut.Row::rating, LoadOut.Row::shelf)
        .containsExactly("45.0 m", "breaks at 120 kN", "left 1");
    assertThat(list.trucks().get(1).needed()).isEmpty();
    assertThat(list.trucks().get(1).spare()).extracting(LoadOut.Row::count).containsExactly(2);
    assertThat(list.leftBehind()).containsExactly("L1, Truck 2");
    assertThat(list.notes()).isEmpty();
    LoadOut unknown = LoadOut.of(whole, List.of(judged(whole, DemoSite.ROW_4)), null);
    assertThat(unknown.trucks())
        .singleElement()
        .extracting(LoadOut.Truck::name)
        .isEqualTo("All gear");
    assertThat(unknown.trucks().get(0).needed())
        .extracting(LoadOut.Row::item)
        .containsExactly("L1", "LC1", "pickup");
    assertThat(unknown.notes()).hasSize(1);
  }
}
