package org.fallwright.ui.setups;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.ArrayList;
import java.util.Collections;
import java.util.Comparator;
import java.util.List;
import java.util.Map;
import java.util.stream.IntStream;
import org.fallwright.core.plan.Judged;
import org.fallwright.core.plan.Plan;
import org.fallwright.core.plan.Setup;
import org.fallwright.core.plan.Verdict;
import org.fallwright.core.site.Site;
import org.fallwright.ui.demo.DemoSite;
import org.fallwright.ui.text.Amounts;
import org.junit.jupiter.api.Test;

class WaysTest {
  private final Plan plan = DemoSite.coarse(Site.Display.METRIC).plan();
  private final Ways ways = Ways.of(plan, new Amounts(Site.Display.METRIC));

  @Test
  void ranksCountUpAndReasonsComeMostOftenFirst() {
    assertThat(ways.ranked())
        .extracting(Ways.Row::lead)
        .containsExactlyElementsOf(
            IntStream.rangeClosed(1, ways.ranked().size()).mapToObj(String::valueOf).toList());
    assertThat(ways.ranked())
        .extracting(Ways.Row::setup)
        .containsExactlyElementsOf(plan.ranked().subList(0, ways.ranked().size()));
    Map<String, Integer> reasons = plan.byBindingCheck();
    List<Integer> counts = new ArrayList<>();
    for (Ways.Row r : ways.ruledOut()) {
      // the first check that it misses, in the fixed order of the checks
      String check =
          r.setup().checks().stream()
              .filter(c -> c.verdict() == Verdict.NOT_WORKABLE)
              .findFirst()
              .orElseThrow()
              .id();
      assertThat(r.title()).isEqualTo(Way.name(check) + "  (" + reasons.get(check) + ")");
      counts.add(reasons.get(check));
    }
    assertThat(counts).isSortedAccordingTo(Comparator.reverseOrder()).hasSize(reasons.size());
    assertThat(ways.ruledOut().get(0).title()).startsWith("Clear of House");
    assertThat(ways.ruledOut())
        .filteredOn(r -> r.title().startsWith("Anchor A2 at plan"))
        .extracting(Ways.Row::detail)
        .allMatch(d -> d.startsWith("nearest: ") && d.contains("A2"));
    int workable = plan.byVerdict().get(Verdict.WORKABLE);
    int tight = plan.byVerdict().get(Verdict.TIGHT);
    assertThat(workable).isPositive().isNotEqualTo(tight);
    assertThat(ways.summary())
        .isEqualTo(
            plan.judged() + " setups judged: " + workable + " workable, " + tight + " tight");
  }

  @Test
  void aWayTellsItsLayLineAndHinge() {
    Ways.Row first = ways.ranked().get(0);
    assertThat(first.title()).isEqualTo("Hand-winch at A3 over A1");
    assertThat(first.detail()).isEqualTo("lay 000°, line L2 at 10.5 m, hinge 45 mm");
    assertThat(first.margin()).isEqualTo("1.46");
  }

  @Test
  void aSourceThatCanBeRunInMoreThanOneWayTellsHow() {
    assertThat(Way.title(DemoSite.ROW_4)).isEqualTo("pickup (awd) at V1");
    assertThat(Way.title(DemoSite.ROW_6)).isEqualTo("hand-winch at A3 over A1");
  }

  @Test
  void aDrivenTackleNamesItsDriver() {
    Setup s = DemoSite.tackle(3, "3", "pickup", "pull", "V1");
    assertThat(Way.title(s)).isEqualTo("tackle (3) at A1 by pickup at V1");
  }

  @Test
  void ofManyWaysThatDoNotWorkOnlySomeAreListed() {
    List<Verdict> all = plan.ranked().stream().map(Judged::verdict).toList();
    assertThat(Collections.frequency(all, Verdict.NOT_WORKABLE)).isGreaterThan(50);
    assertThat(ways.ranked())
        .filteredOn(r -> r.verdict() == Verdict.NOT_WORKABLE)
        .hasSize(12)
        .hasSizeLessThan(ways.ranked().size());
    assertThat(ways.ranked())
        .filteredOn(r -> r.verdict() != Verdict.NOT_WORKABLE)
        .hasSize(all.indexOf(Verdict.NOT_WORKABLE));
  }
}
